import { krippendorffAlpha, pooledKappa } from '../stats/index.ts';
import { type PairAgreement, type PairData, pairAgreement } from './pairAgreement.ts';
import { scoredAs } from './pairedLooks.ts';
import type { Analysed, Remark } from './remark.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';
import type { Visit } from './visits.ts';
import { settle, type Why, type WhyCode } from './why.ts';

export interface AgreementPair extends PairAgreement {
  readonly visit: string | null;
  readonly class: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  readonly observers: readonly [string, string];
  readonly sessions: readonly [string, string];
}

export interface AgreementOverall {
  readonly pairs: number;
  readonly compared: number;
  readonly percentAgreement: number | null;
  readonly kappa: number | null;
  readonly alpha: number | null;
  readonly doubleCoded: number;
  readonly visits: number;
  readonly percentDoubleCoded: number | null;
  readonly why: Why<'percentAgreement' | 'kappa' | 'alpha' | 'percentDoubleCoded'>;
}

export interface AgreementReport {
  readonly pairs: readonly AgreementPair[];
  readonly overall: AgreementOverall;
}

/** Two records of one visit by different observers, with everything that their comparison gave. */
export interface ComparedPair {
  readonly visit: Visit;
  readonly a: SessionRecord;
  readonly b: SessionRecord;
  readonly data: PairData;
}

/** Every two records of a visit, the observers in code-point order. */
export function comparedPairs(visits: readonly Visit[]): ComparedPair[] {
  return visits.flatMap((visit) =>
    visit.records.flatMap((a, i) =>
      visit.records.slice(i + 1).map((b) => ({ visit, a, b, data: pairAgreement(a, b) })),
    ),
  );
}

/** The agreement of every pair, and over all pairs: the document of `agreement`. */
export function agreementReport(visits: readonly Visit[]): Analysed<AgreementReport> {
  const pairs = comparedPairs(visits);
  return {
    report: { pairs: pairs.map(agreementPair), overall: agreementOverall(visits, pairs) },
    problems: [],
    notices: methodsJoined(pairs),
  };
}

export function agreementPair({ visit, a, b, data }: ComparedPair): AgreementPair {
  return {
    visit: visit.visit,
    class: visit.className,
    condition: visit.condition,
    phase: visit.phase,
    observers: [a.observer, b.observer],
    sessions: [a.label, b.label],
    ...data.agreement,
  };
}

/**
 * Over all pairs: compared intervals taken together; kappa pooled from the unweighted means over pairs of observed and
 * chance agreement (De Vries et al. 2008); Krippendorff's alpha over the compared intervals. Intervals with several
 * codes or with counts are in percentAgreement only.
 */
export function agreementOverall(visits: readonly Visit[], pairs: readonly ComparedPair[]): AgreementOverall {
  const compared = pairs.reduce((sum, { data }) => sum + data.agreement.compared, 0);
  const same = pairs.reduce((sum, { data }) => sum + agreed(data), 0);
  const tables = pairs.flatMap(({ data }) =>
    data.agreement.table.counts === null ? [] : [data.agreement.table.counts],
  );
  const doubleCoded = visits.filter(({ records }) => records.length > 1).length;
  const { figures, why } = settle(
    {
      percentAgreement: (100 * same) / compared,
      kappa: tables.length === 0 ? Number.NaN : pooledKappa(tables).kappa,
      alpha: krippendorffAlpha(alphaUnits(pairs)),
      percentDoubleCoded: (100 * doubleCoded) / visits.length,
    },
    (field): WhyCode => {
      if (field === 'percentDoubleCoded') return 'noVisits';
      if (pairs.length === 0) return 'noPairs';
      if (compared === 0) return 'nothingCompared';
      return tables.length === 0 ? (pairs[0]?.data.agreement.why.table ?? 'severalCodes') : 'oneCodeOnly';
    },
  );
  return { pairs: pairs.length, compared, doubleCoded, visits: visits.length, ...figures, why };
}

function agreed({ lines }: PairData): number {
  return lines.filter((line) => line.compared && scoredAs(line.a as Look) === scoredAs(line.b as Look))
    .length;
}

/** One unit for every interval that at least two observers scored with one code: a code for each observer of the visit. */
function alphaUnits(pairs: readonly ComparedPair[]): (string | null)[][] {
  const units = new Map<string, Map<string, string>>();
  for (const { visit, a, b, data } of pairs) {
    if (data.kind !== 'codes') continue;
    for (const line of data.lines) {
      if (!line.compared) continue;
      const key = JSON.stringify([visit.key, line.child, line.number]);
      const unit = units.get(key) ?? new Map<string, string>();
      unit.set(a.observer, scoredAs(line.a as Look)).set(b.observer, scoredAs(line.b as Look));
      units.set(key, unit);
    }
  }
  const rows = [...units.values()].map((unit) => [...unit.values()]);
  const width = rows.reduce((most, row) => Math.max(most, row.length), 0);
  return rows.map((row) => Array.from({ length: width }, (_, i) => row[i] ?? null));
}

function methodsJoined(pairs: readonly ComparedPair[]): Remark[] {
  const counting = pairs.filter(({ data }) => data.agreement.compared > 0);
  const methods = [...new Set(counting.map(({ a }) => a.method))].sort();
  if (methods.length < 2) return [];
  const sessions = counting.flatMap(({ a, b }) => [a.session, b.session]);
  return [{ code: 'methodsJoinedOverall', values: { methods: methods.join(', ') }, sessions }];
}
