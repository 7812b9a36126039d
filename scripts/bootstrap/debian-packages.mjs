// @ts-check
import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { run, tail } from './run.mjs';
import { step } from './say.mjs';

// A user's PATH often leaves out sbin, where Debian puts the database server.
const ALSO_LOOKED_IN = ['/usr/local/sbin', '/usr/sbin', '/sbin', '/usr/bin'];

/** @typedef {{ name: string, commands: readonly string[] }} DebianPackage */

/** @type {readonly DebianPackage[]} */
export const DATABASE_PACKAGES = [
  { name: 'mariadb-server-core', commands: ['mariadbd', 'mariadb-install-db'] },
  { name: 'mariadb-client-core', commands: ['mariadb'] },
];

/** @type {readonly DebianPackage[]} */
export const BROWSER_PACKAGES = [{ name: 'chromium', commands: ['chromium'] }];

/**
 * Where a command is, or null.
 * @param {string} command
 * @param {string} [path] as in the environment variable PATH
 */
export function findCommand(command, path = process.env.PATH ?? '') {
  for (const folder of [...path.split(delimiter), ...ALSO_LOOKED_IN]) {
    if (!folder) continue;
    const file = join(folder, command);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {
      // Not in this folder; the next one may have it.
    }
  }
  return null;
}

/**
 * @param {readonly DebianPackage[]} packages
 * @param {(command: string) => string | null} [find]
 */
export function missingPackages(packages, find = findCommand) {
  return packages
    .filter(({ commands }) => commands.some((command) => !find(command)))
    .map(({ name }) => name);
}

/**
 * What has to be typed by someone who may install, to the letter.
 * @param {readonly string[]} names
 */
export function installCommand(names) {
  return `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${names.join(' ')}`;
}

/**
 * Installs what is missing, where that is allowed without asking anyone.
 * @param {readonly DebianPackage[]} packages
 */
export async function ensurePackages(packages) {
  const missing = missingPackages(packages);
  if (missing.length === 0) return;
  const names = missing.join(', ');
  if (!findCommand('apt-get')) {
    throw new Refusal(
      `Stillground needs ${names} and this system has no apt-get; install them by its own package manager and run the command again.`,
    );
  }
  const prefix = await installerPrefix();
  if (!prefix) {
    throw new Refusal(
      `Stillground needs ${names} and may not install them; run this, then the same command again: ${installCommand(missing)}`,
    );
  }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await step(`Installing ${names}`, async () => {
    for (const args of [
      ['update', '-q'],
      ['install', '-y', '-q', '--no-install-recommends', ...missing],
    ]) {
      const [command = '', ...rest] = [...prefix, 'apt-get', ...args];
      const { code, output } = await run(command, rest, { env });
      if (code !== 0) {
        throw new Refusal(
          `apt-get could not install ${names}; put right what it says and run the command again:\n${tail(output)}`,
        );
      }
    }
  });
}

/** How apt-get has to be called here, or null if nobody here may call it. */
async function installerPrefix() {
  if (process.getuid?.() === 0) return [];
  if (!findCommand('sudo')) return null;
  const { code } = await run('sudo', ['-n', 'true']);
  // `env` is spelt out because sudo drops the variable that keeps apt-get from asking questions.
  return code === 0 ? ['sudo', '-n', 'env', 'DEBIAN_FRONTEND=noninteractive'] : null;
}
