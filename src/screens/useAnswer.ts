import { useEffect, useState } from 'react';
import type { Result } from '../kernel/result.ts';

export type Pending<T> =
  | { readonly state: 'working'; readonly progress: number | null }
  | { readonly state: 'answered'; readonly answer: Result<T> };

/**
 * Asks for something that takes a while, again whenever `key` changes, and forgets the answer of a question that
 * is no longer asked.
 */
export function useAnswer<T>(
  ask: (signal: AbortSignal, progress: (share: number) => void) => Promise<Result<T>>,
  key: string,
): Pending<T> {
  const [pending, setPending] = useState<Pending<T>>({ state: 'working', progress: null });
  // biome-ignore lint/correctness/useExhaustiveDependencies: `key` says when the question is another one
  useEffect(() => {
    const aborter = new AbortController();
    setPending({ state: 'working', progress: null });
    const tell = (share: number) => {
      if (!aborter.signal.aborted) setPending({ state: 'working', progress: share });
    };
    ask(aborter.signal, tell).then(
      (answer) => {
        if (!aborter.signal.aborted) setPending({ state: 'answered', answer });
      },
      (error: unknown) => {
        if (!aborter.signal.aborted) throw error;
      },
    );
    return () => aborter.abort();
  }, [key]);
  return pending;
}
