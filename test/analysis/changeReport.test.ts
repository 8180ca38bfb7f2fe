import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  type ChangeOptions,
  changeDetails,
  changeReport,
  recordsOf,
  visits,
} from '../../src/analysis/index.ts';
import {
  pairedChange,
  poolRandomEffects,
  pretestPosttestControl,
  standardizedMeanChange,
  welchDifference,
} from '../../src/stats/index.ts';
import { looksOf, type Row, sessionsFrom } from './sessionsFrom.ts';

type Scores = readonly (readonly [before: number, after: number])[];

/** A class whose children have these numbers of on-task looks out of ten before and after. */
function classRows(name: string, condition: string, scores: Scores): Row[] {
  return (['before', 'after'] as const).flatMap((phase, side) =>
    looksOf(
      {
        session: `${name} ${phase}`,
        class: name,
        condition,
        phase,
        date: phase === 'before' ? '2026-11-03' : '2026-11-10',
      },
      Object.fromEntries(
        scores.map((pair, i) => [
          `${name}-${i}`,
          '1'.repeat(pair[side] as number) + '0'.repeat(10 - (pair[side] as number)),
        ]),
      ),
    ),
  );
}

async function analysed(rows: readonly Row[], options: ChangeOptions = {}) {
  const answer = changeReport(visits(recordsOf(await sessionsFrom(rows))), options);
  if (!answer.ok) throw new Error(answer.problem.code);
  return answer.value;
}

const points = (scores: Scores, side: 0 | 1): number[] => scores.map((pair) => 10 * pair[side]);
const otters: Scores = [
  [6, 8],
  [5, 8],
  [7, 7],
  [4, 6],
];
const herons: Scores = [
  [7, 9],
  [5, 9],
  [6, 7],
];
const voles: Scores = [
  [6, 6],
  [8, 7],
  [5, 6],
];
const newts: Scores = [
  [7, 6],
  [4, 6],
  [6, 6],
];

