// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { tail } from './run.mjs';
import { step } from './say.mjs';
import { runTool } from './tool.mjs';

const STAMP = join('.next', 'stillground-build.json');

/** All that the built application is made of. */
const SOURCES = [
  'app',
  'components',
  'lib',
  'models',
  'public',
  'tiles',
  'demo',
  'proxy.ts',
  'instrumentation.ts',
  'next.config.ts',
  'tailwind.config.ts',
  'postcss.config.mjs',
  'tsconfig.json',
  'package-lock.json',
];

/**
 * One hash over names and contents of the sources, so that neither a touched file nor another
 * checkout of the same text calls for a build.
 * @param {string} root
 */
export function sourcesHash(root) {
  const hash = createHash('sha256').update(`node ${process.versions.node.split('.')[0]}\n`);
  for (const file of SOURCES.flatMap((name) => filesUnder(root, name)).sort()) {
    const content = readFileSync(join(root, file));
    hash.update(`${file}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/**
 * @param {string} root
 * @param {string} name
 * @returns {string[]}
 */
function filesUnder(root, name) {
  const found = statSync(join(root, name), { throwIfNoEntry: false });
  if (!found) return [];
  if (!found.isDirectory()) return [name];
  return readdirSync(join(root, name)).flatMap((inner) => filesUnder(root, join(name, inner)));
}

/** @param {string} root */
export function isBuilt(root) {
  return buildFault(root, sourcesHash(root)) === null;
}

/**
 * @param {string} root
 * @param {string} hash
 * @returns {string | null} why the build there can't be served
 */
function buildFault(root, hash) {
  const id = join(root, '.next', 'BUILD_ID');
  if (!existsSync(id)) return 'there is none';
  try {
    const stamp = JSON.parse(readFileSync(join(root, STAMP), 'utf8'));
    if (stamp.sources !== hash) return 'the sources have changed';
    return stamp.build === readFileSync(id, 'utf8') ? null : 'it was made by hand';
  } catch {
    return 'it was never finished';
  }
}

/**
 * Builds the application unless the build there is of these very sources.
 * @param {string} root
 * @param {NodeJS.ProcessEnv} env
 */
export async function ensureBuild(root, env) {
  const hash = sourcesHash(root);
  const fault = buildFault(root, hash);
  if (fault === null) return;
  rmSync(join(root, STAMP), { force: true });
  // Types left by a development server that was killed would fail the build's own type check.
  rmSync(join(root, '.next', 'dev', 'types'), { recursive: true, force: true });
  await step(`Building the application (${fault}; one to three minutes)`, async () => {
    const { code, output } = await runTool(root, 'next', ['build'], {
      env: { ...env, NODE_ENV: 'production' },
    });
    if (code !== 0) throw new Refusal(`The application could not be built:\n${tail(output, 60)}`);
  });
  const build = readFileSync(join(root, '.next', 'BUILD_ID'), 'utf8');
  writeFileSync(join(root, STAMP), JSON.stringify({ sources: hash, build }));
}
