import { describe, expect, it } from 'vitest';
import { swapPairs } from '../../src/recorder/swapPairs.ts';
import { headerOf } from '../support/session.ts';
import { Lesson } from './fakes/lesson.ts';

/* Momentary looks at 15, 30 … 90 s of c1, c2, c3, c1, c2, c3. */
async function marked(...codes: string[]): Promise<Lesson> {
  const lesson = await new Lesson({ header: headerOf() }).begin();
  for (const [i, code] of codes.entries()) {
    await lesson.until((i + 1) * 15_000 + 1000);
    lesson.touch(code);
  }
  return lesson;
}

describe('corrections in the room', () => {
  it('of any look of the last round, and only of looks that have come', async () => {
    const lesson = await marked('on', 'on', 'on', 'off');
    const { session } = lesson;
    expect(session.snapshot().lastRound.map(({ number, child }) => [number, child])).toEqual([
      [1, 'c1'],
      [2, 'c2'],
      [3, 'c3'],
      [4, 'c1'],
    ]);
    session.correct(3, { codes: ['off'] });
    session.correct(2, { missing: 'with another adult' });
    session.correct(6, { codes: ['on'] });
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['on', 'with another adult', 'off', 'off', 'missed', 'missed']);
    expect(lesson.kinds().filter((kind) => kind === 'corrected')).toHaveLength(2);
  });

  it('the wrong child was watched: the marks of two children over the last looks change places, and back', async () => {
    const lesson = await marked('on', 'on', 'off', 'off', 'on');
    const { session } = lesson;
    const pairs = swapPairs(session.snapshot().intervals, ['c3', 'c1'], 3);
    expect(pairs).toEqual([[3, 4]]);
    expect(swapPairs(session.snapshot().intervals, ['c1', 'c2'], 5)).toEqual([
      [1, 2],
      [4, 5],
    ]);
    // Only c1 was watched in these: nothing has a counterpart.
    expect(swapPairs(session.snapshot().intervals, ['c1', 'c3'], 1)).toEqual([]);
    session.swap([[4, 5]]);
    await lesson.until(78_000);
    expect(
      session
        .snapshot()
        .intervals.slice(3, 5)
        .map(({ codes }) => codes),
    ).toEqual([['on'], ['off']]);
    expect(session.snapshot().undo).toMatchObject({ kind: 'swapped' });
    session.undo();
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['on', 'on', 'off', 'off', 'on', 'missed']);
  });

  it('a stretch of no use takes its looks, whatever was touched in it', async () => {
    const lesson = await marked('on', 'on', 'off', 'off');
    lesson.session.unusable({ from: 30_000, to: 60_000 }, 'other', 'wrong class');
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(['on', 'other', 'other', 'off', 'missed', 'missed']);
    expect(lesson.store.journal().find(({ kind }) => kind === 'unusable')).toMatchObject({
      words: 'wrong class',
    });
  });
});

describe('a reserve steps in when the protocol says so', () => {
  const reserves = ['r1', 'r2'].map((id) => ({ id, pseudonym: id, stratum: null }));
  const whoComes = async (reservesStepIn: boolean) => {
    const header = headerOf({ reservesStepIn, partLength: { kind: 'rounds', rounds: 3 } }, ['before'], {
      reserves,
    });
    return new Lesson({ header }).begin();
  };

  it('in the drawn order, until the child returns; a reserve who leaves is stood in for by the next', async () => {
    const lesson = await whoComes(true);
    await lesson.until(17_000);
    lesson.session.childLeft('c2', 'left the room');
    expect(lesson.session.snapshot().upcoming).toMatchObject({ child: 'r1', number: 2 });
    await lesson.until(31_000);
    lesson.touch('on');
    await lesson.until(62_000);
    lesson.session.childLeft('r1', 'with another adult');
    expect(lesson.session.snapshot().upcoming).toMatchObject({ child: 'r2', number: 5 });
    await lesson.until(77_000);
    lesson.session.childReturned('c2');
    await lesson.until(160_000);
    expect(lesson.kept().map(({ child }) => child)).toEqual([
      'c1',
      'r1',
      'c3',
      'c1',
      'r2',
      'c3',
      'c1',
      'c2',
      'c3',
    ]);
    expect(lesson.outcome()[1]).toBe('on');
  });

  it('undoing that the child left sends the reserve back', async () => {
    const lesson = await whoComes(true);
    await lesson.until(17_000);
    lesson.session.childLeft('c2', 'left the room');
    lesson.session.undo();
    expect(lesson.session.snapshot().upcoming?.child).toBe('c2');
  });

  it('and does not where the protocol says nothing of it', async () => {
    const lesson = await whoComes(false);
    await lesson.until(17_000);
    lesson.session.childLeft('c2', 'left the room');
    expect(lesson.session.snapshot().upcoming).toMatchObject({ child: 'c2', away: 'left the room' });
  });
});

