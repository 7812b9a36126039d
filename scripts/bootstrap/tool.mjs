// @ts-check
import { join } from 'node:path';
import { run } from './run.mjs';

const ENTRY = {
  next: 'next/dist/bin/next',
  vitest: 'vitest/vitest.mjs',
  eslint: 'eslint/bin/eslint.js',
  prettier: 'prettier/bin/prettier.cjs',
  tsc: 'typescript/bin/tsc',
};

/** @typedef {keyof typeof ENTRY} Tool */

/**
 * How to start one of the project's own tools without a shell and without npm between, so that a
 * signal reaches it.
 * @param {string} root
 * @param {Tool} tool
 * @param {readonly string[]} args
 * @returns {[command: string, args: string[]]}
 */
export function toolCommand(root, tool, args) {
  return [process.execPath, [join(root, 'node_modules', ENTRY[tool]), ...args]];
}

/**
 * @param {string} root
 * @param {Tool} tool
 * @param {readonly string[]} args
 * @param {{ env: NodeJS.ProcessEnv, live?: boolean }} options
 */
export function runTool(root, tool, args, options) {
  return run(...toolCommand(root, tool, args), { cwd: root, ...options });
}

/**
 * Runs one of the project's TypeScript scripts in a process of its own, with no other between.
 * @param {string} root
 * @param {string} file
 * @param {{ env: NodeJS.ProcessEnv, live?: boolean }} options
 */
export function runScript(root, file, options) {
  // The scripts are server code: under this condition the marker that keeps it out of browsers is quiet.
  const args = ['--conditions=react-server', '--import', 'tsx', file];
  return run(process.execPath, args, { cwd: root, ...options });
}
