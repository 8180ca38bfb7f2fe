import { expect, it } from 'vitest';
import { pageMs } from '../../src/kernel/units.ts';
import { swapPairs } from '../../src/recorder/swapPairs.ts';
import { headerOf } from '../support/session.ts';
import { Lesson } from './fakes/lesson.ts';

/*
 * A hundred minutes of an observer alone: 400 momentary looks at six children, every 15 seconds, in two parts of 50
 * minutes with a break between. Each look is answered "on" two seconds after its cue, except where something goes wrong;
 * what goes wrong is what goes wrong in schools (common practice, no source). What each look comes to is written down
 * by hand below; every look that is not named there is "on".
 */
const everySecond = 1000;
const cueAt = (look: number): number => look * 15 * everySecond;
const children = ['c1', 'c2', 'c3', 'c4', 'c5', 'c6'];
const header = headerOf(
  { partLength: { kind: 'minutes', minutes: 50 }, childrenToDraw: 6 },
  ['before', 'after'],
  {
    role: null,
    children: children.map((id, i) => ({ id, pseudonym: `Otter-0${i + 1}`, stratum: null })),
  },
);

/** Where the second part began, in seconds of session time: the tap, a head start, three, two, one. */
const secondPart = 3200 + 3.25;

/** looks from – to, and what stands there. */
const expected: readonly (readonly [number, number, string])[] = [
  [17, 28, 'class interrupted'], // 1 fire drill, 4:05 to 7:05
  [39, 39, 'left the room'], // 2 the third child is away, 9:01 to 12:01
  [45, 45, 'left the room'],
  [56, 56, 'missed'], // 3 a prompt missed by the observer
  // 4 look 60: the wrong code, taken back and touched anew
  [67, 67, 'off'], // 5 two children taken for each other: "on" and "off" change places
  [81, 86, 'prompt failed'], // 6 the tablet sleeps, 20:03 to 21:33
  [101, 106, 'other'], // 7 place lost in the rotation: a stretch of no use
  [121, 130, 'prompt failed'], // 8 battery empty, 30:03 to 32:33
  // 9 a call: looks 145 to 147 are shown and not heard, and answered
  [161, 162, 'missed'], // 10 a message hides the page, 40:03 to 40:38: heard, and nobody can touch
  // 11 a child changes seats; 12 another teacher takes over; 13 the earpiece is pulled out; 14 the clock is set back
  [197, 200, 'ended early'], // 15 the break comes early, at 49:10
  [203, 203, 'on late'], // 16 touched 0.3 s after the next cue
  // 17 a true pause of four minutes; 18 the disk refuses for a minute; 19 look 230 answered by "child before"
  [381, 400, 'ended early'], // 20 the lesson is cut short
];

const byHand = Array.from({ length: 400 }, (_, i) => {
  const look = i + 1;
  return expected.find(([from, to]) => from <= look && look <= to)?.[2] ?? 'on';
});

/** Answers the looks from – to, each two seconds after its cue; part two counts from its own beginning. */
async function answer(lesson: Lesson, from: number, to: number, code = 'on', origin = 0): Promise<void> {
  for (let look = from; look <= to; look++) {
    await lesson.until(origin * 1000 + cueAt(look) + 2000);
    lesson.touch(code);
  }
}

