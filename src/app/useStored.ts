import { useLiveQuery } from 'dexie-react-hooks';
import type { Result } from '../kernel/result.ts';
import { useCoreServices } from '../screens/coreServices.ts';
import type { StoreReader } from '../tasks/ports.ts';

/** A stored answer that is asked again whenever something that it read has changed. */
export function useStored<T>(
  query: (reader: StoreReader) => Promise<Result<T>>,
  dependencies: readonly unknown[],
): Result<T> | undefined {
  const { store } = useCoreServices();
  // Dexie follows awaits only in a function that it can see to be asynchronous.
  return useLiveQuery(async () => await query(store), [store, ...dependencies]);
}
