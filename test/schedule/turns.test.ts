import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawTurns, intervalsInRound } from '../../src/schedule/turns.ts';

const children = fc.integer({ min: 1, max: 12 });

describe('turns by chance, anew for each round', () => {
  it('are the same for the same seed, and others for another one', () => {
    const turns = (seed: string) => drawTurns({ rotation: { kind: 'next' } }, 6, 60, 2, seed);
    expect(turns('one')).toEqual(turns('one'));
    expect(turns('one')).not.toEqual(turns('two'));
    expect(turns('one')[0]).not.toEqual(turns('one')[1]);
  });

  it('have every child once in each round, whether one look or one sweep is its turn', () => {
    const kinds = fc.constantFrom({ kind: 'next' as const }, { kind: 'sweep' as const, eachMs: 2000 });
    fc.assert(
      fc.property(
        kinds,
        children,
        fc.integer({ min: 1, max: 20 }),
        fc.string(),
        (rotation, n, rounds, seed) => {
          const [turns = []] = drawTurns({ rotation }, n, n * rounds, 1, seed);
          for (let round = 0; round < rounds; round++) {
            const own = turns.slice(round * n, (round + 1) * n);
            expect([...own].sort((a, b) => a - b)).toEqual(Array.from({ length: n }, (_, place) => place));
          }
        },
      ),
    );
  });

  it('keep blocks whole, and the target child at its places', () => {
    fc.assert(
      fc.property(children, fc.integer({ min: 2, max: 6 }), fc.string(), (n, size, seed) => {
        const block = { kind: 'block' as const, intervals: size };
        const [blocks = []] = drawTurns({ rotation: block }, n, n * size, 1, seed);
        for (let k = 0; k < n; k++) expect(new Set(blocks.slice(k * size, (k + 1) * size)).size).toBe(1);
        const target = { kind: 'target' as const, peerEvery: size };
        const inRound = intervalsInRound({ method: 'momentary', rotation: target }, n);
        const [turns = []] = drawTurns({ rotation: target }, n, inRound, 1, seed);
        const peers = turns.filter((_turn, k) => k % size === size - 1);
        expect(turns.filter((_turn, k) => k % size !== size - 1).every((turn) => turn === 0)).toBe(true);
        expect([...peers].sort((a, b) => a - b)).toEqual(
          n === 1 ? [0] : Array.from({ length: n - 1 }, (_, place) => place + 1),
        );
      }),
    );
  });
});
