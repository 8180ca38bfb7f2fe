import type { Classroom } from '../model/classroom.ts';
import type { Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import type { Store, StoreReader, StudyBundle } from '../tasks/ports.ts';
import { type Core, queue } from './core.ts';
import { answer } from './problems.ts';
import {
  listProtocols,
  listRecords,
  listStudies,
  openRecords,
  protocolVersions,
  readRecord,
} from './records.ts';
import type { EntryRow, RowStore } from './rows.ts';
import { identitySeal, type Seal } from './seal.ts';
import { openSession, type SessionRows, sessionTables } from './sessionRows.ts';
import {
  appendEntries,
  createSession,
  listSessions,
  markHandedOver,
  packSession,
  readSession,
  readSummary,
  unfinishedSessions,
} from './sessions.ts';
import { readSettings, saveSettings } from './settings.ts';

/** The recording writes entries and settings only, and is loaded without the rest. */
const studyWrites = () => import('./studyWrites.ts');

const done = (work: () => Promise<void>) => answer(async () => work().then(() => null));

/** What is asked of the store, over the rows of a core. */
function readerOver(core: Core): StoreReader {
  return {
    study: (id) => answer(() => readRecord(core, 'study', id)),
    studies: () => answer(() => listStudies(core)),
    classroom: (id) => answer(() => readRecord(core, 'classroom', id)),
    classes: (study) => answer(() => listRecords(core, 'classroom', study)),
    observer: (id) => answer(() => readRecord(core, 'observer', id)),
    observers: (study) => answer(() => listRecords(core, 'observer', study)),
    protocol: (id, version) =>
      answer(async () => {
        const all = await protocolVersions(core, id);
        return (version === undefined ? all.at(-1) : all.find((one) => one.version === version)) ?? null;
      }),
    protocols: (study) => answer(() => listProtocols(core, study)),
    protocolVersions: (id) => answer(() => protocolVersions(core, id)),
    readSession: (id) => answer(() => readSession(core, id)),
    session: (id) => answer(() => readSummary(core, id)),
    listSessions: (study) => answer(() => listSessions(core, study)),
    unfinishedSessions: () => answer(() => unfinishedSessions(core)),
    bundle: (study) => answer(() => readBundle(core, study)),
    settings: () => answer(() => readSettings(core)),
  };
}

/** The store of the use cases over any rows: real ones or those in memory. */
export function storeOver(rows: RowStore, seal: Seal = identitySeal): Store {
  const core: Core = { rows, seal, inTurn: queue() };
  return {
    ...readerOver(core),
    put: (edits) => done(async () => (await studyWrites()).putEdits(core, edits)),
    createSession: (header) => done(() => createSession(core, header)),
    appendEntries: (session, entries) => done(() => appendEntries(core, session, entries)),
    pack: (session) => done(() => packSession(core, session)),
    applyBundles: (bundles, join, options = {}) =>
      done(async () => (await studyWrites()).applyBundles(core, bundles, join, new Set(options.revive))),
    removeStudy: (tombstone) => done(async () => (await studyWrites()).removeStudy(core, tombstone)),
    markHandedOver: (covers) => done(() => markHandedOver(core, covers)),
    saveSettings: (changes) => done(() => saveSettings(core, changes)),
    watch: (query, callback) =>
      rows.watch((read) => query(readerOver({ ...core, rows: { ...rows, read } })), callback),
    close: () => rows.close(),
  };
}

/** Everything of a study as one transaction saw it; null for a study that is unknown or removed. */
async function readBundle(core: Core, id: string): Promise<StudyBundle | null> {
  const seen = await core.rows.read(['records', ...sessionTables], async (rows) => {
    const records = await rows.by('records', 'study', id);
    const sessions = await rows.by('sessions', 'study', id);
    const headers = await rows.by('headers', 'study', id);
    const packs = await rows.by('packs', 'study', id);
    const entries = await rows.by('entries', 'study', id);
    return { records, sessions, headers, packs, entries };
  });
  const [study] = await openRecords(core, 'study', seen.records);
  if (study === undefined || study.removed) return null;
  const headers = new Map(seen.headers.map((row) => [row.key, row]));
  const packs = new Map(seen.packs.map((row) => [row.key, row]));
  const entries = new Map<string, EntryRow[]>();
  for (const row of seen.entries) {
    const of = entries.get(row.session);
    if (of === undefined) entries.set(row.session, [row]);
    else of.push(row);
  }
  const sessions = await Promise.all(
    seen.sessions.map((row) => {
      const rows: SessionRows = {
        row,
        header: headers.get(row.key),
        pack: packs.get(row.key),
        entries: entries.get(row.key) ?? [],
      };
      return openSession(core, rows);
    }),
  );
  return {
    study,
    classes: byId(await openRecords<'classroom'>(core, 'classroom', seen.records)) as Classroom[],
    observers: byId(await openRecords<'observer'>(core, 'observer', seen.records)) as Observer[],
    protocols: byId(await openRecords<'protocol'>(core, 'protocol', seen.records)) as Protocol[],
    sessions: sessions
      .filter((session) => session !== null)
      .sort((a, b) => (a.header.id < b.header.id ? -1 : 1)),
  };
}

/** By id, and the versions of a protocol in order: the same contents give the same bundle. */
function byId<R extends { id: string; version?: number }>(records: R[]): R[] {
  return records.sort((a, b) => (a.id === b.id ? (a.version ?? 0) - (b.version ?? 0) : a.id < b.id ? -1 : 1));
}
