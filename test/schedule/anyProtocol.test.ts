import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { intervalsInPart, type ScheduledInterval } from '../../src/schedule/layOut.ts';
import { protocolMeaning } from '../../src/schedule/protocolMeaning.ts';
import { anyRecipe, childrenOf, hasTurns, laidOut } from './anyRecipe.ts';

const parts = fc.integer({ min: 1, max: 2 });
const inPart = (lines: readonly ScheduledInterval[], part: number) =>
  lines.filter((line) => line.part === part);
const runs = { numRuns: 150 };

describe('any protocol that can be kept, laid out', () => {
  it('numbers its intervals 1 … n and tiles each part without gap or overlap', () => {
    fc.assert(
      fc.property(anyRecipe, parts, (recipe, n) => {
        const lines = laidOut(recipe, n);
        expect(lines.map(({ number }) => number)).toEqual(lines.map((_line, k) => k + 1));
        for (let part = 0; part < n; part++) {
          const own = inPart(lines, part);
          expect(own).toHaveLength(intervalsInPart(recipe.partLength, recipe, recipe.childrenToDraw));
          if (own.length > 0) expect(own[0]?.openMs).toBe(0);
          const torn = own.filter((line, k) => k > 0 && line.openMs !== own[k - 1]?.endMs);
          expect(torn).toEqual([]);
          expect(own.filter(({ openMs, endMs }) => endMs <= openMs)).toEqual([]);
        }
      }),
      runs,
    );
  });

  it('lets no prompt overlap another: all cues of a part come at least a second apart', () => {
    fc.assert(
      fc.property(anyRecipe, (recipe) => {
        const cues = laidOut(recipe, 1).flatMap(({ cueMs, recordMs }) =>
          recordMs === null ? [cueMs] : [cueMs, recordMs],
        );
        const tooSoon = cues.filter((at, k) => k > 0 && at - (cues[k - 1] ?? 0) < 1000);
        expect(tooSoon).toEqual([]);
      }),
      runs,
    );
  });

  it('gives a touch to one interval: each closes where the next one’s cue comes', () => {
    fc.assert(
      fc.property(anyRecipe, (recipe) => {
        const lines = laidOut(recipe, 1);
        const torn = lines.filter((line, k) => k > 0 && line.cueMs !== lines[k - 1]?.closeMs);
        expect(torn).toEqual([]);
      }),
      runs,
    );
  });

  it('gives every target child its looks: as many as the others, give or take one (a block: its length)', () => {
    fc.assert(
      fc.property(anyRecipe, (recipe) => {
        const lines = laidOut(recipe, 1);
        const children = childrenOf(recipe.childrenToDraw);
        const looks = children.map((child) => lines.filter((line) => line.child === child).length);
        const spread = (counts: readonly number[]) =>
          counts.length === 0 ? 0 : Math.max(...counts) - Math.min(...counts);
        if (!hasTurns(recipe)) {
          const whose = recipe.method === 'headcount' ? null : 'c1';
          expect(lines.every(({ child }) => child === whose)).toBe(true);
          return;
        }
        switch (recipe.rotation.kind) {
          case 'one':
            expect(looks).toEqual([lines.length, ...children.slice(1).map(() => 0)]);
            break;
          case 'block':
            expect(spread(looks)).toBeLessThanOrEqual(recipe.rotation.intervals);
            break;
          case 'target': {
            const [target = 0, ...peers] = looks;
            expect(spread(peers)).toBeLessThanOrEqual(1);
            if (peers.length === 0) expect(target).toBe(lines.length);
            else
              expect(peers.reduce((sum, n) => sum + n, 0)).toBe(
                Math.floor(lines.length / recipe.rotation.peerEvery),
              );
            break;
          }
          case 'sweep':
            expect(spread(looks)).toBe(0);
            break;
          case 'next':
            expect(spread(looks)).toBeLessThanOrEqual(1);
        }
      }),
      runs,
    );
  });

  it('has one pass through all who are watched in each full round', () => {
    fc.assert(
      fc.property(anyRecipe, (recipe) => {
        if (!hasTurns(recipe) || recipe.rotation.kind === 'one') return;
        const lines = laidOut(recipe, 1);
        const last = lines.at(-1)?.round ?? 0;
        const children = childrenOf(recipe.childrenToDraw);
        for (let round = 1; round < last; round++) {
          const seen = lines.filter((line) => line.round === round).map(({ child }) => child);
          expect([...new Set(seen)].sort()).toEqual([...children].sort());
        }
      }),
      runs,
    );
  });

  it('means what it comes to: protocolMeaning counts the laid-out schedule', () => {
    fc.assert(
      fc.property(anyRecipe, (recipe) => {
        // Turns by chance differ from listed ones only within a round that is cut short.
        const lines = laidOut({ ...recipe, order: 'listed' }, 1);
        const meaning = protocolMeaning(recipe);
        const watched =
          recipe.method === 'headcount'
            ? [null]
            : recipe.method === 'duration' || recipe.rotation.kind === 'one'
              ? ['c1']
              : childrenOf(recipe.childrenToDraw);
        const looks = watched.map((child) => lines.filter((line) => line.child === child).length);
        expect(meaning).toMatchObject({
          intervals: lines.length,
          // A sweep at the interval's end runs on a little after the last interval.
          lengthMs: laidOut({ ...recipe, order: 'listed', lookAt: 'start' }, 1).at(-1)?.endMs ?? 0,
          fewest: Math.min(...looks),
          most: Math.max(...looks),
          watched: recipe.method === 'headcount' ? 0 : watched.length,
        });
      }),
      runs,
    );
  });
});
