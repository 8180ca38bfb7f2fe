import type { IntervalRecord } from '../journal/readOut.ts';

/**
 * Which intervals change places when two children were taken for each other over the last `last` intervals whose cues
 * have come: the first of the one with the first of the other, and so on. An interval without a counterpart stays.
 */
export function swapPairs(
  intervals: readonly IntervalRecord[],
  children: readonly [string, string],
  last: number,
): [number, number][] {
  const come = intervals.filter(({ status }) => status !== 'waiting').slice(-last);
  const of = (child: string): number[] =>
    come.filter((line) => line.child === child).map(({ number }) => number);
  const [first, second] = [of(children[0]), of(children[1])];
  return first.flatMap((number, i): [number, number][] => {
    const other = second[i];
    return other === undefined ? [] : [[number, other]];
  });
}
