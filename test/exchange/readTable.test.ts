import { describe, expect, test } from 'vitest';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import type { ReadFile, ReadOptions } from '../../src/exchange/types.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { labelsOfTable } from '../../src/model/codeSet.ts';
import { bytesOf, classroom, laidSession, protocol, study } from './sampleStudy.ts';
import { sentence } from './sentence.ts';
import { rowsOf } from './tableText.ts';

const outcomeOf = (text: string, options?: ReadOptions) =>
  readIncoming({ name: 'a.csv', bytes: bytesOf(text) }, options);

async function take(text: string, options?: ReadOptions): Promise<ReadFile> {
  const outcome = await outcomeOf(text, options);
  if (!outcome.ok) throw new Error(outcome.problems.map(sentence).join(' '));
  return outcome;
}

const head = 'session,observer,child,interval,code';

describe('what a table becomes', () => {
  test('a session that reads out to its rows: codes, missing, times', async () => {
    const { bundle } = await take(
      [
        'session,observer,child,interval,code,missing,start_s,phase,class,date',
        'one,Quill,Otter-07,1,on-task,,0,before,3B,2026-11-03',
        'one,Quill,Heron-02,2,,out of view,15.25,before,3B,2026-11-03',
        'one,Quill,Otter-07,3,off-task,,30,after,3B,2026-11-03',
      ].join('\n'),
    );
    const [session] = bundle.sessions;
    if (session === undefined) throw new Error('no session');
    const { header, journal } = session;
    expect(header).toMatchObject({
      sessionLabel: 'one',
      observer: { name: 'Quill' },
      classroom: { name: '3B' },
      date: '2026-11-03',
      visitLabel: null,
      schedule: { kind: 'listed', method: 'momentary', codeSet: { name: labelsOfTable } },
    });
    expect(journal.map(({ seq, at, kind }) => [seq, at, kind])).toEqual([
      [0, 0, 'started'],
      [1, 0, 'marked'],
      [2, 15_250, 'missing'],
      [3, 30_000, 'marked'],
      [4, 30_000, 'ended'],
    ]);
    expect(journal[2]?.wall).toBe('2026-11-03T00:00:15.250+00:00');
    const pseudonym = new Map(header.children.map((child) => [child.id, child.pseudonym]));
    expect(
      readOut(fold(header, journal), { final: true }).map((line) => [
        line.number,
        pseudonym.get(line.child ?? ''),
        line.phase,
        line.codes,
        line.missing,
        line.openAt,
      ]),
    ).toEqual([
      [1, 'Otter-07', 'before', ['on-task'], null, 0],
      [2, 'Heron-02', 'before', null, 'out of view', 15_250],
      [3, 'Otter-07', 'after', ['off-task'], null, 30_000],
    ]);
  });

  test('children may share an interval number, and each keeps its own code', async () => {
    const rows = [
      'one,Quill,Otter-07,1,on-task',
      'one,Quill,Heron-02,1,off-task',
      'one,Quill,Otter-07,2,off-task',
    ];
    const { bundle } = await take([head, ...rows].join('\n'));
    expect(
      rowsOf(writeIntervalTable(bundle.sessions)).map(({ child, interval, code }) => [child, interval, code]),
    ).toEqual([
      ['Heron-02', '1', 'off-task'],
      ['Otter-07', '1', 'on-task'],
      ['Otter-07', '2', 'off-task'],
    ]);
  });

  test('partial interval: several codes, none, and a reason are three things', async () => {
    const { bundle } = await take(
      [
        `${head},missing,method`,
        's,Quill,Otter-07,1,on|off,,partial',
        's,Quill,Otter-07,2,,,partial',
        's,Quill,Otter-07,3,,paused,partial',
      ].join('\n'),
    );
    const [session] = bundle.sessions;
    if (session === undefined) throw new Error('no session');
    expect(
      readOut(fold(session.header, session.journal)).map(({ codes, missing }) => [codes, missing]),
    ).toEqual([
      [['on', 'off'], null],
      [[], null],
      [null, 'paused'],
    ]);
  });

  test('sessions of a visit share its id; sessions without one do not', async () => {
    const { bundle } = await take(
      [
        `${head},visit`,
        'a,Quill,Otter-07,1,on,v1',
        'b,Marsh,Otter-07,1,on,v1',
        'c,Quill,Otter-07,1,on,',
        'd,Marsh,Otter-07,1,on,',
      ].join('\n'),
    );
    const [a, b, c, d] = bundle.sessions.map(({ header }) => header.visit);
    expect(a).toBe(b);
    expect(new Set([a, c, d]).size).toBe(3);
    expect(bundle.sessions.map(({ header }) => header.visitLabel)).toEqual(['v1', 'v1', null, null]);
  });

  test('a missing date is taken from the start, as it was where it was written', async () => {
    const { bundle } = await take(`${head},start\na,Quill,Otter-07,1,on,2026-11-03T00:30+02:00\n`);
    expect(bundle.sessions[0]?.header.date).toBe('2026-11-03');
    expect(bundle.sessions[0]?.journal[0]?.wall).toBe('2026-11-03T00:30:00.000+02:00');
  });
});

