import { useEffect, useState, useSyncExternalStore } from 'react';
import { PageHead } from '../../ui/PageHead.tsx';
import { say } from '../../words/say.ts';
import { useCoreServices } from '../coreServices.ts';
import { CountingFrom } from './Counting.tsx';
import { Lesson } from './Lesson.tsx';
import { MannerFrom } from './MannerFrom.tsx';
import { RoomFactsFrom } from './RoomFacts.tsx';
import { LiveContext } from './useRoom.ts';

/** The recording of one session: the one that runs in this tab, or one that is taken up again. */
export function Room({ session }: { readonly session: string }) {
  const { words, recorder } = useCoreServices();
  const isHere = useSyncExternalStore(recorder.subscribe, () => recorder.currentId() === session);
  const [problem, setProblem] = useState<string | null>(null);
  // Put away while its screen is still there (on the way out): not to be taken up again.
  const [wasHere, setWasHere] = useState(false);
  if (isHere && !wasHere) setWasHere(true);

  useEffect(() => {
    if (isHere || wasHere) return;
    let asked = true;
    recorder.resume(session).then((resumed) => {
      if (asked && !resumed.ok) setProblem(say(words.problems, resumed.problem));
    });
    return () => {
      asked = false;
    };
  }, [recorder, session, isHere, wasHere, words]);

  const live = isHere ? recorder.current() : null;
  if (live === null)
    return (
      <main className="page">
        {problem === null ? (
          <p className="second">{words.room.opening}</p>
        ) : (
          <>
            <PageHead note={problem}>{words.room.notOpened}</PageHead>
            <a className="button" href="#/room">
              {words.room.toDoor}
            </a>
          </>
        )}
      </main>
    );
  return (
    <LiveContext value={live}>
      <RoomFactsFrom header={live.snapshot().state.header}>
        <MannerFrom>
          <CountingFrom>
            <Lesson />
          </CountingFrom>
        </MannerFrom>
      </RoomFactsFrom>
    </LiveContext>
  );
}
