import { byCodePoint } from '../kernel/compare.ts';
import { labelsOfTable } from '../model/codeSet.ts';
import { cohenKappa, confusionTable, gwetAC1, intervalAgreement } from '../stats/index.ts';
import { type Comparable, comparableAs, type PairedLook, pairedLooks, scoredAs } from './pairedLooks.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';
import { type Settled, settle, type Why, type WhyCode } from './why.ts';

type Field =
  | 'percentAgreement'
  | 'chanceAgreement'
  | 'kappa'
  | 'standardError'
  | 'lower'
  | 'upper'
  | 'maximumKappa'
  | 'ac1'
  | 'occurrence'
  | 'nonOccurrence';

export interface CodeAgreement {
  readonly code: string;
  readonly kappa: number | null;
  readonly occurrence: number | null;
  readonly nonOccurrence: number | null;
  readonly why: Why<'kappa' | 'occurrence' | 'nonOccurrence'>;
}

/** The agreement of two records of one visit and phase. Percentages 0–100; kappa, its errors and limits, and AC1 0–1. */
export interface PairAgreement extends Settled<Record<Field, number>> {
  readonly compared: number;
  readonly excluded: number;
  /** Rows = first observer. `counts` is null where an interval has no single code. */
  readonly table: {
    readonly codes: readonly string[];
    readonly counts: readonly (readonly number[])[] | null;
  };
  readonly codes: readonly CodeAgreement[];
  readonly why: Why<Field | 'table'>;
}

/** The intervals behind a pair's figures, for whoever pools them. */
export interface PairData {
  readonly kind: Comparable;
  readonly lines: readonly PairedLook[];
  readonly agreement: PairAgreement;
}

/**
 * Compares two records of one visit interval by interval.
 *
 * Intervals with one code: all figures. Sets of codes (partial, whole): percentAgreement counts identical sets; kappa,
 * its companions and AC1 are null and each code has its own. Headcounts: percentAgreement counts identical counts.
 * Durations and two different methods: nothing is compared.
 */
export function pairAgreement(a: SessionRecord, b: SessionRecord): PairData {
  const kind = comparableAs(a, b);
  const all = pairedLooks(a, b);
  const usable = kind !== 'duration' && kind !== 'methods differ';
  const lines = usable
    ? all.map((line) => ({ ...line, compared: line.compared && hasValue(line, kind) }))
    : [];
  const compared = lines.filter((line) => line.compared);
  const excluded = all.length - compared.length;
  const firsts = compared.map((line) => line.a as Look);
  const seconds = compared.map((line) => line.b as Look);
  const codes = kind === 'codes' || kind === 'sets' ? codesOf(a, b, [...firsts, ...seconds]) : [];
  const oneCode = kind === 'codes';
  const counts = oneCode ? confusionTable(firsts.map(codeOf), seconds.map(codeOf), codes) : null;
  const same = compared.filter((_, i) => scoredAs(firsts[i] as Look) === scoredAs(seconds[i] as Look)).length;
  const kappa = counts === null ? null : cohenKappa(counts);
  const onTask =
    oneCode || kind === 'sets' ? intervalAgreement(firsts.map(isOn), seconds.map(isOn), 1) : null;
  const undefinedNumber = Number.NaN;
  const { figures, why } = settle(
    {
      percentAgreement: (100 * same) / compared.length,
      chanceAgreement: kappa === null ? undefinedNumber : 100 * kappa.chanceAgreement,
      kappa: kappa?.kappa ?? undefinedNumber,
      standardError: kappa?.standardError ?? undefinedNumber,
      lower: kappa?.lower ?? undefinedNumber,
      upper: kappa?.upper ?? undefinedNumber,
      maximumKappa: kappa?.maximumKappa ?? undefinedNumber,
      ac1: counts === null || codes.length < 2 ? undefinedNumber : gwetAC1(counts).ac1,
      occurrence: 100 * (onTask?.occurrence ?? undefinedNumber),
      nonOccurrence: 100 * (onTask?.nonOccurrence ?? undefinedNumber),
    } satisfies Record<Field, number>,
    (field) => whyUndefined(field, kind, compared.length),
  );
  return {
    kind,
    lines: usable ? lines : all.map((line) => ({ ...line, compared: false })),
    agreement: {
      compared: compared.length,
      excluded,
      ...figures,
      table: { codes, counts },
      codes: codes.map((code) => agreementOnCode(code, firsts, seconds)),
      why: counts === null ? { ...why, table: notOneCode(kind) } : why,
    },
  };
}

const codeOf = (look: Look): string => look.labels?.[0] ?? '';
const isOn = (look: Look): number => (look.as === 'on' ? 1 : 0);

function hasValue({ a, b }: PairedLook, kind: Comparable): boolean {
  if (kind === 'counts') return a?.counts != null && b?.counts != null;
  return kind === 'sets' || (codeOf(a as Look) !== '' && codeOf(b as Look) !== '');
}

/** The code set's codes in its order; of a table without one the labels in the compared intervals, in code-point order. */
function codesOf(a: SessionRecord, b: SessionRecord, looks: readonly Look[]): string[] {
  const sets = [a, b].map(({ facts }) => facts.codeSet).filter(({ name }) => name !== labelsOfTable);
  const used = [...new Set(looks.flatMap((look) => look.labels ?? []))].sort(byCodePoint);
  return [...new Set([...sets.flatMap(({ codes }) => codes.map(({ label }) => label)), ...used])];
}

function agreementOnCode(code: string, a: readonly Look[], b: readonly Look[]): CodeAgreement {
  const has = (look: Look): number => (look.labels?.includes(code) ? 1 : 0);
  const [first, second] = [a.map(has), b.map(has)];
  const { occurrence, nonOccurrence } = intervalAgreement(first, second, 1);
  const { kappa } = cohenKappa(confusionTable(first, second, [1, 0]));
  const never = ![...first, ...second].includes(1);
  const { figures, why } = settle(
    { kappa, occurrence: 100 * occurrence, nonOccurrence: 100 * nonOccurrence },
    () => (a.length === 0 ? 'nothingCompared' : never ? 'codeNeverUsed' : 'codeAlwaysUsed'),
  );
  return { code, ...figures, why };
}

function notOneCode(kind: Comparable): WhyCode {
  switch (kind) {
    case 'counts':
      return 'headcountHasNoCodes';
    case 'duration':
      return 'durationNotCompared';
    case 'methods differ':
      return 'methodsDiffer';
    default:
      return 'severalCodes';
  }
}

function whyUndefined(field: Field, kind: Comparable, compared: number): WhyCode {
  if (kind === 'duration' || kind === 'methods differ') return notOneCode(kind);
  const everyKind = field === 'percentAgreement' || field === 'occurrence' || field === 'nonOccurrence';
  if (kind === 'counts' && field !== 'percentAgreement') return 'headcountHasNoCodes';
  if (kind === 'sets' && !everyKind) return 'severalCodes';
  if (compared === 0) return 'nothingCompared';
  if (field === 'occurrence') return 'neverOnTask';
  if (field === 'nonOccurrence') return 'alwaysOnTask';
  return field === 'ac1' ? 'oneCodeListed' : 'oneCodeOnly';
}
