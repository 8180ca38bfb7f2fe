import { readdirSync, readFileSync } from 'node:fs';
import type { Endpoint } from 'comlink';
import { afterEach, expect, it } from 'vitest';
import { problem } from '../../src/kernel/result.ts';
import { importDemo } from '../../src/tasks/index.ts';
import { askDirectly, createAsker } from '../../src/worker/client.ts';
import type { Ask, Question } from '../../src/worker/questions.ts';
import { serveQuestions } from '../../src/worker/serve.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, recorded, school } from '../tasks/bench.ts';

const ends: MessageChannel[] = [];
afterEach(() => {
  for (const { port1, port2 } of ends.splice(0)) {
    port1.close();
    port2.close();
  }
});

function acrossTo(open: Parameters<typeof serveQuestions>[0]): Ask {
  const channel = new MessageChannel();
  ends.push(channel);
  serveQuestions(open, channel.port1 as unknown as Endpoint);
  return createAsker(channel.port2 as unknown as Endpoint);
}

const folder = new URL('../../demo-sessions/', import.meta.url);

async function demo() {
  const on = await bench();
  const files = readdirSync(folder)
    .filter((name) => /\.(json|csv)$/.test(name))
    .map((name) => ({ name, bytes: new Uint8Array(readFileSync(new URL(name, folder))) }));
  const preview = given(await importDemo(on.deps, files));
  return { ...on, study: preview.bundles[0]?.study.id ?? '' };
}

it('answers every question on the demo, and the same across a channel as on the spot', async () => {
  const { deps, study } = await demo();
  const near = askDirectly(deps.store);
  const far = acrossTo(async () => ({ ok: true, value: deps.store }));
  const overview = given(await near({ kind: 'study', study }));
  expect(overview.visits.length).toBeGreaterThan(4);
  const double = overview.visits.find((visit) => visit.sessions.length > 1);
  const session = overview.visits[0]?.sessions[0] ?? '';
  const questions: Question[] = [
    { kind: 'study', study },
    { kind: 'session', session },
    { kind: 'agreement', study },
    { kind: 'agreement', study, visit: double?.key ?? '' },
    { kind: 'change', study },
  ];
  for (const question of questions) expect(given(await far(question))).toEqual(given(await near(question)));
  const one = given(await near({ kind: 'agreement', study, visit: double?.key ?? '' }));
  expect(one.pairs).toHaveLength(1);
  const bySession = given(await near({ kind: 'agreement', study, visit: double?.sessions[0] ?? '' }));
  expect(bySession.pairs.length).toBeGreaterThanOrEqual(1);
  expect(given(await near({ kind: 'change', study })).classes.length).toBeGreaterThan(1);
});

it('leaves practice out of what counts, and shows it where it is asked for', async () => {
  const on = await bench();
  const made = await school(on);
  const practised = await recorded(on, made, { practice: true });
  const ask = askDirectly(on.deps.store);
  expect(given(await ask({ kind: 'study', study: made.study.id })).visits).toEqual([]);
  const { details, sheets } = given(await ask({ kind: 'session', session: practised.id }));
  expect(details).toMatchObject({ session: practised.id, scored: 3, ended: true });
  expect(sheets).toHaveLength(1);
  const practice = given(await ask({ kind: 'agreement', study: made.study.id, practice: true }));
  expect(practice.report.overall).toMatchObject({ visits: 1, pairs: 0 });
});

it('tells how far it is', async () => {
  const on = await bench();
  const made = await school(on);
  for (let i = 0; i < 3; i++) await recorded(on, made);
  const ask = acrossTo(async () => ({ ok: true, value: on.deps.store }));
  const shares: number[] = [];
  given(await ask({ kind: 'study', study: made.study.id }, { progress: (share) => shares.push(share) }));
  expect(shares).toEqual([0.25, 0.5, 0.75]);
});

it.each(['near', 'far'])('stops a question that nobody waits for (%s)', async (where) => {
  const on = await bench();
  const made = await school(on);
  for (let i = 0; i < 5; i++) await recorded(on, made);
  let read = 0;
  const store = {
    ...on.deps.store,
    readSession: (id: string) => {
      read += 1;
      return on.deps.store.readSession(id);
    },
  };
  const ask = where === 'near' ? askDirectly(store) : acrossTo(async () => ({ ok: true, value: store }));
  const aborter = new AbortController();
  const question = { kind: 'study', study: made.study.id } as const;
  const answer = await ask(question, { signal: aborter.signal, progress: () => aborter.abort() });
  expect(codeOf(answer)).toBe('ask.stopped');
  const other = given(await ask(question));
  expect(other.visits).toHaveLength(5);
  expect(read).toBeLessThan(10);
  expect(codeOf(await ask(question, { signal: aborter.signal }))).toBe('ask.stopped');
});

it('says what is unknown, and opens the store again when it could not be opened before', async () => {
  const on = await bench();
  let opened = 0;
  const ask = acrossTo(async () => {
    opened += 1;
    return opened === 1 ? problem('store.refused') : { ok: true, value: on.deps.store };
  });
  expect(codeOf(await ask({ kind: 'study', study: 'nothing' }))).toBe('store.refused');
  expect(codeOf(await ask({ kind: 'study', study: 'nothing' }))).toBe('task.noStudy');
  expect(codeOf(await ask({ kind: 'session', session: 'nothing' }))).toBe('task.noSession');
  expect(codeOf(await ask({ kind: 'change', study: 'nothing' }))).toBe('task.noStudy');
  expect(opened).toBe(2);
});
