import type { RowReader, RowWriter, TableName } from './rows.ts';

const answerOf = <T>(request: IDBRequest<T>): Promise<T> =>
  new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });

/** Reads rows inside a transaction. */
export function readerOf(transaction: IDBTransaction): RowReader {
  const table = (name: TableName): IDBObjectStore => transaction.objectStore(name);
  return {
    get: (name, key) => answerOf(table(name).get(key)),
    getMany: (name, keys) => Promise.all(keys.map((key) => answerOf(table(name).get(key)))),
    by: (name, index, value) =>
      answerOf(
        table(name)
          .index(index as string)
          .getAll(value),
      ),
    all: (name) => answerOf(table(name).getAll()),
  };
}

/** Reads and writes rows inside a transaction. */
export function writerOf(transaction: IDBTransaction): RowWriter {
  const table = (name: TableName): IDBObjectStore => transaction.objectStore(name);
  return {
    ...readerOf(transaction),
    put: async (name, rows) => {
      await Promise.all(rows.map((row) => answerOf(table(name).put(row))));
    },
    remove: async (name, keys) => {
      await Promise.all(keys.map((key) => answerOf(table(name).delete(key))));
    },
  };
}
