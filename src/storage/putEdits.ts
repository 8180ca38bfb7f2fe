import { canonicalJson } from '../kernel/canonicalJson.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import type { Revision } from '../model/common.ts';
import { compareRevisions } from '../model/revision.ts';
import type { Edit, Edits } from '../tasks/ports.ts';
import type { Core } from './core.ts';
import { StoreFailure } from './problems.ts';
import { type RecordTypes, recordKey } from './records.ts';
import { type HistoryRow, keyOf, type RecordKind, type RecordRow, type RowReader } from './rows.ts';
import { newStamp } from './stamp.ts';
import { versionOf } from './upcast.ts';

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
