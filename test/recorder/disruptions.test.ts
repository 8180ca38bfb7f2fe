import { describe, expect, it } from 'vitest';
import { headerOf } from '../support/session.ts';
import { Lesson, outcomeOf } from './fakes/lesson.ts';
import { begun, heardTimes, mark } from './fakes/quarters.ts';

// What each test expects is written down by hand beside it, in the order of the intervals.

describe('the class is interrupted', () => {
  it('runs the schedule on in silence; looks that fell into it are missing and take no mark', async () => {
    const lesson = await begun();
    await mark(lesson, 1);
    await lesson.until(20_000);
    lesson.session.interruptClass();
    expect(lesson.session.snapshot().phase).toBe('interrupted');
    await lesson.until(47_000);
    lesson.touch('on');
    expect(lesson.session.snapshot().refusal?.why).toBe('class interrupted');
    await lesson.until(50_000);
    lesson.session.continueClass();
    await lesson.until(52_000);
    // The look of interval 3 came while the class was interrupted: still no mark.
    lesson.touch('on');
    await mark(lesson, 4, 5, 6);
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['on', 'class interrupted', 'class interrupted', 'on', 'on', 'on']);
    expect(heardTimes(lesson)).toEqual([15_000, 60_000, 75_000, 90_000]);
    expect(lesson.store.journal().at(-1)?.at).toBe(105_000);
    expect(lesson.store.journal().some((e) => e.kind === 'cued' && [2, 3].includes(e.interval))).toBe(false);
  });

  it('leaves the interval open whose look came before; it can still be marked', async () => {
    const lesson = await begun();
    await lesson.until(17_000);
    lesson.session.interruptClass();
    await lesson.until(18_000);
    lesson.touch('off');
    await lesson.until(20_000);
    lesson.session.continueClass();
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['off', 'missed', 'missed', 'missed', 'missed', 'missed']);
  });

  it('undone, it never was: the looks that were held back came to nobody', async () => {
    const lesson = await begun();
    await lesson.until(20_000);
    lesson.session.interruptClass();
    await lesson.until(35_000);
    lesson.session.undo();
    expect(lesson.session.snapshot().phase).toBe('running');
    await mark(lesson, 3, 4);
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['missed', 'prompt failed', 'on', 'on', 'missed', 'missed']);
    expect(heardTimes(lesson)).toEqual([15_000, 45_000, 60_000, 75_000, 90_000]);
  });
});

describe('a true pause', () => {
  it('alone, stops session time: the grid goes on where it stood, and nothing is lost', async () => {
    const lesson = await begun(headerOf({}, ['before'], { role: null }));
    await mark(lesson, 1);
    await lesson.until(20_000);
    lesson.session.pause();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'paused', mayPause: true });
    await lesson.clock.advance(600_000);
    expect(lesson.session.snapshot().now).toBe(20_000);
    lesson.session.resume();
    lesson.zero += 600_000;
    await mark(lesson, 2, 3, 4, 5, 6);
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['on', 'on', 'on', 'on', 'on', 'on']);
    const cued = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.delivered] : []));
    expect(cued).toEqual([15_000, 30_000, 45_000, 60_000, 75_000, 90_000]);
    // Ten minutes later by the clock on the wall, to the millisecond.
    expect(heardTimes(lesson)).toEqual([30_000, 45_000, 60_000, 75_000, 90_000]);
  });

  it('breaks an observed interval that it falls into, and no other', async () => {
    const lesson = await begun(
      headerOf({ method: 'partial', partLength: { kind: 'rounds', rounds: 1 } }, ['before'], { role: null }),
    );
    await lesson.until(20_000);
    lesson.session.pause();
    await lesson.clock.advance(60_000);
    lesson.session.resume();
    await lesson.clock.advance(60_000);
    expect(lesson.outcome()).toEqual(['missed', 'paused', 'missed']);
  });

  it('is refused to an observer with a role: two tablets would drift apart', async () => {
    for (const role of ['primary', 'second'] as const) {
      const lesson = await begun(headerOf({}, ['before'], { role }));
      await lesson.until(20_000);
      lesson.session.pause();
      expect(lesson.session.snapshot()).toMatchObject({ phase: 'running', mayPause: false });
      await lesson.until(110_000);
      expect(lesson.kinds()).toEqual(['started', 'ended']);
    }
  });
});

describe('children come and go', () => {
  it('an away child is missing with that reason until it is back, and its seat is the one it moved to', async () => {
    const lesson = await begun();
    await lesson.until(31_000);
    // c2 is being looked at and leaves; c3 and c1 go on.
    lesson.touch('on');
    await lesson.until(33_000);
    lesson.session.childLeft('c2', 'with another adult');
    lesson.session.childMoved('c3', 'seat-9');
    expect(lesson.session.snapshot().away.get('c2')).toBe('with another adult');
    expect(lesson.session.snapshot().seats.get('c3')).toBe('seat-9');
    await mark(lesson, 3, 4);
    await lesson.until(80_000);
    expect(lesson.session.snapshot().current?.missing).toBe('with another adult');
    await lesson.until(91_000);
    lesson.session.childReturned('c2');
    await mark(lesson, 6);
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['missed', 'on', 'on', 'on', 'with another adult', 'on']);
    expect(lesson.session.snapshot().away.size).toBe(0);
  });
});

