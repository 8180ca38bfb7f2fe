import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

/** Whom to look at, and whom then: the largest words on the glass. */
export function LookAt() {
  const { room, missing } = useCoreWords();
  const { pseudonyms } = useFacts();
  const s = useRoom(({ current, upcoming, countIn, cuePart, armedBefore, previous, away }) => ({
    child: current?.child ?? null,
    isCurrent: current !== null,
    next: upcoming?.child ?? null,
    hasNext: upcoming !== null,
    countIn,
    cuePart,
    armed: armedBefore === null ? null : (previous?.child ?? null),
    away: current?.child == null ? null : (away.get(current.child) ?? null),
  }));
  const nameOf = (child: string | null): string =>
    child === null ? room.everyone : (pseudonyms.get(child) ?? room.everyone);

  if (s.countIn !== null)
    return (
      <div className="look">
        <p className="look-lead">{room.countIn}</p>
        <h1 className="look-name look-count">{s.countIn}</h1>
        <p className="look-then">{s.hasNext && room.readyFirst({ child: nameOf(s.next) })}</p>
      </div>
    );
  if (!s.isCurrent)
    return (
      <div className="look">
        <p className="look-lead">{room.first}</p>
        <h1 className="look-name">{s.hasNext ? nameOf(s.next) : ''}</h1>
        <p className="look-then">{room.atFirstCue}</p>
      </div>
    );
  const lead = s.cuePart === 'observe' ? room.watch : s.cuePart === 'record' ? room.record : room.lookAt;
  const then = !s.hasNext
    ? room.nextNone
    : s.next === s.child
      ? room.nextSame
      : room.next({ child: nameOf(s.next) });
  return (
    <div className="look">
      <p className="look-lead">{lead}</p>
      <h1 className="look-name">{nameOf(s.child)}</h1>
      <p className="look-then">
        {s.armed !== null ? (
          <strong>{room.armed({ child: nameOf(s.armed) })}</strong>
        ) : s.away !== null ? (
          <strong>{room.awayNow({ reason: missing[s.away] })}</strong>
        ) : (
          then
        )}
      </p>
    </div>
  );
}
