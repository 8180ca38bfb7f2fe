import { describe, expect, it } from 'vitest';
import { pageMs } from '../../src/kernel/units.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import { headerOf } from '../support/session.ts';
import { Lesson, outcomeOf } from './fakes/lesson.ts';

const lessonOf = (
  changes: Partial<Protocol>,
  phases = ['before'],
  more: Parameters<typeof headerOf>[2] = {},
) => new Lesson({ header: headerOf(changes, phases, more) }).begin();

const cuesOf = (lesson: Lesson) =>
  lesson.store
    .journal()
    .flatMap((e) => (e.kind === 'cued' ? [`${e.interval} ${e.cue} ${e.planned / 1000}`] : []));

describe('whole interval', () => {
  it('watches, then records; several codes add up, none is an answer, silence is missed', async () => {
    const lesson = await lessonOf({
      method: 'whole',
      observeMs: 10_000,
      partLength: { kind: 'rounds', rounds: 1 },
    });
    await lesson.until(11_000);
    lesson.touch('on');
    await lesson.until(13_000);
    lesson.touch('off');
    await lesson.until(26_000);
    lesson.touch(null);
    await lesson.until(50_000);
    expect(lesson.outcome()).toEqual(['on+off', 'none', 'missed']);
    expect(cuesOf(lesson)).toEqual([
      '1 observe 0',
      '1 record 10',
      '2 observe 15',
      '2 record 25',
      '3 observe 30',
      '3 record 40',
    ]);
  });
});

describe('headcount', () => {
  const scans = { method: 'headcount', intervalMs: 60_000, observeMs: 60_000 } as const;
  const count = (lesson: Lesson, on: number, present: number) =>
    lesson.session.count(on, present, pageMs(lesson.clock.page));

  it('looks at everybody at each prompt; the last count of a scan stands; who is present is carried along', async () => {
    const lesson = await lessonOf({ ...scans, partLength: { kind: 'minutes', minutes: 3 } });
    expect(lesson.session.snapshot()).toMatchObject({ present: 3, rounds: 3 });
    await lesson.until(60_500);
    expect(lesson.session.snapshot()).toMatchObject({ current: { child: null, status: 'open' } });
    // Seats tapped as fast as a hand can: each one counts.
    for (const on of [1, 2, 3]) {
      await lesson.clock.advance(90);
      count(lesson, on, 22);
    }
    expect(lesson.session.snapshot()).toMatchObject({
      present: 22,
      current: { counts: { on: 3, present: 22 } },
    });
    await lesson.until(125_000);
    count(lesson, 20, 21);
    await lesson.until(250_000);
    const { ended } = lesson.session.snapshot();
    expect(ended).toBe('complete');
    expect(lesson.kept().map(({ counts, missing }) => counts ?? missing)).toEqual([
      { on: 3, present: 22 },
      { on: 20, present: 21 },
      'missed',
    ]);
    expect(cuesOf(lesson)).toEqual(['1 look 60', '2 look 120', '3 look 180']);
  });

  it('begins a count with its prompt: its first steps are never late ones of the scan before', async () => {
    const lesson = await lessonOf({ ...scans, partLength: { kind: 'minutes', minutes: 2 } });
    await lesson.until(120_100); // nobody counted at the first prompt
    count(lesson, 1, 9);
    await lesson.clock.advance(100);
    count(lesson, 2, 9);
    await lesson.until(190_000);
    expect(lesson.kept().map(({ counts, missing }) => counts ?? missing)).toEqual([
      'missed',
      { on: 2, present: 9 },
    ]);
  });

  it('carries the number present along: who leaves is one fewer, and old scans that are corrected change nothing', async () => {
    const lesson = await lessonOf({ ...scans, partLength: { kind: 'minutes', minutes: 5 } });
    const present = () => lesson.session.snapshot().present;
    await lesson.until(10_000);
    lesson.session.childLeft('c2', 'left the room');
    expect(present()).toBe(2);
    await lesson.until(61_000);
    count(lesson, 2, 20); // the others of the class are there, too
    await lesson.until(70_000);
    lesson.session.childReturned('c2');
    expect(present()).toBe(21);
    lesson.session.undo();
    expect(present()).toBe(20);
    await lesson.until(121_000);
    count(lesson, 2, 19);
    lesson.session.correct(1, { counts: { on: 5, present: 22 } });
    expect(present()).toBe(19);
  });

  it('needs no drawn children', async () => {
    const lesson = await lessonOf(scans, ['before'], { children: [] });
    await lesson.until(61_000);
    count(lesson, 5, 9);
    expect(lesson.session.snapshot().current?.counts).toEqual({ on: 5, present: 9 });
  });
});

