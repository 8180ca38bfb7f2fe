import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { JournalState } from '../../src/journal/state.ts';
import { fold } from '../../src/journal/step.ts';
import { pageMs } from '../../src/kernel/units.ts';
import { methods, type Protocol } from '../../src/model/protocol.ts';
import { swapPairs } from '../../src/recorder/swapPairs.ts';
import { headerOf } from '../support/session.ts';
import { FakeStore } from './fakes/fakeStore.ts';
import { settled } from './fakes/handClock.ts';
import { Lesson } from './fakes/lesson.ts';

/** One thing that an observer, the tablet or the world does. */
const action = fc.oneof(
  {
    weight: 6,
    arbitrary: fc.record({ kind: fc.constant('touch' as const), code: fc.constantFrom('on', 'off', null) }),
  },
  {
    weight: 3,
    arbitrary: fc.record({ kind: fc.constant('wait' as const), ms: fc.integer({ min: 1, max: 20_000 }) }),
  },
  {
    weight: 8,
    arbitrary: fc.record({
      kind: fc.constantFrom(
        ...([
          'cannotSee',
          'childBefore',
          'undo',
          'left',
          'returned',
          'moved',
          'interrupt',
          'continue',
        ] as const),
        ...(['pause', 'resume', 'flag', 'note', 'lessonPart', 'break', 'first task'] as const),
        ...([
          'silence',
          'sound',
          'output gone',
          'hide',
          'show',
          'audio off',
          'audio on',
          'audio anew',
        ] as const),
        ...(['busy', 'sleep', 'wall', 'refuse', 'keep'] as const),
        ...(['correct', 'clear', 'swap', 'unusable', 'count', 'kill'] as const),
      ),
    }),
  },
);
type Action = typeof action extends fc.Arbitrary<infer T> ? T : never;

async function act(lesson: Lesson, { ...what }: Action): Promise<void> {
  const { session, audio, clock, store } = lesson;
  const { intervals, now } = session.snapshot();
  switch (what.kind) {
    case 'correct':
      return session.correct(2, { codes: ['off'] });
    case 'clear':
      return session.correct(3, { missing: 'other' });
    case 'swap':
      return session.swap(swapPairs(intervals, ['c1', 'c2'], 6));
    case 'unusable':
      return session.unusable({ from: now - 20_000, to: now }, 'class interrupted');
    case 'count':
      return session.count(intervals.length % 7, 9, pageMs(clock.page));
    case 'touch':
      return lesson.touch(what.code);
    case 'wait':
      return clock.advance(what.ms);
    case 'cannotSee':
      return lesson.cannotSee();
    case 'childBefore':
      return session.childBefore();
    case 'undo':
      return session.undo();
    case 'left':
      return session.childLeft('c2', 'left the room');
    case 'returned':
      return session.childReturned('c2');
    case 'moved':
      return session.childMoved('c1', 'seat-3');
    case 'interrupt':
      return session.interruptClass();
    case 'continue':
      return session.continueClass();
    case 'pause':
      return session.pause();
    case 'resume':
      return session.resume();
    case 'flag':
      return session.flag();
    case 'note':
      return session.note('words');
    case 'lessonPart':
      return session.lessonPart('individual');
    case 'break':
      return session.breakStarted();
    case 'first task':
      return session.firstTaskGiven();
    case 'silence':
      return session.silence(true);
    case 'sound':
      return session.silence(false);
    case 'output gone':
      return audio.output('gone');
    case 'hide':
      return lesson.setHidden(true);
    case 'show':
      return lesson.setHidden(false);
    case 'audio off':
      return audio.interrupt();
    case 'audio on':
      return audio.comeBack();
    case 'audio anew':
      return audio.comeBack({ anew: true });
    case 'busy':
      return clock.block(1700);
    case 'sleep':
      return clock.sleep(30_000);
    case 'wall':
      return clock.sleep(-45_000);
    case 'refuse':
      store.mood = 'refuses';
      return;
    case 'keep':
      store.mood = 'keeps';
  }
}

/** What must be alike: everything but the identity of objects. */
const plain = (state: JournalState) => ({
  ...state,
  swapped: [...state.swapped].sort((a, b) => a - b),
  sayings: [...state.sayings].sort(([a], [b]) => a - b),
  cues: [...state.cues].sort(([a], [b]) => a - b),
  settled: [...state.settled],
  seats: [...state.seats],
});

