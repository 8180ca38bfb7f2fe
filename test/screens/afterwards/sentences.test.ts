import { describe, expect, test } from 'vitest';
import { wordsFor } from '../../../src/words/words.ts';

const { afterwards, agreement, change, files } = wordsFor();
const thin = '\u202f';
const kappa = (value: number, lower: number | null, upper: number | null, phase: string | null = null) => ({
  phase,
  kappa: value,
  lower,
  upper,
});

describe('agreement', () => {
  test('says looks, kappa and its limits, as the field writes kappa', () => {
    expect(
      agreement.title({ agreed: 104, compared: 116, looks: true, kappas: [kappa(0.758, 0.641, 0.876)] }),
    ).toBe('They agree on 104 of 116 looks. Kappa .76, between .64 and .88.');
  });

  test('a single look, and intervals where there are no looks', () => {
    expect(agreement.title({ agreed: 1, compared: 1, looks: true, kappas: [] })).toBe(
      'They agree on 1 of 1 look.',
    );
    expect(agreement.title({ agreed: 0, compared: 2, looks: false, kappas: [] })).toBe(
      'They agree on 0 of 2 intervals.',
    );
  });

  test('names the phases where each has its own kappa', () => {
    const kappas = [kappa(0.78, 0.6, 0.95, 'before'), kappa(-0.05, null, null, 'after')];
    expect(agreement.title({ agreed: 50, compared: 60, looks: true, kappas })).toBe(
      'They agree on 50 of 60 looks. Kappa .78 before, between .60 and .95; −.05 after.',
    );
  });

  test('perfect agreement claims no certainty, and no limit lies above 1', () => {
    expect(agreement.title({ agreed: 60, compared: 60, looks: true, kappas: [kappa(1, 1, 1)] })).toBe(
      'They agree on 60 of 60 looks. Kappa 1.00.',
    );
    expect(
      agreement.title({ agreed: 59, compared: 60, looks: true, kappas: [kappa(0.95, 0.87, 1.04)] }),
    ).toContain('between .87 and 1.00');
  });

  test('undefined kappa says why instead of a number', () => {
    expect(agreement.kappaUndefined({ phase: null, reason: 'both observers used one code only' })).toBe(
      'Kappa is not defined: both observers used one code only.',
    );
  });

  test.each([
    [71, 'common'],
    [50, 'about as common as not'],
    [12, 'rare'],
  ])('%d percent on-task is %s', (percent, word) => {
    expect(agreement.prevalence({ percent, chance: 58 })).toBe(
      `On-task was ${word} (${percent}${thin}%), so two people guessing would agree on 58${thin}%; kappa takes that luck out.`,
    );
  });

  test('one difference is no number of differences', () => {
    expect(agreement.differencesOpen({ n: 1 })).toBe('Go through the difference');
    expect(agreement.differencesOpen({ n: 12 })).toBe('Go through the 12 differences');
    expect(agreement.differencesTitle({ n: 0 })).toBe('They differ nowhere');
  });
});

describe('change', () => {
  const one = { class: 'Otter', before: 'before', after: 'after', of: 15 };

  test.each([
    [13.8, 'Otter was on-task 14 points more after than before: about 2 minutes in 15.'],
    [11, 'Otter was on-task 11 points more after than before: about a minute and a half in 15.'],
    [6.7, 'Otter was on-task 7 points more after than before: about a minute in 15.'],
    [3, 'Otter was on-task 3 points more after than before: about half a minute in 15.'],
    [1, 'Otter was on-task 1 point more after than before: less than half a minute in 15.'],
    [-20, 'Otter was on-task 20 points less after than before: about 3 minutes in 15.'],
    [0.2, 'Otter was on-task as much after as before.'],
  ])('%d points', (points, sentence) => {
    expect(change.describesOnly({ ...one, change: points })).toBe(sentence);
  });

  test('phases of other names are named', () => {
    expect(change.describesOnly({ ...one, before: 'baseline', after: 'intervention', change: 13.8 })).toBe(
      'Otter was on-task 14 points more in “intervention” than in “baseline”: about 2 minutes in 15.',
    );
  });

  test('several classes are counted when nothing joins them', () => {
    expect(change.classesDescribe({ classes: 4, up: 1, before: 'before', after: 'after' })).toBe(
      '1 of 4 classes was on-task more after than before.',
    );
  });

  test('a comparison says more or less, or as much', () => {
    const of = { condition: 'break', control: 'usual' };
    expect(change.classesCompared({ ...of, difference: 16.1 })).toBe(
      'On-task changed 16 points more in the classes with “break” than in those with “usual”.',
    );
    expect(change.classAndBreakInseparable({ ...of, difference: -1.2 })).toBe(
      'On-task changed 1 point less with “break” than with “usual”.',
    );
    expect(change.classesCompared({ ...of, difference: 0.1 })).toBe(
      'Classes with “break” changed as much as classes with “usual”.',
    );
  });

  test('ranges have signs, a true minus, and no −0', () => {
    expect(change.noteRange({ lower: -3.4, upper: 25.2 })).toBe('Likely between −3 and +25 points.');
    expect(change.noteRange({ lower: -0.3, upper: 0.4 })).toBe('Likely between 0 and 0 points.');
  });

  test('a headcount joins no children', () => {
    const phases = { before: 'before', after: 'after' };
    const way = (method: 'headcount' | 'momentary') => [{ method, lookAt: null }];
    expect(change.how({ ...phases, ways: way('headcount') })).toContain('A headcount knows no children');
    expect(change.how({ ...phases, ways: way('headcount') })).not.toContain('Paired t');
    expect(change.how({ ...phases, ways: way('momentary') })).toContain('The unit is the child’s percentage');
  });
});

