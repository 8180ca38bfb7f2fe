import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import {
  agreementReport,
  changeReport,
  recordsOf,
  sessionDetails,
  visits,
} from '../../src/analysis/index.ts';
import type { EntryBody, KnownEntry } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { VisitPlan } from '../../src/model/visitPlan.ts';
import { sheetLabel } from '../../src/schedule/sheetLabel.ts';
import {
  addObserver,
  beginPaper,
  findSheet,
  hasStandIns,
  keepPaperSession,
  keepSheet,
  type PaperAnswer,
  type PaperDraft,
  savePaper,
  startSession,
  visitOfSession,
} from '../../src/tasks/index.ts';
import { paperProblems } from '../../src/words/en/paper.ts';
import { codeOf, given } from '../storage/samples.ts';
import { protocolOf } from '../support/session.ts';
import { type Bench, bench, type School, school } from './bench.ts';

/** Three children, two rounds a part, before and after a break. */
function planOf(made: School, protocol: Partial<Protocol> = {}, phases = ['before', 'after']): VisitPlan {
  const { study, classroom } = made;
  return {
    visit: 'visit-1',
    study: {
      id: study.id,
      name: study.name,
      phases: study.phases,
      conditions: study.conditions,
      lessonParts: study.lessonParts,
    },
    classroom: { id: classroom.id, name: classroom.name },
    condition: 'break',
    plannedStart: null,
    children: ['c1', 'c2', 'c3'].map((id) => ({ id, pseudonym: `Otter-0${id.slice(1)}`, stratum: null })),
    plan: null,
    draw: null,
    orderSeed: null,
    schedule: { kind: 'laid', protocol: protocolOf({ study: study.id, ...protocol }), phases },
  };
}

const code = (...codes: string[]) => ({ codes });
/** Twelve looks; 5 empty, 9 away. */
const answers: Record<number, PaperAnswer> = {
  1: code('on'),
  2: code('off'),
  3: code('on'),
  4: code('on'),
  6: { missing: 'out of view' },
  7: code('off'),
  8: code('on'),
  9: { missing: 'left the room' },
  10: code('on'),
  11: code('on'),
  12: code('off'),
};

const head: Partial<PaperDraft> = {
  role: 'primary',
  date: '2026-11-02',
  start: '10:41',
  parts: [{ breakStarted: '10:43', firstTask: '10:52:30' }],
  answers,
};

async function typed(on: Bench, made: School, plan: VisitPlan, changes: Partial<PaperDraft>) {
  const draft = given(await beginPaper(on.deps, plan));
  return keepPaperSession(on.deps, { ...draft, observer: made.observer, ...head, ...changes });
}

async function stored(on: Bench, id: string): Promise<StoredSession> {
  const found = given(await on.deps.store.readSession(id));
  if (found === null) throw new Error('no session');
  return found;
}

/** The same marks, touched on a tablet with prompts, each 700 ms after its cue. */
async function onTablet(on: Bench, plan: VisitPlan, observer: string, said: Record<number, PaperAnswer>) {
  const header = given(await startSession(on.deps, plan, { observer, role: 'second', practice: false }));
  const start = Date.UTC(2026, 10, 2, 10, 41);
  const at = (interval: number): number =>
    interval <= 6 ? interval * 15_000 : 690_000 + (interval - 6) * 15_000;
  const marks = Array.from({ length: 12 }, (_, k): [number, EntryBody][] => {
    const interval = k + 1;
    const cue = at(interval);
    const answer = said[interval];
    const cued: [number, EntryBody] = [
      cue,
      { kind: 'cued', interval, cue: 'look', planned: cue, delivered: cue, by: ['sound'] },
    ];
    if (answer === undefined) return [cued];
    const body: EntryBody =
      'missing' in answer
        ? { kind: 'missing', interval, reason: answer.missing }
        : { kind: 'marked', interval, code: 'codes' in answer ? (answer.codes[0] ?? null) : null };
    return [cued, [cue + 700, body]];
  });
  const all: [number, EntryBody][] = [
    [0, { kind: 'started', checks: [], anyway: false }],
    [0, { kind: 'phaseStarted', phase: 'before', part: 0, origin: 0 }],
    ...marks.slice(0, 6).flat(),
    [120_000, { kind: 'breakStarted' }],
    [690_000, { kind: 'breakEnded' }],
    [690_000, { kind: 'phaseStarted', phase: 'after', part: 1, origin: 690_000 }],
    ...marks.slice(6).flat(),
    [795_000, { kind: 'ended', reason: 'complete' }],
  ];
  const journal = all.map(([when, body], seq) => ({
    session: header.id,
    writer: 'run-2',
    seq,
    at: when,
    wall: new Date(start + when).toISOString().replace('Z', '+00:00'),
    ...body,
  })) as KnownEntry[];
  given(await on.deps.store.appendEntries(header.id, journal));
  return header.id;
}

