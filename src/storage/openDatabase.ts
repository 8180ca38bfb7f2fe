import { StoreFailure } from './problems.ts';
import { indexes, tableNames } from './rows.ts';

/** Raised when tables or indexes change; the forms of what is in the rows have versions of their own. */
export const schemaVersion = 1;

/** IndexedDB's own number for a version: tens, as the first builds counted. */
export const nativeVersion = (version: number): number => version * 10;

/** Creates what is not there yet. Tables and indexes are only ever added. */
function upgrade(db: IDBDatabase, change: IDBTransaction): void {
  for (const name of tableNames) {
    const table = db.objectStoreNames.contains(name)
      ? change.objectStore(name)
      : db.createObjectStore(name, { keyPath: 'key' });
    for (const index of indexes[name]) if (!table.indexNames.contains(index)) table.createIndex(index, index);
  }
}

/**
 * Opens the database, and makes it when there is none.
 *
 * @param onBlocked told when another tab has an older one open and does not let go
 * @throws StoreFailure `store.newer` when a newer build has written it; what the database throws otherwise
 */
export function openDatabase(
  factory: IDBFactory,
  name: string,
  onBlocked: () => void = () => undefined,
): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const request = factory.open(name, nativeVersion(schemaVersion));
    request.onupgradeneeded = () => {
      if (request.transaction !== null) upgrade(request.result, request.transaction);
    };
    request.onblocked = onBlocked;
    request.onsuccess = () => resolve(request.result);
    request.onerror = async () => {
      if (request.error?.name !== 'VersionError') return reject(request.error);
      const found = (await factory.databases?.())?.find((one) => one.name === name)?.version ?? 0;
      reject(new StoreFailure('store.newer', { found: found / 10, expected: schemaVersion }));
    };
  });
}
