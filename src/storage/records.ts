import { byCodePoint } from '../kernel/compare.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import type { Study } from '../model/study.ts';
import type { Core } from './core.ts';
import { keyOf, type RecordKind, type RecordRow } from './rows.ts';
import { upcast } from './upcast.ts';

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
