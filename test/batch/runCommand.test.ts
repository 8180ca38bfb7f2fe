import { describe, expect, test } from 'vitest';
import { csvOf, pairOf } from '../analysis/sessionsFrom.ts';
import { workedClass } from '../analysis/workedClass.ts';
import { answer, documentOf } from './command.ts';

const worked = { 'worked.csv': csvOf(workedClass) };

const keysOf = (row: object): string[] => Object.keys(row);

describe('ontask', () => {
  test('the members of its document', async () => {
    const { document } = await documentOf(['ontask'], worked);
    expect(keysOf(document)).toEqual(['sessions']);
    expect(keysOf(document.sessions[0]).join(' ')).toBe(
      'session visit class condition phase observer method scored missing onTask percentOnTask lower upper classPercent children',
    );
    expect(keysOf(document.sessions[0].children[0]).join(' ')).toBe(
      'child scored missing onTask percentOnTask lower upper',
    );
  });

  test('for people: aligned lines', async () => {
    const { out, err, status } = await answer(['ontask'], worked);
    expect({ err, status }).toEqual({ err: [], status: 0 });
    expect(out).toContain(
      'Otters  before  Quill     s1       momentary      58        2       43       74.1',
    );
    expect(out).not.toMatch(/NaN|undefined|null/);
  });

  test('partial interval: sets of codes, and what the figure is said to be', async () => {
    const rows = ['on-task|talking', '', 'talking', 'on-task'].map((code, i) => ({
      session: 's',
      observer: 'Quill',
      child: 'A',
      interval: i + 1,
      code,
      method: 'partial',
    }));
    const { document } = await documentOf(['ontask', '--off', 'talking'], { 'p.csv': csvOf(rows) });
    expect(document.sessions[0]).toMatchObject({
      method: 'partial',
      scored: 4,
      onTask: 2,
      percentOnTask: 50,
    });
    const { out } = await answer(['ontask', '--off', 'talking'], { 'p.csv': csvOf(rows) });
    expect(out).toContain('intervals with some on-task code, not of time');
  });

  test('a label of which nobody knows how it counts is an error that the options answer', async () => {
    const rows = ['busy', 'idle', 'busy'].map((code, i) => ({
      session: 's',
      observer: 'Quill',
      child: 'A',
      interval: i + 1,
      code,
    }));
    const file = { 'labels.csv': csvOf(rows) };
    const refused = await documentOf(['ontask'], file);
    expect(refused.status).toBe(1);
    expect(refused.document).toEqual({ sessions: [] });
    expect(refused.err).toHaveLength(1);
    expect(refused.err[0]).toMatch(/^labels\.csv:2: .*busy/);
    const { document, status } = await documentOf(['ontask', '--on=busy', '--off', 'idle'], file);
    expect(status).toBe(0);
    expect(document.sessions[0]).toMatchObject({ onTask: 2, scored: 3 });
  });

  test('a repeated interval: the file contributes nothing, the other is reported', async () => {
    const twice =
      'session,observer,child,interval,code\ns,Quill,A,1,on-task\ns,Quill,A,2,off-task\ns,Quill,A,1,on-task\n';
    const { document, err, status } = await documentOf(['ontask'], { 'twice.csv': twice, ...worked });
    expect(status).toBe(1);
    expect(document.sessions).toHaveLength(2);
    expect(err).toHaveLength(1);
    expect(err[0]).toMatch(/^twice\.csv:4: /);
  });

  test('reading the same table twice doubles nothing', async () => {
    const once = await answer(['ontask', '--json'], worked);
    const both = await answer(['ontask', '--json'], {
      ...worked,
      'copy.csv': csvOf([...workedClass].reverse()),
    });
    expect(both).toEqual(once);
  });

  test('a session with different contents in two tables is told and left out, whatever the order of the files', async () => {
    const other = workedClass.map((row) =>
      row.session === 's1' && row.interval === 1 ? { ...row, code: 'off-task' } : row,
    );
    const told = async (first: string, second: string) => {
      const { document, err, status } = await documentOf(['ontask'], { 'a.csv': first, 'b.csv': second });
      const sessions = document.sessions.map((row: { session: string }) => row.session);
      return { sessions, err, status };
    };
    const expected = {
      sessions: ['s2'],
      err: [expect.stringMatching(/^a\.csv: session s1 .*a\.csv, b\.csv/)],
      status: 1,
    };
    expect(await told(csvOf(workedClass), csvOf(other))).toEqual(expected);
    expect(await told(csvOf(other), csvOf(workedClass))).toEqual(expected);
  });
});

