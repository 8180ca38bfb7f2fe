import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layOut } from '../../src/schedule/layOut.ts';
import { whenSeen } from '../../src/schedule/whenSeen.ts';
import { protocolOf } from '../support/session.ts';
import { anyRecipe, childrenOf, laidOut } from './anyRecipe.ts';

const three = childrenOf(3);

describe('when each child is seen', () => {
  it('worked by hand: three children in turn every 15 s, looked at when the interval ends, two rounds', () => {
    const [first, second] = whenSeen(layOut(protocolOf(), ['before'], three), 'momentary', three, 1);
    expect(first).toEqual({
      child: 'c1',
      part: 0,
      looks: [
        [15_000, 15_000],
        [60_000, 60_000],
      ],
      firstMs: 15_000,
      lastMs: 60_000,
      longestMs: 45_000,
      watchedMs: null,
    });
    expect(second).toMatchObject({ child: 'c2', firstMs: 30_000, lastMs: 75_000 });
  });

  it('adds up the time watched: 10 s of 15, twice', () => {
    const partial = protocolOf({ method: 'partial', observeMs: 10_000 });
    const [first] = whenSeen(layOut(partial, ['before'], three), 'partial', three, 1);
    expect(first).toMatchObject({
      looks: [
        [0, 10_000],
        [45_000, 55_000],
      ],
      watchedMs: 20_000,
    });
  });

  it('has one row for everybody, one stretch for a duration, and a row for a child without a look', () => {
    const minutes = { kind: 'minutes' as const, minutes: 3 };
    const count = protocolOf({ method: 'headcount', intervalMs: 60_000, partLength: minutes });
    expect(whenSeen(layOut(count, ['before'], three), 'headcount', three, 1)).toMatchObject([
      { child: null, looks: [{}, {}, {}], longestMs: 60_000 },
    ]);
    const duration = protocolOf({ method: 'duration', partLength: minutes });
    expect(whenSeen(layOut(duration, ['before'], ['c1']), 'duration', ['c1'], 1)).toMatchObject([
      { child: 'c1', looks: [[0, 180_000]], longestMs: null, watchedMs: 180_000 },
    ]);
    const one = protocolOf({ rotation: { kind: 'one' } });
    expect(whenSeen(layOut(one, ['before'], three), 'momentary', three, 1)[1]).toEqual({
      child: 'c2',
      part: 0,
      looks: [],
      firstMs: null,
      lastMs: null,
      longestMs: null,
      watchedMs: null,
    });
  });

  it('loses no look and invents none, in any protocol', () => {
    fc.assert(
      fc.property(anyRecipe, fc.integer({ min: 1, max: 2 }), (recipe, parts) => {
        const lines = laidOut(recipe, parts);
        const seen = whenSeen(lines, recipe.method, childrenOf(recipe.childrenToDraw), parts);
        expect(seen.reduce((sum, { looks }) => sum + looks.length, 0)).toBe(lines.length);
        for (const { looks } of seen)
          looks.forEach(([from, to], k) => {
            expect(to).toBeGreaterThanOrEqual(from);
            if (k > 0) expect(from).toBeGreaterThanOrEqual(looks[k - 1]?.[1] ?? 0);
          });
      }),
      { numRuns: 100 },
    );
  });
});
