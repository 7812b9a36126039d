// @ts-check

const WINDOW_MS = 5 * 60_000;
const MOST_FALLS = 5;

/**
 * Whether something that fell should be put up again: yes, until it falls too often for that to
 * help.
 * @param {() => number} [now] in milliseconds
 */
export function patience(now = () => performance.now()) {
  /** @type {number[]} */
  let falls = [];
  return () => {
    falls = [...falls.filter((at) => now() - at < WINDOW_MS), now()];
    return falls.length <= MOST_FALLS;
  };
}
