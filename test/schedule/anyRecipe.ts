import fc from 'fast-check';
import type { Protocol } from '../../src/model/protocol.ts';
import { layOut, type ScheduledInterval } from '../../src/schedule/layOut.ts';
import { drawTurns } from '../../src/schedule/turns.ts';
import { protocolOf } from '../support/session.ts';

const seconds = (min: number, max: number) => fc.integer({ min, max }).map((s) => s * 1000);

const rotation = fc.oneof(
  fc.constant({ kind: 'next' as const }),
  fc.constant({ kind: 'one' as const }),
  fc.record({ kind: fc.constant('block' as const), intervals: fc.integer({ min: 1, max: 8 }) }),
  fc.record({ kind: fc.constant('sweep' as const), eachMs: seconds(1, 10) }),
  fc.record({ kind: fc.constant('target' as const), peerEvery: fc.integer({ min: 2, max: 9 }) }),
);

const partLength = fc.oneof(
  fc.integer({ min: 2, max: 180 }).map((minutes) => ({ kind: 'minutes' as const, minutes })),
  fc.integer({ min: 1, max: 12 }).map((rounds) => ({ kind: 'rounds' as const, rounds })),
);

/** Any recipe that a form keeps: every method, rotation, order, look moment and length; sweeps that fit. */
export const anyRecipe: fc.Arbitrary<Protocol> = fc
  .record({
    method: fc.constantFrom('momentary', 'partial', 'whole', 'headcount', 'duration'),
    observeMs: seconds(3, 120),
    recordMs: fc.oneof(fc.constant(0), seconds(3, 60)),
    lookAt: fc.constantFrom('end', 'start'),
    rotation,
    partLength,
    order: fc.constantFrom('random', 'listed', 'random each round'),
    childrenToDraw: fc.integer({ min: 1, max: 12 }),
  })
  .map(({ recordMs, ...recipe }): Protocol => {
    const moments = recipe.method === 'momentary' || recipe.method === 'headcount';
    const sweepMs = recipe.rotation.kind === 'sweep' ? recipe.rotation.eachMs * recipe.childrenToDraw : 0;
    const intervalMs = Math.max(recipe.observeMs + (moments ? 0 : recordMs), sweepMs);
    return protocolOf({ ...recipe, intervalMs, observeMs: moments ? intervalMs : recipe.observeMs });
  });

export const childrenOf = (n: number): string[] => Array.from({ length: n }, (_, i) => `c${i + 1}`);

export const hasTurns = ({ method }: Protocol): boolean => method !== 'headcount' && method !== 'duration';

/** The recipe laid out over some parts, with turns by chance where it wants them. */
export function laidOut(recipe: Protocol, parts: number): ScheduledInterval[] {
  const children = childrenOf(recipe.childrenToDraw);
  const phases = Array.from({ length: parts }, (_, i) => `p${i}`);
  const listed = layOut(recipe, phases, children);
  if (recipe.order !== 'random each round' || !hasTurns(recipe)) return listed;
  const perPart = listed.length / parts;
  return layOut(recipe, phases, children, drawTurns(recipe, children.length, perPart, parts, 'a seed'));
}
