// Live queries of Dexie want a global database; it is looked for when Dexie is loaded.
import 'fake-indexeddb/auto';
import { IDBFactory, IDBKeyRange } from 'fake-indexeddb';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import { openDexieRows } from '../../src/storage/dexieRows.ts';
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
export const openedDexie = async (seal?: Seal): Promise<Opened> => {
  databases += 1;
  const rows = await openDexieRows({ name: `store-${databases}`, indexedDB: new IDBFactory(), IDBKeyRange });
  return { store: storeOver(rows, seal), dump: () => dumpOf(rows) };
};
