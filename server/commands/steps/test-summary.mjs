export { countResults, summaryLine }

/**
 * Counts a test run from the report of vitest's `json` reporter. A file that could not be loaded has no tests
 * to count and counts as one failure itself; so does a run that ended badly with no failed test to show for
 * it (an error outside any test, a crash, no report at all).
 * @param {object | null} report null when there is none
 * @param {number | null} exitCode of the run; null when a signal ended it
 * @returns {{ passed: number, failed: number }}
 */
function countResults(report, exitCode) {
  const files = report?.testResults ?? []
  const unloadable = files.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  ).length
  const passed = report?.numPassedTests ?? 0
  const failed = (report?.numFailedTests ?? 0) + unloadable
  const endedBadly = report === null || exitCode !== 0
  return { passed, failed: failed === 0 && endedBadly ? 1 : failed }
}

function summaryLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`
}
