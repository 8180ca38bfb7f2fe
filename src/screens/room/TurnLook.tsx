import { useCoreWords } from '../coreServices.ts';
import { Look } from './Look.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';
import { useSweep, useSweepRest } from './useSweep.ts';

/** Looks at children in turn: whose it is, and whose comes then. */
export function TurnLook() {
  const { room, missing } = useCoreWords();
  const { pseudonyms } = useFacts();
  const lead = useLead();
  const resting = useSweepRest();
  const s = useRoom(({ current, upcoming, armedBefore, previous, away }) => ({
    child: current?.child ?? null,
    number: current?.number ?? null,
    next: upcoming?.child ?? null,
    hasNext: upcoming !== null,
    armed: armedBefore === null ? null : (previous?.child ?? null),
    away: current?.child == null ? null : (away.get(current.child) ?? null),
  }));
  const instead = useInsteadOf(s.number, s.child);
  const nameOf = (child: string | null): string =>
    child === null ? room.everyone : (pseudonyms.get(child) ?? room.everyone);
  if (resting) return <BetweenSweeps />;
  const then = !s.hasNext
    ? room.nextNone
    : s.next === s.child
      ? room.nextSame
      : room.next({ child: nameOf(s.next) });
  return (
    <Look
      lead={lead}
      then={
        s.armed !== null ? (
          <strong>{room.armed({ child: nameOf(s.armed) })}</strong>
        ) : s.away !== null ? (
          <strong>{room.awayNow({ reason: missing[s.away] })}</strong>
        ) : instead === null ? (
          then
        ) : (
          `${room.insteadOf({ child: nameOf(instead) })} · ${then}`
        )
      }
    >
      {nameOf(s.child)}
    </Look>
  );
}

/** Between two sweeps there is nobody to look at: what comes, and when. */
function BetweenSweeps() {
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const s = useRoom(({ current, upcoming, now }) => ({
    open: current?.status === 'open' ? current.child : null,
    next: upcoming?.child ?? null,
    seconds: upcoming?.cueAt == null ? null : Math.ceil((upcoming.cueAt - now) / 1000),
  }));
  const next =
    s.seconds === null || s.next === null
      ? room.sweepLast
      : room.sweepNext({ ms: s.seconds * 1000, child: pseudonyms.get(s.next) ?? '' });
  return (
    <Look
      lead={s.open === null ? '' : room.sweepStillOpen({ child: pseudonyms.get(s.open) ?? '' })}
      then={next}
    >
      {room.sweepDone}
    </Look>
  );
}

/** What to do with the child named: look, watch or record; in a whole interval what lasts; the target child or a peer. */
function useLead(): string {
  const { room } = useCoreWords();
  const { method, plan, target } = useFacts();
  const sweep = useSweep();
  const { cuePart, number } = useRoom((s) => ({ cuePart: s.cuePart, number: s.current?.number ?? null }));
  if (sweep !== null) return room.sweepLook(sweep);
  const part = cuePart === 'observe' || cuePart === 'record' ? cuePart : 'look';
  if (target !== null) {
    const isTarget = number !== null && plan.intervals[number - 1]?.child === target;
    if (part === 'look') return isTarget ? room.lookAtTarget : room.lookAtPeer;
    if (part === 'observe') return isTarget ? room.watchTarget : room.watchPeer;
    return isTarget ? room.recordTarget : room.recordPeer;
  }
  if (part === 'look') return room.lookAt;
  if (method === 'whole') return part === 'observe' ? room.watchWhole : room.recordWhole;
  return part === 'observe' ? room.watch : room.record;
}

/** The child whose turn this was meant to be, where a reserve is watched in its place. */
function useInsteadOf(number: number | null, watched: string | null): string | null {
  const planned = useFacts().plan.intervals[(number ?? 0) - 1]?.child ?? null;
  return watched !== null && planned !== watched ? planned : null;
}
