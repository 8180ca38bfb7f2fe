import { useState } from 'react';
import { useLocation } from 'wouter';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useCoreServices } from '../coreServices.ts';
import { partLengths } from './amounts.ts';
import { useFacts } from './RoomFacts.tsx';
import { secondOfDay } from './together/agreedSecond.ts';
import { StartTogether } from './together/StartTogether.tsx';
import { TickCheckPage } from './together/TickCheckPage.tsx';
import { useTogether } from './together/useTogether.ts';
import { useWhyNoEyesUp } from './useManner.ts';
import { useLive, useRoom } from './useRoom.ts';

/** The page of the one tap that begins (or goes on with) a session; the tap also unlocks the sound. */
export function BeforeStart() {
  const live = useLive();
  const { words } = useCoreServices();
  const { room, problems } = words;
  const { header, pseudonyms, plan, unit } = useFacts();
  const [, go] = useLocation();
  const [starting, setStarting] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const s = useRoom(({ resuming, upcoming, intervals, sound }) => ({
    resuming,
    child: upcoming?.child ?? null,
    looks: intervals.length,
    silent: !sound.on,
  }));
  const { schedule } = header;
  const name = s.child === null ? undefined : pseudonyms.get(s.child);
  const together = useTogether(header.plannedStart);
  const shared = header.role !== null;
  const settling = shared && !s.resuming;
  const bySecond = settling && together.by === 'second';
  const begin = async (): Promise<void> => {
    setStarting(true);
    setProblem(null);
    const begun = await live.begin(settling ? together.how : {});
    if (begun.ok) return;
    setProblem(say(problems, begun.problem));
    setStarting(false);
  };
  const noEyesUp = useWhyNoEyesUp();
  const minutes = Math.round(partLengths(plan).reduce((sum, ms) => sum + ms, 0) / 60_000);
  if (settling && together.checking && schedule.kind === 'laid')
    return (
      <TickCheckPage
        nudgeMs={together.nudgeMs}
        volume={schedule.protocol.cues.volume}
        onKeep={together.keep}
        onLeave={together.leave}
      />
    );
  return (
    <main className="room-page">
      <p className="second">
        {room.readyAbout({
          klass: header.classroom.name,
          protocol: schedule.kind === 'laid' ? schedule.protocol.name : '',
          practice: header.practice,
          familiarisation: header.familiarisation === true,
        })}
      </p>
      <h1 tabIndex={-1}>
        {s.resuming
          ? room.readyTitleResuming
          : bySecond
            ? room.readyTitleSecond
            : shared
              ? room.readyTitleShared
              : room.readyTitle}
      </h1>
      <p>
        {s.resuming
          ? unit === 'time'
            ? room.readyResumingTime
            : room.readyResuming
          : bySecond
            ? room.readySecond
            : shared
              ? room.readyShared
              : room.readyAlone}
      </p>
      <p className="second">
        {name !== undefined && !s.resuming && `${room.readyFirst({ child: name })} · `}
        {room.readyAmount({ unit, n: s.looks, minutes })}
        {s.silent && ` · ${room.readySilent}`}
      </p>
      {noEyesUp !== null && <p className="second">{noEyesUp}</p>}
      {settling && <StartTogether together={together} />}
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <Button look="main" className="start" disabled={starting} onClick={begin}>
        {starting
          ? room.starting
          : s.resuming
            ? room.goOn
            : bySecond
              ? room.startAt({ time: secondOfDay(together.at, together.now) })
              : room.start}
      </Button>
      <div>
        <Button look="quiet" disabled={starting} onClick={() => go('/room')}>
          {room.leaveReady}
        </Button>
      </div>
    </main>
  );
}
