/**
 * What one stage of tests came to.
 *
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 */

/**
 * Counts the tests of one stage from vitest's JSON report. A file that could not be loaded, a stage that ended badly
 * without a failed test, and a stage that ran no test count as one failure each: nothing that went wrong is silent.
 *
 * @param {object | null} report what vitest wrote, or null where it wrote nothing
 * @param {number} exitCode of vitest
 * @returns {Counts}
 */
export function countStage(report, exitCode) {
  if (report === null) return { passed: 0, failed: 1, skipped: 0 };
  const files = report.testResults ?? [];
  const tests = files.flatMap(({ assertionResults }) => assertionResults ?? []);
  const having = (...states) => tests.filter(({ status }) => states.includes(status)).length;
  const brokenFiles = files.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !(assertionResults ?? []).some((test) => test.status === 'failed'),
  ).length;
  const passed = having('passed');
  const skipped = having('skipped', 'pending', 'todo', 'disabled');
  const failed = tests.length - passed - skipped + brokenFiles;
  const silentFailure = failed === 0 && (exitCode !== 0 || tests.length === 0);
  return { passed, failed: silentFailure ? 1 : failed, skipped };
}

/** @param {Counts[]} counts */
export function addCounts(counts) {
  const sum = (name) => counts.reduce((total, one) => total + one[name], 0);
  return { passed: sum('passed'), failed: sum('failed'), skipped: sum('skipped') };
}

/** The last line of `npm test`. */
export function closingLine({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed, ${skipped} skipped`;
}