it('a hundred minutes in which all goes wrong fold to exactly what was written down by hand', async () => {
  let lesson = await new Lesson({ header }).begin();
  await answer(lesson, 1, 16);

  await lesson.until(245_000);
  lesson.session.interruptClass();
  await lesson.until(425_000);
  lesson.session.continueClass();
  await answer(lesson, 29, 36);

  await lesson.until(541_000);
  lesson.session.childLeft('c3', 'left the room');
  await answer(lesson, 37, 38);
  await answer(lesson, 40, 44);
  await answer(lesson, 46, 48);
  await lesson.until(722_500);
  lesson.session.childReturned('c3');
  await answer(lesson, 49, 55);

  await answer(lesson, 57, 59);

  await answer(lesson, 60, 60, 'off');
  await lesson.until(903_500);
  lesson.session.undo();
  lesson.touch('on');
  await answer(lesson, 61, 67);

  await answer(lesson, 68, 68, 'off');
  lesson.session.swap(swapPairs(lesson.session.snapshot().intervals, ['c1', 'c2'], 6));
  await answer(lesson, 69, 80);

  await lesson.until(1_203_000);
  lesson.setHidden(true);
  lesson.clock.sleep(90_000);
  lesson.setHidden(false);
  // The page's clock stood still meanwhile.
  lesson.zero -= 90_000;
  await answer(lesson, 87, 100);

  await answer(lesson, 101, 106, 'off');
  await lesson.until(1_595_000);
  lesson.session.unusable({ from: cueAt(101), to: cueAt(106) + 1 }, 'other', 'lost the place');
  await answer(lesson, 107, 120);

  await lesson.until(1_803_000);
  await lesson.session.flush();
  const dead = lesson;
  lesson = new Lesson({ header, store: dead.store, resumeFrom: [...dead.store.journal()] });
  lesson.clock.wall = dead.clock.wall + 150_000;
  lesson.zero = lesson.clock.page - 1_953_000;
  const begun = await lesson.session.begin();
  expect(begun.ok).toBe(true);
  await answer(lesson, 131, 144);

  await lesson.until(2_163_000);
  lesson.audio.interrupt();
  await answer(lesson, 145, 147);
  await lesson.until(2_208_000);
  lesson.audio.comeBack({ anew: true });
  await answer(lesson, 148, 160);

  await lesson.until(2_403_000);
  lesson.setHidden(true);
  await lesson.until(2_438_000);
  lesson.setHidden(false);
  await answer(lesson, 163, 171);

  await lesson.until(2_580_000);
  lesson.session.childMoved('c5', 'seat-9');
  await answer(lesson, 173, 175);
  // A look at the very moment of the tap above is answered, too.
  lesson.session.correct(172, { codes: ['on'] });
  await lesson.until(2_640_000);
  lesson.session.note('another teacher takes over');
  lesson.session.lessonPart('individual');
  await answer(lesson, 176, 184);

  await lesson.until(2_763_000);
  lesson.audio.output('gone');
  await answer(lesson, 185, 185);
  await lesson.until(2_780_000);
  lesson.session.silence(false);
  await answer(lesson, 186, 192);

  await lesson.until(2_883_000);
  lesson.clock.sleep(-45_000);
  await answer(lesson, 193, 196);

  await lesson.until(2_950_000);
  lesson.session.breakStarted();
  await lesson.until(3_200_000);
  lesson.session.firstTaskGiven();
  await answer(lesson, 1, 2, 'on', secondPart);

  await lesson.until(secondPart * 1000 + cueAt(4) + 300);
  lesson.touch('on');
  await answer(lesson, 4, 20, 'on', secondPart);

  await lesson.until(secondPart * 1000 + cueAt(20) + 5000);
  lesson.session.pause();
  await lesson.clock.advance(240_000);
  lesson.session.resume();
  lesson.zero += 240_000;
  await answer(lesson, 21, 22, 'on', secondPart);

  lesson.store.mood = 'refuses';
  await answer(lesson, 23, 26, 'on', secondPart);
  lesson.store.mood = 'keeps';
  await answer(lesson, 27, 29, 'on', secondPart);

  await lesson.until(secondPart * 1000 + cueAt(31) + 1000);
  lesson.session.childBefore();
  lesson.session.touch('on', pageMs(lesson.clock.page));
  await lesson.clock.advance(500);
  await answer(lesson, 31, 180, 'on', secondPart);

  await lesson.until(secondPart * 1000 + cueAt(180) + 6000);
  lesson.session.end('the lesson was cut short');
  expect(await lesson.session.flush()).toBe(true);

  expect(lesson.outcome()).toEqual(byHand);
  // The grid never moved: every cue that is told of was planned where its look lies, in both parts.
  const { state, kept } = lesson.session.snapshot();
  for (const entry of lesson.store.journal()) {
    if (entry.kind !== 'cued') continue;
    const line = state.planned[entry.interval - 1];
    const origin = line?.part === 0 ? 0 : secondPart * 1000;
    expect(entry.planned).toBe(origin + cueAt(line?.part === 0 ? entry.interval : entry.interval - 200));
  }
  expect(kept).toMatchObject({ kept: lesson.store.rows.size, of: lesson.store.rows.size, refused: null });
  expect(new Set(state.gaps.map(({ cause }) => cause))).toEqual(
    new Set(['asleep', 'closed', 'sound', 'hidden', 'clock']),
  );
  expect(state.seats.get('c5')).toBe('seat-9');
  // More than 100 minutes by the wall: 49:10, the break, 45 minutes and the pause.
  expect(state.at / 60_000 + 4).toBeGreaterThan(100);
});
