import { useWords } from '../services.ts';
import { Ribbon } from './Ribbon.tsx';
import { useRoom } from './useRoom.ts';

/** How far the lesson is: time left, the ribbon, the round. */
export function TopRow() {
  return (
    <header className="room-top">
      <TimeLeft />
      <Ribbon />
      <Round />
    </header>
  );
}

function TimeLeft() {
  const words = useWords();
  const left = useRoom((s) => (s.msLeft === null ? null : Math.ceil(s.msLeft / 1000)));
  return (
    <p className="room-left">
      {left !== null && (
        <>
          <span className="visually-hidden">{words.room.timeLeft} </span>
          {words.f.clock(left * 1000)}
        </>
      )}
    </p>
  );
}

function Round() {
  const words = useWords();
  const { round, rounds } = useRoom((s) => ({ round: s.round, rounds: s.rounds }));
  return (
    <p className="room-round">{round !== null && rounds !== null && words.room.round({ round, rounds })}</p>
  );
}