describe('a break in the session', () => {
  const header = () => headerOf({}, ['before', 'after']);

  it('closes the part before; its last look stays open; the first task opens the part after, with a count-in', async () => {
    const lesson = await begun(header());
    await mark(lesson, 1);
    await lesson.until(31_000);
    lesson.session.breakStarted();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'between parts', breakStarted: true });
    await lesson.until(33_000);
    lesson.touch('off');
    await lesson.until(46_000);
    // The next look would have come at 45 seconds: there is none any more.
    lesson.touch('on');
    expect(lesson.session.snapshot().refusal?.why).toBe('after the last interval');
    expect(lesson.session.snapshot().current).toBeNull();
    lesson.session.childBefore();
    expect(lesson.session.snapshot().armedBefore).toBe(2);
    lesson.session.childBefore();

    // The break is over before the first part would have been: its looks must not mix with those of the second.
    await lesson.until(50_000);
    lesson.session.firstTaskGiven();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'counting in', part: 1, countIn: 3 });
    const origin = 50_000 + 250 + 3000;
    expect(lesson.session.snapshot().state.origins).toEqual([0, origin]);
    for (const k of [1, 2, 3, 4]) {
      await lesson.until(origin + k * 15_000 + 2000);
      lesson.touch('on');
      expect(lesson.session.snapshot().felt?.interval).toBe(6 + k);
    }
    await lesson.until(200_000);
    const early = 'ended early';
    expect(lesson.outcome()).toEqual([
      ...['on', 'off', early, early, early, early],
      ...['on', 'on', 'on', 'on', 'missed', 'missed'],
    ]);
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', at: origin + 105_000 });
    expect(lesson.kinds()).toEqual([
      ...['started', 'marked', 'breakStarted', 'marked', 'breakEnded', 'phaseStarted'],
      ...['marked', 'marked', 'marked', 'marked', 'ended'],
    ]);
    // Silence in the break, three ticks, then the second part.
    expect(heardTimes(lesson)).toEqual([
      ...[15_000, 30_000, origin - 3000, origin - 2000, origin - 1000],
      ...[1, 2, 3, 4, 5, 6].map((k) => origin + k * 15_000),
    ]);
  });

  it('undone at once, costs the looks that it held back and no more', async () => {
    const lesson = await begun(header());
    await lesson.until(16_000);
    lesson.session.breakStarted();
    await lesson.until(31_000);
    lesson.session.undo();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'running', breakStarted: false });
    await mark(lesson, 3);
    await lesson.until(90_500);
    expect(lesson.session.snapshot().intervals.slice(0, 4).map(outcomeOf)).toEqual([
      ...['missed', 'prompt failed', 'on', 'missed'],
    ]);
  });

  it('waits between parts when the first one has run out, and never opens the second by itself', async () => {
    const lesson = await begun(header());
    await lesson.until(3_600_000);
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'between parts', nextPart: { phase: 'after' } });
    lesson.session.firstTaskGiven();
    await lesson.clock.advance(200_000);
    expect(lesson.kinds()).toEqual(['started', 'phaseStarted', 'ended']);
    expect(lesson.session.snapshot().ended).toBe('complete');
  });
});

describe('the end', () => {
  it('early: what had its look keeps its mark, the rest is missing for that reason', async () => {
    const lesson = await begun();
    await mark(lesson, 1, 2);
    await lesson.until(50_000);
    lesson.session.end('the bell rang');
    await lesson.clock.advance(1000);
    expect(lesson.outcome()).toEqual(['on', 'on', ...Array(4).fill('ended early')]);
    expect(lesson.store.journal().at(-1)).toMatchObject({
      reason: 'early',
      words: 'the bell rang',
      at: 50_000,
    });
    lesson.session.undo();
    lesson.session.flag();
    await lesson.clock.advance(200_000);
    expect(lesson.kinds().at(-1)).toBe('ended');
    expect(heardTimes(lesson)).toEqual([15_000, 30_000, 45_000]);
  });
});

describe('flags, notes and lesson parts', () => {
  it('are written with the interval of the moment, and mark nothing', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.session.lessonPart('individual');
    await lesson.until(31_000);
    lesson.session.flag();
    const flag = lesson.session.snapshot().lastFlag;
    lesson.session.note('a bee', flag ?? undefined);
    await lesson.until(110_000);
    const journal = lesson.store.journal();
    expect(journal.find((e) => e.kind === 'flagged')).toMatchObject({ interval: 2, at: 31_000 });
    expect(journal.find((e) => e.kind === 'noted')).toMatchObject({ text: 'a bee', about: flag });
    expect(lesson.kept().map(({ lessonPart }) => lessonPart)).toEqual([null, ...Array(5).fill('individual')]);
  });
});

describe('who may record', () => {
  it('refuses to begin while another tab records, holds nothing, and begins once it may', async () => {
    const lesson = new Lesson();
    lesson.lockTaken = true;
    expect(await lesson.session.begin()).toMatchObject({ problem: { code: 'recorder.otherTabRecords' } });
    expect(lesson).toMatchObject({ wakeLock: 'idle', lockHeld: false });
    expect(lesson.audio.closed).toBe(true);
    expect(lesson.store.rows.size).toBe(0);
    lesson.lockTaken = false;
    await lesson.begin();
    expect(lesson).toMatchObject({ wakeLock: 'held', lockHeld: true });
  });
});
