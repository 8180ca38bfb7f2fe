import type { AgreementReport } from '../analysis/index.ts';
import type { Words } from '../words/words.ts';
import { numbersFor } from './numbersFor.ts';
import { textTable } from './textTable.ts';

/** The agreement report as tables for people. */
export function textOfAgreement({ pairs, overall }: AgreementReport, words: Words): string {
  const { batch, f } = words;
  const { whole, decimal, kappa } = numbersFor(words);
  const names = [batch.class, batch.condition, batch.visit, batch.phase, batch.observers].map((head) => ({
    head,
  }));
  const nameCells = (row: AgreementReport['pairs'][number]): string[] => [
    ...[row.class, row.condition, row.visit, row.phase].map((cell) => cell ?? ''),
    f.list(row.observers),
  ];
  const heads = [
    batch.compared,
    batch.excluded,
    batch.agreement,
    batch.chance,
    batch.kappa,
    batch.limits,
    batch.ac1,
    batch.occurrence,
    batch.nonOccurrence,
  ];
  const limits = (lower: number | null, upper: number | null): string =>
    lower === null ? batch.undefinedMark : `${kappa(lower)} … ${kappa(upper)}`;
  const blocks =
    pairs.length === 0
      ? [batch.noPairs]
      : [
          batch.pairsTitle,
          textTable(
            [...names, ...heads.map((head) => ({ head, number: true }))],
            pairs.map((row) => [
              ...nameCells(row),
              whole(row.compared),
              whole(row.excluded),
              decimal(row.percentAgreement),
              decimal(row.chanceAgreement),
              kappa(row.kappa),
              limits(row.lower, row.upper),
              kappa(row.ac1),
              decimal(row.occurrence),
              decimal(row.nonOccurrence),
            ]),
          ),
          '',
          batch.codesTitle,
          textTable(
            [
              ...names,
              { head: batch.code },
              ...[batch.kappa, batch.occurrence, batch.nonOccurrence].map((head) => ({ head, number: true })),
            ],
            pairs.flatMap((row) =>
              row.codes.map((one) => [
                ...nameCells(row),
                one.code,
                kappa(one.kappa),
                decimal(one.occurrence),
                decimal(one.nonOccurrence),
              ]),
            ),
          ),
        ];
  return [
    ...blocks,
    '',
    batch.overallTitle,
    batch.overall({
      pairs: overall.pairs,
      compared: overall.compared,
      doubleCoded: overall.doubleCoded,
      visits: overall.visits,
      agreement: decimal(overall.percentAgreement),
      kappa: kappa(overall.kappa),
      alpha: kappa(overall.alpha),
      share: decimal(overall.percentDoubleCoded),
    }),
  ].join('\n');
}
