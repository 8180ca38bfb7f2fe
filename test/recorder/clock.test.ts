import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { audioSeconds, pageMs, sessionMs } from '../../src/kernel/units.ts';
import { SessionClock } from '../../src/recorder/clock.ts';

const sample = (audio: number, page: number) => ({ audio: audioSeconds(audio), page: pageMs(page) });

/** Audio time 10 s at page time 1000 ms, session time 0 there, read ten times in ten seconds. */
function running(): SessionClock {
  const clock = new SessionClock();
  expect(clock.read(sample(10, 1000), 1)).toBe('anchored');
  clock.start(pageMs(1000), 0);
  for (let k = 1; k <= 10; k++) expect(clock.read(sample(10 + k, 1000 + k * 1000), 1)).toBe('steady');
  return clock;
}

describe('SessionClock', () => {
  it('reads session time off page and audio time alike', () => {
    const clock = running();
    expect(clock.at(pageMs(16_000))).toBe(15_000);
    expect(clock.audioAt(sessionMs(15_000))).toBe(25);
    expect(clock.pageAt(15_000)).toBe(16_000);
  });

  it('keeps what lies on the audio clock where it is, whatever the page clock does', () => {
    const clock = running();
    const before = clock.audioAt(sessionMs(60_000));
    // The page clock runs 0.1 % fast: 30 ms in 30 s, taken up by the page's side.
    for (let k = 1; k <= 30; k++) clock.read(sample(20 + k, 11_000 + k * 1001), 1);
    expect(clock.audioAt(sessionMs(60_000))).toBe(before);
    expect(Math.abs(clock.at(pageMs(11_000 + 30 * 1001)) - 40_000)).toBeLessThan(6);
  });

  it('waits for a second strange reading before it believes a jump; then session time still does not move', () => {
    const clock = running();
    expect(clock.read(sample(21.2, 12_000), 1)).toBe('doubtful');
    expect(clock.read(sample(22, 13_000), 1)).toBe('steady');
    expect(clock.read(sample(23.2, 14_000), 1)).toBe('doubtful');
    expect(clock.audioAt(sessionMs(20_000))).toBe(30);
    expect(clock.late).toBeCloseTo(-200, 9);
    expect(clock.read(sample(23.25, 14_050), 1)).toBe('slipped');
    // What sounded until now lay on the clock as it was before.
    expect(clock.late).toBeCloseTo(-200, 9);
    expect(clock.at(pageMs(14_050))).toBe(13_050);
    // Session time 20 s now lies at the audio time that will be read then.
    expect(clock.audioAt(sessionMs(20_000))).toBeCloseTo(23.25 + 6.95, 9);
    expect(clock.read(sample(24.2, 15_000), 1)).toBe('steady');
    expect(clock.late).toBe(0);
  });

  it('goes on by the page clock when the audio clock is gone, and puts a new one onto the same grid', () => {
    const clock = running();
    expect(clock.read(null, 1)).toBe('lost');
    expect([clock.hasAudio, clock.audioAt(sessionMs(0))]).toEqual([false, null]);
    expect(clock.at(pageMs(40_000))).toBe(39_000);
    expect(clock.read(sample(0.5, 41_000), 2)).toBe('anchored');
    expect(clock.at(pageMs(41_000))).toBe(40_000);
    expect(clock.audioAt(sessionMs(45_000))).toBeCloseTo(5.5, 9);
  });

  it('does not believe a clock that stands, and takes it up again once it moves', () => {
    const clock = running();
    expect(clock.read(sample(20.02, 12_000), 1)).toBe('lost');
    expect(clock.read(sample(20.02, 13_000), 1)).toBe('steady');
    expect(clock.hasAudio).toBe(false);
    expect(clock.read(sample(21, 14_000), 1)).toBe('anchored');
    expect(clock.at(pageMs(14_000))).toBe(13_000);
  });

  it('stands while paused, for page and audio time alike, and a sleep in the pause changes nothing', () => {
    const clock = running();
    clock.pause(pageMs(11_000));
    clock.skip(50_000);
    expect(clock.at(pageMs(31_000))).toBe(10_000);
    clock.resume(pageMs(31_000));
    expect(clock.at(pageMs(32_000))).toBe(11_000);
    expect(clock.audioAt(sessionMs(11_000))).toBeCloseTo(41, 9);
  });

  it('steps on by a sleep, the audio clock with it', () => {
    const clock = running();
    clock.skip(30_000);
    expect(clock.at(pageMs(12_000))).toBe(41_000);
    expect(clock.audioAt(sessionMs(41_000))).toBeCloseTo(21, 9);
  });

  it('never runs by more than the scatter of its readings off a true clock, through any number of new contexts', () => {
    const event = fc.record({
      ms: fc.integer({ min: 200, max: 3000 }),
      scatter: fc.integer({ min: -5, max: 5 }),
      what: fc.constantFrom('run', 'run', 'run', 'run', 'new', 'none'),
    });
    fc.assert(
      fc.property(fc.array(event, { minLength: 20, maxLength: 200 }), (events) => {
        const clock = new SessionClock();
        clock.read(sample(0, 0), 0);
        clock.start(pageMs(0), 0);
        let [page, audio, generation, anchors] = [0, 0, 0, 1];
        for (const { ms, scatter, what } of events) {
          page += ms;
          audio += ms / 1000;
          if (what === 'new') [audio, generation] = [0, generation + 1];
          const reading = clock.read(
            what === 'none' ? null : sample(audio + scatter / 1000, page),
            generation,
          );
          if (reading === 'anchored') anchors += 1;
          // Each anchoring is as exact as one reading, and each reading as the scatter: 10 ms from end to end.
          expect(Math.abs(clock.at(pageMs(page)) - page)).toBeLessThanOrEqual(10 * anchors);
        }
      }),
      { seed: 20261103, numRuns: 200 },
    );
  });
});
