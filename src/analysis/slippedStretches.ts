import { comparing, type Likeness, type Said } from './likeness.ts';

/** A stretch in which one record stands some places off the other. Places are indexes into the two records. */
export interface Slip {
  readonly from: number;
  /** The last place of it. */
  readonly to: number;
  /** How many places later the second record says what the first one says; negative: earlier. */
  readonly places: number;
  /** By how much the shift explains the two records better, as a logarithm of likelihoods. */
  readonly gain: number;
  /** Places at which both have an entry, as they stand and shifted, and how many of these are the same. */
  readonly unshifted: Agreement;
  readonly shifted: Agreement;
}

interface Agreement {
  readonly compared: number;
  readonly same: number;
}

export const shifts: readonly number[] = [-2, -1, 1, 2];
/** So many places must be there to be compared, in all and within a stretch. */
export const fewestPlaces = 20;
export const fewestInStretch = 8;
/** At most so many stretches are told; a record with more of them is no record. */
const mostStretches = 4;
/** How much more of the shifted stretch must agree than of the stretch as it stands (0–1). */
const clearlyBetter = 0.15;
/** See `neededGain`. */
const beyondChance = 4.1;
const forLasting = 13;

/**
 * The gain that is asked for. Chance grows with the number of places at which a stretch may begin, and with how long
 * behaviour lasts: where one look is like the next (one child, a block, a whole class), two slips of the pen at
 * neighbouring looks pass for a shift. Both constants are set by simulation, so that under 1 in 100 pairs of observers
 * who are in step is called lost, with the bouts, rotations and agreement of real lessons
 * (test/analysis/slippedStretches.test.ts; bench/analysis/lostPlace.bench.ts has the whole table).
 * @param lasting how much neighbouring entries of one record agree beyond chance, 0–1
 */
export function neededGain(places: number, lasting: number): number {
  return Math.log(places) + beyondChance + forLasting * lasting;
}

/**
 * Finds the stretches in which two records agree clearly better when one is shifted by one or two places of the
 * schedule: an observer lost the place and found it again, or never did.
 *
 * Generalised likelihood ratio over the shift, both ends of the stretch and the closeness of the observers, against no
 * shift at all (a change in an epidemic: Levin & Kline 1985; the best stretch for one shift and closeness is a
 * maximum-sum segment: Kadane, as told by Bentley 1984). After a stretch is found, the rest is searched again.
 * @param a what the first observer has, place by place; null where missing
 * @param b the same of the second, equally long
 */
export function slippedStretches(a: readonly Said[], b: readonly Said[]): Slip[] {
  const found: Slip[] = [];
  const both = a.filter((x, i) => x !== null && (b[i] ?? null) !== null).length;
  if (both < fewestPlaces) return found;
  const scan = scanOf(a, b);
  while (found.length < mostStretches) {
    const next = scan(found);
    if (next === null) break;
    found.push(next);
  }
  return found.sort((x, y) => x.from - y.from);
}

interface Best {
  readonly from: number;
  readonly to: number;
  readonly places: number;
  readonly total: number;
}

function scanOf(a: readonly Said[], b: readonly Said[]) {
  const n = a.length;
  const { likenesses, lasting } = comparing(a, b);
  // Of the places i of a stretch: the entry of one record with the later one of the other.
  const placesOf = (i: number, places: number): [number, number] =>
    places >= 0 ? [i, i + places] : [i - places, i];
  const sums = (places: number, likeness: Likeness): number[] => {
    const out = [0];
    for (let i = 0; i < n; i++) out.push((out[i] as number) + likeness(...placesOf(i, places)));
    return out;
  };
  // For each closeness: the running sums of likeness as the records stand, and for each shift.
  const tables = likenesses.map((likeness) => ({
    straight: sums(0, likeness),
    shifted: shifts.map((places) => ({ places, sums: sums(places, likeness) })),
  }));
  const agreement = (from: number, to: number, places: number): Agreement => {
    const pairs = Array.from({ length: Math.max(0, to - from + 1 - Math.abs(places)) }, (_, k) => {
      const [i, j] = placesOf(from + k, places);
      return [a[i] ?? null, b[j] ?? null];
    }).filter(([x, y]) => x !== null && y !== null);
    return { compared: pairs.length, same: pairs.filter(([x, y]) => x === y).length };
  };
  const between = (sum: readonly number[], from: number, to: number): number =>
    (sum[to] as number) - (sum[from] as number);

  return (found: readonly Slip[]): Slip | null => {
    let best: Best | null = null;
    let plain = Number.NEGATIVE_INFINITY;
    for (const { straight, shifted } of tables) {
      const base = found.reduce(
        (sum, { from, to, places }) => {
          const own = shifted.find((one) => one.places === places)?.sums ?? straight;
          return sum + between(own, from, to + 1 - Math.abs(places)) - between(straight, from, to + 1);
        },
        between(straight, 0, n),
      );
      plain = Math.max(plain, base);
      for (const { places, sums: moved } of shifted) {
        for (const [start, end] of freeRanges(n, found)) {
          const one = bestSegment(straight, moved, Math.abs(places), start, end);
          if (one !== null && (best === null || base + one.gain > best.total))
            best = { from: one.from, to: one.to, places, total: base + one.gain };
        }
      }
    }
    if (best === null) return null;
    const { from, to, places, total } = best;
    const slip = {
      from,
      to,
      places,
      gain: total - plain,
      unshifted: agreement(from, to, 0),
      shifted: agreement(from, to, places),
    };
    return isClear(slip, neededGain(n, lasting)) ? slip : null;
  };
}

function isClear({ gain, unshifted, shifted }: Slip, needed: number): boolean {
  if (gain < needed || shifted.compared < fewestInStretch) return false;
  return shifted.same / shifted.compared - unshifted.same / Math.max(1, unshifted.compared) >= clearlyBetter;
}

/** The places [start, end) that no stretch has taken yet. */
function freeRanges(n: number, found: readonly Slip[]): [number, number][] {
  const taken = [...found].sort((x, y) => x.from - y.from);
  const ranges: [number, number][] = [];
  let start = 0;
  for (const { from, to } of taken) {
    if (from > start) ranges.push([start, from]);
    start = to + 1;
  }
  if (start < n) ranges.push([start, n]);
  return ranges;
}

/**
 * The stretch [from, to] whose shifted pairs gain most. While one record is off, as many entries of each as it is off
 * by have no partner: at the one end what was written twice or not at all, at the other what was skipped.
 */
function bestSegment(
  straight: readonly number[],
  moved: readonly number[],
  off: number,
  start: number,
  end: number,
): { from: number; to: number; gain: number } | null {
  let best: { from: number; to: number; gain: number } | null = null;
  let from = start;
  let least = Number.POSITIVE_INFINITY;
  for (let last = start + off + fewestInStretch - 1; last < end; last++) {
    const s = last - off - fewestInStretch + 1;
    const value = (moved[s] as number) - (straight[s] as number);
    if (value < least) {
      least = value;
      from = s;
    }
    const gain = (moved[last + 1 - off] as number) - (straight[last + 1] as number) - least;
    if (best === null || gain > best.gain) best = { from, to: last, gain };
  }
  return best;
}
