// @ts-check

/**
 * @typedef {{ passed: number, failed: number }} Tally
 *
 * @typedef {object} VitestReport the part of vitest's JSON report that is counted
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * Counts a report. A file that could not even be loaded has no tests to its name and is one failed;
 * a test that was skipped has not passed.
 * @param {VitestReport} report
 * @returns {Tally}
 */
export function tallyReport(report) {
  const results = report.testResults.flatMap((file) =>
    file.assertionResults.length === 0 || file.status === 'failed'
      ? withLoadFault(file)
      : file.assertionResults.map(({ status }) => status),
  );
  const passed = results.filter((status) => status === 'passed').length;
  return { passed, failed: results.length - passed };
}

/** @param {VitestReport['testResults'][number]} file */
function withLoadFault({ assertionResults }) {
  const statuses = assertionResults.map(({ status }) => status);
  return statuses.includes('failed') ? statuses : [...statuses, 'failed'];
}

/** @param {readonly Tally[]} tallies */
export function sum(tallies) {
  return tallies.reduce(
    (all, one) => ({ passed: all.passed + one.passed, failed: all.failed + one.failed }),
    { passed: 0, failed: 0 },
  );
}

/**
 * The last line of a test run, to the letter.
 * @param {Tally} tally
 */
export function lastLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`;
}

/**
 * Nothing having run is no success either.
 * @param {Tally} tally
 */
export function exitCode({ passed, failed }) {
  return failed === 0 && passed > 0 ? 0 : 1;
}
