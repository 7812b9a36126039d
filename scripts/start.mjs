#!/usr/bin/env node
// @ts-check
import { checkNode } from './bootstrap/node-version.mjs';

// Everything else is loaded after this, so that an old Node can still say that it is old.
try {
  checkNode(process.versions.node);
} catch (refusal) {
  console.error(/** @type {Error} */ (refusal).message);
  process.exit(1);
}

const { command } = await import('./bootstrap/command.mjs');
const { start } = await import('./bootstrap/start.mjs');

const work = async () => {
  const { fallen } = await start({ dev: process.argv.includes('--dev') });
  await fallen;
  return 0;
};
// Ctrl-C is the ordinary way to end it, so it is no failure.
await command(work, { interrupted: 0 });
