import type { JournalEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import type { Random } from '../kernel/random.ts';
import type { Result } from '../kernel/result.ts';
import type { WallTime } from '../kernel/units.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Revision } from '../model/common.ts';
import type { Observer } from '../model/observer.ts';
import type { Method, Protocol } from '../model/protocol.ts';
import type { Role, SessionHeader } from '../model/session.ts';
import type { Study } from '../model/study.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { PaperDraft } from './paperDraft.ts';

/** What a use case is handed: the store, the wall clock, chance, and who and what writes. */
export interface Deps {
  readonly store: Store;
  readonly clock: { wall(): WallTime };
  readonly random: Random;
  /** This installation's id, as it stands in revisions and in entries made after a session. */
  readonly writer: string;
  readonly app: string;
  readonly device: string;
  readonly timeZone: string | null;
}

/** All of one study, or a part of it, as it travels between stores and files. */
export interface StudyBundle {
  readonly study: Study;
  readonly classes: readonly Classroom[];
  readonly observers: readonly Observer[];
  readonly protocols: readonly Protocol[];
  readonly sessions: readonly StoredSession[];
}

/** Joins two states of one study: a union, so that its order and its repetition change nothing. */
export type Join = (kept: StudyBundle, incoming: StudyBundle) => StudyBundle;

/** A record to keep, and the revision on which the edit was made; null for a new record. */
export interface Edit<Kept> {
  readonly record: Kept;
  readonly previous: Revision | null;
}

/** Edits that are kept together or not at all. */
export interface Edits {
  readonly studies?: readonly Edit<Study>[];
  readonly classes?: readonly Edit<Classroom>[];
  readonly observers?: readonly Edit<Observer>[];
  readonly protocols?: readonly Edit<Protocol>[];
}

/** What lists show of a session without opening its journal. */
export interface SessionSummary {
  readonly id: string;
  readonly study: string;
  readonly classroom: { readonly id: string; readonly name: string };
  readonly condition: string | null;
  readonly visit: string;
  readonly visitLabel: string | null;
  readonly observer: { readonly id: string; readonly name: string };
  readonly role: Role | null;
  readonly practice: boolean;
  /** A visit to let the class get used to the observer; left out of results. */
  readonly familiarisation?: boolean;
  /** Recorded on paper and typed in. */
  readonly fromPaper?: boolean;
  readonly date: string | null;
  readonly plannedStart: string | null;
  readonly method: Method;
  readonly protocol: { readonly id: string; readonly version: number; readonly name: string } | null;
  readonly phases: readonly (string | null)[];
  readonly children: number;
  readonly entries: number;
  /** Wall times of the first and the latest entry kept; null without entries. */
  readonly firstWall: string | null;
  readonly lastWall: string | null;
  readonly ended: 'complete' | 'early' | null;
  /** Recorded on this tablet (not brought in by a file). */
  readonly here: boolean;
  /** Entries written on this tablet. */
  readonly own: number;
  /** All that was written here has left the tablet in a file. */
  readonly handedOver: boolean;
}

/** One session as a file took it along: `own` entries of this tablet were in it. */
export interface HandOver {
  readonly session: string;
  readonly own: number;
}

/** A file ready to leave the tablet; `covers` is given to `markHandedOver` once it has left. */
export interface ExportedFile {
  readonly name: string;
  readonly type: string;
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly covers: readonly HandOver[];
}

/** What the tick check of a visit found, and when: clocks drift apart, and may be set. */
export interface TickChecked {
  readonly visit: string;
  /** How many milliseconds later than it shows this tablet's wall clock is to be read. */
  readonly nudgeMs: number;
  /** This tablet's wall time then, as it showed. */
  readonly wall: WallTime;
}

export interface Settings {
  readonly theme: 'light' | 'dim' | 'system';
  /** The study that the screens show. */
  readonly study: string | null;
  /** This installation's writer id; null until the app has made one. */
  readonly installation: string | null;
  /** When a study file last left the tablet. */
  readonly lastBackup: string | null;
  /** The visit that was prepared (or taken over from a file) and has not been recorded yet. */
  readonly prepared: VisitPlan | null;
  /** The last tick check of this tablet. */
  readonly tickChecked: TickChecked | null;
  /** Protocol versions (`id version`) that were prepared for a visit or have left the tablet: they stand. */
  readonly frozenProtocols: readonly string[];
  /** Schedules that were printed as sheets, newest first. */
  readonly sheets: readonly VisitPlan[];
  /** The sheet that is being typed in. */
  readonly paper: PaperDraft | null;
}

export interface StoreReader {
  study(id: string): Promise<Result<Study | null>>;
  /** Without removed ones, by name. */
  studies(): Promise<Result<Study[]>>;
  classroom(id: string): Promise<Result<Classroom | null>>;
  classes(study: string): Promise<Result<Classroom[]>>;
  observer(id: string): Promise<Result<Observer | null>>;
  observers(study: string): Promise<Result<Observer[]>>;
  /** One version, or the newest. */
  protocol(id: string, version?: number): Promise<Result<Protocol | null>>;
  /** The newest version of each protocol, by name. */
  protocols(study: string): Promise<Result<Protocol[]>>;
  protocolVersions(id: string): Promise<Result<Protocol[]>>;
  readSession(id: string): Promise<Result<StoredSession | null>>;
  session(id: string): Promise<Result<SessionSummary | null>>;
  /** Oldest first; entries and headers stay where they are. */
  listSessions(study: string): Promise<Result<SessionSummary[]>>;
  /** Begun on this tablet and not ended, newest first. */
  unfinishedSessions(): Promise<Result<SessionSummary[]>>;
  /** Everything of a study, removed records included: what a study file holds. */
  bundle(study: string): Promise<Result<StudyBundle | null>>;
  settings(): Promise<Result<Settings>>;
}

/**
 * Where everything is kept. Each writing call is one transaction that is on the disk when the promise resolves
 * (strict durability), or has changed nothing. Problems begin with `store.`.
 */
export interface Store extends StoreReader {
  /** `store.changedMeanwhile` when a record does not stand at the revision on which its edit was made. */
  put(edits: Edits): Promise<Result<null>>;
  createSession(header: SessionHeader): Promise<Result<null>>;
  /** The same entry again is no second entry; one identity with other content is refused. */
  appendEntries(session: string, entries: readonly JournalEntry[]): Promise<Result<null>>;
  /** Packs the rows of a session into one record: smaller and faster to read. Nothing else changes. */
  pack(session: string): Promise<Result<null>>;
  /**
   * Joins what came in with what is kept, all bundles in one transaction. A removed study stays removed
   * unless its id is in `revive`.
   */
  applyBundles(
    bundles: readonly StudyBundle[],
    join: Join,
    options?: { readonly revive?: readonly string[] },
  ): Promise<Result<null>>;
  /** Removes all of a study and keeps its tombstone, so that a union does not bring it back. */
  removeStudy(tombstone: Edit<Study>): Promise<Result<null>>;
  markHandedOver(covers: readonly HandOver[]): Promise<Result<null>>;
  saveSettings(changes: Partial<Settings>): Promise<Result<null>>;
  /** Calls back with the answer now and after each change that touches it. Returns the way to stop. */
  watch<T>(
    query: (store: StoreReader) => Promise<Result<T>>,
    callback: (answer: Result<T>) => void,
  ): () => void;
  close(): void;
}

/** What happens to the store from outside: another build wants it, or it was closed for good. */
export type StoreNotice = 'newerVersionWaits' | 'blockedByOtherTab' | 'closed';
