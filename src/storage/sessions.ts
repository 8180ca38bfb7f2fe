import type { JournalEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { SessionHeader } from '../model/session.ts';
import type { HandOver, SessionSummary } from '../tasks/ports.ts';
import { ChangedMeanwhile, type Core, changeRows } from './core.ts';
import { StoreFailure } from './problems.ts';
import type { RowWriter, SessionRow } from './rows.ts';
import { factsAfter, factsIn, noFacts } from './sessionFacts.ts';
import {
  entryKey,
  entryRow,
  headerRow,
  lookAtSession,
  openSession,
  packRow,
  sessionRow,
  sessionTables,
  summaryOf,
  withFacts,
} from './sessionRows.ts';
import { newStamp } from './stamp.ts';

/** Keeps the header of a session that begins here. The same header again changes nothing. */
export function createSession(core: Core, header: SessionHeader): Promise<void> {
  return changeRows(
    core,
    sessionTables,
    (rows) => lookAtSession(rows, header.id),
    async (seen) => {
      const kept = await openSession(core, seen);
      if (kept !== null) {
        if (canonicalJson(kept.header) === canonicalJson(header)) return null;
        throw new StoreFailure('store.sessionExists', { session: header.id });
      }
      const row = await sessionRow(core, header, { here: true, own: 0, handed: null }, noFacts);
      const top = await headerRow(core, header);
      return async (rows) => {
        if ((await rows.get('sessions', header.id)) !== undefined) throw new ChangedMeanwhile();
        await rows.put('headers', [top]);
        await rows.put('sessions', [row]);
      };
    },
  );
}

/** Adds entries to a journal. Ones that are kept already are passed over, so that a queue may be sent again. */
export async function appendEntries(
  core: Core,
  session: string,
  entries: readonly JournalEntry[],
): Promise<void> {
  const strange = entries.find((entry) => entry.session !== session);
  if (strange !== undefined) throw new StoreFailure('store.wrongSession', { session });
  await changeRows(
    core,
    ['sessions', 'packs', 'entries'],
    async (rows) => ({
      row: await rows.get('sessions', session),
      // A live session has no pack, so the hot path reads two rows and no journal.
      pack: await rows.get('packs', session),
      kept: await rows.getMany('entries', entries.map(entryKey)),
    }),
    async ({ row, pack, kept }) => {
      if (row === undefined) throw new StoreFailure('store.noSession', { session });
      const known = new Map<string, string>();
      const learn = (entry: JournalEntry): unknown => known.set(entryKey(entry), canonicalJson(entry));
      for (const found of kept)
        if (found !== undefined) learn((await core.seal.open(found.sealed)) as JournalEntry);
      if (pack !== undefined)
        for (const entry of (await core.seal.open(pack.sealed)) as JournalEntry[]) learn(entry);
      const fresh: JournalEntry[] = [];
      for (const entry of entries) {
        const before = known.get(entryKey(entry));
        if (before === undefined) {
          learn(entry);
          fresh.push(entry);
        } else if (before !== canonicalJson(entry)) {
          throw new StoreFailure('store.entryTaken', { session, seq: entry.seq });
        }
      }
      if (fresh.length === 0) return null;
      const rowsToAdd = await Promise.all(fresh.map((entry) => entryRow(core, row.study, entry)));
      const next = withFacts({ ...row, own: row.own + fresh.length }, factsAfter(factsIn(row), fresh));
      return async (rows) => {
        await requireStamp(rows, row, next);
        await rows.put('entries', rowsToAdd);
        await rows.put('sessions', [next]);
      };
    },
  );
}

/** Packs the journal of a session into one row. */
export function packSession(core: Core, session: string): Promise<void> {
  return changeRows(
    core,
    sessionTables,
    (rows) => lookAtSession(rows, session),
    async (seen) => {
      const kept = await openSession(core, seen);
      const { row } = seen;
      if (kept === null || row === undefined) throw new StoreFailure('store.noSession', { session });
      if (seen.entries.length === 0) return null;
      const pack = await packRow(core, kept.header, kept.journal);
      const next = withFacts(row, factsIn(row));
      return async (rows) => {
        await requireStamp(rows, row, next);
        await rows.put('packs', [pack]);
        await rows.remove(
          'entries',
          seen.entries.map((entry) => entry.key),
        );
        await rows.put('sessions', [next]);
      };
    },
  );
}

/** The row must stand as it was read, or as this very write has left it before its connection was lost. */
export async function requireStamp(rows: RowWriter, seen: SessionRow, next: SessionRow): Promise<void> {
  const found = await rows.get('sessions', seen.key);
  if (found?.stamp !== seen.stamp && found?.stamp !== next.stamp) throw new ChangedMeanwhile();
}

export async function readSession(core: Core, id: string): Promise<StoredSession | null> {
  return openSession(core, await core.rows.read(sessionTables, (rows) => lookAtSession(rows, id)));
}

export async function readSummary(core: Core, id: string): Promise<SessionSummary | null> {
  const row = await core.rows.read(['sessions'], (rows) => rows.get('sessions', id));
  return row === undefined ? null : summaryOf(core, row);
}

const when = (summary: SessionSummary): string =>
  summary.firstWall ?? summary.plannedStart ?? summary.date ?? '';

/** By date as written, then by time; sessions of tables without a date come first. */
export async function listSessions(core: Core, study: string): Promise<SessionSummary[]> {
  const rows = await core.rows.read(['sessions'], (reader) => reader.by('sessions', 'study', study));
  const all = await Promise.all(rows.map((row) => summaryOf(core, row)));
  return all.sort((a, b) => byCodePoint(when(a), when(b)) || byCodePoint(a.id, b.id));
}

export async function unfinishedSessions(core: Core): Promise<SessionSummary[]> {
  const rows = await core.rows.read(['sessions'], (reader) => reader.by('sessions', 'open', 1));
  const all = await Promise.all(rows.map((row) => summaryOf(core, row)));
  return all.sort((a, b) => byCodePoint(when(b), when(a)) || byCodePoint(a.id, b.id));
}

/** Notes which sessions a file took along, and how much of them. Sessions that are gone are passed over. */
export async function markHandedOver(core: Core, covers: readonly HandOver[]): Promise<void> {
  await core.rows.write(['sessions'], async (rows) => {
    const found = await rows.getMany(
      'sessions',
      covers.map(({ session }) => session),
    );
    const marked = found.flatMap((row, i) => {
      const own = covers[i]?.own ?? 0;
      return row === undefined || (row.handed ?? -1) >= own
        ? []
        : [{ ...row, handed: own, stamp: newStamp() }];
    });
    await rows.put('sessions', marked);
  });
}
