import { Tick } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import { Ribbon } from './Ribbon.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

/** How far the lesson is: time left, the ribbon, the round; and the small sign of what is on the disk. */
export function TopRow() {
  return (
    <header className="room-top">
      <TimeLeft />
      <Ribbon />
      <div className="room-facts">
        <Round />
        <KeptSign />
      </div>
    </header>
  );
}

function TimeLeft() {
  const words = useCoreWords();
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
  const { room } = useCoreWords();
  const { unit, sweep } = useFacts();
  const { round, rounds } = useRoom((s) => ({ round: s.round, rounds: s.rounds }));
  const said = unit === 'scan' ? room.scanOf : sweep === null ? room.round : room.sweepOf;
  // A duration record has no rounds.
  return (
    <p className="room-round">
      {round !== null && rounds !== null && unit !== 'time' && said({ round, rounds })}
    </p>
  );
}

/**
 * What is on the disk, of what was written down. Prompts are written down, too: before the first mark a number would be
 * read as looks, so it is said only when something is not kept yet.
 */
export function KeptSign() {
  const { room } = useCoreWords();
  const { kept, of, marked } = useRoom((s) => ({
    kept: s.kept.kept,
    of: s.kept.of,
    marked: s.state.sayings.size > 0,
  }));
  const all = kept === of;
  return (
    <p className="room-kept">
      <span className="room-kept-sign">{all && marked && <Tick size={14} />}</span>
      {all && !marked ? room.nothingMarked : room.kept({ kept, of })}
    </p>
  );
}
