import type { Study } from '../../model/study.ts';
import type { SessionSummary } from '../../tasks/ports.ts';
import type { VisitLine } from '../../worker/questions.ts';

export interface ListedSession {
  readonly summary: SessionSummary;
  /** null until the figures have been worked out, and for practice. */
  readonly counts: { readonly scored: number; readonly missing: number } | null;
}

/** One visit as the list shows it: all its phases together. */
export interface VisitGroup {
  readonly key: string;
  readonly date: string | null;
  readonly klass: string;
  readonly phases: readonly string[];
  readonly sessions: readonly ListedSession[];
  /** What a pairing by hand would name to bring another session here. */
  readonly pairAs: string;
}

export interface Day {
  readonly date: string | null;
  readonly visits: readonly VisitGroup[];
}

/** Brings the sessions of a study together by visit and day, newest first; `lines` (when known) say who belongs together. */
export function visitDays(
  sessions: readonly SessionSummary[],
  lines: readonly VisitLine[],
  pairings: Study['pairings'],
): Day[] {
  const placeOf = new Map<string, string>();
  const placeOfVisit = new Map<string, string>();
  for (const line of lines) {
    const key = line.sessions.map((id) => placeOf.get(id)).find((known) => known !== undefined) ?? line.key;
    for (const id of line.sessions) placeOf.set(id, key);
    for (const visit of line.visitIds) placeOfVisit.set(visit, placeOfVisit.get(visit) ?? key);
  }
  const hand = new Map(pairings.map(({ session, visit }) => [session, visit]));
  const groups = new Map<string, SessionSummary[]>();
  for (const session of sessions) {
    // What no line tells of (practice, or closed for now) stands beside the others of its visit.
    const visit = hand.get(session.id) ?? session.visit;
    const key = placeOf.get(session.id) ?? placeOfVisit.get(visit) ?? visit;
    groups.set(key, [...(groups.get(key) ?? []), session]);
  }
  const visits = [...groups].map(([key, own]) => groupOf(key, own, lines, hand));
  const days = new Map<string | null, VisitGroup[]>();
  for (const visit of visits) days.set(visit.date, [...(days.get(visit.date) ?? []), visit]);
  return [...days]
    .map(([date, own]) => ({ date, visits: own.sort((a, b) => newest(startOf(a), startOf(b))) }))
    .sort((a, b) => newest(a.date ?? '', b.date ?? ''));
}

function groupOf(
  key: string,
  own: readonly SessionSummary[],
  lines: readonly VisitLine[],
  hand: ReadonlyMap<string, string>,
): VisitGroup {
  const [first] = own;
  const free = own.find(({ id }) => !hand.has(id)) ?? first;
  return {
    // Its first session: whatever is still being worked out, the row stays the same row.
    key: first?.id ?? key,
    date: own.map(dateOf).find((date) => date !== null) ?? null,
    klass: first?.classroom.name ?? '',
    phases: [...new Set(own.flatMap(({ phases }) => phases.flatMap((phase) => phase ?? [])))],
    sessions: own.map((summary) => ({ summary, counts: countsOf(summary.id, lines) })),
    pairAs: free === undefined ? key : (hand.get(free.id) ?? free.visit),
  };
}

/** Scored and missing of a session over all its phases. */
function countsOf(session: string, lines: readonly VisitLine[]): ListedSession['counts'] {
  const counts = lines.flatMap((line) => line.counts[line.sessions.indexOf(session)] ?? []);
  if (counts.length === 0) return null;
  return counts.reduce((sum, one) => ({
    scored: sum.scored + one.scored,
    missing: sum.missing + one.missing,
  }));
}

const dateOf = ({ date, firstWall }: SessionSummary): string | null =>
  date ?? firstWall?.slice(0, 10) ?? null;
const startOf = ({ sessions }: VisitGroup): string => sessions[0]?.summary.firstWall ?? '';
const newest = (a: string, b: string): number => (a < b ? 1 : a > b ? -1 : 0);
