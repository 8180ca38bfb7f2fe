import { Button } from '../../../ui/Button.tsx';
import { useCoreWords } from '../../coreServices.ts';
import { Ribbon } from '../Ribbon.tsx';
import { useFacts } from '../RoomFacts.tsx';
import { KeptSign } from '../TopRow.tsx';
import { useRoom } from '../useRoom.ts';
import './eyesUp.css';

/** The one thin line that eyes-up has for eyes: whom to look at, whom then, how far, what is kept, and the way out. */
export function EyesUpTop({ onLeave }: { readonly onLeave: () => void }) {
  const { room } = useCoreWords();
  return (
    <header className="eyes-up-top">
      <WhoNow />
      <Ribbon />
      <KeptSign />
      <Button className="rare" onClick={onLeave}>
        {room.leaveEyesUp}
      </Button>
    </header>
  );
}

function WhoNow() {
  const { room, missing } = useCoreWords();
  const { pseudonyms } = useFacts();
  const s = useRoom(({ current, upcoming, countIn, startsIn, armedBefore, previous, away }) => ({
    child: current?.child ?? null,
    hasCurrent: current !== null,
    next: upcoming?.child ?? null,
    count: countIn ?? (startsIn === null ? null : Math.ceil(startsIn / 1000)),
    armed: armedBefore === null ? null : (previous?.child ?? null),
    away: current?.child == null ? null : (away.get(current.child) ?? null),
  }));
  const nameOf = (child: string | null): string => (child === null ? '' : (pseudonyms.get(child) ?? ''));
  if (s.count !== null)
    return (
      <>
        <h1 className="eyes-up-name">{room.startsWith({ n: s.count })}</h1>
        <p className="eyes-up-then">{nameOf(s.next)}</p>
      </>
    );
  const now = s.armed ?? (s.hasCurrent ? s.child : s.next);
  return (
    <>
      <h1 className="eyes-up-name">{nameOf(now)}</h1>
      <p className="eyes-up-then">
        {s.armed !== null
          ? room.armed({ child: nameOf(s.armed) })
          : s.away !== null
            ? room.awayNow({ reason: missing[s.away] })
            : s.hasCurrent && s.next !== null
              ? room.thenChild({ child: nameOf(s.next) })
              : ''}
      </p>
    </>
  );
}
