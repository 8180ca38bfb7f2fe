import type { JournalEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import { unionOfJournals } from '../journal/union.ts';
import type { SessionHeader } from '../model/session.ts';
import type { SessionSummary } from '../tasks/ports.ts';
import type { Core } from './core.ts';
import {
  type EntryRow,
  type HeaderRow,
  keyOf,
  type PackRow,
  type RowReader,
  type SessionRow,
  type TableName,
} from './rows.ts';
import { type HeaderFacts, headerFactsOf, type JournalFacts } from './sessionFacts.ts';
import { newStamp } from './stamp.ts';
import { upcast, versionOf } from './upcast.ts';

export const sessionTables: readonly TableName[] = ['sessions', 'headers', 'packs', 'entries'];

/** All rows of one session, as one transaction saw them. */
export interface SessionRows {
  readonly row: SessionRow | undefined;
  readonly header: HeaderRow | undefined;
  readonly pack: PackRow | undefined;
  readonly entries: readonly EntryRow[];
}

export async function lookAtSession(rows: RowReader, id: string): Promise<SessionRows> {
  return {
    row: await rows.get('sessions', id),
    header: await rows.get('headers', id),
    pack: await rows.get('packs', id),
    entries: await rows.by('entries', 'session', id),
  };
}

/** Opens the rows of a session: pack and single rows together are its journal. */
export async function openSession(core: Core, seen: SessionRows): Promise<StoredSession | null> {
  if (seen.header === undefined) return null;
  const { header, pack, entries } = seen;
  const single = await Promise.all(
    entries.map(async (row) =>
      upcast<JournalEntry>('entry', row.v, await core.seal.open(row.sealed), row.key),
    ),
  );
  const packed =
    pack === undefined
      ? []
      : upcast<JournalEntry[]>('journal', pack.v, await core.seal.open(pack.sealed), pack.key);
  return {
    header: upcast<SessionHeader>('header', header.v, await core.seal.open(header.sealed), header.key),
    // A pack is its own union; only rows beside it have to be put in.
    journal: single.length === 0 ? packed : unionOfJournals(packed, single).entries,
  };
}

export const entryKey = (entry: Pick<JournalEntry, 'session' | 'writer' | 'seq'>): string =>
  keyOf(entry.session, entry.writer, entry.seq);

export async function entryRow(core: Core, study: string, entry: JournalEntry): Promise<EntryRow> {
  return {
    key: entryKey(entry),
    session: entry.session,
    study,
    v: versionOf('entry'),
    sealed: await core.seal.seal(entry),
  };
}

export async function packRow(
  core: Core,
  header: SessionHeader,
  journal: readonly JournalEntry[],
): Promise<PackRow> {
  return {
    key: header.id,
    study: header.study,
    v: versionOf('journal'),
    sealed: await core.seal.seal(journal),
  };
}

export async function headerRow(core: Core, header: SessionHeader): Promise<HeaderRow> {
  return {
    key: header.id,
    study: header.study,
    v: versionOf('header'),
    sealed: await core.seal.seal(header),
  };
}

type Kept = Pick<SessionRow, 'here' | 'own' | 'handed'>;

export async function sessionRow(
  core: Core,
  header: SessionHeader,
  kept: Kept,
  facts: JournalFacts,
): Promise<SessionRow> {
  return withFacts(
    {
      key: header.id,
      study: header.study,
      v: versionOf('facts'),
      sealed: await core.seal.seal(headerFactsOf(header)),
      here: kept.here,
      own: kept.own,
      handed: kept.handed,
    },
    facts,
  );
}

/** The row with other facts: a new stamp, and its place in the index of open sessions. */
export function withFacts(
  row: Omit<SessionRow, keyof JournalFacts | 'stamp' | 'open'>,
  facts: JournalFacts,
): SessionRow {
  return { ...row, ...facts, stamp: newStamp(), open: row.here && facts.ended === null ? 1 : 0 };
}

export async function summaryOf(core: Core, row: SessionRow): Promise<SessionSummary> {
  const facts = upcast<HeaderFacts>('facts', row.v, await core.seal.open(row.sealed), row.key);
  const { entries, firstWall, lastWall, ended, here, own, handed } = row;
  const handedOver = own === 0 || (handed !== null && handed >= own);
  return { ...facts, entries, firstWall, lastWall, ended, here, own, handedOver };
}
