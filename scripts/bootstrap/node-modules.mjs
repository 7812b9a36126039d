// @ts-check
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { run, tail } from './run.mjs';
import { step } from './say.mjs';

/** @typedef {{ version?: string, integrity?: string, optional?: boolean, devOptional?: boolean, peer?: boolean, link?: boolean }} Locked */

/**
 * Why node_modules is not what the lock says, or null. npm writes its own account of what it
 * installed, last of all, so that an interrupted installation has none.
 * @param {string} root
 * @returns {Promise<string | null>}
 */
export async function modulesFault(root) {
  const wanted = await packagesOf(join(root, 'package-lock.json'));
  if (!wanted) {
    throw new Refusal(
      'package-lock.json is missing or damaged; fetch it again with `git checkout package-lock.json`.',
    );
  }
  const installed = await packagesOf(join(root, 'node_modules', '.package-lock.json'));
  if (!installed) return 'nothing is installed';
  for (const [path, locked] of Object.entries(wanted)) {
    if (path === '') continue;
    const found = installed[path];
    if (!found) {
      // Optional packages are those of other machines: another processor, another system.
      if (locked.optional || locked.devOptional) continue;
      return `${path} is missing`;
    }
    if (found.version !== locked.version || found.integrity !== locked.integrity) {
      return `${path} is not the version in the lock`;
    }
  }
  return null;
}

/**
 * @param {string} file
 * @returns {Promise<Record<string, Locked> | null>}
 */
async function packagesOf(file) {
  try {
    return JSON.parse(await readFile(file, 'utf8')).packages ?? null;
  } catch {
    return null;
  }
}

/** @param {string} root */
export async function ensureModules(root) {
  const fault = await modulesFault(root);
  if (!fault) return;
  await step(`Installing the Node packages (${fault}; about two minutes)`, async () => {
    // Started through npm, the same npm goes on; otherwise whichever is found first.
    const npm = process.env.npm_execpath;
    const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    const { code, output } = npm
      ? await run(process.execPath, [npm, ...args], { cwd: root })
      : await run('npm', args, { cwd: root });
    if (code !== 0) {
      throw new Refusal(
        `npm ci failed; put right what it says and run the command again:\n${tail(output)}`,
      );
    }
  });
}
