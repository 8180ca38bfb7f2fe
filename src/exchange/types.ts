import type { JournalEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import type { Id } from '../kernel/ids.ts';
import type { Problem } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { CodeSet } from '../model/codeSet.ts';
import type { Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import type { SessionHeader } from '../model/session.ts';
import type { Study } from '../model/study.ts';
import type { VisitPlan } from '../model/visitPlan.ts';

/** A file as somebody handed it over; its name is only for telling people which one is meant. */
export interface IncomingFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** What is wrong (or worth knowing) and where: a physical line of a text (from 1) or a JSON path. */
export interface FileProblem {
  readonly file: string;
  readonly line: number | null;
  readonly path: string | null;
  readonly problem: Problem;
}

/** What a file holds, or several files together. */
export interface Bundle {
  readonly study: Study | null;
  readonly classes: Classroom[];
  readonly observers: Observer[];
  readonly protocols: Protocol[];
  readonly sessions: StoredSession[];
  readonly visitPlans: VisitPlan[];
}

export type FileForm = 'study' | 'visit' | 'table';

/** A file that can be taken. */
export interface ReadFile {
  readonly ok: true;
  readonly file: string;
  readonly form: FileForm;
  readonly bundle: Bundle;
  readonly notices: FileProblem[];
}

/** A file that contributes nothing. */
export interface RefusedFile {
  readonly ok: false;
  readonly file: string;
  readonly problems: FileProblem[];
  /** Labels of a table that somebody has to call on-task, off-task or neither before it can be read. */
  readonly askRoles?: readonly string[];
}

export type ReadOutcome = ReadFile | RefusedFile;

export interface ReadOptions {
  /** Labels of a table that count as on-task, as off-task, as neither. */
  readonly on?: readonly string[];
  readonly off?: readonly string[];
  readonly other?: readonly string[];
  /** The study that takes the sessions of a table; its codes, classes and observers are recognised by name. */
  readonly study?: {
    readonly id: Id;
    readonly codeSets?: readonly CodeSet[];
    readonly classes?: readonly Classroom[];
    readonly observers?: readonly Observer[];
  };
  /** Unknown columns of a table that somebody ticked: they are kept as notes in the journal. */
  readonly keepColumns?: readonly string[];
}

export type RecordNoun = 'study' | 'class' | 'observer' | 'protocol' | 'visit';
export type BundleRecord = Study | Classroom | Observer | Protocol | VisitPlan;

/** One identity with two contents. The bundle holds the first of them; all are told. */
export type MergeConflict =
  | {
      readonly kind: 'session';
      readonly session: Id;
      /** In the order of preference; the first one is in the bundle. */
      readonly headers: readonly SessionHeader[];
    }
  | {
      readonly kind: 'entry';
      readonly session: Id;
      readonly writer: string;
      readonly seq: number;
      readonly contents: readonly JournalEntry[];
    }
  | {
      readonly kind: 'record';
      readonly noun: RecordNoun;
      readonly id: Id;
      readonly states: readonly BundleRecord[];
    };

export interface Merged {
  readonly bundle: Bundle;
  readonly conflicts: MergeConflict[];
  /** The same conflicts and other things worth knowing, for people. */
  readonly notices: Problem[];
  /** Older states of records that a newer one replaced: kept as history by whoever stores. */
  readonly history: { readonly noun: RecordNoun; readonly record: BundleRecord }[];
}

export interface WriteOptions {
  readonly exportedAt: string;
  readonly app: string;
  /** gzip */
  readonly compress?: boolean;
}

export type TableDelimiter = ',' | ';' | '\t';

export interface TableOptions {
  readonly delimiter?: TableDelimiter;
  /** Decimal sign; a comma only where the delimiter is none. Default: comma with semicolons, point otherwise. */
  readonly decimal?: '.' | ',';
}

export interface ListedChild {
  readonly pseudonym: string;
  readonly consent: true;
  readonly stratum: string | null;
  readonly seat: string | null;
  /** Where the list says so. */
  readonly line: number;
}

export interface ClassList {
  readonly children: ListedChild[];
  /** Children without consent: counted, never written down. */
  readonly leftOut: number;
  /** False where the list has no consent column at all: whoever pasted it has to answer for consent. */
  readonly consentStated: boolean;
}
