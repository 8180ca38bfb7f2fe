import type { Result } from '../kernel/result.ts';
import type { Store } from '../tasks/ports.ts';
import { type IndexedOptions, openIndexedRows } from './indexedRows.ts';
import { answer } from './problems.ts';
import type { Seal } from './seal.ts';
import { storeOver } from './storeOver.ts';

/** The name of the database of this origin. */
export const databaseName = 'lookbell';

/**
 * Opens the tablet's store. Problems: `store.newer` (a newer build has written it), `store.refused` (private mode,
 * blocked storage), `store.full`.
 */
export function openStore(
  options: Partial<IndexedOptions> & { readonly seal?: Seal } = {},
): Promise<Result<Store>> {
  return answer(async () =>
    storeOver(await openIndexedRows({ name: databaseName, ...options }), options.seal),
  );
}
