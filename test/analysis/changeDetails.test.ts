import { describe, expect, test } from 'vitest';
import { changeDetails, changeReport, recordsOf, visits } from '../../src/analysis/index.ts';
import { type Row, sessionsFrom } from './sessionsFrom.ts';
import { workedClass } from './workedClass.ts';

async function detailsOf(rows: readonly Row[]) {
  const answer = changeReport(visits(recordsOf(await sessionsFrom(rows))));
  if (!answer.ok) throw new Error(answer.problem.code);
  return changeDetails(answer.value);
}

describe('changeDetails', () => {
  test('one class without a comparison: describes, in points and in minutes of a lesson', async () => {
    const { classes, sentence } = await detailsOf(workedClass);
    expect(sentence.code).toBe('describesOnly');
    // 13.8426 points of 15 minutes.
    expect(classes[0]?.minutes).toBeCloseTo(2.0764, 4);
    expect(sentence.values.children).toBe(6);
    expect(classes[0]?.lines[0]).toEqual({
      child: 'C1',
      before: 70,
      after: 90,
      looksBefore: 10,
      looksAfter: 10,
    });
  });

  test('several classes without a comparison describe too', async () => {
    const other = workedClass.map((row) => ({ ...row, class: 'Voles', session: `v${row.session}` }));
    const { sentence, classes } = await detailsOf([...workedClass, ...other]);
    expect(sentence).toEqual({ code: 'classesDescribe', values: { classes: 2, up: 2 } });
    expect(classes.every((one) => one.sentence.code === 'describesOnly')).toBe(true);
  });
});
