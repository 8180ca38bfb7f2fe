import { heldBack } from '../../journal/heldBack.ts';
import { ok } from '../../kernel/result.ts';
import type { SessionSummary } from '../../tasks/ports.ts';
import { useServices } from '../services.ts';

export interface Listed {
  readonly sessions: readonly SessionSummary[];
  /** Sessions that stay closed until one's own record of the same visit has ended. */
  readonly held: ReadonlySet<string>;
  /** Where it belongs: a pairing by hand goes before what it was recorded for. */
  readonly visitOf: (session: Pick<SessionSummary, 'id' | 'visit'>) => string;
}

/** The sessions of a study, and which of them nobody may see yet; undefined while it is being read. */
export function useListed(study: string | undefined): Listed | undefined {
  const answer = useServices().useStored(
    async (store) => {
      if (study === undefined) return ok(undefined);
      const [found, sessions] = [await store.study(study), await store.listSessions(study)];
      if (!found.ok) return found;
      if (!sessions.ok) return sessions;
      const pairings = found.value?.pairings ?? [];
      const hand = new Map(pairings.map((pairing) => [pairing.session, pairing.visit]));
      const listed: Listed = {
        sessions: sessions.value,
        held: heldBack(sessions.value, pairings),
        visitOf: ({ id, visit }) => hand.get(id) ?? visit,
      };
      return ok(listed);
    },
    [study],
  );
  return answer?.ok ? answer.value : undefined;
}
