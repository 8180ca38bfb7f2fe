import { useEffect, useState } from 'react';
import type { Result } from '../kernel/result.ts';
import { useCoreServices } from '../screens/coreServices.ts';
import type { StoreReader } from '../tasks/ports.ts';

/** A stored answer that is asked again whenever something that it read has changed. */
export function useStored<T>(
  query: (reader: StoreReader) => Promise<Result<T>>,
  dependencies: readonly unknown[],
): Result<T> | undefined {
  const { store } = useCoreServices();
  const [answer, setAnswer] = useState<Result<T>>();
  // biome-ignore lint/correctness/useExhaustiveDependencies: the caller names what the query depends on
  useEffect(() => store.watch(query, setAnswer), [store, ...dependencies]);
  return answer;
}
