import type { StoreNotice } from '../tasks/ports.ts';
import { changeNews } from './changeNews.ts';
import { openDatabase } from './openDatabase.ts';
import { isLost, StoreFailure } from './problems.ts';
import type { RowStore, TableName } from './rows.ts';
import { readerOf, writerOf } from './tableAccess.ts';

export interface IndexedOptions {
  readonly name: string;
  readonly onNotice?: (notice: StoreNotice) => void;
  /** Where there is no global one (tests). */
  readonly indexedDB?: IDBFactory;
}

/**
 * Rows in IndexedDB, every write transaction with strict durability. A lost connection is opened again once and the
 * work done again; a database that a newer build has written is refused.
 * @throws what the database throws when it cannot be opened
 */
export async function openIndexedRows(options: IndexedOptions): Promise<RowStore> {
  const factory = options.indexedDB ?? indexedDB;
  const tell = (notice: StoreNotice): void => options.onNotice?.(notice);
  let closedForGood = false;

  const open = async (): Promise<IDBDatabase> => {
    const opened = await openDatabase(factory, options.name, () => tell('blockedByOtherTab'));
    opened.onversionchange = () => {
      // Transactions that run are finished first; nothing new begins, so that the newer build can go ahead.
      closedForGood = true;
      opened.close();
      tell('newerVersionWaits');
    };
    return opened;
  };
  let db = await open();
  const news = changeNews(options.name);

  const once = async <R>(
    tables: readonly TableName[],
    mode: IDBTransactionMode,
    work: (transaction: IDBTransaction) => Promise<R>,
  ): Promise<R> => {
    // Only strict durability means that what is told as kept outlives a dead battery.
    const transaction = db.transaction(
      [...tables],
      mode,
      mode === 'readwrite' ? { durability: 'strict' } : {},
    );
    const done = new Promise<void>((resolve, reject) => {
      transaction.oncomplete = () => resolve();
      transaction.onabort = () => reject(transaction.error ?? new StoreFailure('store.lost'));
    });
    // It may be awaited only after `work` has failed.
    done.catch(() => undefined);
    try {
      const result = await work(transaction);
      await done;
      return result;
    } catch (error) {
      try {
        transaction.abort();
      } catch {
        // It is over already.
      }
      // A request that fails because its transaction was aborted says so, and not why.
      throw (error as { name?: string } | null)?.name === 'AbortError' ? (transaction.error ?? error) : error;
    }
  };

  const run: typeof once = async (tables, mode, work) => {
    try {
      return await once(tables, mode, work);
    } catch (error) {
      if (closedForGood) throw new StoreFailure('store.closed');
      if (!isLost(error)) throw error;
      db.close();
      db = await open();
      return await once(tables, mode, work);
    }
  };

  const read: RowStore['read'] = (tables, work) => run(tables, 'readonly', (tx) => work(readerOf(tx)));

  return {
    read,
    write: async (tables, work) => {
      const result = await run(tables, 'readwrite', (tx) => work(writerOf(tx)));
      news.tell(tables);
      return result;
    },
    watch: (query, callback) => {
      let asked = 0;
      let live = true;
      const seen = new Set<TableName>();
      const ask = async (): Promise<void> => {
        asked += 1;
        const turn = asked;
        const answer = await query((tables, work) => {
          for (const table of tables) seen.add(table);
          return read(tables, work);
        });
        if (live && turn === asked) callback(answer);
      };
      const stop = news.subscribe((tables) => {
        if (tables.some((table) => seen.has(table))) void ask();
      });
      // A bug in a query is an exception for the page, not a silence.
      void ask();
      return () => {
        live = false;
        stop();
      };
    },
    close: () => {
      closedForGood = true;
      db.close();
      news.close();
      tell('closed');
    },
  };
}
