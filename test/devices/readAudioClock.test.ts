import { afterEach, describe, expect, it, vi } from 'vitest';
import { readAudioClock } from '../../src/devices/readAudioClock.ts';

afterEach(() => vi.restoreAllMocks());

/** A context as the browser would show it at page time 10 000 ms. */
function context(facts: {
  currentTime: number;
  stamp?: { contextTime?: number; performanceTime?: number };
  outputLatency?: number;
  baseLatency?: number;
}): AudioContext {
  vi.spyOn(performance, 'now').mockReturnValue(10_000);
  const { stamp, ...rest } = facts;
  return {
    outputLatency: 0,
    baseLatency: 0,
    ...rest,
    ...(stamp === undefined ? {} : { getOutputTimestamp: () => stamp }),
  } as unknown as AudioContext;
}

describe('readAudioClock', () => {
  it('takes what the browser says of the sample at the ear', () => {
    const heard = context({ currentTime: 5, stamp: { contextTime: 4.95, performanceTime: 9995 } });
    expect(readAudioClock(heard)).toEqual({ audio: 4.95, page: 9995 });
  });

  it.each([
    ['is all zero, as at first', { contextTime: 0, performanceTime: 0 }],
    ['is missing in parts', {}],
    ['lies in the future of the context', { contextTime: 7, performanceTime: 9995 }],
    ['is older than anybody can use', { contextTime: 4.9, performanceTime: 2000 }],
    ['lies seconds behind', { contextTime: 1, performanceTime: 9995 }],
  ])('falls back to the time of the context less the way to the ear when the stamp %s', (_, stamp) => {
    const doubtful = context({ currentTime: 5, stamp, outputLatency: 0.04 });
    expect(readAudioClock(doubtful)).toEqual({ audio: 4.96, page: 10_000 });
  });

  it('does so, too, where the browser has no such stamp, with the base latency if there is no other', () => {
    expect(readAudioClock(context({ currentTime: 5, baseLatency: 0.01 })).audio).toBeCloseTo(4.99, 9);
  });
});
