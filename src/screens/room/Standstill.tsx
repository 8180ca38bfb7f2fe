import type { ReactNode } from 'react';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { missingOf } from './amounts.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

/** States in which nothing is marked: what goes on, what is missing, one main button. */
export function Standstill() {
  const live = useLive();
  const { room } = useCoreWords();
  const { unit } = useFacts();
  const s = useRoom(({ phase, partPhase, nextPart, breakStarted }) => ({
    phase,
    partPhase: partPhase ?? '',
    nextPhase: nextPart?.phase ?? '',
    breakStarted,
  }));
  if (s.phase === 'interrupted')
    return (
      <Still
        title={room.interruptedTitle}
        text={
          unit === 'look'
            ? room.interruptedText
            : unit === 'scan'
              ? room.interruptedScans
              : room.interruptedTime
        }
      >
        <Button look="main" onClick={() => live.continueClass()}>
          {room.interruptedDo}
        </Button>
      </Still>
    );
  if (s.phase === 'paused')
    return (
      <Still
        title={room.pausedTitle}
        text={unit === 'look' ? room.pausedText : unit === 'scan' ? room.pausedScans : room.pausedTime}
      >
        <Button look="main" onClick={() => live.resume()}>
          {room.pausedDo}
        </Button>
      </Still>
    );
  if (s.breakStarted)
    return (
      <Still title={room.breakTitle} text={room.breakText({ phase: s.nextPhase })}>
        <Button look="main" onClick={() => live.firstTaskGiven()}>
          {room.firstTaskDo}
        </Button>
      </Still>
    );
  return (
    <Still title={room.closedTitle({ phase: s.partPhase })} text={room.closedText}>
      <Button look="main" onClick={() => live.breakStarted()}>
        {room.breakStartedDo}
      </Button>
      <Button onClick={() => live.firstTaskGiven()}>{room.firstTaskDo}</Button>
    </Still>
  );
}

function Still({
  title,
  text,
  children,
}: {
  readonly title: string;
  readonly text: string;
  readonly children: ReactNode;
}) {
  const { room } = useCoreWords();
  const { unit } = useFacts();
  const missing = useRoom((s) => missingOf(s.intervals, unit));
  return (
    <div className="still">
      <h1>{title}</h1>
      <p>{text}</p>
      <p className="second">{room.missingSoFar(missing)}</p>
      <div className="row">{children}</div>
    </div>
  );
}
