/**
 * @typedef {{ name: string, passed: number, failed: number, note?: string }} Result
 *   what one runner did; `note` says in a few words what is not a count.
 */

/**
 * Adds up all runners. A runner that ran nothing has failed: silence is not success.
 *
 * @param {Result[]} results
 * @returns {{ passed: number, failed: number, rows: Result[], line: string }}
 */
export function addUp(results) {
  const rows = results.map((result) =>
    result.passed + result.failed === 0
      ? { ...result, failed: 1, note: result.note ?? 'ran nothing' }
      : result,
  );
  if (rows.length === 0) rows.push({ name: 'all', passed: 0, failed: 1, note: 'ran nothing' });
  const passed = rows.reduce((sum, row) => sum + row.passed, 0);
  const failed = rows.reduce((sum, row) => sum + row.failed, 0);
  return { passed, failed, rows, line: `${passed} passed, ${failed} failed` };
}

/** The summary as a table and, as the last line, the sum. @param {Result[]} results */
export function summaryText(results) {
  const { rows, line } = addUp(results);
  const width = Math.max(...rows.map(({ name }) => name.length));
  const table = rows.map(({ name, passed, failed, note }) => {
    const mark = failed > 0 ? '✗' : '✓';
    const counts = `${String(passed).padStart(6)} passed ${String(failed).padStart(4)} failed`;
    return `  ${mark} ${name.padEnd(width)} ${counts}${note ? `  ${note}` : ''}`;
  });
  return ['', ...table, '', line].join('\n');
}

/**
 * Prints the summary and sets the exit code.
 *
 * @param {Result[]} results
 */
export function finish(results) {
  console.log(summaryText(results));
  process.exitCode = addUp(results).failed > 0 ? 1 : 0;
}
