import type { Row } from '../../tools/bench.ts';

/** The middle of five timings of one piece of work, in milliseconds, after one run to warm up. */
export function timed(label: string, work: () => unknown): Row {
  work();
  const times = Array.from({ length: 5 }, () => {
    const from = performance.now();
    work();
    return performance.now() - from;
  });
  times.sort((a, b) => a - b);
  return { label, value: times[2] as number, unit: 'ms' };
}

/** A seeded series of whole numbers below `codes`, as a small typed array. */
export function codesDrawn(length: number, codes: number, random: () => number): Int8Array {
  return Int8Array.from({ length }, () => Math.floor(random() * codes));
}
