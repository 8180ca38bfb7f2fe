import { describe, expect, it } from 'vitest';
import { headerOf } from '../support/session.ts';
import { Lesson } from './fakes/lesson.ts';

/** Looks at 15, 30, 45, 60, 75 and 90 seconds; the last one stays open until 105. */
const begun = () => new Lesson().begin();

const marks = (lesson: Lesson) =>
  lesson.store
    .journal()
    .flatMap((entry) =>
      entry.kind === 'marked'
        ? [`${entry.interval} ${entry.code}${entry.late ? ' late' : ''}${entry.before ? ' before' : ''}`]
        : entry.kind === 'missing'
          ? [`${entry.interval} ${entry.reason}`]
          : [],
    );

const refusal = (lesson: Lesson) => lesson.session.snapshot().refusal?.why ?? null;

describe('whose touch is it', () => {
  it('takes nothing before the first cue, not even a millisecond', async () => {
    const lesson = await begun();
    await lesson.until(14_999);
    lesson.touch('on');
    expect(refusal(lesson)).toBe('before the first cue');
    await lesson.until(15_000 + 400);
    lesson.touch('off');
    await lesson.until(20_000);
    expect(marks(lesson)).toEqual(['1 off']);
  });

  it('gives a touch at the very cue, and up to the grace after it, to an empty interval before, as late', async () => {
    for (const after of [0, 1, 399, 400]) {
      const lesson = await begun();
      await lesson.until(30_000 + after);
      lesson.touch('on');
      await lesson.until(110_000);
      expect(marks(lesson)).toEqual(['1 on late']);
      expect(lesson.outcome().slice(0, 2)).toEqual(['on late', 'missed']);
    }
  });

  it('gives a touch a millisecond after the grace to the new interval', async () => {
    const lesson = await begun();
    await lesson.until(30_401);
    lesson.touch('on');
    await lesson.until(110_000);
    expect(lesson.outcome().slice(0, 2)).toEqual(['missed', 'on']);
  });

  it('gives a touch within the grace to the new interval when the one before has its mark', async () => {
    const lesson = await begun();
    await lesson.until(20_000);
    lesson.touch('off');
    await lesson.until(30_050);
    lesson.touch('on');
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['1 off', '2 on']);
  });

  it('gives it to the new interval, too, when the one before was out of view', async () => {
    const lesson = await begun();
    await lesson.until(20_000);
    lesson.cannotSee();
    await lesson.until(30_050);
    lesson.touch('on');
    await lesson.until(110_000);
    expect(lesson.outcome().slice(0, 2)).toEqual(['out of view', 'on']);
  });

  it('gives it to the new interval when the child before is away and waits for no mark', async () => {
    const lesson = await begun();
    await lesson.until(5_000);
    lesson.session.childLeft('c1', 'left the room');
    await lesson.until(30_100);
    lesson.touch('on');
    await lesson.until(110_000);
    expect(lesson.outcome().slice(0, 2)).toEqual(['left the room', 'on']);
  });

  it('goes by the moment of touching down, not by the moment at which it is told', async () => {
    const lesson = await begun();
    await lesson.until(29_990);
    const down = lesson.clock.pageClock.now();
    // The page is busy for 900 ms, over the next cue and its grace.
    lesson.clock.block(900);
    lesson.session.touch('on', down);
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['1 on']);
    expect(lesson.store.journal().find((entry) => entry.kind === 'marked')?.at).toBe(29_990);
    expect(lesson.outcome()[0]).toBe('on');
  });

  it('keeps the last interval open for one interval length, and takes a touch told after the end', async () => {
    const lesson = await begun();
    await lesson.until(104_999);
    const down = lesson.clock.pageClock.now();
    lesson.clock.block(500);
    lesson.session.touch('on', down);
    await lesson.clock.advance(1000);
    expect(lesson.outcome().at(-1)).toBe('on');
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', at: 105_000, reason: 'complete' });
    lesson.touch('off');
    expect(refusal(lesson)).toBe('not running');
    expect(lesson.outcome().at(-1)).toBe('on');
  });

  it('lets another code replace the mark, with both in the journal; the same code again makes no entry', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(18_000);
    lesson.touch('off');
    await lesson.until(20_000);
    lesson.touch('off');
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['1 on', '1 off']);
    expect(lesson.outcome()[0]).toBe('off');
    expect(lesson.session.snapshot().felt?.count).toBe(3);
  });

  it('makes one mark of a double touch and of a palm, also over a cue', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(16_060);
    lesson.touch('off');
    expect(refusal(lesson)).toBe('double touch');
    await lesson.until(29_900);
    lesson.touch('off');
    await lesson.until(30_150);
    lesson.touch('off');
    expect(refusal(lesson)).toBe('double touch');
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['1 on', '1 off']);
    expect(lesson.outcome().slice(0, 2)).toEqual(['off', 'missed']);
  });

  it('takes two quick marks of two fingers once no palm can be meant', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(16_080);
    lesson.touch('off');
    await lesson.until(16_380);
    lesson.touch('off');
    await lesson.until(20_000);
    expect(marks(lesson)).toEqual(['1 on', '1 off']);
  });
});

