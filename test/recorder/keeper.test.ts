import { describe, expect, it } from 'vitest';
import { retryAfter, slowAfterMs } from '../../src/recorder/keeper.ts';
import { FakeStore } from './fakes/fakeStore.ts';
import { settled } from './fakes/handClock.ts';
import { Lesson } from './fakes/lesson.ts';

/** A lesson with marks every ten seconds or so, up to session time `until`. */
async function lessonUntil(until: number, store = new FakeStore()): Promise<Lesson> {
  const lesson = await new Lesson({ store }).begin();
  await lesson.until(until);
  return lesson;
}

const kept = (lesson: Lesson) => lesson.session.snapshot().kept;

describe('the write queue', () => {
  it('shows an entry as felt at once and as kept only when it is durable', async () => {
    const lesson = await lessonUntil(16_000);
    expect(kept(lesson)).toEqual({ kept: 2, of: 2, refused: null });
    lesson.touch('on');
    expect(lesson.session.snapshot().felt?.count).toBe(1);
    expect(kept(lesson)).toEqual({ kept: 2, of: 3, refused: null });
    expect(lesson.store.rows.size).toBe(2);
    await settled();
    expect(kept(lesson)).toEqual({ kept: 3, of: 3, refused: null });
    expect(lesson.store.rows.size).toBe(3);
  });

  it.each(['refuses', 'throws'] as const)(
    'says "kept 2 of 6" while the store %s, catches up in order, loses nothing',
    async (mood) => {
      const lesson = await lessonUntil(16_000);
      lesson.store.mood = mood;
      lesson.touch('on');
      // While the first write is still on its way.
      lesson.session.note('first');
      await lesson.clock.advance(1000);
      lesson.touch('off');
      lesson.session.flag();
      await settled();
      expect(kept(lesson)).toMatchObject({ kept: 2, of: 6 });
      expect(kept(lesson).refused?.code).toBe(mood === 'throws' ? 'recorder.storeFailed' : 'store.full');
      expect(lesson.store.rows.size).toBe(2);
      await lesson.until(50_000);
      lesson.store.mood = 'keeps';
      await lesson.until(60_500);
      const { kept: now, of, refused } = kept(lesson);
      expect([now, refused]).toEqual([of, null]);
      expect(lesson.store.journal().map(({ seq }) => seq)).toEqual(Array.from({ length: of }, (_, i) => i));
      expect(lesson.outcome()[0]).toBe('off');
    },
  );

  it('tries again after growing pauses, and at once when asked', async () => {
    const lesson = await lessonUntil(16_000);
    const tries = () => lesson.store.appends.length;
    const before = tries();
    lesson.store.mood = 'refuses';
    lesson.touch('on');
    await settled();
    expect(tries()).toBe(before + 1);
    for (const [n, pause] of retryAfter.slice(0, 3).entries()) {
      await lesson.clock.advance(pause - 1);
      expect(tries()).toBe(before + 1 + n);
      await lesson.clock.advance(1);
      expect(tries()).toBe(before + 2 + n);
    }
    expect(await lesson.session.flush()).toBe(false);
    lesson.store.mood = 'keeps';
    expect(await lesson.session.flush()).toBe(true);
    expect(await lesson.session.flush()).toBe(true);
    expect(kept(lesson).refused).toBeNull();
  });

  it('puts all that waits into one write', async () => {
    const lesson = await lessonUntil(16_000);
    const writes = lesson.store.appends.length;
    lesson.touch('on');
    lesson.session.flag();
    lesson.session.note('one');
    lesson.session.note('two');
    await settled();
    expect(lesson.store.appends.slice(writes)).toEqual([1, 3]);
  });

  it('says it when a write hangs, answers who waits for it, and goes on when it comes through', async () => {
    const lesson = await lessonUntil(16_000);
    lesson.store.mood = 'hangs';
    lesson.touch('on');
    const flushed = lesson.session.flush();
    await lesson.clock.advance(slowAfterMs - 1);
    expect(kept(lesson).refused).toBeNull();
    await lesson.clock.advance(1);
    expect(await flushed).toBe(false);
    expect(kept(lesson).refused?.code).toBe('recorder.storeSlow');
    expect(kept(lesson).kept).toBe(2);
    lesson.store.mood = 'keeps';
    lesson.store.letGo();
    await settled();
    expect(kept(lesson).refused).toBeNull();
    expect(kept(lesson).kept).toBe(kept(lesson).of);
  });

  it('writes again what was kept without an answer, and nothing is there twice', async () => {
    const lesson = await lessonUntil(16_000);
    lesson.store.mood = 'kept, then lost';
    lesson.touch('on');
    await lesson.clock.advance(3000);
    lesson.store.mood = 'keeps';
    await lesson.clock.advance(9000);
    expect(kept(lesson)).toMatchObject({ kept: 3, of: 3, refused: null });
    expect(lesson.store.rows.size).toBe(3);
  });

  it('a session that ends on a refusing store is packed, and the right to record given back, once all is kept', async () => {
    const lesson = await lessonUntil(16_000);
    lesson.store.mood = 'refuses';
    lesson.session.end();
    await settled();
    expect([lesson.store.packed, lesson.lockHeld]).toEqual([0, true]);
    lesson.session.dispose();
    expect(lesson.lockHeld).toBe(true);
    lesson.store.mood = 'keeps';
    await lesson.clock.advance(10_000);
    expect([lesson.store.packed, lesson.lockHeld]).toEqual([1, false]);
    expect(lesson.store.journal().at(-1)?.kind).toBe('ended');
    expect(lesson.clock.pendingTimers).toBe(0);
  });

  it('a session that is put aside in the middle keeps what it has and touches nothing more', async () => {
    const lesson = await lessonUntil(16_000);
    lesson.touch('on');
    lesson.session.dispose();
    await lesson.clock.advance(100_000);
    expect(lesson.store.journal().map(({ kind }) => kind)).toEqual(['started', 'cued', 'marked']);
    expect(lesson).toMatchObject({ wakeLock: 'idle', lockHeld: false });
    expect(lesson.audio.heard()).toHaveLength(4);
    expect(lesson.clock.pendingTimers).toBe(0);
  });
});
