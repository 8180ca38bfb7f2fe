import { describe, expect, it } from 'vitest';
import { fromPlaywright, fromVitest, sum } from '../../tools/run/reports.mjs';
import { addUp, summaryText } from '../../tools/run/summary.mjs';

describe('the closing line', () => {
  it('adds up all runners', () => {
    const results = [
      { name: 'unit', passed: 40, failed: 2 },
      { name: 'browser', passed: 7, failed: 1 },
    ];
    expect(addUp(results).line).toBe('47 passed, 3 failed');
    expect(summaryText(results).split('\n').at(-1)).toBe('47 passed, 3 failed');
  });

  it('counts a runner that ran nothing as a failure and says so', () => {
    const { line, rows } = addUp([
      { name: 'unit', passed: 40, failed: 0 },
      { name: 'browser', passed: 0, failed: 0 },
    ]);
    expect(line).toBe('40 passed, 1 failed');
    expect(rows[1]?.note).toBe('ran nothing');
  });

  it('fails when there was no runner at all', () => {
    expect(addUp([]).line).toBe('0 passed, 1 failed');
  });
});

const vitest = { numPassedTests: 5, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0, testResults: [] };

describe('what Vitest wrote down', () => {
  it('is counted test by test', () => {
    expect(fromVitest({ ...vitest, numFailedTests: 2 }, 1, 'unit')).toEqual({
      name: 'unit',
      passed: 5,
      failed: 2,
    });
  });

  it('fails for a file that could not be loaded', () => {
    const testResults = [{ status: 'failed', assertionResults: [] }];
    expect(fromVitest({ ...vitest, testResults }, 1, 'unit').failed).toBe(1);
  });

  it('fails for skipped tests', () => {
    expect(fromVitest({ ...vitest, numPendingTests: 3 }, 0, 'unit').failed).toBe(3);
  });

  it('fails for an error outside of any test', () => {
    expect(fromVitest(vitest, 1, 'unit').failed).toBe(1);
  });

  it('fails when no report was written', () => {
    expect(fromVitest(undefined, 0, 'unit').failed).toBe(1);
  });
});

describe('what Playwright wrote down', () => {
  it('is counted, a test that passed at the second try as failed', () => {
    const stats = { expected: 6, unexpected: 1, flaky: 1, skipped: 1 };
    expect(fromPlaywright({ stats }, 1, 'browser')).toMatchObject({ passed: 6, failed: 3 });
  });

  it('adds up over several runs, and one without a report fails the whole', () => {
    const stats = { expected: 6, unexpected: 1, flaky: 0, skipped: 0 };
    const runs = [fromPlaywright({ stats }, 1, 'app'), fromPlaywright(undefined, 1, 'time')];
    expect(sum('browser', runs)).toEqual({
      name: 'browser',
      passed: 6,
      failed: 2,
      note: 'no report written',
    });
  });
});
