import { expect, test } from 'vitest';
import { recorderDesk } from '../../src/app/recorderDesk.ts';
import { pageMs } from '../../src/kernel/units.ts';
import type { Manner } from '../../src/model/observer.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import { memoryStore } from '../../src/storage/index.ts';
import { coreWordsFor } from '../../src/words/coreWords.ts';
import { beforeZero, Lesson } from '../recorder/fakes/lesson.ts';
import { headerOf, protocolOf } from '../support/session.ts';

/** A desk whose session runs on the clocks and the sound of a hand-driven lesson. */
async function atTheDesk(manner: Manner | undefined, changes: Partial<Protocol> = {}) {
  const header = headerOf(changes);
  const lesson = new Lesson({ header });
  lesson.hasVoice = true;
  const store = memoryStore();
  const record = {
    ...header.observer,
    study: header.study,
    keyMap: null,
    ...(manner === undefined ? {} : { manner }),
    removed: false,
    revision: { counter: 0, writer: 'w' },
  };
  await store.put({ observers: [{ record, previous: null }] });
  await store.createSession(header);
  const desk = recorderDesk(store, coreWordsFor(), () => lesson.ports());
  const opened = await desk.open(header, { checks: [], anyway: false });
  if (!opened.ok) throw new Error(opened.problem.code);
  const live = opened.value;
  const zero = lesson.clock.page + beforeZero;
  await live.begin();
  /** Time goes by until this second of the session. */
  const until = (seconds: number) => lesson.clock.advance(zero + seconds * 1000 - lesson.clock.page);
  return { lesson, desk, live, until };
}

const eyesUp: Manner = { layout: 'eyes-up', hand: 'right', confirm: false, remind: true };

test('a session begins as its observer likes it: unanswered touches, prompts recalled', async () => {
  const { lesson, live, until } = await atTheDesk(eyesUp);
  await until(15.5);
  live.touch('on', pageMs(lesson.clock.page));
  expect(lesson.vibrations).toBe(0);
  await until(44);
  expect(live.snapshot().reminded).toBe(1);
});

test('an observer who has chosen nothing is answered, and not reminded', async () => {
  const { lesson, live, until } = await atTheDesk(undefined);
  await until(15.5);
  live.touch('on', pageMs(lesson.clock.page));
  expect(lesson.vibrations).toBe(1);
  await until(44);
  expect(live.snapshot().reminded).toBe(0);
});

test('the words ahead of a look are the pseudonyms as one says them, where the protocol wants any', async () => {
  const cues = { ...protocolOf().cues, headsUp: { says: 'child', aheadMs: 2000 } } as const;
  const wanted = await atTheDesk(undefined, { cues });
  await wanted.until(31);
  expect(wanted.lesson.spoken.map(({ words }) => words)).toEqual(['Otter 1', 'Otter 2']);
  const silent = await atTheDesk(undefined);
  await silent.until(31);
  expect(silent.lesson.spoken).toEqual([]);
});

test('two taps at the door open one session', async () => {
  const { desk } = await atTheDesk(eyesUp);
  const again = await desk.open(headerOf({}, ['before'], { id: 'session-2' }), { checks: [], anyway: false });
  expect(again).toMatchObject({ ok: false, problem: { code: 'session.running' } });
  expect(desk.currentId()).toBe('session-1');
});
