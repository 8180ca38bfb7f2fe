import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { percentNonoverlapping } from '../../src/stats/percentNonoverlapping.ts';
import { expectNear } from './near.ts';
import { handA, handB, improving, type Phases, phase, present } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('percentNonoverlapping', () => {
  referenceTests<Phases>('nonoverlap', (input) => ({
    pnd: 100 * percentNonoverlapping(...improving(input)),
  }));

  test('by hand: .80', () => {
    expectNear(percentNonoverlapping(handA, handB), 0.8);
  });

  test('hangs on the highest score before alone, and a tie with it does not count', () => {
    fc.assert(
      fc.property(phase, phase, (a, b) => {
        const share = percentNonoverlapping(a, b);
        if (present(a).length === 0 || present(b).length === 0) expect(share).toBeNaN();
        else expect(percentNonoverlapping([Math.max(...present(a))], b)).toBe(share);
      }),
    );
    expect(percentNonoverlapping([5], [5, 6])).toBe(0.5);
  });

  test('nonsense throws and names the argument', () => {
    expect(() => percentNonoverlapping([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => percentNonoverlapping([1], [Number.NaN])).toThrow(RangeError);
  });
});
