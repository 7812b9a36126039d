// @ts-check
import { Refusal } from './refusal.mjs';

/**
 * Next needs 20.9; 21 was never kept up.
 * @param {string} version such as `20.20.2`
 */
export function checkNode(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const enough = (major === 20 && minor >= 9) || major >= 22;
  if (!enough) {
    throw new Refusal(
      `Stillground needs Node 20.9 or later of the 20 line, or 22 and up, and this is Node ${version}; install a newer Node and run the command again.`,
    );
  }
}
