import { seededRandom, shuffled } from '../kernel/random.ts';
import type { Protocol } from '../model/protocol.ts';

type Recipe = Pick<Protocol, 'method' | 'rotation'>;

/** How many intervals one round has: one pass through all who are watched. At least 1. */
export function intervalsInRound({ method, rotation }: Recipe, children: number): number {
  if (method === 'headcount' || method === 'duration') return 1;
  switch (rotation.kind) {
    case 'one':
      return 1;
    case 'block':
      return Math.max(1, children * rotation.intervals);
    case 'target':
      return rotation.peerEvery * Math.max(1, children - 1);
    case 'next':
    case 'sweep':
      return Math.max(1, children);
  }
}

/**
 * Whose turn it is in one round, as places (from 0) in the list of children. `order` is that list's order in this
 * round; with a target child (place 0) only its peers change places.
 */
function roundOf({ rotation }: Pick<Recipe, 'rotation'>, order: readonly number[]): number[] {
  switch (rotation.kind) {
    case 'one':
      return [0];
    case 'block':
      return order.flatMap((place) => Array.from({ length: rotation.intervals }, () => place));
    case 'target': {
      const peers = order.filter((place) => place !== 0);
      const target = Array.from({ length: rotation.peerEvery - 1 }, () => 0);
      return (peers.length === 0 ? [0] : peers).flatMap((peer) => [...target, peer]);
    }
    case 'next':
    case 'sweep':
      return [...order];
  }
}

/** Whose turn each of the first `intervals` intervals of a part is, when the children keep their order. */
export function listedTurns(recipe: Pick<Recipe, 'rotation'>, children: number, intervals: number): number[] {
  const round = roundOf(
    recipe,
    Array.from({ length: children }, (_, place) => place),
  );
  return Array.from({ length: intervals }, (_, k) => round[k % round.length] as number);
}

/**
 * Whose turn it is when chance puts the children in a new order for each round, part by part. The same seed gives the
 * same turns; they are kept with the schedule all the same, so that it can be read without this method.
 */
export function drawTurns(
  recipe: Pick<Recipe, 'rotation'>,
  children: number,
  intervals: number,
  parts: number,
  seed: string,
): number[][] {
  const places = Array.from({ length: children }, (_, place) => place);
  return Array.from({ length: parts }, (_, part) => {
    const random = seededRandom(`${seed}, part ${part + 1}`);
    const turns: number[] = [];
    while (turns.length < intervals) turns.push(...roundOf(recipe, shuffled(places, random)));
    return turns.slice(0, intervals);
  });
}
