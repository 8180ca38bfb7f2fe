import { describe, expect, test } from 'vitest';
import * as stats from '../../src/stats/index.ts';

const listed = [
  'wilsonInterval',
  'clopperPearsonInterval',
  'lagOneAutocorrelation',
  'effectiveLooks',
  'runsTest',
  'confusionTable',
  'intervalAgreement',
  'cohenKappa',
  'kappaPerCode',
  'prevalenceAndBias',
  'gwetAC1',
  'pooledKappa',
  'fleissKappa',
  'krippendorffAlpha',
  'krippendorffAlphaInterval',
  'intraclassCorrelation',
  'proportionChart',
  'pairedChange',
  'signFlipTest',
  'wilcoxonSignedRank',
  'hedgesCorrection',
  'standardizedMeanChange',
  'hedgesG',
  'welchDifference',
  'pretestPosttestControl',
  'logOddsRatio',
  'riskDifference',
  'poolRandomEffects',
  'poolThreeLevel',
  'linearMixedModel',
  'nonoverlapAllPairs',
  'tauAB',
  'tauU',
  'percentNonoverlapping',
  'logResponseRatio',
  'theilSenSlope',
  'phaseRandomizationTest',
  'expectedProportion',
  'momentaryVariance',
  'boutsFromSummary',
  'simulateLesson',
  'scoreBouts',
];

describe('the measures as one list', () => {
  test('every measure of the contract is a function, and nothing else but the methods page data is exported', () => {
    expect(Object.keys(stats).sort()).toEqual([...listed, 'checkHolds', 'measures'].sort());
    const functions = Object.entries(stats).filter(([, value]) => typeof value === 'function');
    expect(functions.map(([name]) => name).sort()).toEqual([...listed, 'checkHolds'].sort());
  });

  test('every measure has its record', () => {
    expect(stats.measures.map(({ name }) => name).sort()).toEqual([...listed].sort());
  });

  test.each(stats.measures.map((about) => [about.name, about.check.source, about] as const))(
    '%s gives its check value: %s',
    (_name, _source, about) => {
      expect(stats.checkHolds(about), `${about.recompute()} for ${about.check.expected}`).toBe(true);
      for (const text of [about.sentence, about.formula, about.source, about.check.input]) {
        expect(text.length).toBeGreaterThan(3);
      }
      expect(about.check.tolerance).toBeLessThanOrEqual(0.006);
    },
  );

  test('a check that does not hold is told', () => {
    const [first] = stats.measures as [(typeof stats.measures)[0]];
    expect(stats.checkHolds({ ...first, recompute: () => first.check.expected * 1.1 + 0.1 })).toBe(false);
    expect(stats.checkHolds({ ...first, recompute: () => Number.NaN })).toBe(false);
  });
});