describe('A sheet that was typed in', () => {
  it('is a session from paper, with the marks at their planned looks and no word of prompts', async () => {
    const on = await bench();
    const made = await school(on);
    const header = given(await typed(on, made, planOf(made), {}));
    expect(header).toMatchObject({ fromPaper: true, visit: 'visit-1', date: '2026-11-02', role: 'primary' });
    const { journal } = await stored(on, header.id);
    const lines = journal.map((entry) => `${entry.at} ${entry.kind}`);
    expect(lines).toEqual([
      '0 started',
      '0 phaseStarted',
      '15000 marked',
      '30000 marked',
      '45000 marked',
      '60000 marked',
      '90000 missing',
      '120000 breakStarted',
      '690000 breakEnded',
      '690000 phaseStarted',
      '705000 marked',
      '720000 marked',
      '735000 missing',
      '750000 marked',
      '765000 marked',
      '780000 marked',
      '795000 ended',
    ]);
    expect(journal[2]?.wall).toBe('2026-11-02T10:41:15.000+00:00');
    expect(given(await on.deps.store.session(header.id))).toMatchObject({
      fromPaper: true,
      ended: 'complete',
      here: true,
      handedOver: false,
    });
  });

  it('gives the same figures as the same marks on a tablet, and pairs with a record of the visit', async () => {
    const on = await bench();
    const made = await school(on);
    const marsh = given(await addObserver(on.deps, made.study.id, 'Marsh'));
    const plan = planOf(made);
    const paper = await stored(on, given(await typed(on, made, plan, {})).id);
    const tablet = await stored(on, await onTablet(on, plan, marsh.id, answers));
    const figures = (session: StoredSession) => {
      const { phases, planned, scored, missing, missingBy } = sessionDetails(session);
      return {
        counts: { planned, scored, missing, missingBy },
        phases: phases.map(({ row: { session: _, observer: __, ...row }, ...rest }) => ({
          ...rest,
          row,
        })),
      };
    };
    expect(figures(paper)).toEqual(figures(tablet));
    // By hand: before 1, 3, 4 on, 2 off, 5 and 6 missing; after 8, 10, 11 on, 7 and 12 off, 9 missing.
    expect(sessionDetails(paper).phases.map(({ row }) => row.percentOnTask)).toEqual([75, 60]);
    expect(sessionDetails(paper).timing?.cues).toBe(0);
    const grouped = visits(recordsOf([paper, tablet]));
    expect(grouped.map(({ records }) => records.length)).toEqual([2, 2]);
    const { pairs } = agreementReport(grouped).report;
    expect(
      pairs.map(({ observers, compared, percentAgreement }) => [observers, compared, percentAgreement]),
    ).toEqual([
      [['Marsh', 'Quill'], 4, 100],
      [['Marsh', 'Quill'], 5, 100],
    ]);
    const change = (sessions: StoredSession[]) => changeReport(visits(recordsOf(sessions)), {});
    const asPrimary = {
      ...tablet,
      header: { ...paper.header, fromPaper: false, observer: tablet.header.observer },
    };
    expect(change([paper])).toEqual(change([asPrimary]));
  });

  it('counts what stays empty as missed, and what came after an early stop as that', async () => {
    const on = await bench();
    const made = await school(on);
    const short = { 1: code('on'), 2: code('on') };
    const stopped = given(
      await typed(on, made, planOf(made, {}, ['before']), { answers: short, parts: [], stoppedAfter: 4 }),
    );
    const { missingBy } = sessionDetails(await stored(on, stopped.id));
    expect(missingBy.map(({ reason, n }) => [reason, n])).toEqual([
      ['missed', 2],
      ['ended early', 2],
    ]);
    // A part that never began was not observed.
    const half = given(
      await typed(on, made, planOf(made), { answers: short, parts: [{ breakStarted: '', firstTask: '' }] }),
    );
    const details = sessionDetails(await stored(on, half.id));
    expect(details.phases.map(({ row }) => row.phase)).toEqual(['before']);
    expect(details.missing).toBe(4);
  });

  it('holds sets of codes, counts and onsets as the recorder would', async () => {
    const on = await bench();
    const made = await school(on);
    const plain = { parts: [] };
    const partial = planOf(made, { method: 'partial', observeMs: 10_000 }, ['before']);
    const sets = given(
      await typed(on, made, partial, {
        ...plain,
        answers: { 1: code('on', 'off'), 2: code(), 3: code('off') },
      }),
    );
    const [first] = sessionDetails(await stored(on, sets.id)).phases;
    expect(first?.codes.map(({ code: label, n }) => [label, n])).toEqual([
      ['on-task', 1],
      ['off-task', 2],
    ]);
    expect([first?.row.scored, first?.row.onTask]).toEqual([3, 1]);
    const headcount = planOf(made, { method: 'headcount', partLength: { kind: 'minutes', minutes: 1 } }, [
      'before',
    ]);
    const counted = given(
      await typed(on, made, headcount, {
        ...plain,
        answers: {
          1: { on: 10, present: 20 },
          2: { on: 15, present: 20 },
          3: { missing: 'class interrupted' },
        },
      }),
    );
    expect(sessionDetails(await stored(on, counted.id)).phases[0]?.row.percentOnTask).toBe(62.5);
    const duration = planOf(
      made,
      { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 10 } },
      ['before'],
    );
    const watched = given(
      await typed(on, made, duration, {
        ...plain,
        answers: {},
        onsets: [
          { part: 0, atMs: 360_000, answer: code('off') },
          { part: 0, atMs: 0, answer: code('on') },
        ],
      }),
    );
    // Six of ten minutes, by hand.
    expect(sessionDetails(await stored(on, watched.id)).phases[0]?.row.percentOnTask).toBe(60);
    const stopped = given(
      await typed(on, made, duration, {
        ...plain,
        answers: {},
        onsets: [
          { part: 0, atMs: 0, answer: code('on') },
          { part: 0, atMs: 360_000, answer: code('off') },
        ],
        stoppedAt: 480_000,
      }),
    );
    // Six of eight; the last two minutes were not observed.
    expect(sessionDetails(await stored(on, stopped.id)).phases[0]?.row.percentOnTask).toBe(75);
  });

  it('keeps what the sitting was for: a familiarisation visit stays out of results', async () => {
    const on = await bench();
    const made = await school(on);
    const kept = given(await typed(on, made, planOf(made), { familiarisation: true }));
    expect(kept).toMatchObject({ familiarisation: true, practice: false, fromPaper: true });
  });

  it('is refused with one sentence for what cannot be, and nothing is kept of it', async () => {
    const on = await bench();
    const made = await school(on);
    const refused = async (changes: Partial<PaperDraft>, protocol: Partial<Protocol> = {}) =>
      codeOf(await typed(on, made, planOf(made, protocol), changes));
    const part = (breakStarted: string, firstTask: string) => ({ parts: [{ breakStarted, firstTask }] });
    expect(await refused({ observer: null })).toBe('paper.noObserver');
    expect(await refused({ answers: {} })).toBe('paper.nothing');
    expect(await refused({ date: '' })).toBe('paper.noDate');
    expect(await refused({ date: '2026-11-04' })).toBe('paper.inFuture');
    expect(await refused({ date: '2026-02-30' })).toBe('paper.badStart');
    expect(await refused({ start: '' })).toBe('paper.noStart');
    expect(await refused({ start: '25:00' })).toBe('paper.badStart');
    expect(await refused(part('', ''))).toBe('paper.noFirstTask');
    expect(await refused(part('', 'noon'))).toBe('paper.badTime');
    expect(await refused(part('10:40', '10:52'))).toBe('paper.breakBeforeStart');
    expect(await refused(part('10:45', '10:43'))).toBe('paper.firstTaskBeforeBreak');
    expect(await refused(part('10:41', '10:52'))).toBe('paper.markAfterBreak');
    expect(await refused(part('', '10:41:20'))).toBe('paper.firstTaskTooEarly');
    expect(await refused({ stoppedAfter: 13 })).toBe('paper.stoppedNowhere');
    expect(await refused({ stoppedAfter: 8 })).toBe('paper.markAfterStop');
    expect(await refused({ answers: { 13: code('on') } })).toBe('task.noSuchInterval');
    expect(await refused({ answers: { 1: code('sings') } })).toBe('task.noSuchCode');
    expect(await refused({ answers: { 1: code('on', 'off') } })).toBe('task.oneCode');
    expect(await refused({ answers: { 1: { on: 1, present: 2 } } })).toBe('paper.otherMethod');
    const noPart = { breakStarted: '', firstTask: '' };
    const counting = { method: 'headcount' as const };
    expect(await refused({ answers: { 1: { on: 9, present: 8 } } }, counting)).toBe('paper.onOverPresent');
    expect(await refused({ answers: { 1: { on: 9, present: Number.NaN } } }, counting)).toBe('paper.noCount');
    expect(await refused({ answers: { 1: { on: 9, present: 1820 } } }, counting)).toBe('paper.tooMany');
    const watching = { method: 'duration' as const, partLength: { kind: 'minutes' as const, minutes: 2 } };
    const onset = (atMs: number) => ({ part: 0, atMs, answer: { codes: ['on'] } });
    expect(await refused({ answers: {}, onsets: [onset(120_000)] }, watching)).toBe('paper.onsetOutside');
    expect(await refused({ answers: {}, onsets: [onset(0), onset(0)] }, watching)).toBe('paper.onsetTwice');
    const stop = (stoppedAt: number) => ({
      answers: {},
      onsets: [onset(30_000)],
      stoppedAt,
      parts: [noPart],
    });
    expect(await refused(stop(30_000), watching)).toBe('paper.onsetAfterStop');
    expect(await refused(stop(120_000), watching)).toBe('paper.stoppedOutside');
    expect(given(await on.deps.store.listSessions(made.study.id))).toEqual([]);
  });

  it('writes the wall clock with the offset of its own day, across the end of summer time', async () => {
    const on = await bench();
    const made = await school(on);
    const header = given(
      await typed(on, made, planOf(made), {
        date: '2026-10-22',
        parts: [{ breakStarted: '', firstTask: '' }],
        answers: { 1: code('on') },
      }),
    );
    const { journal } = await stored(on, header.id);
    expect(journal[0]?.wall).toBe('2026-10-22T10:41:00.000+01:00');
  });
});

