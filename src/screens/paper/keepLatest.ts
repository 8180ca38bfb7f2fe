import type { Result } from '../../kernel/result.ts';

export interface LatestKeeper<T> {
  put(value: T): void;
  /** Resolves when nothing waits to be kept any more. */
  settled(): Promise<void>;
}

/** Keeps one state after the other, and of those that came while one was being kept only the latest. */
export function keepLatest<T extends object>(
  write: (value: T) => Promise<Result<null>>,
  told: (answer: Result<null>, more: boolean) => void,
): LatestKeeper<T> {
  let waiting: T | null = null;
  let running: Promise<void> | null = null;
  const run = async (): Promise<void> => {
    while (waiting !== null) {
      const value: T = waiting;
      waiting = null;
      told(await write(value), waiting !== null);
    }
    running = null;
  };
  return {
    put: (value) => {
      waiting = value;
      running ??= run();
    },
    settled: () => running ?? Promise.resolve(),
  };
}
