import { useState } from 'react';
import { useLocation } from 'wouter';
import { Button } from '../../ui/Button.tsx';
import { Hold, Tick } from '../../ui/Sign.tsx';
import { say } from '../../words/say.ts';
import { useCoreServices } from '../coreServices.ts';
import { missingOf, partLengths } from './amounts.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

/** The end: whether everything is kept, how complete it is, and the way to the figures. No figure is shown here. */
export function Over() {
  const live = useLive();
  const { words, recorder } = useCoreServices();
  const { room, problems } = words;
  const { header, unit, plan } = useFacts();
  const [, go] = useLocation();
  const [asking, setAsking] = useState(false);
  const s = useRoom(({ kept, ended, intervals }) => ({
    ...kept,
    early: ended === 'early',
    of: kept.of,
    all: unit === 'time' ? 0 : intervals.length,
    ...missingOf(intervals, unit),
  }));
  const allKept = s.kept === s.of;
  const again = async (): Promise<void> => {
    setAsking(true);
    await live.flush();
    setAsking(false);
  };
  const leave = (): void => {
    go(`/afterwards/session/${header.id}`, { replace: true });
    recorder.close();
  };
  return (
    <main className="room-page">
      <h1 tabIndex={-1}>{s.early ? room.overEarlyTitle : room.overTitle}</h1>
      <p className="over-kept" role="status">
        {allKept ? <Tick size={30} /> : <Hold size={30} />}
        <strong>
          {allKept ? room.overKept({ of: s.of }) : room.overNotKept({ kept: s.kept, of: s.of })}
        </strong>
      </p>
      {!allKept && s.refused !== null && <p>{say(problems, s.refused)}</p>}
      <p className="second">
        {room.missingAtEnd({
          unit,
          n: s.n,
          ms: s.ms,
          of: s.all,
          ofMs: partLengths(plan).reduce((sum, ms) => sum + ms, 0),
        })}
      </p>
      <div className="row">
        {allKept ? (
          <Button look="main" onClick={leave}>
            {room.overDo}
          </Button>
        ) : (
          <Button look="main" disabled={asking} onClick={again}>
            {room.overAgain}
          </Button>
        )}
      </div>
    </main>
  );
}
