import type { TableName } from './rows.ts';

type Told = (tables: readonly TableName[]) => void;

/** Which tables were written, in this tab and in others. */
export interface ChangeNews {
  tell: Told;
  /** Returns the way to stop. */
  subscribe(told: Told): () => void;
  close(): void;
}

/** News of one database, told to every tab of this origin. */
export function changeNews(database: string): ChangeNews {
  const listeners = new Set<Told>();
  const hand = (tables: readonly TableName[]): void => {
    for (const told of [...listeners]) told(tables);
  };
  const channel = new BroadcastChannel(`${database}: written`);
  channel.onmessage = ({ data }: MessageEvent<readonly TableName[]>) => hand(data);
  // Under Node, where tests run, a channel would keep the process alive.
  (channel as { unref?(): void }).unref?.();
  return {
    tell: (tables) => {
      hand(tables);
      channel.postMessage(tables);
    },
    subscribe: (told) => {
      listeners.add(told);
      return () => listeners.delete(told);
    },
    close: () => channel.close(),
  };
}
