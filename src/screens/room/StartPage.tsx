import { type ReactNode, useState } from 'react';
import { useLocation } from 'wouter';
import type { Beginning } from '../../recorder/liveSession.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useCoreServices } from '../coreServices.ts';
import { partLengths } from './amounts.ts';
import { useFacts } from './RoomFacts.tsx';
import { useWhyNoEyesUp } from './useManner.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly title: string;
  readonly text: string;
  /** What the button says, and how the session begins at its tap. */
  readonly start: string;
  readonly how?: Beginning;
  readonly children?: ReactNode;
}

/** The page of the one tap that begins (or goes on with) a session; the tap also unlocks the sound. */
export function StartPage({ title, text, start, how = {}, children }: Props) {
  const live = useLive();
  const { words, recorder } = useCoreServices();
  const { room, problems } = words;
  const { header, pseudonyms, plan, unit } = useFacts();
  const [, go] = useLocation();
  const noEyesUp = useWhyNoEyesUp();
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
  const begin = async (): Promise<void> => {
    setStarting(true);
    setProblem(null);
    const begun = await live.begin(how);
    if (begun.ok) return;
    if (begun.problem.code === 'recorder.goneOn') {
      // The door reads the session anew.
      recorder.close();
      go('/room');
      return;
    }
    setProblem(say(problems, begun.problem));
    setStarting(false);
  };
  const minutes = Math.round(partLengths(plan).reduce((sum, ms) => sum + ms, 0) / 60_000);
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
      <h1 tabIndex={-1}>{title}</h1>
      <p>{text}</p>
      <p className="second">
        {name !== undefined && !s.resuming && `${room.readyFirst({ child: name })} · `}
        {room.readyAmount({ unit, n: s.looks, minutes })}
        {s.silent && ` · ${room.readySilent}`}
      </p>
      {noEyesUp !== null && <p className="second">{noEyesUp}</p>}
      {children}
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <Button look="main" className="start" disabled={starting} onClick={begin}>
        {starting ? room.starting : start}
      </Button>
      <div>
        <Button look="quiet" disabled={starting} onClick={() => go('/room')}>
          {room.leaveReady}
        </Button>
      </div>
    </main>
  );
}
