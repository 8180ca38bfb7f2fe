import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawChildren } from '../../src/schedule/drawChildren.ts';
import { replaceAbsent } from '../../src/schedule/replaceAbsent.ts';

const classOf = (...strata: (string | null)[]) =>
  strata.map((stratum, i) => ({
    id: `id-${i}`,
    pseudonym: `Otter-${String(i + 1).padStart(2, '0')}`,
    stratum,
  }));

describe('drawChildren', () => {
  it('draws the same children for the same seed, whatever the order of the list', () => {
    const list = classOf('a', 'a', 'b', 'b', 'b', null, null, 'a');
    const there = drawChildren(list, 4, 2, 'seed-1');
    expect(drawChildren([...list].reverse(), 4, 2, 'seed-1')).toEqual(there);
    expect(drawChildren(list, 4, 2, 'seed-2').chosen).not.toEqual(there.chosen);
  });

  it('keeps the strata in proportion: 12 and 12 give 3 and 3, 18 and 6 give 4 or 5 and 2 or 1', () => {
    const even = drawChildren(classOf(...Array(12).fill('a'), ...Array(12).fill('b')), 6, 0, 's');
    const inA = (ids: string[], size: number) => ids.filter((id) => Number(id.slice(3)) < size).length;
    expect(inA(even.chosen, 12)).toBe(3);
    const uneven = drawChildren(classOf(...Array(18).fill('a'), ...Array(6).fill('b')), 6, 0, 's');
    expect([4, 5]).toContain(inA(uneven.chosen, 18));
  });

  it('gives every child of a stratum the same chance (4,000 draws of 2 of 8, each within 5 standard errors)', () => {
    const list = classOf(...Array(8).fill(null));
    const times = new Map<string, number>();
    for (let i = 0; i < 4000; i++)
      for (const id of drawChildren(list, 2, 0, `seed ${i}`).chosen) times.set(id, (times.get(id) ?? 0) + 1);
    for (const child of list)
      expect(Math.abs((times.get(child.id) ?? 0) - 1000)).toBeLessThan(5 * Math.sqrt(4000 * 0.25 * 0.75));
  });

  it('never draws a child twice, and shares places by largest remainder', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom('a', 'b', 'c', null), { maxLength: 40 }),
        fc.nat(12),
        fc.nat(6),
        fc.string({ minLength: 1 }),
        (strata, count, reserves, seed) => {
          const list = classOf(...strata);
          const draw = drawChildren(list, count, reserves, seed);
          const all = [...draw.chosen, ...draw.reserves];
          expect(new Set(all).size).toBe(all.length);
          expect(draw.chosen).toHaveLength(Math.min(count, list.length));
          expect(draw.reserves).toHaveLength(Math.min(reserves, list.length - draw.chosen.length));
          for (const stratum of new Set(strata)) {
            const size = strata.filter((s) => s === stratum).length;
            const drawn = draw.chosen.filter((id) => strata[Number(id.slice(3))] === stratum).length;
            const exact = (draw.chosen.length * size) / Math.max(1, list.length);
            expect(Math.abs(drawn - exact)).toBeLessThan(1);
          }
        },
      ),
    );
  });
});

describe('replaceAbsent', () => {
  const children = classOf('a', 'a', 'a', 'b', 'b', 'b');
  const draw = {
    seed: 's',
    method: { name: 'm', version: 1, generator: 'g' },
    from: [],
    chosen: ['id-0', 'id-3'],
    reserves: ['id-4', 'id-1', 'id-2'],
  };

  it('takes the first reserve of the same stratum, in the place of the absent child', () => {
    expect(replaceAbsent(draw, new Set(['id-0']), children)).toEqual({
      children: ['id-1', 'id-3'],
      replaced: [{ absent: 'id-0', by: 'id-1' }],
    });
  });

  it('takes the next in order where the stratum has no reserve left, skips absent reserves, and leaves the place empty at last', () => {
    const absent = new Set(['id-0', 'id-3', 'id-4', 'id-2']);
    expect(replaceAbsent(draw, absent, children)).toEqual({
      children: ['id-1'],
      replaced: [
        { absent: 'id-0', by: 'id-1' },
        { absent: 'id-3', by: null },
      ],
    });
  });
});
