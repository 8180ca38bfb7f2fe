/**
 * Reads what Vitest and Playwright wrote down about a run. Skipped tests count as failed: a test that is not
 * run proves nothing, and a test that passes at the second try has failed once.
 *
 * @typedef {import('./summary.mjs').Result} Result
 */

/**
 * @typedef {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number,
 *   testResults: { status: string, assertionResults: unknown[] }[] }} VitestReport
 */

/** @param {VitestReport | undefined} report @param {number} code the exit code @param {string} name @returns {Result} */
export function fromVitest(report, code, name) {
  if (!report) return { name, passed: 0, failed: 1, note: 'no report written' };
  const skipped = report.numPendingTests + report.numTodoTests;
  // A file that cannot be loaded has no tests, so it is in no count.
  const unloaded = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  ).length;
  return judged(name, report.numPassedTests, report.numFailedTests + unloaded, skipped, code);
}

/** @typedef {{ stats: { expected: number, unexpected: number, flaky: number, skipped: number }, errors?: unknown[] }} PlaywrightReport */

/** @param {PlaywrightReport | undefined} report @param {number} code @param {string} name @returns {Result} */
export function fromPlaywright(report, code, name) {
  if (!report) return { name, passed: 0, failed: 1, note: 'no report written' };
  const { expected, unexpected, flaky, skipped } = report.stats;
  return judged(name, expected, unexpected + flaky, skipped, code);
}

/**
 * @param {string} name @param {number} passed @param {number} failed @param {number} skipped @param {number} code
 * @returns {Result}
 */
function judged(name, passed, failed, skipped, code) {
  if (skipped > 0) return { name, passed, failed: failed + skipped, note: `${skipped} skipped` };
  // Errors outside of any test (a rejected promise, a worker that died) show in the exit code alone.
  if (code !== 0 && failed === 0 && passed > 0)
    return { name, passed, failed: 1, note: `ended with code ${code}` };
  return { name, passed, failed };
}

/** Several runs as one. @param {string} name @param {Result[]} runs @returns {Result} */
export function sum(name, runs) {
  const count = (/** @type {'passed' | 'failed'} */ what) => runs.reduce((all, run) => all + run[what], 0);
  const notes = runs.flatMap(({ note }) => (note === undefined ? [] : [note]));
  return {
    name,
    passed: count('passed'),
    failed: count('failed'),
    ...(notes.length > 0 ? { note: notes.join('; ') } : {}),
  };
}
