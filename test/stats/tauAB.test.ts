import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { nonoverlapAllPairs } from '../../src/stats/nonoverlapAllPairs.ts';
import { tauAB } from '../../src/stats/tauAB.ts';
import { expectNear } from './near.ts';
import { handA, handB, improving, type Phases, phase } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

describe('tauAB', () => {
  referenceTests<Phases>('nonoverlap', (input) => ({ tau: tauAB(...improving(input)) }));

  test('by hand: .96', () => {
    expectNear(tauAB(handA, handB), 0.96);
  });

  test('is 2 NAP − 1 and turns its sign when the phases change places', () => {
    fc.assert(
      fc.property(phase, phase, (a, b) => {
        const tau = tauAB(a, b);
        if (Number.isNaN(tau)) {
          expect(nonoverlapAllPairs(a, b)).toBeNaN();
          return;
        }
        expectNear(tau, 2 * nonoverlapAllPairs(a, b) - 1);
        expectNear(tauAB(b, a), -tau);
      }),
    );
  });

  test('an empty phase is undefined; nonsense throws', () => {
    expect(tauAB([], [1])).toBeNaN();
    expect(() => tauAB([1], [Number.NaN])).toThrow(/^b:/);
    expect(() => tauAB([1], [Number.NaN])).toThrow(RangeError);
  });
});
