import { byCodePoint } from '../kernel/compare.ts';
import { generatorName, type Random, randomBelow, seededRandom, shuffled } from '../kernel/random.ts';
import type { Child, Draw } from '../model/classroom.ts';

/** Name and version of the drawing method, kept with every draw. */
export const drawMethod = {
  name: 'stratified without replacement, largest remainder',
  version: 1,
  generator: generatorName,
};

type Candidate = Pick<Child, 'id' | 'pseudonym' | 'stratum'>;

/**
 * Draws target children at random, each stratum in proportion to its size (largest remainder, ties by chance),
 * and reserves in order from everybody left. The same children and seed give the same draw, whatever the order
 * of the list: children are first put in code-point order of their pseudonyms.
 * @param count children to draw; all when there are fewer
 * @param reserves reserves to draw after them
 */
export function drawChildren(
  children: readonly Candidate[],
  count: number,
  reserves: number,
  seed: string,
): Draw {
  const random = seededRandom(seed);
  const from = [...children].sort((a, b) => byCodePoint(a.pseudonym, b.pseudonym) || byCodePoint(a.id, b.id));
  const strata = new Map<string | null, Candidate[]>();
  for (const child of from) strata.set(child.stratum, [...(strata.get(child.stratum) ?? []), child]);
  const keys = [...strata.keys()].sort((a, b) => byCodePoint(a ?? '', b ?? ''));
  const mixed = keys.map((key) => shuffled(strata.get(key) ?? [], random));
  const places = shareOut(
    mixed.map((group) => group.length),
    Math.min(count, from.length),
    random,
  );
  const chosen = shuffled(
    mixed.flatMap((group, i) => group.slice(0, places[i])),
    random,
  );
  const left = shuffled(
    mixed.flatMap((group, i) => group.slice(places[i])),
    random,
  );
  return {
    seed,
    method: drawMethod,
    from: from.map((child) => child.id),
    chosen: chosen.map((child) => child.id),
    reserves: left.slice(0, reserves).map((child) => child.id),
  };
}

/** Shares `seats` among groups in proportion to their sizes: whole parts first, then by largest remainder. */
function shareOut(sizes: readonly number[], seats: number, random: Random): number[] {
  const total = sizes.reduce((sum, size) => sum + size, 0);
  if (total === 0) return sizes.map(() => 0);
  const exact = sizes.map((size) => (seats * size) / total);
  const places = exact.map(Math.floor);
  const byRemainder = exact
    .map((value, i) => ({ i, rest: value - Math.floor(value), chance: randomBelow(random, 1 << 30) }))
    .sort((a, b) => (Math.abs(a.rest - b.rest) > 1e-9 ? b.rest - a.rest : a.chance - b.chance));
  let open = seats - places.reduce((sum, n) => sum + n, 0);
  for (const { i } of byRemainder) {
    if (open === 0) break;
    places[i] = (places[i] as number) + 1;
    open -= 1;
  }
  return places;
}
