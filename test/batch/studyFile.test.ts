import { describe, expect, test } from 'vitest';
import { parseArguments } from '../../src/batch/parseArguments.ts';
import { runCommand } from '../../src/batch/runCommand.ts';
import type { Bundle } from '../../src/exchange/types.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import type { SessionHeader } from '../../src/model/session.ts';
import type { Study } from '../../src/model/study.ts';
import { wordsFor } from '../../src/words/words.ts';
import { csvOf } from '../analysis/sessionsFrom.ts';
import { headerOf, journalOf, protocolOf } from '../support/session.ts';

const codeSet = {
  name: 'Alone or with others',
  codes: [
    { id: 'on', label: 'on-task', role: 'on-task' as const, definition: '', examples: '', nonExamples: '' },
    {
      id: 'alone',
      label: 'by oneself',
      role: 'off-task' as const,
      definition: '',
      examples: '',
      nonExamples: '',
    },
    {
      id: 'help',
      label: 'asked for help',
      role: 'other' as const,
      definition: '',
      examples: '',
      nonExamples: '',
    },
  ],
};

const study: Study = {
  id: 'study-1',
  name: 'Otters at their desks',
  phases: ['before', 'after'],
  conditions: [],
  control: null,
  lessonParts: [],
  criterion: { agreement: 0.8, kappa: 0.6 },
  safeguarding: '',
  pairings: [],
  demo: false,
  removed: false,
  revision: { counter: 0, writer: 'w' },
};

/** One part of six looks; `codes` are marked in turn. */
function recorded(
  id: string,
  observer: string,
  codes: readonly string[],
  more: Partial<SessionHeader> = {},
): StoredSession {
  const header = headerOf({ codeSet }, ['before'], {
    id,
    observer: { id: observer, name: observer },
    ...more,
  });
  const marks = codes.map((code, i): [number, EntryBody] => [
    15_000 * (i + 1) + 800,
    { kind: 'marked', interval: i + 1, code },
  ]);
  const journal = journalOf([0, { kind: 'started', checks: [], anyway: false }], ...marks, [
    105_000,
    { kind: 'ended', reason: 'complete' },
  ]).map((entry) => ({ ...entry, session: id, writer: `writer ${id}` }));
  return { header, journal };
}

async function run(command: string, bundle: Partial<Bundle>, tables: Record<string, string> = {}) {
  const whole = {
    study,
    classes: [],
    observers: [],
    protocols: [protocolOf({ codeSet })],
    sessions: [],
    visitPlans: [],
    ...bundle,
  };
  const bytes = await writeStudyFile(whole, { exportedAt: '2026-11-03T12:00:00+00:00', app: '0.1.0' });
  const files = [{ name: 'study.lookbell.json', bytes }];
  for (const [name, text] of Object.entries(tables))
    files.push({ name, bytes: new TextEncoder().encode(text) });
  const request = parseArguments([...command.split(' '), 'study.lookbell.json', '--json']);
  if (!request.ok || request.value === 'help') throw new Error('not a request');
  const { out, err, status } = await runCommand(request.value, files, wordsFor());
  return { document: JSON.parse(out), err, status };
}

describe('figures from a study file', () => {
  const marsh = recorded('m', 'Marsh', ['on', 'on', 'alone', 'on', 'help', 'alone'], { role: 'second' });
  const quill = recorded('q', 'Quill', ['on', 'alone', 'alone', 'on', 'on', 'alone']);

  test('codes that count as neither are scored, and left out of percent on-task', async () => {
    const { document, err, status } = await run('ontask', { sessions: [marsh] });
    expect({ err, status }).toEqual({ err: [], status: 0 });
    expect(document.sessions[0]).toMatchObject({
      session: 'm',
      visit: 'visit-1',
      class: 'Class Otter',
      condition: 'break',
      scored: 6,
      missing: 0,
      onTask: 3,
      percentOnTask: 60,
    });
  });

  test("agreement on the code set's own codes, in its order, by their labels", async () => {
    const { document } = await run('agreement', { sessions: [quill, marsh] });
    expect(document.pairs[0].table).toEqual({
      codes: ['on-task', 'by oneself', 'asked for help'],
      counts: [
        [2, 1, 0],
        [0, 2, 0],
        [1, 0, 0],
      ],
    });
    // By hand: po 4/6; pe (3·3 + 2·3 + 1·0)/36.
    expect(document.pairs[0].kappa).toBeCloseTo((4 / 6 - 15 / 36) / (1 - 15 / 36), 12);
  });

  test('a pairing by hand that is kept in the study', async () => {
    const apart = recorded('q', 'Quill', ['on', 'on', 'on', 'on', 'on', 'on'], { visit: 'visit-2' });
    const pairs = async (pairings: Study['pairings']) =>
      (await run('agreement', { study: { ...study, pairings }, sessions: [marsh, apart] })).document.overall;
    expect(await pairs([])).toMatchObject({
      pairs: 0,
      visits: 2,
      kappa: null,
      why: { kappa: 'kappa is undefined: no visit has two observers' },
    });
    expect(await pairs([{ session: 'q', visit: 'visit-1' }])).toMatchObject({ pairs: 1, visits: 1 });
  });

  test('familiarisation visits only when asked for, in every command', async () => {
    const sessions = [
      quill,
      recorded('f', 'Reed', ['on'], { familiarisation: true, visit: 'visit-3' }),
      recorded('g', 'Marsh', ['on'], { familiarisation: true, visit: 'visit-3' }),
    ];
    const with_ = '--with-familiarisation';
    expect((await run('ontask', { sessions })).document.sessions).toHaveLength(1);
    expect((await run(`ontask ${with_}`, { sessions })).document.sessions).toHaveLength(3);
    expect((await run('ontask --practice', { sessions })).document.sessions).toHaveLength(1);
    expect((await run('agreement', { sessions })).document.pairs).toEqual([]);
    expect((await run(`agreement ${with_}`, { sessions })).document.pairs).toHaveLength(1);
    expect((await run('check', { sessions })).document.sessions).toBe(1);
    expect((await run(`check ${with_}`, { sessions })).document.sessions).toBe(3);
  });

  test('practice sessions only when asked for', async () => {
    const sessions = [quill, recorded('p', 'Reed', ['on'], { practice: true, visit: 'visit-3' })];
    expect((await run('ontask', { sessions })).document.sessions).toHaveLength(1);
    expect((await run('ontask --practice', { sessions })).document.sessions).toHaveLength(2);
  });

  test('a table beside it knows its codes', async () => {
    const table = csvOf(
      ['on-task', 'by oneself'].map((code, i) => ({
        session: 'paper',
        observer: 'Reed',
        child: 'Otter-01',
        interval: i + 1,
        code,
      })),
    );
    const { document, err, status } = await run('ontask', { sessions: [quill] }, { 'paper.csv': table });
    expect({ err, status }).toEqual({ err: [], status: 0 });
    expect(document.sessions.map((row: { session: string }) => row.session)).toContain('paper');
  });
});
