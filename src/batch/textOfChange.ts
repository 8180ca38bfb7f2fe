import type { ChangeReport } from '../analysis/index.ts';
import { say } from '../words/say.ts';
import type { Words } from '../words/words.ts';
import { numbersFor } from './numbersFor.ts';
import { textTable } from './textTable.ts';

/** The change report as tables for people. */
export function textOfChange({ classes, pooled, comparison, why }: ChangeReport, words: Words): string {
  const { batch } = words;
  const first = classes[0];
  if (first === undefined) return batch.nothingToReport;
  const { whole, decimal, two, points, p } = numbersFor(words);
  const limits = (lower: number | null, upper: number | null): string =>
    lower === null ? batch.undefinedMark : `${points(lower)} … ${points(upper)}`;
  const numbers = (heads: readonly string[]): { head: string; number: true }[] =>
    heads.map((head) => ({ head, number: true }));
  const lines = [
    batch.ofPhases(first),
    textTable(
      [
        { head: batch.class },
        { head: batch.condition },
        ...numbers([batch.children, batch.before, batch.after, batch.change, batch.limits, batch.p, batch.g]),
      ],
      classes.map((row) => [
        row.class ?? '',
        row.condition ?? '',
        whole(row.children),
        decimal(row.meanBefore),
        decimal(row.meanAfter),
        points(row.change),
        limits(row.lower, row.upper),
        p(row.p),
        two(row.g),
      ]),
    ),
  ];
  if (pooled.length > 0) {
    lines.push(
      '',
      batch.pooledTitle,
      textTable(
        [
          { head: batch.condition },
          ...numbers([batch.classes, batch.change, batch.limits, batch.tau2, batch.i2]),
        ],
        pooled.map((row) => [
          row.condition ?? '',
          whole(row.classes),
          points(row.change),
          limits(row.lower, row.upper),
          decimal(row.tau2),
          decimal(row.i2),
        ]),
      ),
    );
  }
  lines.push('', batch.comparisonTitle);
  if (comparison === null) {
    const reason = say(words.why, { code: why.comparison ?? 'noSecondCondition', values: {} });
    lines.push(batch.noComparison({ reason }));
    if (classes.length === 1) lines.push(batch.caution);
  } else {
    const { condition, control, unit, difference, lower, upper } = comparison;
    lines.push(
      batch.comparison({
        condition,
        control,
        unit,
        difference: points(difference),
        lower: points(lower),
        upper: points(upper),
        p: p(comparison.p),
        g: two(comparison.g),
      }),
    );
  }
  return lines.join('\n');
}
