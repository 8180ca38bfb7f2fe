import type { Revision } from '../model/common.ts';

/** What the seal made of a value: the value itself until the vault comes. */
export type Sealed = unknown;

export type RecordKind = 'study' | 'classroom' | 'observer' | 'protocol';

interface Stamped {
  readonly key: string;
  readonly study: string;
  /** Form of what is sealed: see `upcast.ts`. */
  readonly v: number;
  readonly sealed: Sealed;
}

/** A record that people edit. `stamp` is new with each write: a replay knows its own write by it. */
export interface RecordRow extends Stamped {
  readonly kind: RecordKind;
  readonly id: string;
  readonly version: number;
  readonly revision: Revision;
  readonly removed: boolean;
  readonly stamp: string;
}

/** A state that lost against a newer one. */
export interface HistoryRow extends Stamped {
  readonly kind: RecordKind;
}

/** What changes while a session grows, and what lists show of it. Facts that name people are sealed. */
export interface SessionRow extends Stamped {
  readonly stamp: string;
  /** 1 while it was begun here and has not ended: an index of few. */
  readonly open: 0 | 1;
  readonly here: boolean;
  readonly own: number;
  readonly handed: number | null;
  readonly entries: number;
  readonly firstWall: string | null;
  readonly lastWall: string | null;
  readonly ended: 'complete' | 'early' | null;
  readonly endedBy: { readonly writer: string; readonly seq: number } | null;
}

export type HeaderRow = Stamped;
/** A journal in one piece; rows of `entries` may stand beside it. */
export type PackRow = Stamped;

export interface EntryRow extends Stamped {
  readonly session: string;
}

export interface SettingRow {
  readonly key: string;
  readonly value: unknown;
}

export interface Tables {
  readonly records: RecordRow;
  readonly history: HistoryRow;
  readonly sessions: SessionRow;
  readonly headers: HeaderRow;
  readonly packs: PackRow;
  readonly entries: EntryRow;
  readonly settings: SettingRow;
}
export type TableName = keyof Tables;

/** Tables and the members by which rows are looked up, `key` aside. */
export const indexes = {
  records: ['kind', 'id', 'study'],
  history: ['study'],
  sessions: ['study', 'open'],
  headers: ['study'],
  packs: ['study'],
  entries: ['session', 'study'],
  settings: [],
} as const satisfies Record<TableName, readonly string[]>;

export const tableNames = Object.keys(indexes) as TableName[];

type IndexOf<T extends TableName> = (typeof indexes)[T][number];

export interface RowReader {
  get<T extends TableName>(table: T, key: string): Promise<Tables[T] | undefined>;
  getMany<T extends TableName>(table: T, keys: readonly string[]): Promise<(Tables[T] | undefined)[]>;
  by<T extends TableName>(table: T, index: IndexOf<T>, value: string | number): Promise<Tables[T][]>;
  all<T extends TableName>(table: T): Promise<Tables[T][]>;
}

export interface RowWriter extends RowReader {
  put<T extends TableName>(table: T, rows: readonly Tables[T][]): Promise<void>;
  remove<T extends TableName>(table: T, keys: readonly string[]): Promise<void>;
}

/**
 * The smallest thing that the store needs below it: transactions over rows. `work` awaits nothing but its reader or
 * writer, and may be run a second time after a lost connection; when it throws, nothing has changed.
 */
export interface RowStore {
  read<R>(tables: readonly TableName[], work: (rows: RowReader) => Promise<R>): Promise<R>;
  write<R>(tables: readonly TableName[], work: (rows: RowWriter) => Promise<R>): Promise<R>;
  /** Asks now, and again whenever something was written into a table that the query has read through its `read`. */
  watch<R>(query: (read: RowStore['read']) => Promise<R>, callback: (answer: R) => void): () => void;
  close(): void;
}

/** One text of several parts, whatever they contain. */
export const keyOf = (...parts: readonly (string | number)[]): string => JSON.stringify(parts);
