import { byCodePoint } from '../kernel/compare.ts';
import { epochOf } from '../kernel/wallTime.ts';
import type { Pairing } from '../model/study.ts';
import { byRecord, byStart, byText } from './order.ts';
import type { SessionRecord } from './sessionRecord.ts';

/** The records of one class at one time in one phase, one an observer, observers in code-point order. */
export interface Visit {
  readonly key: string;
  readonly visit: string | null;
  readonly className: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  readonly date: string | null;
  readonly records: readonly SessionRecord[];
}

/** How far apart two starts may lie and still be one visit. */
const sameStartMs = 30 * 60_000;

/**
 * Brings records together to visits: by what a table or a visit file called the visit (within one class); without that by class, phase and
 * date, with starts within 30 minutes where both are known; with neither each session is a visit of its own. A
 * pairing by hand goes before all that. One observer twice under one key: the k-th session (by start, then name)
 * belongs with the other's k-th. The order of rows and files decides nothing.
 *
 * A recorded session always has a visit id. Two such sessions that did not share a schedule are not joined by their
 * time: their interval numbers mean different children.
 */
export function visits(records: readonly SessionRecord[], pairings: readonly Pairing[] = []): Visit[] {
  const sorted = [...records].sort(byRecord);
  const hand = new Map(pairings.map(({ session, visit }) => [session, visit]));
  const keys = automaticKeys(sorted.filter((record) => !hand.has(record.session)));
  const byId = new Map<string, SessionRecord>();
  for (const record of keys.keys()) {
    const id = JSON.stringify([record.visitId, record.phase]);
    if (!byId.has(id)) byId.set(id, record);
  }
  const groups = new Map<string, { visit: string | null; records: SessionRecord[] }>();
  for (const record of sorted) {
    const target = hand.get(record.session);
    const other = target === undefined ? record : byId.get(JSON.stringify([target, record.phase]));
    const key = (other && keys.get(other)) ?? JSON.stringify(['hand', target, record.phase]);
    const group = groups.get(key) ?? { visit: other ? other.visit : (target ?? null), records: [] };
    group.records.push(record);
    groups.set(key, group);
  }
  return [...groups]
    .flatMap(([key, group]) =>
      inTurns(group.records).map((turn, k) => visitOf(`${key} ${k + 1}`, group.visit, turn)),
    )
    .sort(byVisit);
}

/** Orders visits by class, date, start, name and phase. */
function byVisit(a: Visit, b: Visit): number {
  const [first, second] = [a.records[0], b.records[0]];
  return (
    byText(a.className, b.className) ||
    byText(a.date, b.date) ||
    byStart(first?.start ?? null, second?.start ?? null) ||
    byText(a.visit, b.visit) ||
    byCodePoint(first?.label ?? '', second?.label ?? '') ||
    (first?.place ?? 0) - (second?.place ?? 0) ||
    byCodePoint(a.key, b.key)
  );
}

function visitOf(key: string, visit: string | null, records: readonly SessionRecord[]): Visit {
  const first = records[0];
  return {
    key,
    visit,
    className: records.find((record) => record.className !== null)?.className ?? null,
    condition: records.find((record) => record.condition !== null)?.condition ?? null,
    phase: first?.phase ?? null,
    date: records.find((record) => record.date !== null)?.date ?? null,
    records,
  };
}

/** The first sessions of all observers, then the second ones … */
function inTurns(records: readonly SessionRecord[]): SessionRecord[][] {
  const byObserver = new Map<string, SessionRecord[]>();
  for (const record of records)
    byObserver.set(record.observer, [...(byObserver.get(record.observer) ?? []), record]);
  const observers = [...byObserver.keys()].sort(byCodePoint);
  const turns = Math.max(0, ...[...byObserver.values()].map((own) => own.length));
  return Array.from({ length: turns }, (_, k) =>
    observers.flatMap((observer) => byObserver.get(observer)?.[k] ?? []),
  );
}

function automaticKeys(sorted: readonly SessionRecord[]): Map<SessionRecord, string> {
  const keys = new Map<SessionRecord, string>();
  const byTime = new Map<string, SessionRecord[]>();
  const classesOf = new Map<string, Set<string>>();
  for (const { visit, className } of sorted) {
    if (visit === null || className === null) continue;
    classesOf.set(visit, (classesOf.get(visit) ?? new Set()).add(className));
  }
  for (const record of sorted) {
    const { visit, className, phase, date, session } = record;
    // The same name in several classes ("visit 1" in each) means several visits; a class left out means none of them.
    const several = visit !== null && (classesOf.get(visit)?.size ?? 0) > 1;
    if (visit !== null) keys.set(record, JSON.stringify(['visit', visit, several ? className : null, phase]));
    else if (date === null) keys.set(record, JSON.stringify(['alone', session, phase]));
    else {
      const key = JSON.stringify(['time', className, phase, date]);
      byTime.set(key, [...(byTime.get(key) ?? []), record]);
    }
  }
  for (const [key, records] of byTime) {
    for (const [record, place] of startPlaces(records)) keys.set(record, `${key} ${place}`);
  }
  return keys;
}

/** Which start each record belongs to: 0, 1, 2 … A record without a start joins the only one there is, or stays apart. */
function startPlaces(records: readonly SessionRecord[]): [SessionRecord, number][] {
  const epochs = records.map((record) => (record.start === null ? Number.NaN : epochOf(record.start)));
  const known = epochs.filter((epoch) => !Number.isNaN(epoch)).sort((a, b) => a - b);
  const firsts: number[] = [];
  for (const epoch of known) {
    const last = firsts.at(-1);
    if (last === undefined || epoch - last > sameStartMs) firsts.push(epoch);
  }
  return records.map((record, i) => {
    const epoch = epochs[i] ?? Number.NaN;
    if (Number.isNaN(epoch)) return [record, firsts.length <= 1 ? 0 : firsts.length];
    return [record, firsts.findLastIndex((first) => first <= epoch)];
  });
}
