import type { Id } from '../kernel/ids.ts';

interface Listed {
  readonly id: Id;
  readonly visit: Id;
  readonly observer: { readonly id: Id };
  readonly here: boolean;
  readonly ended: 'complete' | 'early' | null;
}

/**
 * The sessions that nobody on this tablet may see yet: another observer's record of a visit of which a record on this
 * tablet has begun and has not ended. Whoever knows what the other marked does not observe independently any more.
 * @param pairings sessions that were put to a visit by hand
 */
export function heldBack(
  sessions: readonly Listed[],
  pairings: readonly { readonly session: Id; readonly visit: Id }[] = [],
): ReadonlySet<Id> {
  const hand = new Map(pairings.map(({ session, visit }) => [session, visit]));
  const visitsOf = ({ id, visit }: Listed): Id[] => [visit, hand.get(id) ?? visit];
  const running = sessions.filter(({ here, ended }) => here && ended === null);
  const held = sessions.filter((session) =>
    running.some(
      (own) =>
        own.observer.id !== session.observer.id &&
        visitsOf(own).some((visit) => visitsOf(session).includes(visit)),
    ),
  );
  return new Set(held.map(({ id }) => id));
}
