import { type MissingReason, missingReasons } from '../model/missing.ts';
import { type AgreementPair, agreementPair, type ComparedPair } from './agreementReport.ts';
import { type DurationAgreement, durationAgreement } from './durationAgreement.ts';
import { type InStep, inStep } from './inStep.ts';
import { byText } from './order.ts';
import { scoredAs } from './pairedLooks.ts';
import { type RoundSheet, roundSheet } from './roundSheet.ts';
import type { Look } from './sessionRecord.ts';
import type { Visit } from './visits.ts';
import { limits, type Warning, warning } from './warning.ts';
import { type Way, waysOf } from './waysOf.ts';

/** The study's own criterion for agreement, both 0–1. */
export interface Criterion {
  readonly agreement: number;
  readonly kappa: number;
}

/** One interval that both scored and not the same. */
export interface Difference {
  readonly number: number;
  readonly child: string | null;
  /** Session time of the look in ms; null where unknown. */
  readonly at: number | null;
  readonly minutesFromBreak: number | null;
  readonly lessonPart: string | null;
  readonly a: Pick<Look, 'labels' | 'counts'>;
  readonly b: Pick<Look, 'labels' | 'counts'>;
}

/** How many intervals were left out because this observer did not score them, and why; reason null = not in that record at all. */
export interface ExcludedBy {
  readonly observer: string;
  readonly reason: MissingReason | null;
  readonly n: number;
}

export interface PairDetails {
  readonly key: string;
  /** Header ids, in the order of `row.observers`. */
  readonly sessionIds: readonly [string, string];
  readonly method: string;
  /** How the two recorded: one way, unless they looked at different moments. */
  readonly ways: readonly Way[];
  readonly date: string | null;
  readonly row: AgreementPair;
  /** An interval that both missed is counted with both observers. */
  readonly excludedBy: readonly ExcludedBy[];
  readonly differences: readonly Difference[];
  /** Whether the two ran in step, and in the same place of the schedule. */
  readonly step: InStep;
  /** Percent on-task (0–100) of each observer in the compared intervals, and their mean; null where nothing counts. */
  readonly prevalence: { readonly a: number; readonly b: number; readonly mean: number } | null;
  /** null where agreement (or, with one code an interval, kappa) is undefined. */
  readonly criterionMet: boolean | null;
  /** Second by second; null unless both recorded durations. */
  readonly durations: DurationAgreement | null;
  readonly sheet: RoundSheet;
  readonly warnings: readonly Warning[];
}

/** Everything that screens say of one pair in one phase. */
export function pairDetails(pair: ComparedPair, criterion: Criterion): PairDetails {
  const { a, b, data, visit } = pair;
  const row = agreementPair(pair);
  const prevalence = prevalenceOf(pair);
  const met = criterionMet(row, criterion);
  const step = inStep(a, b, met);
  return {
    key: `${visit.key} ${a.session} ${b.session}`,
    sessionIds: [a.session, b.session],
    method: a.method,
    ways: waysOf([a, b]),
    date: visit.date,
    row,
    excludedBy: [...excludedBy(pair, 'a'), ...excludedBy(pair, 'b')],
    differences: data.lines.flatMap((line): Difference[] => {
      const { a: first, b: second, compared, number, child } = line;
      if (!compared || first === null || second === null || scoredAs(first) === scoredAs(second)) return [];
      const { minutesFromBreak, lessonPart } = first;
      return [
        {
          number,
          child,
          at: Number.isNaN(first.cueAt) ? null : first.cueAt,
          minutesFromBreak,
          lessonPart,
          a: { labels: first.labels, counts: first.counts },
          b: { labels: second.labels, counts: second.counts },
        },
      ];
    }),
    step,
    prevalence,
    criterionMet: met,
    durations: durationAgreement(a, b),
    sheet: roundSheet(a, b),
    warnings: [
      ...(row.compared < limits.pairedIntervals
        ? [warning('fewPairedIntervals', { compared: row.compared })]
        : []),
      ...prevalenceWarnings(prevalence?.mean ?? null, row.kappa),
      ...(met === false
        ? [warning('underCriterion', { agreement: 100 * criterion.agreement, kappa: criterion.kappa })]
        : []),
      ...(step.far === null ? [] : [warning('oftenOutOfStep', { seconds: Math.abs(step.far.seconds) })]),
    ],
  };
}

/** Kappa falls when nearly everybody is on-task (or hardly anybody): say so beside it. */
function prevalenceWarnings(mean: number | null, kappa: number | null): Warning[] {
  if (mean === null || kappa === null) return [];
  if (mean >= limits.prevalentPercent) return [warning('nearlyAlwaysOnTask', { percent: mean })];
  if (mean <= 100 - limits.prevalentPercent) return [warning('nearlyNeverOnTask', { percent: mean })];
  return [];
}

function criterionMet(row: AgreementPair, criterion: Criterion): boolean | null {
  if (row.percentAgreement === null) return null;
  const agreed = row.percentAgreement >= 100 * criterion.agreement - 1e-9;
  if (!agreed) return false;
  // Without one code an interval there is no kappa to ask for; with one code only it is undefined.
  if (row.table.counts === null) return true;
  return row.kappa === null ? null : row.kappa >= criterion.kappa - 1e-12;
}

function prevalenceOf({ data }: ComparedPair): PairDetails['prevalence'] {
  if (data.kind !== 'codes' && data.kind !== 'sets') return null;
  const lines = data.lines.filter((line) => line.compared);
  if (lines.length === 0) return null;
  const share = (side: 'a' | 'b'): number =>
    (100 * lines.filter((line) => line[side]?.as === 'on').length) / lines.length;
  const [a, b] = [share('a'), share('b')];
  return { a, b, mean: (a + b) / 2 };
}

function excludedBy(pair: ComparedPair, side: 'a' | 'b'): ExcludedBy[] {
  const { observer } = pair[side];
  const out = pair.data.lines.filter((line) => !line.compared && line[side]?.status !== 'scored');
  const count = (reason: MissingReason | null): ExcludedBy => ({
    observer,
    reason,
    n: out.filter((line) => (line[side]?.missing ?? null) === reason).length,
  });
  return [...missingReasons.map(count), count(null)].filter(({ n }) => n > 0);
}

/** How many visits of a phase were double-coded, and whether that is enough (default 20 %). */
export interface DoubleCodedShare {
  readonly phase: string | null;
  readonly visits: number;
  readonly doubleCoded: number;
  /** 0–100 */
  readonly percent: number;
  readonly enough: boolean;
}

/** The share double-coded, phase by phase (Kratochwill et al. 2010: at least 20 % in each). */
export function doubleCodedShares(all: readonly Visit[]): DoubleCodedShare[] {
  const phases = [...new Set(all.map(({ phase }) => phase))].sort(byText);
  return phases.map((phase) => {
    const own = all.filter((visit) => visit.phase === phase);
    const doubleCoded = own.filter(({ records }) => records.length > 1).length;
    const percent = (100 * doubleCoded) / own.length;
    return { phase, visits: own.length, doubleCoded, percent, enough: percent >= limits.doubleCodedPercent };
  });
}
