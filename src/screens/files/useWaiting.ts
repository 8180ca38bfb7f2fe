import { useServices } from '../services.ts';

export interface Waiting {
  /** Sessions recorded here whose entries have not all left in a file. */
  readonly sessions: number;
  /** Sessions recorded here at all. */
  readonly recorded: number;
}

/** What of a study is only on this tablet; undefined while it is being read. */
export function useWaiting(study: string | undefined): Waiting | undefined {
  const answer = useServices().useStored(
    async (store) => {
      if (study === undefined) return { ok: true as const, value: { sessions: 0, recorded: 0 } };
      const listed = await store.listSessions(study);
      if (!listed.ok) return listed;
      const own = listed.value.filter((session) => session.own > 0);
      const waiting = own.filter((session) => !session.handedOver);
      return { ok: true as const, value: { sessions: waiting.length, recorded: own.length } };
    },
    [study],
  );
  return answer?.ok ? answer.value : undefined;
}