describe('the child before', () => {
  it('is marked by the next touch, even when a cue comes between the two', async () => {
    const lesson = await begun();
    await lesson.until(44_000);
    lesson.session.childBefore();
    expect(lesson.session.snapshot().armedBefore).toBe(1);
    await lesson.until(46_000);
    lesson.touch('off');
    expect(lesson.session.snapshot().armedBefore).toBeNull();
    await lesson.until(47_000);
    lesson.touch('on');
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['1 off before', '3 on']);
  });

  it('is forgotten after five seconds and taken back by a second touch', async () => {
    const lesson = await begun();
    await lesson.until(31_000);
    lesson.session.childBefore();
    await lesson.until(36_001);
    lesson.touch('on');
    lesson.session.childBefore();
    lesson.session.childBefore();
    await lesson.until(38_000);
    lesson.touch('off');
    await lesson.until(110_000);
    expect(marks(lesson)).toEqual(['2 on', '2 off']);
  });

  it('replaces a mark that is there, and says so where there is nobody before', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.session.childBefore();
    expect(refusal(lesson)).toBe('nothing before');
    lesson.touch('on');
    await lesson.until(31_000);
    lesson.session.childBefore();
    lesson.cannotSee();
    await lesson.until(110_000);
    expect(lesson.outcome().slice(0, 2)).toEqual(['out of view', 'missed']);
  });
});

describe('undo', () => {
  it('takes back the last word, then the one before it; the same code may be touched again at once', async () => {
    const lesson = await begun();
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(17_000);
    lesson.touch('off');
    expect(lesson.session.snapshot().undo).toMatchObject({ kind: 'marked', code: 'off', interval: 1 });
    lesson.session.undo();
    await lesson.until(17_100);
    expect(lesson.session.snapshot().current?.codes).toEqual(['on']);
    lesson.session.undo();
    expect(lesson.session.snapshot().current?.status).toBe('open');
    expect(lesson.session.snapshot().undo).toBeNull();
    lesson.touch('off');
    await lesson.until(110_000);
    expect(lesson.outcome()[0]).toBe('off');
    expect(lesson.kinds().filter((kind) => kind === 'withdrawn')).toHaveLength(2);
  });
});

describe('partial intervals', () => {
  const partial = () =>
    new Lesson({
      header: headerOf({
        method: 'partial',
        intervalMs: 10_000,
        observeMs: 7000,
        partLength: { kind: 'rounds', rounds: 1 },
      }),
    }).begin();

  it('latch several codes within one interval; "none of these" wipes them; each code once', async () => {
    const lesson = await partial();
    await lesson.until(1000);
    lesson.touch('on');
    await lesson.until(3000);
    lesson.touch('off');
    await lesson.until(5000);
    lesson.touch('on');
    await lesson.until(11_000);
    lesson.touch('on');
    await lesson.until(12_000);
    lesson.touch(null);
    await lesson.until(13_000);
    lesson.touch('off');
    await lesson.until(22_000);
    lesson.touch(null);
    await lesson.until(40_000);
    expect(lesson.outcome()).toEqual(['on+off', 'off', 'none']);
    expect(marks(lesson)).toEqual(['1 on', '1 off', '2 on', '2 null', '2 off', '3 null']);
  });

  it('take touches through the record part, and within the grace for an empty interval before', async () => {
    const lesson = await partial();
    await lesson.until(9_900);
    lesson.touch('on');
    await lesson.until(20_300);
    lesson.touch('off');
    await lesson.until(20_700);
    lesson.touch('on');
    await lesson.until(40_000);
    expect(lesson.outcome()).toEqual(['on', 'off late', 'on']);
  });
});

describe('what the hand feels', () => {
  it('clicks for a touch that was taken and stays quiet for one that was not', async () => {
    const lesson = await begun();
    await lesson.until(10_000);
    lesson.touch('on');
    expect(lesson.audio.played).toHaveLength(0);
    await lesson.until(16_000);
    lesson.touch('on');
    expect(lesson.audio.played).toHaveLength(1);
    await lesson.until(16_020);
    lesson.touch('off');
    expect(lesson.audio.played).toHaveLength(1);
    lesson.session.silence(true);
    await lesson.until(18_000);
    lesson.touch('off');
    expect(lesson.audio.played).toHaveLength(1);
  });
});
