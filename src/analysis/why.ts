/**
 * Why a figure is undefined. The sentences are in the message catalogue (`words/en/why.ts`); an undefined figure is
 * null beside its code, never NaN, 0 or 100.
 */
export type WhyCode =
  | 'nothingScored'
  | 'neitherOnNorOff'
  | 'headcountHasNoChildren'
  | 'durationHasNoLooks'
  | 'timesUnknown'
  | 'tooFewLooks'
  | 'alwaysTheSame'
  | 'notMomentary'
  | 'nothingCompared'
  | 'severalCodes'
  | 'headcountHasNoCodes'
  | 'durationNotCompared'
  | 'methodsDiffer'
  | 'oneCodeOnly'
  | 'oneCodeListed'
  | 'codeNeverUsed'
  | 'codeAlwaysUsed'
  | 'neverOnTask'
  | 'alwaysOnTask'
  | 'noPairs'
  | 'noVisits'
  | 'noChildInBoth'
  | 'oneChild'
  | 'underThreeChildren'
  | 'sameChange'
  | 'noSpreadBefore'
  | 'noSpreadAfter'
  | 'underTwoUsableClasses'
  | 'noSecondCondition'
  | 'severalConditions'
  | 'classInBoth'
  | 'controlUnknown'
  | 'oneInAGroup'
  | 'tooFewForVariance'
  | 'phasesUnknown';

/** Field name → why it is null. Empty where everything is defined. */
export type Why<Field extends string = string> = Readonly<Partial<Record<Field, WhyCode>>>;

/** The same figures with null where they were NaN or infinite, and why. */
export type Settled<Values> = { readonly [Key in keyof Values]: number | null };

/** Turns undefined numbers into null with a reason, so that no NaN leaves the floor. */
export function settle<Values extends Readonly<Record<string, number>>>(
  values: Values,
  whyOf: (field: keyof Values & string) => WhyCode,
): { readonly figures: Settled<Values>; readonly why: Why<keyof Values & string> } {
  const figures: Record<string, number | null> = {};
  const why: Record<string, WhyCode> = {};
  for (const [field, value] of Object.entries(values)) {
    const defined = Number.isFinite(value);
    figures[field] = defined ? value : null;
    if (!defined) why[field] = whyOf(field);
  }
  return { figures: figures as Settled<Values>, why: why as Why<keyof Values & string> };
}
