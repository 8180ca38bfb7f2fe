import { pretestPosttestControl, welchDifference } from '../stats/index.ts';
import { type ClassData, pairedScores } from './childChanges.ts';
import type { ClassChange } from './classChange.ts';
import { byText } from './order.ts';
import { type Settled, settle, type Why, type WhyCode } from './why.ts';

type Field = 'difference' | 'standardError' | 'df' | 'lower' | 'upper' | 'p' | 'g' | 'gVariance';

/** How much more the one condition changed than its control: points, and g in pooled SDs before (d_ppc2, on children). */
export interface Comparison extends Settled<Record<Field, number>> {
  readonly condition: string;
  readonly control: string;
  /** Whose changes were compared: the classes' means, or all children of a condition. */
  readonly unit: 'class' | 'child';
  readonly why: Why<Field>;
}

export type NoComparison =
  | 'noSecondCondition'
  | 'severalConditions'
  | 'classInBoth'
  | 'controlUnknown'
  | 'noChildInBoth';

/** What a control is called when nobody says which it is. */
const controlNames = ['control', 'comparison', 'usual'];

/**
 * Compares two conditions by Welch's test: on the classes' mean changes where each condition has two or more classes,
 * else on the changes of all children, which treats children as independent. Not where a class is in both conditions,
 * or where it is not known which condition is the control.
 */
export function compareConditions(
  rows: readonly ClassChange[],
  data: readonly ClassData[],
  control: string | null,
):
  | { readonly comparison: Comparison; readonly why: null }
  | { readonly comparison: null; readonly why: NoComparison } {
  const none = (why: NoComparison): { comparison: null; why: NoComparison } => ({ comparison: null, why });
  const conditions = [...new Set(data.flatMap((one) => one.conditions))].sort(byText);
  if (conditions.length < 2) return none('noSecondCondition');
  if (conditions.length > 2) return none('severalConditions');
  const classesOf = (condition: string): (string | null)[] =>
    data.filter((one) => one.conditions.includes(condition)).map(({ className }) => className);
  const [first, second] = conditions as [string, string];
  if (classesOf(first).some((name) => classesOf(second).includes(name))) return none('classInBoth');
  const controls =
    control === null
      ? conditions.filter((name) => controlNames.includes(name.trim().toLowerCase()))
      : conditions.filter((name) => name === control);
  const theControl = controls[0];
  if (controls.length !== 1 || theControl === undefined) return none('controlUnknown');
  const condition = theControl === first ? second : first;
  const scores = (name: string): { before: number[]; after: number[] }[] =>
    data
      .filter((one) => one.condition === name)
      .map(({ lines }) => pairedScores(lines))
      .filter(({ before }) => before.length > 0);
  const [treated, usual] = [scores(condition), scores(theControl)];
  if (treated.length === 0 || usual.length === 0) return none('noChildInBoth');
  const unit = treated.length >= 2 && usual.length >= 2 ? 'class' : 'child';
  const changes = (name: string, groups: readonly { before: number[]; after: number[] }[]): number[] =>
    unit === 'class'
      ? rows.flatMap((row) => (row.condition === name && row.children > 0 ? (row.change ?? []) : []))
      : groups.flatMap(({ before, after }) => after.map((score, i) => score - (before[i] as number)));
  const welch = welchDifference(changes(condition, treated), changes(theControl, usual));
  const effect = pretestPosttestControl(
    treated.flatMap(({ before }) => before),
    treated.flatMap(({ after }) => after),
    usual.flatMap(({ before }) => before),
    usual.flatMap(({ after }) => after),
  );
  const sizes = [treated, usual].map((groups) => groups.reduce((sum, { before }) => sum + before.length, 0));
  const oneAlone = Math.min(...sizes) < 2;
  const { difference, standardError, df, lower, upper, p } = welch;
  const { figures, why } = settle(
    {
      difference,
      standardError,
      df,
      lower,
      upper,
      p,
      g: effect.estimate,
      gVariance: effect.variance,
    } satisfies Record<Field, number>,
    (field): WhyCode => {
      if (oneAlone) return 'oneInAGroup';
      if (field === 'g') return 'noSpreadBefore';
      if (field !== 'gVariance') return 'sameChange';
      if (!Number.isFinite(effect.estimate)) return 'noSpreadBefore';
      return sizes.reduce((a, b) => a + b, 0) <= 4 ? 'tooFewForVariance' : 'noSpreadAfter';
    },
  );
  return { comparison: { condition, control: theControl, unit, ...figures, why }, why: null };
}
