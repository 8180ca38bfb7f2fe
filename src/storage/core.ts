import { StoreFailure } from './problems.ts';
import type { RowReader, RowStore, RowWriter, TableName } from './rows.ts';
import type { Seal } from './seal.ts';

/** What all parts of the store share. */
export interface Core {
  readonly rows: RowStore;
  readonly seal: Seal;
  /** Changes of this tab go one after the other; stamps guard against those of other tabs. */
  readonly inTurn: <R>(work: () => Promise<R>) => Promise<R>;
}

/** A queue in which a failure does not hold up what comes after it. */
export function queue(): Core['inTurn'] {
  let last: Promise<unknown> = Promise.resolve();
  return (work) => {
    const turn = last.then(work);
    last = turn.catch(() => undefined);
    return turn;
  };
}

/** Thrown inside a write when what was read before the transaction has changed since: read again, prepare again. */
export class ChangedMeanwhile extends Error {
  override readonly name = 'ChangedMeanwhile';
}

/**
 * A change that depends on what is kept: read, prepare (merge, seal: foreign promises, so outside of a transaction),
 * then write if nothing has changed in between, else the same again.
 * @param prepare gives the write, which throws `ChangedMeanwhile` when it finds other stamps than were read
 */
export function changeRows<Seen>(
  core: Core,
  tables: readonly TableName[],
  look: (rows: RowReader) => Promise<Seen>,
  prepare: (seen: Seen) => Promise<((rows: RowWriter) => Promise<void>) | null>,
): Promise<void> {
  return core.inTurn(async () => {
    for (let attempt = 0; attempt < 8; attempt++) {
      const write = await prepare(await core.rows.read(tables, look));
      if (write === null) return;
      try {
        return await core.rows.write(tables, write);
      } catch (error) {
        if (!(error instanceof ChangedMeanwhile)) throw error;
      }
    }
    throw new StoreFailure('store.busy');
  });
}
