import type { Observer } from '../model/observer.ts';
import type { SessionSummary } from './ports.ts';

/** What was recorded last, of a class or of the whole study. */
export interface LastTime {
  /** The protocol's id. */
  readonly protocol: string;
  readonly phases: readonly string[];
  /** True where it was the class's own record, false where only the study's. */
  readonly ofClass: boolean;
}

/** The last record with a protocol among `sessions` (oldest first): the class's own where there is one; else the study's; null without any. */
export function lastTime(sessions: readonly SessionSummary[], classroom: string | null): LastTime | null {
  const own = sessions.findLast((one) => one.protocol !== null && one.classroom.id === classroom);
  const last = own ?? sessions.findLast(({ protocol }) => protocol !== null);
  if (last === undefined || last.protocol === null) return null;
  const phases = last.phases.filter((phase) => phase !== null);
  return { protocol: last.protocol.id, phases, ofClass: own !== undefined };
}

/** Who may be taken to record without being asked, and why. */
export interface LikelyObserver {
  readonly id: string;
  readonly why: 'as last time' | 'the only one';
}

/**
 * Who probably records at this tablet: who recorded here last, else the only observer of the study. null where nobody
 * can be told apart: among several, for somebody who checks another's record, and for who has a record of this visit.
 */
export function likelyObserver(
  observers: readonly Observer[],
  sessions: readonly SessionSummary[],
  { visit, second }: { readonly visit: string; readonly second: boolean },
): LikelyObserver | null {
  const taken = new Set(sessions.filter((one) => one.visit === visit).map(({ observer }) => observer.id));
  const free = (id: string): boolean => !taken.has(id) && observers.some((one) => one.id === id);
  const last = sessions.findLast(({ here, fromPaper }) => here && fromPaper !== true)?.observer.id;
  if (last !== undefined && free(last)) return { id: last, why: 'as last time' };
  // The one name that came with the study may be the first observer's.
  const [only, ...others] = observers;
  if (only === undefined || others.length > 0 || second || !free(only.id)) return null;
  return { id: only.id, why: 'the only one' };
}