describe('duration', () => {
  const watching = {
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 2 },
  } as const;
  const stretches = (lesson: Lesson) =>
    lesson.kept().map((line) => `${line.openAt / 1000}–${line.closeAt / 1000} ${outcomeOf(line)}`);

  it('keeps onsets and offsets to the millisecond of the touch; the same code again changes nothing', async () => {
    const lesson = await lessonOf(watching);
    await lesson.until(1250);
    lesson.touch('on');
    await lesson.until(30_000);
    lesson.touch('on');
    await lesson.until(41_007);
    lesson.touch('off');
    expect(lesson.session.snapshot()).toMatchObject({
      current: { codes: ['off'], openAt: 41_007 },
      previous: null,
      lastRound: [],
    });
    await lesson.until(60_000);
    lesson.cannotSee();
    await lesson.until(70_000);
    lesson.touch('on');
    await lesson.until(125_000);
    expect(stretches(lesson)).toEqual([
      '0–1.25 missed',
      '1.25–41.007 on',
      '41.007–60 off',
      '60–70 out of view',
      '70–120 on',
    ]);
    expect(lesson.kinds()).toEqual(['started', 'marked', 'marked', 'missing', 'marked', 'ended']);
  });

  it('undo brings back what held before', async () => {
    const lesson = await lessonOf(watching);
    await lesson.until(1000);
    lesson.touch('on');
    await lesson.until(10_000);
    lesson.touch('off');
    await lesson.until(12_000);
    lesson.session.undo();
    await lesson.until(13_000);
    expect(lesson.session.snapshot().current).toMatchObject({ codes: ['on'], openAt: 1000 });
  });

  it('takes no touch during an interruption, and one after it begins anew', async () => {
    const lesson = await lessonOf(watching);
    await lesson.until(1000);
    lesson.touch('on');
    await lesson.until(10_000);
    lesson.session.interruptClass();
    await lesson.until(15_000);
    lesson.touch('on');
    expect(lesson.session.snapshot().refusal?.why).toBe('class interrupted');
    await lesson.until(20_000);
    lesson.session.continueClass();
    await lesson.until(21_000);
    lesson.touch('on');
    await lesson.until(125_000);
    expect(stretches(lesson)).toEqual([
      '0–1 missed',
      '1–10 on',
      '10–20 class interrupted',
      '20–21 missed',
      '21–120 on',
    ]);
  });

  it('a hidden page saw no touches: that time is missed, whether a prompt fell into it or not', async () => {
    const lesson = await lessonOf(watching);
    await lesson.until(1000);
    lesson.touch('on');
    await lesson.until(30_000);
    lesson.setHidden(true);
    await lesson.until(50_000);
    lesson.setHidden(false);
    await lesson.until(52_000);
    lesson.touch('off');
    await lesson.until(125_000);
    expect(stretches(lesson)).toEqual(['0–1 missed', '1–30 on', '30–52 missed', '52–120 off']);
  });

  it('goes on in the second part with a new stretch', async () => {
    const lesson = await lessonOf(watching, ['before', 'after']);
    await lesson.until(1000);
    lesson.touch('on');
    await lesson.until(60_000);
    lesson.session.breakStarted();
    await lesson.until(90_000);
    lesson.session.firstTaskGiven();
    await lesson.until(95_000);
    lesson.touch('off');
    await lesson.until(230_000);
    expect(stretches(lesson)).toEqual([
      '0–1 missed',
      '1–60 on',
      '60–120 ended early',
      '93.25–95 missed',
      '95–213.25 off',
    ]);
    expect(lesson.session.snapshot().ended).toBe('complete');
  });
});

describe('a sweep of all children at one prompt', () => {
  it('gives each child its seconds, with a softer cue for each one after the first', async () => {
    const lesson = await lessonOf({
      rotation: { kind: 'sweep', eachMs: 3000 },
      partLength: { kind: 'rounds', rounds: 2 },
    });
    for (const [at, code] of [
      [16_000, 'on'],
      [19_500, 'off'],
      [22_000, 'on'],
      [31_000, 'off'],
      [34_000, 'on'],
    ] as const) {
      await lesson.until(at);
      lesson.touch(code);
    }
    await lesson.until(60_000);
    expect(lesson.outcome()).toEqual(['on', 'off', 'on', 'off', 'on', 'missed']);
    expect(lesson.kept().map(({ child, round }) => `${child} ${round}`)).toEqual([
      'c1 1',
      'c2 1',
      'c3 1',
      'c1 2',
      'c2 2',
      'c3 2',
    ]);
    expect(cuesOf(lesson)).toEqual([
      '1 look 15',
      '2 next 18',
      '3 next 21',
      '4 look 30',
      '5 next 33',
      '6 next 36',
    ]);
  });
});

describe('turns', () => {
  const whose = (lesson: Lesson) => lesson.kept().map(({ child }) => child);

  it('one target child, and every third look at the next of its peers', async () => {
    const lesson = await lessonOf({
      rotation: { kind: 'target', peerEvery: 3 },
      partLength: { kind: 'rounds', rounds: 1 },
    });
    expect(whose(lesson)).toEqual(['c1', 'c1', 'c2', 'c1', 'c1', 'c3']);
  });

  it('as chance gave them, read from the schedule itself', async () => {
    const header = headerOf({ order: 'random each round' });
    if (header.schedule.kind !== 'laid') throw new Error('not laid');
    const schedule = { ...header.schedule, turns: [[2, 0, 1, 1, 2, 0]] };
    const lesson = await new Lesson({ header: { ...header, schedule } }).begin();
    await lesson.until(16_000);
    expect(lesson.session.snapshot()).toMatchObject({ current: { child: 'c3' }, upcoming: { child: 'c1' } });
    expect(whose(lesson)).toEqual(['c3', 'c1', 'c2', 'c2', 'c3', 'c1']);
  });
});
