import { lazy, Suspense } from 'react';
import { Route, Switch } from 'wouter';
import { useCoreWords } from './coreServices.ts';

const loadRoom = () => import('./room/Room.tsx').then((m) => ({ default: m.Room }));
const loadPages = () => import('./Pages.tsx').then((m) => ({ default: m.Pages }));
const Room = lazy(loadRoom);
const Pages = lazy(loadPages);

/** Loads what an address shows, so that its first picture is not a word about loading. */
export async function loadAhead(hash: string): Promise<void> {
  // What cannot be loaded now is tried again, and told, when it is shown.
  await (/^#\/room\/./.test(hash) ? loadRoom() : loadPages()).catch(() => undefined);
}

function Opening() {
  return (
    <main className="page">
      <h1>{useCoreWords().common.loading}</h1>
    </main>
  );
}

/**
 * Which address shows which screen. The recording has no frame around it: only the lesson is on the glass, and only
 * what it needs is loaded.
 */
export function Routes() {
  return (
    <Suspense fallback={<Opening />}>
      <Switch>
        <Route path="/room/:session">{({ session }) => <Room session={session} />}</Route>
        <Route component={Pages} />
      </Switch>
    </Suspense>
  );
}