describe('how a table may be written', () => {
  test('semicolons and decimal commas; names in any case and order; blank lines; a byte order mark', async () => {
    const text =
      '\ufeff Interval ;CODE;child;Observer;session;start_s\r\n\r\n1;on;Otter-07;Quill;s;1,5\r\n;;;;;\r\n2;off;Otter-07;Quill;s;16.5\r\n';
    const { bundle } = await take(text);
    const { schedule } = bundle.sessions[0]?.header ?? {};
    expect(schedule?.kind === 'listed' && schedule.intervals.map(({ startMs }) => startMs)).toEqual([
      1500, 16_500,
    ]);
  });

  test('tabs, and lines that end in CR alone', async () => {
    const { bundle } = await take('session\tobserver\tchild\tinterval\tcode\rs\tQuill\tOtter-07\t1\ton\r');
    expect(bundle.sessions).toHaveLength(1);
  });

  test('lines are those of the file, also below a cell with line breaks', async () => {
    const outcome = await outcomeOf(
      `${head},lesson_part\ns,Quill,Otter-07,1,on,"one\r\ntwo\nthree"\ns,Quill,Otter-07,zero,on,\n`,
    );
    expect(!outcome.ok && outcome.problems).toMatchObject([{ line: 5, problem: { code: 'table.interval' } }]);
  });

  test('unknown columns are listed and dropped, unless somebody ticks them', async () => {
    const text = `${head},Full name,remark\ns,Quill,Otter-07,1,on,Somebody,tired\n`;
    const dropped = await take(text);
    expect(dropped.notices.map(sentence)).toEqual(['Unknown columns, not taken over: Full name, remark.']);
    expect(JSON.stringify(dropped.bundle)).not.toMatch(/Somebody|tired/);
    const kept = await take(text, { keepColumns: ['remark'] });
    expect(kept.notices.map(sentence)).toEqual(['Unknown column, not taken over: Full name.']);
    expect(kept.bundle.sessions[0]?.journal[2]).toMatchObject({ kind: 'noted', text: 'remark: tired' });
  });
});

