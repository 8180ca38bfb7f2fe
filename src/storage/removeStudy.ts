import type { Study } from '../model/study.ts';
import type { Edit } from '../tasks/ports.ts';
import type { Core } from './core.ts';
import { recordRow, requireRevision } from './putEdits.ts';
import { type RowWriter, type TableName, tableNames } from './rows.ts';

/** Removes whatever belongs to a study, all at once, and keeps its tombstone. */
export async function removeStudy(core: Core, { record, previous }: Edit<Study>): Promise<void> {
  const row = await recordRow(core, 'study', record);
  await core.rows.write(tableNames, async (rows) => {
    await requireRevision(rows, row, previous);
    for (const table of ['records', 'history', 'sessions', 'headers', 'packs', 'entries'] as const)
      await removeOf(rows, table, record.id);
    await rows.put('records', [row]);
  });
}

async function removeOf(
  rows: RowWriter,
  table: Exclude<TableName, 'settings'>,
  study: string,
): Promise<void> {
  const found = await rows.by(table, 'study', study);
  await rows.remove(
    table,
    found.map(({ key }) => key),
  );
}
