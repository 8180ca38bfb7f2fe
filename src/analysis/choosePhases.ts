import { byCodePoint } from '../kernel/compare.ts';
import { type Problem, problem, type Result } from '../kernel/result.ts';
import { byText } from './order.ts';
import type { Remark } from './remark.ts';
import type { SessionRecord } from './sessionRecord.ts';

export interface PhasePair {
  readonly before: string;
  readonly after: string;
  readonly notices: readonly Remark[];
}

export type PhaseProblem = Problem<'phaseNotFound' | 'phasesToChoose' | 'tooFewPhases'>;

const namedPairs = [
  ['before', 'after'],
  ['pre', 'post'],
  ['baseline', 'intervention'],
] as const;

/**
 * Which phase is before and which after. What is asked for goes first; else the two phases in the data, the earlier
 * date first; with equal or missing dates the order in which a recorded session laid them out, then their names
 * (before/after, pre/post, baseline/intervention), then code-point order, which is said.
 */
export function choosePhases(
  records: readonly SessionRecord[],
  asked: { readonly before?: string | undefined; readonly after?: string | undefined },
): Result<PhasePair, PhaseProblem> {
  const phases = [...new Set(records.flatMap(({ phase }) => (phase === null ? [] : [phase])))].sort(
    byCodePoint,
  );
  const list = phases.join(', ');
  for (const phase of [asked.before, asked.after]) {
    if (phase !== undefined && !phases.includes(phase))
      return problem('phaseNotFound', { phase, phases: list });
  }
  const { before, after } = asked;
  if (before !== undefined && after !== undefined) {
    if (before === after) return problem('phasesToChoose', { phases: list });
    return { ok: true, value: { before, after, notices: [] } };
  }
  if (phases.length < 2) return problem('tooFewPhases', { phases: list });
  if (phases.length > 2) return problem('phasesToChoose', { phases: list });
  const [first, second] = phases as [string, string];
  if (before !== undefined) return pair(before, before === first ? second : first);
  if (after !== undefined) return pair(after === first ? second : first, after);
  return inTime(records, first, second);
}

function pair(before: string, after: string, notices: Remark[] = []): Result<PhasePair, PhaseProblem> {
  return { ok: true, value: { before, after, notices } };
}

function inTime(
  records: readonly SessionRecord[],
  first: string,
  second: string,
): Result<PhasePair, PhaseProblem> {
  const earliest = (phase: string): string | null =>
    records
      .filter((record) => record.phase === phase)
      .map(({ date }) => date)
      .sort(byText)[0] ?? null;
  const [a, b] = [earliest(first), earliest(second)];
  if (a !== null && b !== null && a !== b) return a < b ? pair(first, second) : pair(second, first);
  const laid = laidOrder(records, first, second);
  if (laid !== null) return laid ? pair(first, second) : pair(second, first);
  const names = [first.trim().toLowerCase(), second.trim().toLowerCase()];
  for (const [early, late] of namedPairs) {
    if (names[0] === early && names[1] === late) return pair(first, second);
    if (names[0] === late && names[1] === early) return pair(second, first);
  }
  return pair(first, second, [
    { code: 'phasesByName', values: { before: first, after: second }, sessions: [] },
  ]);
}

/** True when recorded sessions lay out `first` before `second`, false for the other way round, null when none or both do. */
function laidOrder(records: readonly SessionRecord[], first: string, second: string): boolean | null {
  const orders = new Set<boolean>();
  for (const { laid, facts } of records) {
    if (!laid) continue;
    const [i, j] = [facts.phases.indexOf(first), facts.phases.indexOf(second)];
    if (i >= 0 && j >= 0) orders.add(i < j);
  }
  return orders.size === 1 ? [...orders][0] === true : null;
}
