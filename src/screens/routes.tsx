import { lazy, Suspense } from 'react';
import { Route, Switch } from 'wouter';
import { useCoreWords } from './coreServices.ts';

const Room = lazy(() => import('./room/Room.tsx').then((m) => ({ default: m.Room })));
const Pages = lazy(() => import('./Pages.tsx').then((m) => ({ default: m.Pages })));

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
