import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { tauAB } from '../../src/stats/tauAB.ts';
import { tauU } from '../../src/stats/tauU.ts';
import { expectNear } from './near.ts';
import { handA, handB, improving, type Phases, phase } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('tauU', () => {
  referenceTests<Phases>('nonoverlap', (input) => ({ tau_u: tauU(...improving(input)) }));

  test('by hand: .88', () => {
    expectNear(tauU(handA, handB), 0.88);
  });

  test('a baseline run backwards takes back what it gave: the two average to Tau', () => {
    fc.assert(
      fc.property(phase, phase, (a, b) => {
        const there = tauU(a, b);
        const back = tauU([...a].reverse(), b);
        if (Number.isNaN(there)) expect(back).toBeNaN();
        else expectNear((there + back) / 2, tauAB(a, b));
      }),
    );
  });

  test('can exceed 1: a falling baseline and complete nonoverlap', () => {
    expect(tauU([9, 8, 7, 6, 5], [10, 11])).toBeGreaterThan(1);
  });

  test('an empty phase is undefined; nonsense throws', () => {
    expect(tauU([], [1])).toBeNaN();
    expect(tauU([1, 2], [null])).toBeNaN();
    expect(() => tauU([Number.NaN], [1])).toThrow(/^a:/);
    expect(() => tauU([Number.NaN], [1])).toThrow(RangeError);
  });
});