describe('a true pause where broken intervals are done once more', () => {
  const alone = (changes: Parameters<typeof headerOf>[0]) =>
    new Lesson({
      header: headerOf({ afterPause: 'repeat', ...changes }, ['before'], { role: null }),
    }).begin();

  it('momentary: the interval begins anew at its full length; the look before it stays as it was', async () => {
    const lesson = await alone({});
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(25_000);
    lesson.session.pause();
    await lesson.clock.advance(60_000);
    lesson.session.resume();
    expect(lesson.session.snapshot().now).toBe(15_000);
    expect(lesson.session.snapshot().upcoming).toMatchObject({ number: 2, cueAt: 30_000 });
    // 15 s later, by the page, comes the look; and no cue of interval 1 once more.
    await lesson.clock.advance(16_000);
    lesson.touch('off');
    await lesson.clock.advance(90_000);
    expect(lesson.outcome()).toEqual(['on', 'off', 'missed', 'missed', 'missed', 'missed']);
    const cued = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.interval] : []));
    expect(cued).toEqual([1, 2, 3, 4, 5, 6]);
  });

  it('partial: what was said of the broken interval is said anew, after a breath and its own cue', async () => {
    const lesson = await alone({ method: 'partial', observeMs: 10_000 });
    await lesson.until(17_000);
    lesson.touch('off');
    await lesson.until(20_000);
    lesson.session.pause();
    await lesson.clock.advance(30_000);
    lesson.session.resume();
    expect(lesson.session.snapshot().now).toBe(14_000);
    await lesson.clock.advance(3000);
    lesson.touch('on');
    await lesson.clock.advance(100_000);
    expect(lesson.outcome()).toEqual(['missed', 'on', 'missed', 'missed', 'missed', 'missed']);
    const cued = lesson.store
      .journal()
      .flatMap((e) => (e.kind === 'cued' && e.cue === 'observe' ? [e.interval] : []));
    expect(cued).toEqual([1, 2, 2, 3, 4, 5, 6]);
    // Heard to the millisecond, too: the second cue of interval 2 a second after going on.
    expect(lesson.audio.heard().length).toBeGreaterThan(cued.length);
  });

  it('a look that was answered before the pause is not done again', async () => {
    const lesson = await alone({ lookAt: 'start' });
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(20_000);
    lesson.session.pause();
    await lesson.clock.advance(10_000);
    lesson.session.resume();
    expect(lesson.session.snapshot().now).toBe(20_000);
  });

  it('killed right after going on, the session goes on inside the repeated interval', async () => {
    const lesson = await alone({});
    await lesson.until(25_000);
    lesson.session.pause();
    await lesson.clock.advance(5000);
    lesson.session.resume();
    await lesson.clock.advance(3000);
    await lesson.session.flush();
    const again = new Lesson({
      header: lesson.header,
      store: lesson.store,
      resumeFrom: lesson.store.journal(),
    });
    again.clock.wall = lesson.clock.wall + 2000;
    await again.begin();
    expect(again.session.snapshot().now).toBe(20_000);
    expect(again.session.snapshot().upcoming?.number).toBe(2);
  });
});