describe('agreement', () => {
  const pair = { 'pair.csv': csvOf(pairOf([80, 10, 5, 5], { class: 'Otters', phase: 'before' })) };

  test('a table of Feinstein & Cicchetti 1990 (kappa .32); the members of its document', async () => {
    const { document, status } = await documentOf(['agreement'], pair);
    expect(status).toBe(0);
    expect(keysOf(document.pairs[0]).sort().join(' ')).toBe(
      [
        'visit class condition phase observers sessions compared excluded percentAgreement chanceAgreement kappa',
        'standardError lower upper maximumKappa ac1 occurrence nonOccurrence table codes',
      ]
        .join(' ')
        .split(' ')
        .sort()
        .join(' '),
    );
    expect(document.pairs[0]).toMatchObject({
      visit: 'v1',
      class: 'Otters',
      observers: ['Marsh', 'Quill'],
      sessions: ['a', 'b'],
      compared: 100,
      excluded: 0,
      percentAgreement: 85,
      table: { codes: ['off-task', 'on-task'] },
    });
    expect(document.pairs[0].kappa).toBeCloseTo(0.3182, 4);
    expect(document.overall).toMatchObject({ pairs: 1, doubleCoded: 1, visits: 1, percentDoubleCoded: 100 });
    expect((await answer(['agreement'], pair)).out).toContain('.32');
  });

  test('an undefined kappa is null, with a sentence', async () => {
    const { document, out } = await documentOf(['agreement'], { 'c.csv': csvOf(pairOf([20, 0, 0, 0])) });
    expect(document.pairs[0].kappa).toBeNull();
    expect(document.pairs[0].why.kappa).toBe('kappa is undefined: both observers used one code only');
    expect(out).not.toMatch(/NaN|Infinity/);
  });

  test('the two observers may come in two files', async () => {
    const rows = pairOf([80, 10, 5, 5], { class: 'Otters', phase: 'before' });
    const [a, b] = ['a', 'b'].map((session) => csvOf(rows.filter((row) => row.session === session)));
    const { document } = await documentOf(['agreement'], { 'z.csv': a ?? '', 'y.csv': b ?? '' });
    expect(document).toEqual((await documentOf(['agreement'], pair)).document);
  });
});

describe('change', () => {
  test('the worked class; the members of its document', async () => {
    const { document } = await documentOf(['change'], worked);
    expect(keysOf(document.classes[0]).join(' ')).toBe(
      'class condition before after children meanBefore meanAfter change sdChange standardError t df p lower upper g gVariance',
    );
    expect(document.classes[0].t).toBeCloseTo(2.4046, 4);
    expect(document).toMatchObject({ pooled: [], comparison: null });
    expect(document.why.comparison).toBe('the comparison is undefined: there are not two conditions');
    expect((await answer(['change'], worked)).out).toContain('does not show what caused the change');
  });

  test('between two conditions; the order of rows and files decides nothing', async () => {
    const usual = workedClass.map((row) => ({
      ...row,
      class: 'Voles',
      session: `v${row.session}`,
      condition: 'usual',
      code: row.phase === 'after' && row.code === 'off-task' ? 'on-task' : (row.code ?? ''),
    }));
    const rest = workedClass.map((row) => ({ ...row, condition: 'break' }));
    const [one, two] = [csvOf(rest), csvOf(usual)];
    const first = await documentOf(['change'], { 'one.csv': one, 'two.csv': two });
    expect(first.document.comparison).toMatchObject({ condition: 'break', control: 'usual', unit: 'child' });
    // Changes of the Voles by hand: 30, 20, 50, 100/9, 400/9, 0.
    const voles = (30 + 20 + 50 + 100 / 9 + 400 / 9 + 0) / 6;
    expect(first.document.comparison.difference).toBeCloseTo(13.842592592592593 - voles, 9);
    const outOf = async (files: Record<string, string>, ...more: string[]) =>
      (await answer(['change', '--json', ...more], files)).out;
    expect(await outOf({ 'one.csv': two, 'two.csv': one })).toBe(first.out);
    expect(await outOf({ 'all.csv': csvOf([...usual, ...rest].reverse()) })).toBe(first.out);
    expect(await outOf({ 'one.csv': one, 'two.csv': two }, '--control', 'usual')).toBe(first.out);
  });

  test('two observers without roles are named, unless one is chosen', async () => {
    const second = workedClass.map((row) => ({ ...row, observer: 'Marsh', session: `m${row.session}` }));
    const file = { 'no-roles.csv': csvOf([...workedClass, ...second]) };
    const named = await documentOf(['change'], file);
    expect(named.status).toBe(1);
    expect(named.document.classes).toEqual([]);
    expect(named.err[0]).toMatch(/^no-roles\.csv: visit .*Marsh, Quill/);
    const chosen = await documentOf(['change', '--observer', 'Quill'], file);
    expect(chosen).toMatchObject({ status: 0, err: [] });
    expect(chosen.document.classes).toHaveLength(1);
  });

  test('a phase or condition that is not there is wrong usage; one phase only is told', async () => {
    for (const [option, value] of [
      ['--before', 'then'],
      ['--control', 'none such'],
      ['--observer', 'Nobody'],
    ] as const) {
      const { out, err, status } = await answer(['change', option, value], worked);
      expect({ out, status, lines: err.length }).toEqual({ out: '', status: 2, lines: 1 });
      expect(err[0]).toContain(value);
    }
    const half = { 'half.csv': csvOf(workedClass.filter((row) => row.phase === 'before')) };
    const { document, err, status } = await documentOf(['change'], half);
    expect(status).toBe(1);
    expect(document).toMatchObject({ classes: [], comparison: null });
    expect(err[0]).toContain('two phases, found only before');
  });
});
