import { IDBFactory } from 'fake-indexeddb';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import { openIndexedRows } from '../../src/storage/indexedRows.ts';
import { memoryRows } from '../../src/storage/memoryRows.ts';
import { type RowStore, tableNames } from '../../src/storage/rows.ts';
import type { Seal } from '../../src/storage/seal.ts';
import { storeOver } from '../../src/storage/storeOver.ts';
import type { Opened } from '../contract/store.contract.ts';

/** All rows as one text: equal texts, equal stores. */
export function dumpOf(rows: RowStore): Promise<string> {
  return rows.read(tableNames, async (reader) => {
    const all: Record<string, unknown> = {};
    for (const name of tableNames) {
      const list = await reader.all(name);
      all[name] = list.sort((a, b) => (a.key < b.key ? -1 : 1));
    }
    return canonicalJson(all);
  });
}

export const openedMemory = async (seal?: Seal): Promise<Opened> => {
  const rows = memoryRows();
  return { store: storeOver(rows, seal), dump: () => dumpOf(rows) };
};

let databases = 0;
export const openedIndexed = async (seal?: Seal): Promise<Opened> => {
  databases += 1;
  const rows = await openIndexedRows({ name: `store-${databases}`, indexedDB: new IDBFactory() });
  return { store: storeOver(rows, seal), dump: () => dumpOf(rows) };
};
