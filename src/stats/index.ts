export { type About, checkHolds } from './about.ts';
export { boutsFromSummary } from './boutsFromSummary.ts';
export { clopperPearsonInterval } from './clopperPearsonInterval.ts';
export { type CohenKappa, cohenKappa } from './cohenKappa.ts';
export { type Code, type CodeSeries, confusionTable } from './confusionTable.ts';
export type { CountTable } from './countTable.ts';
export { effectiveLooks } from './effectiveLooks.ts';
export { type BehaviourInBouts, expectedProportion, type SamplingMethod } from './expectedProportion.ts';
export { type FleissKappa, fleissKappa } from './fleissKappa.ts';
export { type GwetAC1, gwetAC1 } from './gwetAC1.ts';
export { hedgesCorrection } from './hedgesCorrection.ts';
export { type HedgesG, hedgesG } from './hedgesG.ts';
export { type IntervalAgreement, intervalAgreement } from './intervalAgreement.ts';
export { type IccForm, type IntraclassCorrelation, intraclassCorrelation } from './intraclassCorrelation.ts';
export { type KappaOfCode, kappaPerCode } from './kappaPerCode.ts';
export { krippendorffAlpha, type PairedValues } from './krippendorffAlpha.ts';
export {
  type AlphaInterval,
  type AlphaIntervalOptions,
  krippendorffAlphaInterval,
} from './krippendorffAlphaInterval.ts';
export { lagOneAutocorrelation } from './lagOneAutocorrelation.ts';
export {
  type FixedEffect,
  type LinearMixedModel,
  linearMixedModel,
  type MixedModelInput,
} from './linearMixedModel.ts';
export { logOddsRatio } from './logOddsRatio.ts';
export { type LogResponseRatio, logResponseRatio } from './logResponseRatio.ts';
export { measures } from './measures.ts';
export { momentaryVariance } from './momentaryVariance.ts';
export { nonoverlapAllPairs } from './nonoverlapAllPairs.ts';
export { type PairedChange, pairedChange } from './pairedChange.ts';
export { percentNonoverlapping } from './percentNonoverlapping.ts';
export {
  type PhaseRandomization,
  type PhaseRandomizationOptions,
  phaseRandomizationTest,
} from './phaseRandomizationTest.ts';
export type { PhaseScores } from './phaseScores.ts';
export { type PooledKappa, pooledKappa } from './pooledKappa.ts';
export { type PooledEffect, type PoolingOptions, poolRandomEffects } from './poolRandomEffects.ts';
export { poolThreeLevel, type ThreeLevelEffect, type ThreeLevelOptions } from './poolThreeLevel.ts';
export { pretestPosttestControl } from './pretestPosttestControl.ts';
export { type PrevalenceAndBias, prevalenceAndBias } from './prevalenceAndBias.ts';
export { type ChartPoint, type ProportionChart, proportionChart } from './proportionChart.ts';
export { riskDifference } from './riskDifference.ts';
export { type RunsTest, runsTest } from './runsTest.ts';
export { type ScoringOptions, scoreBouts } from './scoreBouts.ts';
export { type SamplingOptions, signFlipTest } from './signFlipTest.ts';
export { type Bout, type LessonOptions, simulateLesson } from './simulateLesson.ts';
export { type ChangeKind, type Effect, standardizedMeanChange } from './standardizedMeanChange.ts';
export { tauAB } from './tauAB.ts';
export { tauU } from './tauU.ts';
export { theilSenSlope } from './theilSenSlope.ts';
export { type WelchDifference, welchDifference } from './welchDifference.ts';
export { type WilcoxonSignedRank, wilcoxonSignedRank } from './wilcoxonSignedRank.ts';
export { type Interval, wilsonInterval } from './wilsonInterval.ts';