describe('codes of a table', () => {
  const labelled = (...labels: string[]): string =>
    [head, ...labels.map((label, i) => `s,Quill,Otter-07,${i + 1},"${label}"`)].join('\n');
  const roles = async (text: string, options?: ReadOptions) => {
    const { schedule } = (await take(text, options)).bundle.sessions[0]?.header ?? {};
    if (schedule?.kind !== 'listed') throw new Error('not listed');
    return Object.fromEntries(schedule.codeSet.codes.map(({ label, role }) => [label, role]));
  };

  test('labels say their role by how they begin', async () => {
    expect(
      await roles(
        labelled('on-task', 'On task, writing', 'off task', 'OFF-TASK: alone', '1', '0', 'on', 'off'),
      ),
    ).toEqual({
      '0': 'off-task',
      '1': 'on-task',
      'OFF-TASK: alone': 'off-task',
      'On task, writing': 'on-task',
      off: 'off-task',
      'off task': 'off-task',
      on: 'on-task',
      'on-task': 'on-task',
    });
  });

  test('others have to be named, and are then asked for once', async () => {
    const text = labelled('on', 'doodles', 'chats', 'doodles', 'fetches');
    const outcome = await outcomeOf(text, { off: ['chats'] });
    expect(outcome).toMatchObject({ ok: false, askRoles: ['doodles', 'fetches'] });
    expect(!outcome.ok && outcome.problems.map(({ line }) => line)).toEqual([3]);
    expect(await roles(text, { off: ['Chats', 'doodles'], other: ['fetches'] })).toEqual({
      chats: 'off-task',
      doodles: 'off-task',
      fetches: 'other',
      on: 'on-task',
    });
  });

  test("a study's own codes, classes and observers are recognised by name", async () => {
    const options = { study: { id: study.id, codeSets: [protocol.codeSet], classes: [classroom] } };
    const { bundle } = await take(`${head},class\ns,Quill,Otter-07,1,On-task,3B\n`, options);
    expect(bundle.classes).toEqual([]);
    const [session] = bundle.sessions;
    expect(session?.header).toMatchObject({
      study: study.id,
      classroom: { id: classroom.id },
      children: [{ id: 'child-1' }],
      schedule: { codeSet: protocol.codeSet },
    });
    expect(session?.journal[1]).toMatchObject({ code: 'on' });
  });
});

describe('what is written', () => {
  test('a recorded session, with its visit, its real start and the reasons for what is missing', () => {
    const rows = rowsOf(writeIntervalTable([laidSession()]));
    expect(
      rows.map(({ child, interval, phase, code, missing, start_s }) => [
        child,
        interval,
        phase,
        code,
        missing,
        start_s,
      ]),
    ).toEqual([
      ['Otter-07', '1', 'before', 'on-task', '', '0'],
      ['Heron-02', '2', 'before', 'off-task', '', '15'],
      ['Otter-07', '3', 'before', '', 'out of view', '30'],
      ['Heron-02', '4', 'before', '', 'missed', '45'],
      ['Otter-07', '5', 'after', '', 'ended early', ''],
      ['Heron-02', '6', 'after', '', 'ended early', ''],
      ['Otter-07', '7', 'after', '', 'ended early', ''],
      ['Heron-02', '8', 'after', '', 'ended early', ''],
    ]);
    expect(rows[0]).toMatchObject({
      session: 'session-1',
      visit: 'visit-1',
      start: '2026-11-03T10:42:00.000+00:00',
      method: 'momentary',
      interval_s: '15',
    });
  });

  test('what a spreadsheet would run is guarded, and reading takes the guard off', async () => {
    const { bundle } = await take(`${head}\n"'=cmd","'@Quill","''tis",1,on\n`);
    expect(bundle.sessions[0]?.header).toMatchObject({
      sessionLabel: '=cmd',
      observer: { name: '@Quill' },
      children: [{ pseudonym: "'tis" }],
    });
    expect(writeIntervalTable(bundle.sessions)).toContain("'=cmd,'@Quill,''tis,1,on,");
  });

  test('numbers are never guarded, and take a decimal comma beside semicolons', async () => {
    const { bundle } = await take(`${head},minutes_from_break\ns,Quill,Otter-07,1,on,-2.5\n`);
    expect(rowsOf(writeIntervalTable(bundle.sessions))[0]?.minutes_from_break).toBe('-2.5');
    const semicolons = writeIntervalTable(bundle.sessions, { delimiter: ';' });
    expect(rowsOf(semicolons, ';')[0]?.minutes_from_break).toBe('-2,5');
    expect((await take(semicolons)).bundle.sessions).toEqual(bundle.sessions);
  });
});
