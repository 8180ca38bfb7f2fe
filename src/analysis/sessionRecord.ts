import { childrenOf, type RecordingFacts, recordingFacts } from '../journal/headerFacts.ts';
import { type IntervalRecord, readOut } from '../journal/readOut.ts';
import type { JournalState } from '../journal/state.ts';
import { fold } from '../journal/step.ts';
import type { StoredSession } from '../journal/stored.ts';
import { dateOf } from '../kernel/wallTime.ts';
import type { CodeSet } from '../model/codeSet.ts';
import { isForTheRecord, type TakenIn } from '../model/forTheRecord.ts';
import type { Method } from '../model/protocol.ts';
import type { Role } from '../model/session.ts';

/** How a scored interval counts. With sets of codes: `on` when any on-task code is in it, else `off` when any off-task code is. */
export type Counting = 'on' | 'off' | 'other';

/** One interval with its codes by their labels. */
export interface Look extends IntervalRecord {
  /** Labels of the codes scored; null unless scored. Empty = observed, none occurred. */
  readonly labels: readonly string[] | null;
  /** null unless scored, and for headcounts. */
  readonly as: Counting | null;
}

/**
 * One session in one phase: what all figures are made of. A session in which the phase changes gives several, each of
 * them one row, one pair and one visit in every report.
 */
export interface SessionRecord {
  /** Header id. */
  readonly session: string;
  /** What people call the session: the table's text, else the id. */
  readonly label: string;
  readonly className: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  /** 0-based place of the phase within the session. */
  readonly place: number;
  /** What a table called the visit, or the id of a visit made here; null where a table named none. */
  readonly visit: string | null;
  /** Header's visit id: what a pairing by hand refers to. */
  readonly visitId: string;
  readonly observer: string;
  readonly role: Role | null;
  readonly practice: boolean;
  readonly familiarisation: boolean;
  readonly date: string | null;
  readonly start: string | null;
  readonly method: Method;
  readonly facts: RecordingFacts;
  readonly laid: boolean;
  readonly children: readonly { readonly id: string; readonly label: string }[];
  readonly looks: readonly Look[];
  readonly state: JournalState;
}

/**
 * Cuts a session by phase, in the order in which the phases come. A session that never ended (a lost tablet) is read
 * as if it had ended where its journal stops. A phase that was planned and never began was not observed: no record.
 */
export function sessionRecords(session: StoredSession): SessionRecord[] {
  const { header } = session;
  const facts = recordingFacts(header);
  const state = fold(header, session.journal);
  const looks = readOut(state, { final: true }).map((interval) => lookOf(interval, facts));
  const laid = header.schedule.kind === 'laid';
  const began = (look: Look): boolean =>
    !laid || state.origins[look.part] !== null || look.status === 'scored';
  const phases = [...new Set(looks.filter(began).map((look) => look.phase))];
  const started = state.entries.find((entry) => entry.kind === 'started')?.wall ?? null;
  // A table's wall times may be made up; only what it says of the start counts.
  const start =
    header.plannedStart !== null && !laid
      ? header.plannedStart
      : laid
        ? (started ?? header.plannedStart)
        : null;
  return phases.map((phase, place) => ({
    session: header.id,
    label: header.sessionLabel ?? header.id,
    className: header.classroom.name === '' ? null : header.classroom.name,
    condition: header.condition,
    phase,
    place,
    visit: header.visitLabel ?? (laid ? header.visit : null),
    visitId: header.visit,
    observer: header.observer.name,
    role: header.role,
    practice: header.practice,
    familiarisation: header.familiarisation === true,
    date: header.date ?? (start === null ? null : dateOf(start)),
    start,
    method: facts.method,
    facts,
    laid,
    children: childrenOf(header).map(({ id, pseudonym }) => ({ id, label: pseudonym })),
    looks: looks.filter((look) => look.phase === phase && began(look)),
    state,
  }));
}

/** The records of many sessions; practice and familiarisation visits are left out unless asked for. */
export function recordsOf(sessions: readonly StoredSession[], taken: TakenIn = {}): SessionRecord[] {
  return sessions.filter(({ header }) => isForTheRecord(header, taken)).flatMap(sessionRecords);
}

function lookOf(interval: IntervalRecord, facts: RecordingFacts): Look {
  if (interval.status !== 'scored' || interval.codes === null) return { ...interval, labels: null, as: null };
  const labels = interval.codes.map((id) => facts.codeSet.codes.find((code) => code.id === id)?.label ?? id);
  return {
    ...interval,
    labels,
    as: interval.counts === null ? countingOf(interval.codes, facts.codeSet) : null,
  };
}

function countingOf(codes: readonly string[], codeSet: CodeSet): Counting {
  const roles = codes.map((id) => codeSet.codes.find((code) => code.id === id)?.role ?? 'other');
  return roles.includes('on-task') ? 'on' : roles.includes('off-task') ? 'off' : 'other';
}
