import { describe, expect, it } from 'vitest';
import type { Protocol } from '../../src/model/protocol.ts';
import { headerOf } from '../support/session.ts';
import { Lesson, outcomeOf } from './fakes/lesson.ts';

/** Partial intervals of 15 s, each opened by its cue; a pause has its interval done again. */
const again: Partial<Protocol> = {
  method: 'partial',
  lookAt: 'start',
  observeMs: 15_000,
  afterPause: 'repeat',
};
const alone = { role: null } as const;
const r1 = { id: 'r1', pseudonym: 'Otter-09', stratum: null };
const begun = (protocol = again, more = {}) =>
  new Lesson({ header: headerOf(protocol, ['before'], { ...alone, ...more }) }).begin();

async function pausedAt(lesson: Lesson, at: number, meanwhile: () => void = () => undefined): Promise<void> {
  await lesson.until(at);
  lesson.session.pause();
  await lesson.clock.advance(60_000);
  meanwhile();
  lesson.session.resume();
}

const outcomes = (lesson: Lesson) => lesson.session.snapshot().intervals.map(outcomeOf);

describe('an interval that is done again after a pause', () => {
  it('takes marks though its first cue had fallen into an interruption', async () => {
    const lesson = await begun();
    await lesson.until(13_000);
    lesson.session.interruptClass();
    await lesson.until(16_000);
    lesson.session.continueClass();
    await pausedAt(lesson, 20_000);
    // A second's breath, then its cue: two seconds into it.
    await lesson.clock.advance(3000);
    lesson.touch('on');
    expect(lesson.session.snapshot().refusal).toBeNull();
    expect(outcomes(lesson)[1]).toBe('on');
  });

  it('is the reserve’s who had stepped in when the pause began', async () => {
    const lesson = await begun({ ...again, reservesStepIn: true }, { reserves: [r1] });
    await lesson.until(19_000);
    lesson.session.childLeft('c2', 'left the room');
    await pausedAt(lesson, 20_000);
    await lesson.clock.advance(3000);
    expect(lesson.session.snapshot().current?.child).toBe('r1');
    lesson.touch('on');
    expect(lesson.session.snapshot().intervals[1]).toMatchObject({ child: 'r1', codes: ['on'] });
  });

  it('is looked at by nobody’s absence when the child came back in the pause', async () => {
    const lesson = await begun();
    await lesson.until(13_000);
    lesson.session.childLeft('c2', 'left the room');
    await pausedAt(lesson, 20_000, () => lesson.session.childReturned('c2'));
    await lesson.clock.advance(3000);
    expect(lesson.session.snapshot().current).toMatchObject({ child: 'c2', status: 'open', missing: null });
  });

  it('leaves the interval before alone in the breath before its cue', async () => {
    const lesson = await begun();
    await lesson.until(1000);
    lesson.touch('on');
    await pausedAt(lesson, 20_000);
    await lesson.clock.advance(500);
    lesson.touch('off');
    expect(lesson.session.snapshot().refusal?.why).toBe('before the first cue');
    expect(outcomes(lesson)[0]).toBe('on');
  });

  it('makes nothing late: time turned back, but the look before last is long over', async () => {
    const lesson = await begun({ lookAt: 'end', afterPause: 'repeat' });
    await pausedAt(lesson, 33_000);
    await lesson.clock.advance(300);
    lesson.touch('on');
    expect(outcomes(lesson).slice(0, 2)).toEqual(['missed', 'on']);
  });

  it('cannot be called off as if the session had not begun', async () => {
    const lesson = await begun();
    await pausedAt(lesson, 5000);
    expect(lesson.session.snapshot().phase).toBe('counting in');
    lesson.session.callOff();
    expect(lesson.session.snapshot().phase).not.toBe('ready');
    expect(lesson.kinds()).not.toContain('withdrawn');
  });
});

describe('whose word it is', () => {
  it('a code touched after a swap is an entry of its own: undoing it leaves the swap', async () => {
    const lesson = await begun({});
    await lesson.until(16_000);
    lesson.touch('on');
    await lesson.until(31_000);
    lesson.session.swap([[1, 2]]);
    await lesson.until(32_000);
    lesson.touch('on');
    lesson.session.undo();
    expect(outcomes(lesson)[1]).toBe('on');
    expect(lesson.kinds()).toContain('swapped');
  });

  it('a step on the figure of one scan is not taken for another', async () => {
    const lesson = await begun({ method: 'headcount' });
    const count = (on: number, of: number) => lesson.session.count(on, 3, lesson.now, of);
    await lesson.until(16_000);
    count(2, 1);
    await lesson.until(29_995);
    const down = lesson.now;
    await lesson.until(30_003);
    // The finger went down before the prompt, and the glass showed the new scan when it was told.
    lesson.session.count(1, 3, down, 2);
    expect(lesson.session.snapshot().refusal?.why).toBe('another scan');
    expect(lesson.session.snapshot().intervals[0]?.counts).toEqual({ on: 2, present: 3 });
    count(1, 2);
    expect(lesson.session.snapshot().current?.counts).toEqual({ on: 1, present: 3 });
  });

  it('in a duration record nobody is watched in the break, nor while the next part is counted in', async () => {
    const header = headerOf(
      { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
      ['before', 'after'],
      alone,
    );
    const lesson = await new Lesson({ header }).begin();
    await lesson.until(5000);
    lesson.touch('on');
    await lesson.until(20_000);
    lesson.session.breakStarted();
    await lesson.until(25_000);
    lesson.touch('off');
    expect(lesson.session.snapshot().refusal).toMatchObject({ count: 1, why: 'after the last interval' });
    lesson.session.firstTaskGiven();
    await lesson.until(27_000);
    lesson.touch('off');
    expect(lesson.session.snapshot().refusal?.count).toBe(2);
    expect(lesson.session.snapshot().felt?.count).toBe(1);
  });
});

describe('beginning', () => {
  it('by a shared count: at the same distance from the tap, however long the sound takes', async () => {
    const lesson = new Lesson({ header: headerOf() });
    const unlock = lesson.audio.unlock.bind(lesson.audio);
    lesson.audio.unlock = () =>
      new Promise((opened) => {
        lesson.clock.timer.wakeIn(2500, () => opened(unlock()));
      });
    const tapped = lesson.clock.page;
    const begun = lesson.session.begin();
    await lesson.clock.advance(2600);
    await begun;
    await lesson.clock.advance(10_000);
    expect(lesson.clock.page - lesson.session.snapshot().now - tapped).toBe(3250);
  });

  it('not over what another window has recorded since the journal was read', async () => {
    const first = await new Lesson().begin();
    await first.until(20_000);
    first.touch('on');
    await first.clock.advance(10);
    const second = new Lesson({
      store: first.store,
      resumeFrom: first.store.journal(),
      header: first.header,
    });
    expect(second.session.snapshot().resuming).toBe(true);
    await first.until(50_000);
    first.touch('off');
    await first.clock.advance(10);
    const kept = first.store.journal();
    expect(await second.session.begin()).toMatchObject({ ok: false, problem: { code: 'recorder.goneOn' } });
    await second.clock.advance(20_000);
    expect(first.store.journal()).toEqual(kept);
  });
});