describe('afterwards', () => {
  test('percent on-task with its range, by method', () => {
    const phases = [{ phase: 'before', percent: 71.2, lower: 62.3, upper: 78.8 }];
    expect(afterwards.onTaskTitle({ method: 'momentary', phases })).toBe(
      `On-task at 71${thin}% of the looks, between 62 and 79${thin}%.`,
    );
    expect(afterwards.onTaskTitle({ method: 'partial', phases })).toBe(
      `Some on-task in 71${thin}% of the intervals, between 62 and 79${thin}%.`,
    );
    expect(
      afterwards.onTaskTitle({
        method: 'duration',
        phases: [{ phase: null, percent: 71.2, lower: null, upper: null }],
      }),
    ).toBe(`On-task for 71${thin}% of the time.`);
  });

  test('two phases, each with its range', () => {
    expect(
      afterwards.onTaskTitle({
        method: 'momentary',
        phases: [
          { phase: 'before', percent: 75, lower: 63, upper: 84 },
          { phase: 'after', percent: 90, lower: 80, upper: 95 },
        ],
      }),
    ).toBe(
      `On-task at 75${thin}% of the looks before, between 63 and 84${thin}%; 90${thin}% after, between 80 and 95${thin}%.`,
    );
  });

  test('what is missing, with reasons and number forms', () => {
    expect(afterwards.missingBy({ reasons: [] })).toBe('Nothing is missing.');
    expect(
      afterwards.missingBy({
        reasons: [
          { reason: 'missed', n: 3 },
          { reason: 'out of view', n: 1 },
        ],
      }),
    ).toBe('4 missing: missed (3) and out of view (1).');
    expect(afterwards.completeTitle({ scored: 1, planned: 1, method: 'momentary' })).toBe(
      '1 of 1 look is scored.',
    );
    expect(afterwards.completeTitle({ scored: 0, planned: 6, method: 'partial' })).toBe(
      '0 of 6 intervals are scored.',
    );
  });

  test('one late mark counts, several count', () => {
    expect(afterwards.lateMarks({ late: 1 })).toBe(
      '1 mark came within the grace after the next prompt and counts.',
    );
    expect(afterwards.lateMarks({ late: 2 })).toBe(
      '2 marks came within the grace after the next prompt and count.',
    );
  });
});

describe('files', () => {
  test.each([
    [{ new: 1, known: 0, changed: 0 }, '1 new session'],
    [{ new: 2, known: 3, changed: 0 }, '2 new sessions, 3 already here'],
    [{ new: 0, known: 1, changed: 0 }, 'session: 1 already here'],
    [{ new: 0, known: 0, changed: 0 }, ''],
  ])('%o', (counts, sentence) => {
    expect(files.sessions({ counts })).toBe(sentence);
  });

  test('what waits to be handed over', () => {
    expect(files.title({ waiting: 0 })).toBe('Everything recorded here has been handed over.');
    expect(files.title({ waiting: 1 })).toBe('1 record is only on this tablet.');
    expect(files.title({ waiting: 2 })).toBe('2 records are only on this tablet.');
  });
});
