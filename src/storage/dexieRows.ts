import Dexie, { liveQuery, type Table, type Transaction } from 'dexie';
import type { StoreNotice } from '../tasks/ports.ts';
import { isLost, StoreFailure } from './problems.ts';
import {
  indexes,
  type RowReader,
  type RowStore,
  type RowWriter,
  type TableName,
  type Tables,
  tableNames,
} from './rows.ts';

/** Raised when tables or indexes change; the forms of what is in the rows have versions of their own. */
export const schemaVersion = 1;

export interface DexieOptions {
  readonly name: string;
  readonly onNotice?: (notice: StoreNotice) => void;
  /** Where there is no global one (tests). */
  readonly indexedDB?: IDBFactory;
  readonly IDBKeyRange?: typeof IDBKeyRange;
}

/** The database as it is declared, not yet open. */
export function declareDatabase(options: DexieOptions): Dexie {
  const { indexedDB, IDBKeyRange } = options;
  const db = new Dexie(options.name, {
    chromeTransactionDurability: 'strict',
    // No optimistic answers: what a query shows is on the disk.
    cache: 'disabled',
    ...(indexedDB === undefined ? {} : { indexedDB }),
    ...(IDBKeyRange === undefined ? {} : { IDBKeyRange }),
  });
  db.version(schemaVersion).stores(
    Object.fromEntries(tableNames.map((name) => [name, ['key', ...indexes[name]].join(', ')])),
  );
  return db;
}

/**
 * Rows in IndexedDB, every write transaction with strict durability. A lost connection is opened again once and the
 * work done again; a database that a newer build has written is refused.
 * @throws what the database throws when it cannot be opened
 */
export async function openDexieRows(options: DexieOptions): Promise<RowStore> {
  const db = declareDatabase(options);
  let closedForGood = false;
  const tell = (notice: StoreNotice): void => options.onNotice?.(notice);
  // Dexie opens a newer database and would write into it: so the version is looked at whenever one opens.
  db.on('ready', () => refuseNewer(db), true);
  db.on('versionchange', () => {
    // Transactions that run are finished first; nothing new begins, so that the newer build can go ahead.
    closedForGood = true;
    db.close({ disableAutoOpen: true });
    tell('newerVersionWaits');
    return false;
  });
  db.on('blocked', () => tell('blockedByOtherTab'));
  await db.open();

  const onceMore = async <R>(work: () => Promise<R>): Promise<R> => {
    try {
      return await work();
    } catch (error) {
      if (closedForGood || !isLost(error)) throw closedForGood ? new StoreFailure('store.closed') : error;
      db.close({ disableAutoOpen: false });
      await db.open();
      return await work();
    }
  };

  return {
    read: (tables, work) => onceMore(() => db.transaction('r', [...tables], (tx) => work(readerOf(tx)))),
    write: (tables, work) =>
      onceMore(() =>
        db.transaction('rw', [...tables], (tx) => {
          refuseNewer(db);
          return work(writerOf(tx));
        }),
      ),
    watch: (query, callback) => {
      // Dexie follows awaits only in a function that it can see to be asynchronous.
      const watching = liveQuery(async () => await query()).subscribe({ next: callback, error: report });
      return () => watching.unsubscribe();
    },
    close: () => {
      closedForGood = true;
      db.close({ disableAutoOpen: true });
      tell('closed');
    },
  };
}

/** A bug in a query is an exception for the page, not a silence. */
function report(error: unknown): void {
  queueMicrotask(() => {
    throw error;
  });
}

function refuseNewer(db: Dexie): void {
  // IndexedDB counts in tenths of Dexie's versions.
  const found = db.backendDB().version / 10;
  if (found > schemaVersion) throw new StoreFailure('store.newer', { found, expected: schemaVersion });
}

function readerOf(tx: Transaction): RowReader {
  const table = <T extends TableName>(name: T): Table<Tables[T], string> => tx.table(name);
  return {
    get: (name, key) => table(name).get(key),
    getMany: (name, keys) => table(name).bulkGet([...keys]),
    by: (name, index, value) =>
      table(name)
        .where(index as string)
        .equals(value)
        .toArray(),
    all: (name) => table(name).toArray(),
  };
}

function writerOf(tx: Transaction): RowWriter {
  return {
    ...readerOf(tx),
    put: async (name, rows) => {
      await tx.table(name).bulkPut([...rows]);
    },
    remove: async (name, keys) => {
      await tx.table(name).bulkDelete([...keys]);
    },
  };
}
