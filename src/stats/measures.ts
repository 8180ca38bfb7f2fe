import type { About } from './about.ts';
import { about as boutsFromSummary } from './boutsFromSummary.ts';
import { about as clopperPearsonInterval } from './clopperPearsonInterval.ts';
import { about as cohenKappa } from './cohenKappa.ts';
import { about as confusionTable } from './confusionTable.ts';
import { about as effectiveLooks } from './effectiveLooks.ts';
import { about as expectedProportion } from './expectedProportion.ts';
import { about as fleissKappa } from './fleissKappa.ts';
import { about as gwetAC1 } from './gwetAC1.ts';
import { about as hedgesCorrection } from './hedgesCorrection.ts';
import { about as hedgesG } from './hedgesG.ts';
import { about as intervalAgreement } from './intervalAgreement.ts';
import { about as intraclassCorrelation } from './intraclassCorrelation.ts';
import { about as kappaPerCode } from './kappaPerCode.ts';
import { about as krippendorffAlpha } from './krippendorffAlpha.ts';
import { about as krippendorffAlphaInterval } from './krippendorffAlphaInterval.ts';
import { about as lagOneAutocorrelation } from './lagOneAutocorrelation.ts';
import { about as linearMixedModel } from './linearMixedModel.ts';
import { about as logOddsRatio } from './logOddsRatio.ts';
import { about as logResponseRatio } from './logResponseRatio.ts';
import { about as momentaryVariance } from './momentaryVariance.ts';
import { about as nonoverlapAllPairs } from './nonoverlapAllPairs.ts';
import { about as pairedChange } from './pairedChange.ts';
import { about as percentNonoverlapping } from './percentNonoverlapping.ts';
import { about as phaseRandomizationTest } from './phaseRandomizationTest.ts';
import { about as pooledKappa } from './pooledKappa.ts';
import { about as poolRandomEffects } from './poolRandomEffects.ts';
import { about as poolThreeLevel } from './poolThreeLevel.ts';
import { about as pretestPosttestControl } from './pretestPosttestControl.ts';
import { about as prevalenceAndBias } from './prevalenceAndBias.ts';
import { about as proportionChart } from './proportionChart.ts';
import { about as riskDifference } from './riskDifference.ts';
import { about as runsTest } from './runsTest.ts';
import { about as scoreBouts } from './scoreBouts.ts';
import { about as signFlipTest } from './signFlipTest.ts';
import { about as simulateLesson } from './simulateLesson.ts';
import { about as standardizedMeanChange } from './standardizedMeanChange.ts';
import { about as tauAB } from './tauAB.ts';
import { about as tauU } from './tauU.ts';
import { about as theilSenSlope } from './theilSenSlope.ts';
import { about as welchDifference } from './welchDifference.ts';
import { about as wilcoxonSignedRank } from './wilcoxonSignedRank.ts';
import { about as wilsonInterval } from './wilsonInterval.ts';

/** What every measure is, where it comes from, and a check to recompute, in the order of a methods page. */
export const measures: readonly About[] = [
  wilsonInterval,
  clopperPearsonInterval,
  lagOneAutocorrelation,
  effectiveLooks,
  runsTest,
  confusionTable,
  intervalAgreement,
  cohenKappa,
  kappaPerCode,
  prevalenceAndBias,
  gwetAC1,
  pooledKappa,
  fleissKappa,
  krippendorffAlpha,
  krippendorffAlphaInterval,
  intraclassCorrelation,
  proportionChart,
  pairedChange,
  signFlipTest,
  wilcoxonSignedRank,
  hedgesCorrection,
  standardizedMeanChange,
  hedgesG,
  welchDifference,
  pretestPosttestControl,
  logOddsRatio,
  riskDifference,
  poolRandomEffects,
  poolThreeLevel,
  linearMixedModel,
  nonoverlapAllPairs,
  tauAB,
  tauU,
  percentNonoverlapping,
  logResponseRatio,
  theilSenSlope,
  phaseRandomizationTest,
  expectedProportion,
  momentaryVariance,
  boutsFromSummary,
  simulateLesson,
  scoreBouts,
];
