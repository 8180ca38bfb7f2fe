import { lazy, Suspense } from 'react';
import { Redirect, Route, Switch } from 'wouter';
import { Frame } from './frame/Frame.tsx';
import { useWords } from './services.ts';

const Prepare = lazy(() => import('./before/Prepare.tsx').then((m) => ({ default: m.Prepare })));
const Ready = lazy(() => import('./before/Ready.tsx').then((m) => ({ default: m.Ready })));
const RoomDoor = lazy(() => import('./room/RoomDoor.tsx').then((m) => ({ default: m.RoomDoor })));
const Room = lazy(() => import('./room/Room.tsx').then((m) => ({ default: m.Room })));
const Afterwards = lazy(() => import('./afterwards/Afterwards.tsx').then((m) => ({ default: m.Afterwards })));
const StudyPages = lazy(() => import('./study/StudyPages.tsx').then((m) => ({ default: m.StudyPages })));

function OpeningTitle() {
  return <h1>{useWords().common.loading}</h1>;
}

function Opening() {
  return <p className="second">{useWords().common.loading}</p>;
}

/** Which address shows which screen. The recording has no frame around it: only the lesson is on the glass. */
export function Routes() {
  return (
    <Switch>
      <Route path="/room/:session">
        {({ session }) => (
          <Suspense
            fallback={
              <main className="page">
                <OpeningTitle />
              </main>
            }
          >
            <Room session={session} />
          </Suspense>
        )}
      </Route>
      <Route>
        <Frame>
          <Suspense fallback={<Opening />}>
            <Switch>
              <Route path="/before" component={Prepare} />
              <Route path="/before/ready" component={Ready} />
              <Route path="/room" component={RoomDoor} />
              <Route path="/afterwards/*?" component={Afterwards} />
              <Route path="/study/*?" component={StudyPages} />
              <Route>
                <Redirect to="/before" />
              </Route>
            </Switch>
          </Suspense>
        </Frame>
      </Route>
    </Switch>
  );
}
