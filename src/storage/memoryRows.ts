import { StoreFailure } from './problems.ts';
import {
  type RowReader,
  type RowStore,
  type RowWriter,
  type TableName,
  type Tables,
  tableNames,
} from './rows.ts';

type Contents = Record<TableName, Map<string, Tables[TableName]>>;

const copy = <T>(value: T): T => structuredClone(value);

/** Rows in memory, with the transactions of a database: one after the other, each kept whole or not at all. */
export function memoryRows(options: { readonly refuse?: () => string | null } = {}): RowStore {
  const empty = (): Contents =>
    Object.fromEntries(tableNames.map((table) => [table, new Map()])) as unknown as Contents;
  let kept = empty();
  let queue: Promise<unknown> = Promise.resolve();
  let closed = false;
  const watchers = new Set<() => void>();

  const reader = (contents: Contents): RowReader => {
    const table = <T extends TableName>(name: T): Map<string, Tables[T]> =>
      contents[name] as unknown as Map<string, Tables[T]>;
    return {
      get: async (name, key) => copy(table(name).get(key)),
      getMany: async (name, keys) => keys.map((key) => copy(table(name).get(key))),
      by: async (name, index, value) =>
        [...table(name).values()]
          .filter((row) => (row as unknown as Record<string, unknown>)[index as string] === value)
          .map(copy),
      all: async (name) => [...table(name).values()].map(copy),
    };
  };

  const inTurn = <R>(work: () => Promise<R>): Promise<R> => {
    const turn = queue.then(() => {
      if (closed) throw new StoreFailure('store.lost');
      return work();
    });
    queue = turn.catch(() => undefined);
    return turn;
  };

  const read: RowStore['read'] = (_tables, work) => inTurn(() => work(reader(kept)));
  return {
    read,
    write: (_tables, work) =>
      inTurn(async () => {
        const refused = options.refuse?.() ?? null;
        if (refused !== null) throw new StoreFailure(refused);
        const draft = Object.fromEntries(tableNames.map((name) => [name, new Map(kept[name])])) as Contents;
        const writer: RowWriter = {
          ...reader(draft),
          put: async (name, rows) => {
            for (const row of rows) draft[name].set(row.key, copy(row));
          },
          remove: async (name, keys) => {
            for (const key of keys) draft[name].delete(key);
          },
        };
        const result = await work(writer);
        kept = draft;
        for (const again of watchers) again();
        return result;
      }),
    watch: (query, callback) => {
      let asked = 0;
      let live = true;
      const ask = (): void => {
        asked += 1;
        const turn = asked;
        void query(read).then((result) => {
          if (live && turn === asked) callback(result);
        });
      };
      watchers.add(ask);
      ask();
      return () => {
        live = false;
        watchers.delete(ask);
      };
    },
    close: () => {
      closed = true;
    },
  };
}
