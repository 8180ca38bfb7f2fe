import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { restrictedScore } from '../../src/stats/betweenVariance.ts';
import { poolRandomEffects } from '../../src/stats/poolRandomEffects.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

interface Input {
  yi: number[];
  vi: number[];
  conf: number;
}

const study = fc.tuple(fc.integer({ min: -300, max: 300 }), fc.integer({ min: 1, max: 200 }));
const studies = fc.array(study, { minLength: 2, maxLength: 12 }).map((pairs) => ({
  effects: pairs.map(([effect]) => effect / 100),
  variances: pairs.map(([, variance]) => variance / 1000),
}));

describe('poolRandomEffects', () => {
  referenceTests<Input>(
    'pooling',
    ({ yi, vi, conf }) => {
      const figures: Record<string, number> = {};
      for (const estimator of ['DL', 'REML'] as const) {
        for (const [inference, key] of [
          ['normal', 'z'],
          ['knapp-hartung', 'knha'],
        ] as const) {
          const got = poolRandomEffects(yi, vi, { estimator, inference, confidence: conf });
          Object.assign(figures, {
            [`${estimator}_${key}.tau2`]: got.tau2,
            [`${estimator}_${key}.Q`]: got.q,
            [`${estimator}_${key}.Qp`]: got.qP,
            [`${estimator}_${key}.I2`]: got.i2,
            [`${estimator}_${key}.H2`]: got.h2,
            [`${estimator}_${key}.b`]: got.estimate,
            [`${estimator}_${key}.se`]: got.standardError,
            [`${estimator}_${key}.ci_lo`]: got.lower,
            [`${estimator}_${key}.ci_hi`]: got.upper,
            [`${estimator}_${key}.pi_lo`]: got.predictionLower,
            [`${estimator}_${key}.pi_hi`]: got.predictionUpper,
          });
        }
      }
      return figures;
    },
    {
      only: ({ model }) => model === 'two-level',
      // REML too to the promised 1e-8, not only to the file's 1e-6.
      tolerance: (path, given) =>
        path.startsWith('DL')
          ? (given['DL, EE'] as { relative: number; absolute: number })
          : { relative: 1e-8, absolute: 1e-10 },
    },
  );

  test('the thirteen trials of Colditz 1994: REML −0.7145, tau² 0.3132, I² 92.22; DL −0.7141, tau² 0.3088', () => {
    const effects = [
      -0.8893113339202054, -1.5853886572014306, -1.3480731482996933, -1.4415511900213054,
      -0.21754732221129558, -0.786115585818864, -1.6208982235983918, 0.011952333523840508,
      -0.4694176487381494, -1.3713448034727844, -0.3393588283383906, 0.44591340057137874,
      -0.017313948216879815,
    ];
    const variances = [
      0.32558476500396133, 0.19458112139814385, 0.4153679653679654, 0.020010031902247573, 0.05121017216963086,
      0.0069056184559087574, 0.22301724757231517, 0.0039615792978177295, 0.056434210463248966,
      0.07302479361302891, 0.01241221397155972, 0.5325058452001528, 0.0714046596839863,
    ];
    const reml = poolRandomEffects(effects, variances, { estimator: 'REML', inference: 'normal' });
    expect(reml.estimate).toBeCloseTo(-0.7145, 4);
    expect(reml.tau2).toBeCloseTo(0.3132, 4);
    expect(reml.i2).toBeCloseTo(92.22, 2);
    const dl = poolRandomEffects(effects, variances, { estimator: 'DL', inference: 'normal' });
    expect(dl.estimate).toBeCloseTo(-0.7141, 4);
    expect(dl.tau2).toBeCloseTo(0.3088, 4);
  });

  test('lies between the smallest and the largest effect; turns with the sign; shifts with the effects', () => {
    fc.assert(
      fc.property(studies, ({ effects, variances }) => {
        for (const estimator of ['REML', 'DL'] as const) {
          const options = { estimator, inference: 'knapp-hartung' } as const;
          const got = poolRandomEffects(effects, variances, options);
          expect(got.estimate).toBeGreaterThanOrEqual(Math.min(...effects) - 1e-12);
          expect(got.estimate).toBeLessThanOrEqual(Math.max(...effects) + 1e-12);
          const turned = poolRandomEffects(
            effects.map((y) => -y),
            variances,
            options,
          );
          expectNear(turned.estimate, -got.estimate, 1e-8);
          expectNear(turned.tau2, got.tau2, 1e-8);
        }
      }),
      { numRuns: 50 },
    );
  });

  test('REML stands where its derivative is 0, or at 0 where the derivative points below', () => {
    fc.assert(
      fc.property(studies, ({ effects, variances }) => {
        const { tau2 } = poolRandomEffects(effects, variances, { estimator: 'REML', inference: 'normal' });
        const slope = (at: number): number => restrictedScore(effects, variances, at);
        if (tau2 > 0) {
          expect(slope(tau2 * (1 - 1e-8))).toBeGreaterThanOrEqual(0);
          expect(slope(tau2 * (1 + 1e-8))).toBeLessThanOrEqual(0);
        } else expect(slope(0)).toBeLessThanOrEqual(1e-9);
      }),
    );
  });

  test('with equal variances both estimators give the closed form, and all weights are equal', () => {
    fc.assert(
      fc.property(studies, ({ effects }) => {
        const variances = effects.map(() => 0.05);
        const k = effects.length;
        const centre = effects.reduce((x, y) => x + y, 0) / k;
        const sample = effects.reduce((sum, y) => sum + (y - centre) ** 2, 0) / (k - 1);
        for (const estimator of ['REML', 'DL'] as const) {
          const got = poolRandomEffects(effects, variances, { estimator, inference: 'normal' });
          expect(got.tau2).toBeCloseTo(Math.max(0, sample - 0.05), 10);
          expectNear(got.estimate, centre, 1e-9);
        }
      }),
    );
  });

  test('one effect: its own normal interval, the rest undefined', () => {
    const got = poolRandomEffects([0.4], [0.04], { estimator: 'REML', inference: 'normal' });
    expect(got).toMatchObject({ k: 1, estimate: 0.4, q: 0 });
    expectNear(got.lower, 0.4 - 0.2 * 1.959963984540054);
    for (const figure of ['tau2', 'qP', 'i2', 'h2', 'predictionLower', 'predictionUpper'] as const) {
      expect(got[figure]).toBeNaN();
    }
    expect(poolRandomEffects([0.4], [0.04], { estimator: 'DL', inference: 'knapp-hartung' }).lower).toBeNaN();
  });

  test('nothing to pool, or a variance of 0, is undefined', () => {
    const options = { estimator: 'DL', inference: 'normal' } as const;
    expect(poolRandomEffects([], [], options)).toMatchObject({ k: 0, estimate: Number.NaN });
    expect(poolRandomEffects([1, 2], [0, 1], options)).toMatchObject({
      k: 2,
      estimate: Number.NaN,
      tau2: Number.NaN,
    });
  });

  test('nonsense throws and names the argument', () => {
    const options = { estimator: 'DL', inference: 'normal' } as const;
    expect(() => poolRandomEffects([1], [1, 2], options)).toThrow(/^effects, variances/);
    expect(() => poolRandomEffects([1, 2], [1, -2], options)).toThrow(/^variances/);
    expect(() => poolRandomEffects([1, Number.NaN], [1, 2], options)).toThrow(/^effects/);
    expect(() => poolRandomEffects([1], [1], { ...options, confidence: 0 })).toThrow(/^confidence/);
    expect(() => poolRandomEffects([1], [1], { ...options, estimator: 'ML' as 'DL' })).toThrow(/^estimator/);
    expect(() => poolRandomEffects([1], [1], { ...options, inference: 't' as 'normal' })).toThrow(RangeError);
  });
});
