import { useCoreWords } from '../coreServices.ts';
import { CountLook } from './CountLook.tsx';
import { DurationLook } from './DurationLook.tsx';
import { Look } from './Look.tsx';
import { useFacts } from './RoomFacts.tsx';
import { TurnLook } from './TurnLook.tsx';
import { useRoom } from './useRoom.ts';

/** Whom to look at, and whom then: the largest words on the glass. */
export function LookAt() {
  const { room } = useCoreWords();
  const { pseudonyms, method } = useFacts();
  const s = useRoom(({ current, upcoming, countIn }) => ({
    isCurrent: current !== null,
    next: upcoming?.child ?? null,
    hasNext: upcoming !== null,
    countIn,
  }));
  const nameOf = (child: string | null): string =>
    child === null ? room.everyone : (pseudonyms.get(child) ?? room.everyone);
  if (s.countIn !== null)
    return (
      <Look
        lead={room.countIn}
        then={s.hasNext && s.next !== null && room.readyFirst({ child: nameOf(s.next) })}
      >
        <span className="look-count">{s.countIn}</span>
      </Look>
    );
  if (!s.isCurrent)
    return (
      <Look lead={room.first} then={room.atFirstCue}>
        {s.hasNext ? nameOf(s.next) : ''}
      </Look>
    );
  if (method === 'headcount') return <CountLook />;
  return method === 'duration' ? <DurationLook /> : <TurnLook />;
}
