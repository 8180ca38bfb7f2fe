import { describe, expect, it } from 'vitest';
import { TickCheck, tenthTick, tick } from '../../src/recorder/tickCheck.ts';
import { FakeAudio } from './fakes/fakeAudio.ts';
import { HandClock } from './fakes/handClock.ts';

/** A tablet whose wall clock is so many ms fast. */
function tablet(fastMs = 0) {
  const clock = new HandClock();
  clock.wall += fastMs;
  const audio = new FakeAudio(clock);
  const { pageClock: page, wallClock: wall, timer } = clock;
  const seen = { hidden: false, listeners: new Set<() => void>() };
  const visibility = {
    hidden: () => seen.hidden,
    subscribe: (listener: () => void) => {
      seen.listeners.add(listener);
      return () => seen.listeners.delete(listener);
    },
  };
  const see = (visible: boolean) => {
    seen.hidden = !visible;
    for (const listener of [...seen.listeners]) listener();
  };
  const check = new TickCheck({ audio, page, wall, timer, visibility });
  return { clock, audio, check, see, watched: () => seen.listeners.size };
}

/** The wall time (ms after the test's beginning) at which each sound came out, by a clock that is right. */
const heard = ({ clock, audio }: ReturnType<typeof tablet>, fastMs = 0) => {
  const trueLead = clock.wall - fastMs - clock.page - Date.UTC(2026, 10, 3, 10);
  return audio.heard().map(({ heardAt }) => (heardAt ?? Number.NaN) + trueLead);
};

/** How far a moment lies from the nearest whole second. */
const offSecond = (ms: number) => Math.abs(ms - Math.round(ms / 1000) * 1000);

describe('the tick check', () => {
  it('ticks on each second of the wall clock and says each tenth otherwise', async () => {
    const one = tablet(370);
    expect(await one.check.start({ volume: 0.4 })).toEqual({ ok: true, value: null });
    await one.clock.advance(30_000);
    const times = heard(one, 370);
    expect(times.length).toBe(30);
    for (const at of times) expect(offSecond(at + 370)).toBeLessThan(1);
    const accents = one.audio.heard().flatMap(({ pattern }, i) => (pattern === tenthTick ? [times[i]] : []));
    expect(accents.map((at) => Math.round((at ?? 0) + 370))).toEqual([10_000, 20_000, 30_000]);
    expect(one.audio.heard().filter(({ pattern }) => pattern === tick).length).toBe(27);
  });

  it('lays each tick well before its moment, also when no timer wakes for four seconds', async () => {
    const one = tablet();
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(2000);
    one.clock.block(4000);
    await one.clock.advance(2000);
    expect(heard(one).map(Math.round)).toEqual([1000, 2000, 3000, 4000, 5000, 6000, 7000, 8000]);
    for (const { heardAt, laidAt } of one.audio.heard().slice(5))
      expect((heardAt ?? 0) - laidAt).toBeGreaterThan(900);
  });

  it('holds to its second within 4 ms though readings of the audio clock jitter by 10 ms', async () => {
    const one = tablet();
    let n = 0;
    one.audio.jitter = () => [0, 9, -8, 3, -2, 6, -10, 1][n++ % 8] ?? 0;
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(20_000);
    for (const at of heard(one).slice(3)) expect(offSecond(at)).toBeLessThan(4);
  });

  it('two tablets 3.480 s apart are one after the right nudge, accents too', async () => {
    const [first, second] = [tablet(0), tablet(-3480)];
    await first.check.start({ volume: 0.4 });
    await second.check.start({ volume: 0.4 });
    await first.clock.advance(2300);
    await second.clock.advance(2300);
    for (let i = 0; i < 3; i++) second.check.nudge(1000);
    for (let i = 0; i < 24; i++) second.check.nudge(20);
    expect(second.check.nudgeMs).toBe(3480);
    expect(second.check.now()).toBe(first.check.now());
    for (const { clock } of [first, second]) await clock.advance(20_000);
    const from = 2300;
    const [a, b] = [heard(first), heard(second, -3480)].map((times) => times.filter((at) => at > from));
    expect(a?.length).toBe(20);
    expect(b?.map(Math.round)).toEqual(a?.map(Math.round));
    const kinds = (t: ReturnType<typeof tablet>) =>
      t.audio
        .heard()
        .slice(-20)
        .map(({ pattern }) => pattern === tenthTick);
    expect(kinds(second)).toEqual(kinds(first));
    second.check.reset();
    expect(second.check.nudgeMs).toBe(0);
  });

  it('follows a wall clock that is set while it ticks, and a context that is made anew', async () => {
    const one = tablet();
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(3000);
    one.clock.wall += 400;
    await one.clock.advance(3000);
    const before = one.audio.heard().length;
    one.audio.interrupt();
    await one.clock.advance(1000);
    expect(one.audio.heard().length).toBe(before);
    one.audio.comeBack({ anew: true });
    await one.clock.advance(4000);
    const after = heard(one).slice(before);
    expect(after.length).toBeGreaterThanOrEqual(3);
    for (const at of after) expect(offSecond(at)).toBeLessThan(1);
  });

  it('is silent at once when stopped, lets go of the sound, and keeps its nudge', async () => {
    const one = tablet();
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(2500);
    one.check.nudge(-40);
    one.check.stop();
    await one.clock.advance(5000);
    expect(heard(one).length).toBe(2);
    expect(one.audio.closed).toBe(true);
    expect(one.clock.pendingTimers).toBe(0);
    expect([one.check.ticking, one.check.nudgeMs]).toEqual([false, -40]);
  });

  it('stops by itself when the page is hidden, and begins again only when it is asked to', async () => {
    const one = tablet();
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(2500);
    one.check.nudge(60);
    one.see(true);
    expect(one.check.ticking).toBe(true);
    one.see(false);
    expect([one.check.ticking, one.check.nudgeMs, one.watched()]).toEqual([false, 60, 0]);
    one.see(true);
    await one.clock.advance(5000);
    expect(heard(one).length).toBe(2);
    expect(one.clock.pendingTimers).toBe(0);
    await one.check.start({ volume: 0.4 });
    await one.clock.advance(2000);
    expect(heard(one).length).toBe(4);
  });

  it('does not tick where sound stays locked', async () => {
    const one = tablet();
    one.audio.unlocks = false;
    expect(await one.check.start({ volume: 0.4 })).toMatchObject({ problem: { code: 'recorder.noSound' } });
    expect(one.check.ticking).toBe(false);
    await one.clock.advance(3000);
    expect(one.audio.laid).toEqual([]);
  });
});
