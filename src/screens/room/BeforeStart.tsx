import { lazy, type RefObject, Suspense } from 'react';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { StartPage } from './StartPage.tsx';
import type { StartsBy } from './together/useTogether.ts';
import { useRoom } from './useRoom.ts';

// One observer alone, and a session that is taken up again, do without it.
const BeforeTogether = lazy(() =>
  import('./together/BeforeTogether.tsx').then((m) => ({ default: m.BeforeTogether })),
);

/** Before the tap that begins (or goes on with) a session: alone, taken up again, or with a second observer. */
export function BeforeStart({ startsBy }: { readonly startsBy: RefObject<StartsBy | null> }) {
  const { room } = useCoreWords();
  const { header, unit } = useFacts();
  const resuming = useRoom((s) => s.resuming);
  if (resuming)
    return (
      <StartPage
        title={room.readyTitleResuming}
        text={unit === 'time' ? room.readyResumingTime : room.readyResuming}
        start={room.goOn}
      />
    );
  if (header.role === null)
    return <StartPage title={room.readyTitle} text={room.readyAlone} start={room.start} />;
  return (
    <Suspense fallback={<main className="room-page">{room.opening}</main>}>
      <BeforeTogether startsBy={startsBy} />
    </Suspense>
  );
}