describe('The draft and the schedule of a sheet', () => {
  it('keeps what is typed until it is a session, and then forgets it and the prepared visit', async () => {
    const on = await bench();
    const made = await school(on);
    const plan = planOf(made);
    given(await on.deps.store.saveSettings({ prepared: plan }));
    const draft = given(await beginPaper(on.deps, plan));
    given(await savePaper(on.deps, { ...draft, ...head, observer: made.observer }));
    const kept = given(await on.deps.store.settings()).paper;
    expect(kept?.answers).toEqual(answers);
    given(await keepPaperSession(on.deps, kept as PaperDraft));
    expect(given(await on.deps.store.settings())).toMatchObject({ paper: null, prepared: null });
  });

  it('can be kept after all when the disk refused the first time, also with another head', async () => {
    const on = await bench();
    const made = await school(on);
    const { store } = on.deps;
    const begun = given(await beginPaper(on.deps, planOf(made)));
    const draft = { ...begun, ...head, observer: made.observer };
    const append = store.appendEntries;
    store.appendEntries = async () => ({ ok: false, problem: { code: 'store.full', values: {} } });
    expect(codeOf(await keepPaperSession(on.deps, draft))).toBe('store.full');
    store.appendEntries = append;
    const kept = given(await keepPaperSession(on.deps, { ...draft, role: 'second' }));
    expect(kept.id).not.toBe(begun.session);
    expect(sessionDetails(await stored(on, kept.id)).scored).toBe(9);
    // The same draft once more, as after a refusal at the very end: nothing is doubled.
    const whole = await stored(
      on,
      given(await keepPaperSession(on.deps, { ...draft, session: 'session-9' })).id,
    );
    given(await keepPaperSession(on.deps, { ...draft, session: 'session-9' }));
    expect(await stored(on, 'session-9')).toEqual(whole);
  });

  it('finds the schedule by its label: printed, or recorded; the second record is meant as second', async () => {
    const on = await bench();
    const made = await school(on);
    const plan = planOf(made);
    const label = sheetLabel(plan);
    expect(label).toMatch(/^[A-Z0-9]{3}-[A-Z0-9]{3}$/);
    expect(sheetLabel({ ...plan, children: [...plan.children].reverse() })).not.toBe(label);
    expect(codeOf(await findSheet(on.deps, made.study.id, label))).toBe('paper.noLabel');
    given(await keepSheet(on.deps, plan));
    given(await keepSheet(on.deps, plan));
    expect(given(await on.deps.store.settings()).sheets).toHaveLength(1);
    expect(given(await findSheet(on.deps, made.study.id, label.toLowerCase().replace('-', ' ')))).toEqual(
      plan,
    );
    given(await on.deps.store.saveSettings({ sheets: [] }));
    const id = await onTablet(on, plan, made.observer, answers);
    expect(given(await visitOfSession(on.deps, id))).toEqual(plan);
    const found = given(await findSheet(on.deps, made.study.id, label));
    expect(given(await beginPaper(on.deps, found))).toMatchObject({
      role: 'primary',
      date: '2026-11-03',
      start: '10:41:00',
    });
  });
});