describe('what the observer feels and hears', () => {
  it('answers each code with a rhythm of its own, in ear and hand, and falls silent when told to', async () => {
    const lesson = await new Lesson({ header: headerOf() }).begin();
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(17_000);
    lesson.touch('off');
    await lesson.until(18_000);
    lesson.cannotSee();
    expect(new Set(lesson.audio.played.map(({ pattern }) => JSON.stringify(pattern))).size).toBe(3);
    expect(lesson.vibrations).toBe(3);
    lesson.session.behave({ confirm: false, remind: false });
    await lesson.until(19_000);
    lesson.touch('on');
    expect(lesson.audio.played).toHaveLength(3);
    expect(lesson.vibrations).toBe(3);
  });

  it('recalls a prompt that waits, once, three seconds before its interval is lost; a marked one never', async () => {
    const lesson = await new Lesson({
      header: headerOf(),
      manner: { confirm: false, remind: true },
    }).begin();
    await lesson.until(26_900);
    expect(lesson.session.snapshot().reminded).toBe(0);
    await lesson.until(27_001);
    expect(lesson.session.snapshot().reminded).toBe(1);
    const [first] = lesson.audio.played;
    expect(Math.round((first?.page ?? 0) - lesson.zero)).toBe(27_000);
    await lesson.until(31_000);
    lesson.touch('on');
    await lesson.until(44_900);
    expect(lesson.session.snapshot().reminded).toBe(1);
    await lesson.until(110_000);
    expect(lesson.session.snapshot().reminded).toBe(5);
    expect(lesson.audio.played).toHaveLength(5);
  });

  it('recalls nothing while the class is interrupted or the child is away', async () => {
    const lesson = await new Lesson({
      header: headerOf(),
      manner: { confirm: false, remind: true },
    }).begin();
    await lesson.until(10_000);
    lesson.session.childLeft('c1', 'left the room');
    await lesson.until(29_000);
    lesson.session.interruptClass();
    await lesson.until(44_000);
    expect(lesson.session.snapshot().reminded).toBe(0);
  });
});

describe('a heads-up ahead of each look', () => {
  const cues = {
    channel: 'both',
    volume: 0.4,
    flash: false,
    vibration: false,
    headsUp: { says: 'child', aheadMs: 4000 },
  } as const;
  const headsUp = ({ child }: { child: string | null }) => `look at ${child}`;

  it('is spoken by a voice on the tablet, in time, and the prompt stays a tone', async () => {
    const lesson = new Lesson({ header: headerOf({ cues }), headsUp });
    lesson.hasVoice = true;
    await lesson.begin();
    await lesson.until(50_000);
    expect(lesson.spoken.map(({ words, page }) => [words, Math.round(page - lesson.zero)])).toEqual([
      ['look at c1', 11_000],
      ['look at c2', 26_000],
      ['look at c3', 41_000],
    ]);
    const looks = lesson.audio.heard().filter(({ pattern }) => pattern.tones[0]?.pitch === 660);
    expect(looks.map(({ heardAt }) => Math.round((heardAt ?? 0) - lesson.zero))).toEqual([
      15_000, 30_000, 45_000,
    ]);
  });

  it('is a soft tone, exact to the sample, where there is no voice', async () => {
    const lesson = await new Lesson({ header: headerOf({ cues }), headsUp }).begin();
    await lesson.until(50_000);
    expect(lesson.spoken).toEqual([]);
    const near = lesson.audio.heard().filter(({ pattern }) => pattern.tones[0]?.pitch === 370);
    expect(near.map(({ heardAt }) => Math.round((heardAt ?? 0) - lesson.zero))).toEqual([
      11_000, 26_000, 41_000,
    ]);
  });

  it('is not spoken late, not in silence and not while the class is interrupted', async () => {
    const lesson = new Lesson({ header: headerOf({ cues }), headsUp });
    lesson.hasVoice = true;
    await lesson.begin();
    await lesson.until(10_500);
    lesson.clock.block(1500);
    await lesson.until(20_000);
    lesson.session.silence(true);
    await lesson.until(35_000);
    lesson.session.silence(false);
    lesson.session.interruptClass();
    await lesson.until(50_000);
    expect(lesson.spoken).toEqual([]);
  });
});