/** A protocol of any kind, short enough for its end to be reached. */
const protocols = fc.record({
  method: fc.constantFrom(...methods),
  rotation: fc.constantFrom<Protocol['rotation']>(
    { kind: 'next' },
    { kind: 'block', intervals: 2 },
    { kind: 'one' },
    { kind: 'sweep', eachMs: 3000 },
    { kind: 'target', peerEvery: 3 },
  ),
  lookAt: fc.constantFrom('end' as const, 'start' as const),
  observeMs: fc.constantFrom(10_000, 15_000),
  afterPause: fc.constantFrom('missing' as const, 'repeat' as const),
  reservesStepIn: fc.boolean(),
});

const lessonOf = (changes: Partial<Protocol>) =>
  new Lesson({
    store: new FakeStore(),
    manner: { confirm: true, remind: true },
    header: headerOf({ partLength: { kind: 'rounds', rounds: 3 }, ...changes }, ['before', 'after'], {
      role: null,
      reserves: [{ id: 'r1', pseudonym: 'Otter-09', stratum: null }],
    }),
  });

/** The same session taken up after the tablet was switched off for some seconds. */
async function takenUp(lesson: Lesson): Promise<Lesson> {
  lesson.store.mood = 'keeps';
  await lesson.session.flush();
  const journal = [...lesson.store.journal()];
  if (journal.some(({ kind }) => kind === 'ended')) return lesson;
  const again = new Lesson({ header: lesson.header, store: lesson.store, resumeFrom: journal });
  again.clock.wall = lesson.clock.wall + 4000;
  await again.begin();
  return again;
}

describe('whatever happens in whatever order', () => {
  it('what the room shows is what the written journal folds to, and every cue lies on its grid', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(action, { minLength: 5, maxLength: 60 }),
        protocols,
        async (actions, protocol) => {
          let lesson = await lessonOf(protocol).begin();
          for (const one of actions)
            if (one.kind === 'kill') lesson = await takenUp(lesson);
            else await act(lesson, one);
          await settled();
          lesson.store.mood = 'keeps';
          expect(await lesson.session.flush()).toBe(true);
          const { state, kept } = lesson.session.snapshot();
          const journal = lesson.store.journal().sort((a, b) => a.seq - b.seq);
          expect(kept).toEqual({ kept: journal.length, of: journal.length, refused: null });
          expect(journal.map(({ seq }) => seq)).toEqual(journal.map((_, i) => i));
          expect(plain(state)).toEqual(plain(fold(lesson.header, journal)));
          const starts = new Map(
            journal.flatMap((e) => (e.kind === 'phaseStarted' ? [[e.part, e.origin]] : [])),
          );
          const cued = journal.flatMap((e) => (e.kind === 'cued' ? [e] : []));
          for (const { interval, cue, planned, delivered, by, at } of cued) {
            const line = state.planned[interval - 1];
            const place = cue === 'record' ? (line?.openMs ?? Number.NaN) + protocol.observeMs : line?.cueMs;
            expect(planned).toBe((starts.get(line?.part ?? 0) ?? 0) + (place ?? Number.NaN));
            expect(delivered === null).toBe(by.length === 0);
            expect(at).toBeGreaterThanOrEqual(planned);
          }
          // No cue is told of twice, but for an interval that is done again; and all times are whole milliseconds.
          const again = new Set(journal.flatMap((e) => (e.kind === 'resumed' ? [e.repeats] : [])));
          const once = cued.filter(({ interval }) => !again.has(interval));
          expect(new Set(once.map(({ interval, cue }) => `${interval} ${cue}`)).size).toBe(once.length);
          expect(journal.every(({ at }) => Number.isInteger(at))).toBe(true);
        },
      ),
      { seed: 20261103, numRuns: 300 },
    );
  });

  it('sound never comes at another moment than that of a cue or a tick, to the millisecond', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(action, { minLength: 5, maxLength: 60 }), async (actions) => {
        const lesson = await lessonOf({ method: 'momentary' }).begin();
        // What lay ahead when the context stood and went on is another matter: its clock is tested on its own.
        const calm = actions.filter(({ kind }) => !['sleep', 'pause', 'audio on', 'kill'].includes(kind));
        for (const one of calm) await act(lesson, one);
        const { origins } = lesson.session.snapshot().state;
        const moments = origins.flatMap((origin) =>
          origin === null
            ? []
            : [
                ...[3, 2, 1].map((n) => origin - n * 1000),
                ...Array.from({ length: 9 }, (_, k) => origin + (k + 1) * 15_000),
              ],
        );
        for (const { heardAt } of lesson.audio.heard())
          expect(moments).toContain(Math.round((heardAt ?? 0) - lesson.zero));
      }),
      { seed: 20261103, numRuns: 200 },
    );
  });
});
