import { describe, expect, test } from 'vitest';
import { changeReport, onTaskReport, recordsOf, visits } from '../../src/analysis/index.ts';
import { sessionsFrom } from './sessionsFrom.ts';
import { workedClass } from './workedClass.ts';

const records = recordsOf(await sessionsFrom(workedClass));

describe('the worked class (six children, ten looks each, worked by hand)', () => {
  test('percent on-task of each child, of all looks, and the mean of the children: the two averages differ', () => {
    const [before, after] = onTaskReport(records).report.sessions;
    const percents = (row: typeof before) => row?.children.map((child) => child.percentOnTask);
    expect(percents(before)).toEqual([70, 80, 50, (100 * 8) / 9, (100 * 5) / 9, 100]);
    expect(percents(after)).toEqual([90, 90, 70, 100, 87.5, 90]);
    expect(before).toMatchObject({ scored: 58, missing: 2, onTask: 43, why: {} });
    expect(after).toMatchObject({ scored: 58, missing: 2, onTask: 51 });
    expect(before?.percentOnTask).toBeCloseTo(74.1379, 4);
    expect(before?.classPercent).toBeCloseTo(74.0741, 4);
    expect(after?.percentOnTask).toBeCloseTo(87.931, 4);
    expect(after?.classPercent).toBeCloseTo(87.9167, 4);
  });

  test('change with its t interval, and g in standard deviations before', () => {
    const answer = changeReport(visits(records));
    if (!answer.ok) throw new Error(answer.problem.code);
    const [row] = answer.value.report.classes;
    expect(row).toMatchObject({ before: 'before', after: 'after', children: 6, df: 5 });
    expect(row?.change).toBeCloseTo(13.8426, 4);
    expect(row?.sdChange).toBeCloseTo(14.1011, 4);
    expect(row?.t).toBeCloseTo(2.4046, 4);
    expect(row?.p).toBeCloseTo(0.0613, 4);
    expect(row?.lower).toBeCloseTo(-0.956, 3);
    expect(row?.upper).toBeCloseTo(28.641, 3);
    // Uncorrected .7166 (SD before 19.3176); the exact J(5) = Γ(2.5)/(√2.5 Γ(2)) = .84075 stands for the approximation .8421.
    const j = (0.75 * Math.sqrt(Math.PI)) / Math.sqrt(2.5);
    expect(row?.g).toBeCloseTo(0.71658 * j, 4);
    // Becker 1988 as Gibbons et al. 1993: 2(1 − r)/n + g²/2n with r = .7141.
    expect(row?.gVariance).toBeCloseTo((2 * (1 - 0.7141) + (row?.g ?? 0) ** 2 / 2) / 6, 4);
    expect(answer.value.report.comparison).toBeNull();
    expect(answer.value.report.why).toEqual({ comparison: 'noSecondCondition' });
  });
});
