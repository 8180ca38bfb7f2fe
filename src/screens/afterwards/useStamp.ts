import { useServices } from '../services.ts';

/** Changes whenever something of a study that figures are made of has changed; undefined while it is being read. */
export function useStamp(study: string | undefined): string | undefined {
  const answer = useServices().useStored(
    async (store) => {
      if (study === undefined) return { ok: true as const, value: undefined };
      const [found, sessions] = [await store.study(study), await store.listSessions(study)];
      if (!found.ok) return found;
      if (!sessions.ok) return sessions;
      const counts = sessions.value.map(({ id, entries }) => `${id}:${entries}`).join(' ');
      return { ok: true as const, value: `${found.value?.revision.counter ?? 0} ${counts}` };
    },
    [study],
  );
  return answer?.ok ? answer.value : undefined;
}
