import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Protocol } from '../../src/model/protocol.ts';
import { layOut } from '../../src/schedule/layOut.ts';
import { protocolMeaning } from '../../src/schedule/protocolMeaning.ts';

const usual = {
  method: 'momentary',
  intervalMs: 15_000,
  observeMs: 15_000,
  rotation: { kind: 'next' },
  partLength: { kind: 'minutes', minutes: 15 },
  childrenToDraw: 6,
} as const;

describe('what a protocol comes to', () => {
  test('the usual one: 60 looks in 15 minutes, ten for each of six children, nothing to warn of', () => {
    expect(protocolMeaning(usual)).toEqual({
      intervals: 60,
      lengthMs: 900_000,
      watched: 6,
      fewest: 10,
      most: 10,
      warnings: [],
    });
  });

  test('one child gets all looks', () => {
    expect(protocolMeaning({ ...usual, rotation: { kind: 'one' } })).toMatchObject({
      watched: 1,
      fewest: 60,
    });
  });

  test('a momentary interval is long above 30 s, not at 30 s', () => {
    const minutes = { kind: 'minutes', minutes: 60 } as const;
    expect(protocolMeaning({ ...usual, partLength: minutes, intervalMs: 30_000 }).warnings).toEqual([]);
    expect(protocolMeaning({ ...usual, partLength: minutes, intervalMs: 31_000 }).warnings).toEqual([
      'longInterval',
    ]);
  });

  test('watching is long above 10 s in partial intervals, whatever the interval', () => {
    const partial = { ...usual, method: 'partial', intervalMs: 15_000 } as const;
    expect(protocolMeaning({ ...partial, observeMs: 10_000 }).warnings).toEqual([]);
    expect(protocolMeaning({ ...partial, observeMs: 11_000 }).warnings).toEqual(['longObserve']);
  });

  test('looks are few below ten for any child', () => {
    expect(protocolMeaning({ ...usual, childrenToDraw: 7 })).toMatchObject({
      fewest: 8,
      most: 9,
      warnings: ['fewLooks'],
    });
  });

  test('fewest and most are those of the laid-out schedule, for any rotation', () => {
    const rotation = fc.oneof(
      fc.constant({ kind: 'next' as const }),
      fc.constant({ kind: 'one' as const }),
      fc.integer({ min: 1, max: 9 }).map((intervals) => ({ kind: 'block' as const, intervals })),
    );
    const length = fc.oneof(
      fc.integer({ min: 1, max: 40 }).map((minutes) => ({ kind: 'minutes' as const, minutes })),
      fc.integer({ min: 1, max: 12 }).map((rounds) => ({ kind: 'rounds' as const, rounds })),
    );
    fc.assert(
      fc.property(rotation, length, fc.integer({ min: 1, max: 12 }), (turns, partLength, childrenToDraw) => {
        const recipe = { ...usual, rotation: turns, partLength, childrenToDraw };
        const children = Array.from({ length: childrenToDraw }, (_, i) => `c${i}`);
        const laid = layOut({ ...recipe, lookAt: 'end' } as unknown as Protocol, ['before'], children);
        const seen = children
          .slice(0, turns.kind === 'one' ? 1 : childrenToDraw)
          .map((child) => laid.filter((interval) => interval.child === child).length);
        const { fewest, most, intervals } = protocolMeaning(recipe);
        expect([intervals, fewest, most]).toEqual([laid.length, Math.min(...seen), Math.max(...seen)]);
      }),
      { numRuns: 200 },
    );
  });
});