describe('changeReport', () => {
  test('two classes a condition: pooled per condition, compared by classes, g on children', async () => {
    const { report } = await analysed([
      ...classRows('Otters', 'break', otters),
      ...classRows('Voles', 'usual', voles),
      ...classRows('Herons', 'break', herons),
      ...classRows('Newts', 'usual', newts),
    ]);
    expect(report.classes.map((row) => row.class)).toEqual(['Herons', 'Newts', 'Otters', 'Voles']);
    const paired = [herons, otters].map((scores) => pairedChange(points(scores, 0), points(scores, 1)));
    const pooled = poolRandomEffects(
      paired.map(({ change }) => change),
      paired.map(({ standardError }) => standardError ** 2),
      { estimator: 'REML', inference: 'knapp-hartung' },
    );
    expect(report.pooled.map(({ condition, classes }) => [condition, classes])).toEqual([
      ['break', 2],
      ['usual', 2],
    ]);
    expect(report.pooled[0]).toMatchObject({
      change: pooled.estimate,
      standardError: pooled.standardError,
      lower: pooled.lower,
      upper: pooled.upper,
      tau2: pooled.tau2,
      i2: pooled.i2,
    });
    // Mean changes by hand: Herons 70/3, Otters 17.5; Voles 0, Newts 10/3.
    const welch = welchDifference([70 / 3, 17.5], [10 / 3, 0]);
    expect(report.comparison).toMatchObject({ condition: 'break', control: 'usual', unit: 'class', why: {} });
    expect(report.comparison?.difference).toBeCloseTo(welch.difference, 9);
    expect(report.comparison?.df).toBeCloseTo(welch.df, 9);
    expect(report.comparison?.lower).toBeCloseTo(welch.lower, 9);
    expect(report.comparison?.p).toBeCloseTo(welch.p, 9);
    const treated = [...herons, ...otters];
    const control = [...newts, ...voles];
    const effect = pretestPosttestControl(
      points(treated, 0),
      points(treated, 1),
      points(control, 0),
      points(control, 1),
    );
    expect(report.comparison?.g).toBeCloseTo(effect.estimate, 9);
    expect(report.comparison?.gVariance).toBeCloseTo(effect.variance, 9);
    const smcr = standardizedMeanChange(points(herons, 0), points(herons, 1), 'raw-score');
    expect(report.classes[0]).toMatchObject({ g: smcr.estimate, gVariance: smcr.variance });
  });

  test('one class a condition: compared by children, which cannot part class and break', async () => {
    const analysis = await analysed([
      ...classRows('Otters', 'break', otters),
      ...classRows('Voles', 'Usual', voles),
    ]);
    const welch = welchDifference([20, 30, 0, 20], [0, -10, 10]);
    expect(analysis.report.comparison).toMatchObject({ unit: 'child', control: 'Usual', difference: 17.5 });
    expect(analysis.report.comparison?.standardError).toBeCloseTo(welch.standardError, 9);
    expect(analysis.report.pooled).toEqual([]);
    expect(changeDetails(analysis).sentence.code).toBe('classAndBreakInseparable');
  });

  test('the control: named by hand, or by the study, or by its name, else not known', async () => {
    const rows = [...classRows('Otters', 'dance', otters), ...classRows('Voles', 'reading', voles)];
    expect((await analysed(rows)).report).toMatchObject({
      comparison: null,
      why: { comparison: 'controlUnknown' },
    });
    expect((await analysed(rows, { control: 'dance' })).report.comparison).toMatchObject({
      condition: 'reading',
    });
    expect((await analysed(rows, { studyControl: 'reading' })).report.comparison).toMatchObject({
      condition: 'dance',
    });
    const answer = changeReport(visits(recordsOf(await sessionsFrom(rows))), { control: 'none such' });
    expect(answer).toMatchObject({ ok: false, problem: { code: 'controlNotFound' } });
  });

  test('a class in both conditions: no comparison', async () => {
    const moved = classRows('Otters', 'usual', voles).map((row) => ({
      ...row,
      session: `${row.session} again`,
    }));
    const { report } = await analysed([...classRows('Otters', 'break', otters), ...moved]);
    expect(report).toMatchObject({ comparison: null, why: { comparison: 'classInBoth' } });
    expect(report.classes.map(({ condition, change }) => [condition, change])).toEqual([
      ['break', 17.5],
      ['usual', 0],
    ]);
  });

  test('only children with both phases count; sessions of a phase are joined by their looks', async () => {
    const { report, data } = await analysed([
      ...looksOf({ session: '1', phase: 'before', date: '2026-11-03' }, { A: '1000', B: '1', C: '10' }),
      ...looksOf({ session: '2', phase: 'before', date: '2026-11-04' }, { A: '11' }),
      ...looksOf({ session: '3', phase: 'after', date: '2026-11-05' }, { A: '1', C: '.', D: '1' }),
    ]);
    expect(report.classes).toMatchObject([
      {
        children: 1,
        meanBefore: 50,
        meanAfter: 100,
        change: 50,
        sdChange: null,
        p: null,
        g: null,
        why: { p: 'oneChild', g: 'oneChild' },
      },
    ]);
    expect(data[0]?.lines.map(({ child, before, after }) => [child, before, after])).toEqual([
      ['A', 50, 100],
      ['B', 100, null],
      ['C', 50, null],
      ['D', null, 100],
    ]);
  });

  test('every child changes alike: t and p undefined, limits equal the change', async () => {
    const alike: Scores = [
      [4, 5],
      [5, 6],
      [6, 7],
    ];
    const { report } = await analysed(classRows('Otters', 'break', alike));
    expect(report.classes[0]).toMatchObject({
      change: 10,
      sdChange: 0,
      t: null,
      p: null,
      lower: 10,
      upper: 10,
      why: { t: 'sameChange', p: 'sameChange' },
    });
  });

  test('one record a visit: the primary observer counts, not the second', async () => {
    const rows = classRows('Otters', 'break', otters);
    const second = classRows('Otters', 'break', voles).map((row) => ({
      ...row,
      session: `second ${row.session}`,
      observer: 'Marsh',
      role: 'second',
    }));
    const both = [...second, ...rows.map((row) => ({ ...row, role: 'primary' }))];
    const { report, problems } = await analysed(both);
    expect(report.classes[0]?.change).toBe(17.5);
    expect(problems).toEqual([]);
    expect((await analysed(both, { observer: 'Marsh' })).report.classes[0]?.children).toBe(3);
  });

  test('two observers without roles: named, left out, unless somebody chooses', async () => {
    const rows = classRows('Otters', 'break', otters);
    const second = classRows('Otters', 'break', voles).map((row) => ({
      ...row,
      session: `too ${row.session}`,
      observer: 'Marsh',
    }));
    const { report, problems } = await analysed([...rows, ...second]);
    expect(report.classes).toEqual([]);
    expect(problems.map(({ code, values }) => [code, values.observers])).toEqual([
      ['visitWithoutRole', 'Marsh, Quill'],
      ['visitWithoutRole', 'Marsh, Quill'],
    ]);
    const chosen = await analysed([...rows, ...second], { observer: 'Quill' });
    expect(chosen.problems).toEqual([]);
    expect(chosen.report.classes[0]?.change).toBe(17.5);
  });

  test('a second observer alone is left out, and that is said', async () => {
    const rows = classRows('Otters', 'break', otters).map((row) =>
      row.phase === 'after' ? { ...row, role: 'second' } : row,
    );
    const { report, notices } = await analysed(rows);
    expect(report.classes[0]).toMatchObject({ children: 0, change: null, why: { change: 'noChildInBoth' } });
    expect(notices.map(({ code }) => code)).toEqual(['secondAlone']);
  });

  test('figures of different methods are not joined silently', async () => {
    const partial = looksOf(
      {
        session: 'p',
        class: 'Otters',
        condition: 'break',
        phase: 'after',
        date: '2026-11-11',
        method: 'partial',
      },
      { 'Otters-0': '11' },
    );
    const { notices } = await analysed([...classRows('Otters', 'break', otters), ...partial]);
    expect(notices).toMatchObject([
      { code: 'methodsJoined', values: { class: 'Otters', methods: 'momentary, partial' } },
    ]);
  });

  test('headcounts have means and no spread', async () => {
    const scan = (phase: string, interval: number, on: number): Row => ({
      session: phase,
      observer: 'Quill',
      child: '',
      interval,
      code: '',
      method: 'headcount',
      phase,
      on_count: on,
      present_count: 20,
    });
    const { report } = await analysed([scan('before', 1, 12), scan('before', 2, 14), scan('after', 1, 16)]);
    expect(report.classes[0]).toMatchObject({
      children: 0,
      meanBefore: 65,
      meanAfter: 80,
      change: 15,
      p: null,
      why: { p: 'headcountHasNoChildren' },
    });
  });

  test('the order of rows decides no figure', async () => {
    const rows = [
      ...classRows('Otters', 'break', otters),
      ...classRows('Voles', 'usual', voles),
      ...classRows('Herons', 'break', herons),
    ];
    const expected = (await analysed(rows)).report;
    await fc.assert(
      fc.asyncProperty(fc.shuffledSubarray(rows, { minLength: rows.length }), async (shuffled) => {
        expect((await analysed(shuffled)).report).toEqual(expected);
      }),
      { numRuns: 15 },
    );
  });
});

