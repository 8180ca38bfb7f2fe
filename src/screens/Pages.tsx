import { lazy, Suspense, useMemo } from 'react';
import { Redirect, Route, Switch } from 'wouter';
import { wordsFor } from '../words/words.ts';
import { useCoreServices } from './coreServices.ts';
import { Frame } from './frame/Frame.tsx';
import { ServicesContext, useWords } from './services.ts';

const Prepare = lazy(() => import('./before/Prepare.tsx').then((m) => ({ default: m.Prepare })));
const Ready = lazy(() => import('./before/Ready.tsx').then((m) => ({ default: m.Ready })));
const ReadCard = lazy(() => import('./before/card/ReadCard.tsx').then((m) => ({ default: m.ReadCard })));
const SheetPage = lazy(() => import('./paper/SheetPage.tsx').then((m) => ({ default: m.SheetPage })));
const TypePage = lazy(() => import('./paper/TypePage.tsx').then((m) => ({ default: m.TypePage })));
const RoomDoor = lazy(() => import('./room/RoomDoor.tsx').then((m) => ({ default: m.RoomDoor })));
const Afterwards = lazy(() => import('./afterwards/Afterwards.tsx').then((m) => ({ default: m.Afterwards })));
const StudyPages = lazy(() => import('./study/StudyPages.tsx').then((m) => ({ default: m.StudyPages })));

function Opening() {
  return <p className="second">{useWords().common.loading}</p>;
}

/** Every page but the recording, in its frame, and the words of all of them. */
export function Pages() {
  const core = useCoreServices();
  const services = useMemo(() => ({ ...core, words: wordsFor(core.words.f.locale) }), [core]);
  return (
    <ServicesContext value={services}>
      <Frame>
        <Suspense fallback={<Opening />}>
          <Switch>
            <Route path="/before" component={Prepare} />
            <Route path="/before/ready/:as?">
              {({ as }) => <Ready as={as === 'second' ? 'second' : null} />}
            </Route>
            <Route path="/before/card" component={ReadCard} />
            <Route path="/before/paper/type" component={TypePage} />
            <Route path="/before/paper/:session?">
              {({ session }) => <SheetPage key={session} session={session ?? null} />}
            </Route>
            <Route path="/room" component={RoomDoor} />
            <Route path="/afterwards/*?" component={Afterwards} />
            <Route path="/study/*?" component={StudyPages} />
            <Route>
              <Redirect to="/before" />
            </Route>
          </Switch>
        </Suspense>
      </Frame>
    </ServicesContext>
  );
}
