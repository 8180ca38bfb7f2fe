import { poolRandomEffects } from '../stats/index.ts';
import type { ClassChange } from './classChange.ts';
import { byText } from './order.ts';
import type { Remark } from './remark.ts';
import { type Settled, settle, type Why } from './why.ts';

type Field = 'change' | 'standardError' | 'lower' | 'upper' | 'tau2' | 'i2';

/** The classes of one condition together; points, tau2 in points², i2 0–100. */
export interface PooledChange extends Settled<Record<Field, number>> {
  readonly condition: string | null;
  /** Classes that went in. */
  readonly classes: number;
  readonly why: Why<Field>;
}

/**
 * Per condition with at least two classes: random effects on the classes' changes with their squared standard errors
 * (REML; Knapp–Hartung, not truncated, so it can be narrower than a fixed-effect interval). A class whose standard
 * error is undefined or 0 cannot be weighed and is left out, with a notice.
 */
export function pooledChanges(classes: readonly ClassChange[]): {
  pooled: PooledChange[];
  notices: Remark[];
} {
  const conditions = [...new Set(classes.map(({ condition }) => condition))].sort(byText);
  const notices: Remark[] = [];
  const pooled = conditions.flatMap((condition): PooledChange[] => {
    const here = classes.filter((row) => row.condition === condition && row.children > 0);
    if (here.length < 2) return [];
    const usable = here.filter(
      (row) => row.change !== null && row.standardError !== null && row.standardError > 0,
    );
    for (const { class: name } of here.filter((row) => !usable.includes(row))) {
      notices.push({
        code: 'leftOutOfPooling',
        values: { class: name ?? '', condition: condition ?? '' },
        sessions: [],
      });
    }
    const { estimate, standardError, lower, upper, tau2, i2 } =
      usable.length < 2
        ? undefinedEffect
        : poolRandomEffects(
            usable.map((row) => row.change as number),
            usable.map((row) => (row.standardError as number) ** 2),
            { estimator: 'REML', inference: 'knapp-hartung' },
          );
    const { figures, why } = settle(
      { change: estimate, standardError, lower, upper, tau2, i2 } satisfies Record<Field, number>,
      () => 'underTwoUsableClasses',
    );
    return [{ condition, classes: usable.length, ...figures, why }];
  });
  return { pooled, notices };
}

const nothing = Number.NaN;
const undefinedEffect = {
  estimate: nothing,
  standardError: nothing,
  lower: nothing,
  upper: nothing,
  tau2: nothing,
  i2: nothing,
};
