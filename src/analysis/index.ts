export {
  type AgreementOverall,
  type AgreementPair,
  type AgreementReport,
  agreementReport,
  type ComparedPair,
  comparedPairs,
} from './agreementReport.ts';
export { type Apart, apart, type FarStretch } from './apart.ts';
export {
  type ChangeDetails,
  type ChangeSentence,
  type ChangeSentenceCode,
  type ClassChangeDetails,
  changeDetails,
} from './changeDetails.ts';
export {
  type ChangeAnalysis,
  type ChangeOptions,
  type ChangeProblem,
  type ChangeReport,
  changeReport,
  emptyChange,
} from './changeReport.ts';
export type { ChildLine, ClassData } from './childChanges.ts';
export type { ClassChange } from './classChange.ts';
export type { Comparison, NoComparison } from './compareConditions.ts';
export { type CodeDurations, type DurationAgreement, durationAgreement } from './durationAgreement.ts';
export { type InStep, inStep, type StepCode } from './inStep.ts';
export type { LostPlace, LostPlaces, NotSearched, Signs } from './lostPlaces.ts';
export type { CodeCount, MissingFor } from './makeUp.ts';
export { type OnTaskChild, type OnTaskReport, type OnTaskSession, onTaskReport } from './onTaskReport.ts';
export type { CodeAgreement, PairAgreement } from './pairAgreement.ts';
export {
  type Criterion,
  type Difference,
  type DoubleCodedShare,
  doubleCodedShares,
  type ExcludedBy,
  type PairDetails,
  pairDetails,
} from './pairDetails.ts';
export type { PooledChange } from './pooledChange.ts';
export type { Prediction } from './predictions.ts';
export { type Choice, primaryRecord } from './primaryRecord.ts';
export type { Analysed, Remark, RemarkCode } from './remark.ts';
export type { ResponseTimes } from './responseTimes.ts';
export { type CellMark, type RoundSheet, roundSheet, type SheetCell, type SheetRow } from './roundSheet.ts';
export {
  type ChildDetails,
  type LessonPartShare,
  type PhaseDetails,
  type SessionDetails,
  sessionDetails,
} from './sessionDetails.ts';
export { type Counting, type Look, recordsOf, type SessionRecord, sessionRecords } from './sessionRecord.ts';
export type { Share } from './tally.ts';
export type { TimingFacts } from './timingFacts.ts';
export type { TimingGap } from './timingGaps.ts';
export type { TimingReasonCode, TimingVerdict } from './timingVerdict.ts';
export { type Visit, visits } from './visits.ts';
export { limits, type Warning, type WarningCode } from './warning.ts';
export { type Way, waysOf } from './waysOf.ts';
export type { Why, WhyCode } from './why.ts';