it('has a sentence for every problem of a sheet, and none besides', () => {
  const folders = ['tasks/', 'screens/paper/'].map((floor) => new URL(`../../src/${floor}`, import.meta.url));
  const texts = folders.flatMap((folder) =>
    readdirSync(folder)
      .filter((name) => /\.tsx?$/.test(name))
      .map((name) => readFileSync(new URL(name, folder), 'utf8')),
  );
  const codes = texts.flatMap((text) => [...text.matchAll(/'(paper\.\w+)'/g)].map(([, code]) => code ?? ''));
  expect(Object.keys(paperProblems).sort()).toEqual([...new Set(codes)].sort());
});

describe('A reserve who stepped in on paper', () => {
  /** Otter-02 leaves before its second look and is back for its third; two reserves wait. */
  const withReserves = (made: School, protocol: Partial<Protocol> = {}): VisitPlan => ({
    ...planOf(made, { reservesStepIn: true, ...protocol }),
    reserves: ['r1', 'r2'].map((id) => ({ id, pseudonym: `Otter-1${id.slice(1)}`, stratum: null })),
  });
  const standIn = { child: 'c2', reason: 'left the room' as const, by: 'r1', from: 4, until: 11 };

  it('stands in the record as on a tablet: who left, why, who stood in, and who was watched at each look', async () => {
    const on = await bench();
    const made = await school(on);
    const marsh = given(await addObserver(on.deps, made.study.id, 'Marsh'));
    const plan = withReserves(made);
    const paper = await stored(on, given(await typed(on, made, plan, { standIns: [standIn] })).id);
    const left = paper.journal.find(({ kind }) => kind === 'left');
    expect(left).toMatchObject({ kind: 'left', child: 'c2', reason: 'left the room', by: 'r1', at: 60_000 });
    // On a tablet somebody touches it between two looks, not at a line.
    const whole = await stored(on, await onTablet(on, plan, marsh.id, answers));
    const touched: [number, EntryBody][] = [
      [52_000, { kind: 'left', child: 'c2', reason: 'left the room', by: 'r1' }],
      [758_000, { kind: 'returned', child: 'c2' }],
    ];
    const extra = touched.map(([at, body], k) => ({ ...whole.journal[0], ...body, at, seq: 0.25 + k }));
    const journal = [...whole.journal, ...(extra as KnownEntry[])]
      .sort((a, b) => a.at - b.at)
      .map((entry, seq) => ({ ...entry, seq }));
    const read = (one: StoredSession) =>
      readOut(fold(one.header, one.journal)).map(({ child, status, codes, missing }) => ({
        child,
        status,
        codes,
        missing,
      }));
    expect(read(paper)).toEqual(read({ ...whole, journal }));
    // c1 c2 c3, twice before and twice after: c2's looks are 2, 5, 8 and 11.
    expect(read(paper).map(({ child }) => child)).toEqual('c1 c2 c3 c1 r1 c3 c1 r1 c3 c1 c2 c3'.split(' '));
    const figures = (one: StoredSession) =>
      sessionDetails(one).phases.map(({ row }) => [row.scored, row.onTask, row.missing]);
    expect(figures(paper)).toEqual(figures({ ...whole, journal }));
  });

  it('may leave in its turn, or make room for the next one', async () => {
    const on = await bench();
    const made = await school(on);
    const watched = async (standIns: PaperDraft['standIns']) => {
      const header = given(await typed(on, made, withReserves(made), { standIns: standIns ?? [] }));
      const { journal } = await stored(on, header.id);
      return readOut(fold(header, journal))
        .filter(({ number }) => number % 3 === 2)
        .map(({ child }) => child);
    };
    const open = { ...standIn, until: null };
    expect(await watched([open])).toEqual(['c2', 'r1', 'r1', 'r1']);
    expect(await watched([open, { ...open, child: 'r1', by: 'r2', from: 7 }])).toEqual([
      'c2',
      'r1',
      'r2',
      'r2',
    ]);
    expect(await watched([{ ...open, by: 'r2', from: 9 }, open])).toEqual(['c2', 'r1', 'r1', 'r2']);
  });

  it('is cut short by the break as the looks are, and needs the part in which it stands', async () => {
    const on = await bench();
    const made = await school(on);
    const few = { answers: { 1: code('on') } };
    const early = given(
      await typed(on, made, withReserves(made), {
        ...few,
        standIns: [{ ...standIn, from: 6, until: null }],
        parts: [{ breakStarted: '10:41:40', firstTask: '10:52' }],
      }),
    );
    const { journal } = await stored(on, early.id);
    const at = journal.map((entry) => entry.at);
    expect(at).toEqual([...at].sort((a, b) => a - b));
    expect(journal.find(({ kind }) => kind === 'left')?.at).toBe(40_000);
    const noPart = { ...few, parts: [{ breakStarted: '', firstTask: '' }] };
    const later = { ...noPart, standIns: [{ ...standIn, from: 8 }] };
    expect(codeOf(await typed(on, made, withReserves(made), later))).toBe('paper.noFirstTask');
  });

  it('is refused with one sentence for what cannot be', async () => {
    const on = await bench();
    const made = await school(on);
    const refused = async (...standIns: NonNullable<PaperDraft['standIns']>) =>
      codeOf(await typed(on, made, withReserves(made), { standIns }));
    expect(await refused({ ...standIn, by: 'c3' })).toBe('paper.standInWho');
    expect(await refused({ ...standIn, child: 'c9' })).toBe('paper.standInWho');
    expect(await refused({ ...standIn, child: 'r2' })).toBe('paper.standInWho');
    expect(await refused({ ...standIn, from: 13 })).toBe('paper.standInNowhere');
    expect(await refused({ ...standIn, until: 4 })).toBe('paper.standInBack');
    expect(await refused(standIn, { ...standIn, by: 'r2', from: 7 })).toBe('paper.standInAway');
    expect(await refused(standIn, { ...standIn, child: 'c3', from: 9 })).toBe('paper.standInBusy');
  });

  it('is no question of a sheet whose protocol has no stepping in, or where nobody is in reserve', async () => {
    const on = await bench();
    const made = await school(on);
    expect(hasStandIns(withReserves(made))).toBe(true);
    expect(hasStandIns(withReserves(made, { reservesStepIn: false }))).toBe(false);
    expect(hasStandIns(withReserves(made, { method: 'headcount' }))).toBe(false);
    expect(hasStandIns(planOf(made, { reservesStepIn: true }))).toBe(false);
  });
});
