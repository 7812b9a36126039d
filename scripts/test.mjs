#!/usr/bin/env node
// @ts-check
import { checkNode } from './bootstrap/node-version.mjs';

try {
  checkNode(process.versions.node);
} catch (refusal) {
  console.log(`${/** @type {Error} */ (refusal).message}\n0 passed, 1 failed`);
  process.exit(1);
}

const { command } = await import('./bootstrap/command.mjs');
const { say } = await import('./bootstrap/say.mjs');
const { test } = await import('./bootstrap/test.mjs');
const { exitCode, lastLine } = await import('./bootstrap/test-tally.mjs');

let tally = { passed: 0, failed: 1 };
await command(
  async () => {
    tally = await test();
    return exitCode(tally);
  },
  { interrupted: 130 },
);
// Last, after everything has been stopped, because it is what a machine reads.
say(lastLine(tally));