describe('which phase is before', () => {
  async function phasesOf(phases: readonly (readonly [string, string])[], options: ChangeOptions = {}) {
    const rows = phases.flatMap(([phase, date]) => looksOf({ session: phase, phase, date }, { A: '10' }));
    const answer = changeReport(visits(recordsOf(await sessionsFrom(rows))), options);
    if (!answer.ok) return answer.problem.code;
    return [answer.value.before, answer.value.after, ...answer.value.notices.map(({ code }) => code)];
  }

  test('the earlier date, whatever the names', async () => {
    expect(
      await phasesOf([
        ['after', '2026-11-03'],
        ['before', '2026-11-10'],
      ]),
    ).toEqual(['after', 'before']);
  });

  test.each([
    ['after', 'before', 'before', 'after'],
    ['Post', 'Pre', 'Pre', 'Post'],
    ['intervention', 'baseline', 'baseline', 'intervention'],
  ])('equal or missing dates: %s and %s by name', async (a, b, before, after) => {
    expect(
      await phasesOf([
        [a, ''],
        [b, ''],
      ]),
    ).toEqual([before, after]);
    expect(
      await phasesOf([
        [a, '2026-11-03'],
        [b, '2026-11-03'],
      ]),
    ).toEqual([before, after]);
  });

  test('other names by code point, and that is said', async () => {
    expect(
      await phasesOf([
        ['weeks 3–4', ''],
        ['weeks 1–2', ''],
      ]),
    ).toEqual(['weeks 1–2', 'weeks 3–4', 'phasesByName']);
  });

  test('more than two have to be chosen from; fewer give no change', async () => {
    const three = [
      ['a', ''],
      ['b', ''],
      ['c', ''],
    ] as const;
    expect(await phasesOf(three)).toBe('phasesToChoose');
    expect(await phasesOf(three, { before: 'c', after: 'a' })).toEqual(['c', 'a']);
    expect(await phasesOf(three, { before: 'd', after: 'a' })).toBe('phaseNotFound');
    expect(await phasesOf(three.slice(1), { after: 'b' })).toEqual(['c', 'b']);
    expect(await phasesOf(three.slice(2))).toBe('tooFewPhases');
  });
});
