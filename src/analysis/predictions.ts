import { poolRandomEffects } from '../stats/index.ts';
import type { ClassChange } from './classChange.ts';
import { byText } from './order.ts';

/** Where the change of one more class of this condition would lie (95 %), in points; null where that is undefined. */
export interface Prediction {
  readonly condition: string | null;
  readonly lower: number | null;
  readonly upper: number | null;
}

/** Prediction intervals of the classes pooled per condition, from the same classes as `pooledChanges`. */
export function predictions(classes: readonly ClassChange[]): Prediction[] {
  const conditions = [...new Set(classes.map(({ condition }) => condition))].sort(byText);
  return conditions.flatMap((condition): Prediction[] => {
    const usable = classes.flatMap((row) =>
      row.condition === condition &&
      row.change !== null &&
      row.standardError !== null &&
      row.standardError > 0
        ? [{ change: row.change, variance: row.standardError ** 2 }]
        : [],
    );
    if (usable.length < 2) return [];
    const { predictionLower, predictionUpper } = poolRandomEffects(
      usable.map(({ change }) => change),
      usable.map(({ variance }) => variance),
      { estimator: 'REML', inference: 'knapp-hartung' },
    );
    const known = Number.isFinite(predictionLower) && Number.isFinite(predictionUpper);
    return [{ condition, lower: known ? predictionLower : null, upper: known ? predictionUpper : null }];
  });
}
