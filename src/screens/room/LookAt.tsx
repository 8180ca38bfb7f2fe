import type { JournalState } from '../../journal/state.ts';
import { useCoreWords } from '../coreServices.ts';
import { CountLook } from './CountLook.tsx';
import { DurationLook } from './DurationLook.tsx';
import { Look } from './Look.tsx';
import { useFacts } from './RoomFacts.tsx';
import { TurnLook } from './TurnLook.tsx';
import { useRoom } from './useRoom.ts';

/** Whom to look at, and whom then: the largest words on the glass. */
export function LookAt() {
  const { room, f } = useCoreWords();
  const { pseudonyms, method } = useFacts();
  const s = useRoom(({ current, upcoming, countIn, startsIn, state }) => ({
    isCurrent: current !== null,
    next: upcoming?.child ?? null,
    hasNext: upcoming !== null,
    countIn,
    secondsLeft: startsIn === null ? null : Math.ceil(startsIn / 1000),
    agreed: startsIn === null ? null : agreedTime(state),
  }));
  const nameOf = (child: string | null): string =>
    child === null ? room.everyone : (pseudonyms.get(child) ?? room.everyone);
  if (s.countIn !== null || s.secondsLeft !== null)
    return (
      <Look
        lead={s.agreed === null ? room.countIn : room.waitsFor({ time: s.agreed })}
        then={s.hasNext && s.next !== null && room.readyFirst({ child: nameOf(s.next) })}
      >
        <span className="look-count">{s.countIn ?? f.clock((s.secondsLeft ?? 0) * 1000)}</span>
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

/** The second that both observers agreed on, as it was said; null where they began on a count. */
function agreedTime(state: JournalState): string | null {
  const started = state.entries.find((entry) => entry.kind === 'started');
  return started?.agreedStart?.slice(11, 19) ?? null;
}
