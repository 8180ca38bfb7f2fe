import { canonicalJson } from '../kernel/canonicalJson.ts';
import { byCodePoint } from '../kernel/compare.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Revision } from '../model/common.ts';
import type { Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import { compareRevisions } from '../model/revision.ts';
import type { Study } from '../model/study.ts';
import type { Edit, Edits } from '../tasks/ports.ts';
import type { Core } from './core.ts';
import { StoreFailure } from './problems.ts';
import { type HistoryRow, keyOf, type RecordKind, type RecordRow, type RowReader } from './rows.ts';
import { newStamp } from './stamp.ts';
import { upcast, versionOf } from './upcast.ts';

export interface RecordTypes {
  readonly study: Study;
  readonly classroom: Classroom;
  readonly observer: Observer;
  readonly protocol: Protocol;
}
export type AnyRecord = RecordTypes[RecordKind];

/** Where a record stands: protocols have a row a version. */
export function recordKey(
  kind: RecordKind,
  record: { readonly id: string; readonly version?: number },
): string {
  return keyOf(kind, record.id, kind === 'protocol' ? (record.version ?? 0) : 0);
}

/** The row of a record, sealed. */
export async function recordRow<K extends RecordKind>(
  core: Core,
  kind: K,
  record: RecordTypes[K],
): Promise<RecordRow> {
  return {
    key: recordKey(kind, record),
    kind,
    id: record.id,
    version: 'version' in record ? record.version : 0,
    study: 'study' in record ? record.study : record.id,
    revision: { counter: record.revision.counter, writer: record.revision.writer },
    removed: record.removed,
    stamp: newStamp(),
    v: versionOf(kind),
    sealed: await core.seal.seal(record),
  };
}

/** The row of a state that lost, under a key made from its content: the same state twice is one row. */
export async function historyRow<K extends RecordKind>(
  core: Core,
  kind: K,
  record: RecordTypes[K],
): Promise<HistoryRow> {
  return {
    key: keyOf(recordKey(kind, record), idFromContent(canonicalJson(record))),
    kind,
    study: 'study' in record ? record.study : record.id,
    v: versionOf(kind),
    sealed: await core.seal.seal(record),
  };
}

/** Opens the rows of one kind. */
export function openRecords<K extends RecordKind>(
  core: Core,
  kind: K,
  rows: readonly RecordRow[],
): Promise<RecordTypes[K][]> {
  return Promise.all(
    rows
      .filter((row) => row.kind === kind)
      .map(async (row) => upcast<RecordTypes[K]>(kind, row.v, await core.seal.open(row.sealed), row.key)),
  );
}

/** One record, removed or not. */
export async function readRecord<K extends RecordKind>(
  core: Core,
  kind: K,
  id: string,
): Promise<RecordTypes[K] | null> {
  const row = await core.rows.read(['records'], (rows) => rows.get('records', recordKey(kind, { id })));
  return row === undefined ? null : ((await openRecords(core, kind, [row]))[0] ?? null);
}

export const byName = (a: { name: string; id: string }, b: { name: string; id: string }): number =>
  byCodePoint(a.name, b.name) || byCodePoint(a.id, b.id);

/** Records of one kind and study that were not removed, by name. */
export async function listRecords<K extends RecordKind>(
  core: Core,
  kind: K,
  study: string,
): Promise<RecordTypes[K][]> {
  const rows = await core.rows.read(['records'], (reader) => reader.by('records', 'study', study));
  const open = await openRecords(
    core,
    kind,
    rows.filter((row) => !row.removed),
  );
  return open.sort(byName);
}

export async function listStudies(core: Core): Promise<Study[]> {
  const rows = await core.rows.read(['records'], (reader) => reader.by('records', 'kind', 'study'));
  return (
    await openRecords(
      core,
      'study',
      rows.filter((row) => !row.removed),
    )
  ).sort(byName);
}

/** All versions of a protocol, oldest first. */
export async function protocolVersions(core: Core, id: string): Promise<Protocol[]> {
  const rows = await core.rows.read(['records'], (reader) => reader.by('records', 'id', id));
  return (await openRecords(core, 'protocol', rows)).sort((a, b) => a.version - b.version);
}

/** The newest version of each protocol that was not removed, by name. */
export async function listProtocols(core: Core, study: string): Promise<Protocol[]> {
  const rows = await core.rows.read(['records'], (reader) => reader.by('records', 'study', study));
  const newest = new Map<string, RecordRow>();
  for (const row of rows) {
    if (row.kind === 'protocol' && row.version > (newest.get(row.id)?.version ?? 0)) newest.set(row.id, row);
  }
  const open = await openRecords(
    core,
    'protocol',
    [...newest.values()].filter((row) => !row.removed),
  );
  return open.sort(byName);
}

/** Keeps edits, all or none, each on the revision on which it was made. */
export async function putEdits(core: Core, edits: Edits): Promise<void> {
  const prepared: { row: RecordRow; previous: Revision | null }[] = [];
  const add = async <K extends RecordKind>(
    kind: K,
    list: readonly Edit<RecordTypes[K]>[] = [],
  ): Promise<void> => {
    for (const { record, previous } of list)
      prepared.push({ row: await recordRow(core, kind, record), previous });
  };
  await add('study', edits.studies);
  await add('classroom', edits.classes);
  await add('observer', edits.observers);
  await add('protocol', edits.protocols);
  await core.rows.write(['records'], async (rows) => {
    for (const { row, previous } of prepared) await requireRevision(rows, row, previous);
    await rows.put(
      'records',
      prepared.map(({ row }) => row),
    );
  });
}

/** A replay of the same write passes: it finds its own stamp. */
export async function requireRevision(
  rows: RowReader,
  row: RecordRow,
  previous: Revision | null,
): Promise<void> {
  const found = await rows.get('records', row.key);
  if (found?.stamp === row.stamp) return;
  const stands =
    found === undefined
      ? previous === null
      : previous !== null && compareRevisions(found.revision, previous) === 0;
  if (!stands) throw new StoreFailure('store.changedMeanwhile', { kind: row.kind, id: row.id });
}
