import { lazy } from 'react';
import { Route, Switch } from 'wouter';
import { AddClass } from './classroom/AddClass.tsx';
import { ClassPage } from './classroom/ClassPage.tsx';
import { FarewellContext } from './farewell.ts';
import { AtAGlance } from './glance/AtAGlance.tsx';
import { ObserversPage } from './observers/ObserversPage.tsx';
import { NewProtocolPage } from './protocol/NewProtocolPage.tsx';
import { ProtocolPage } from './protocol/ProtocolPage.tsx';
import { NotHere } from './Stored.tsx';
import { SeatsPage } from './seats/SeatsPage.tsx';
import { SettingsPage } from './settings/SettingsPage.tsx';
import { useDoing } from './useDoing.tsx';
import './study.css';

const Files = lazy(() => import('../files/Files.tsx').then((m) => ({ default: m.Files })));
const Methods = lazy(() => import('../methods/Methods.tsx').then((m) => ({ default: m.Methods })));

/** The study: classes, children, seats, protocols, observers, settings. */
export function StudyPages() {
  const farewell = useDoing();
  return (
    <FarewellContext value={farewell}>
      <Switch>
        <Route path="/study" component={AtAGlance} />
        <Route path="/study/class/new" component={AddClass} />
        <Route path="/study/class/:id">{({ id }) => <ClassPage key={id} id={id} />}</Route>
        <Route path="/study/class/:id/seats">{({ id }) => <SeatsPage key={id} id={id} />}</Route>
        <Route path="/study/protocols/new" component={NewProtocolPage} />
        <Route path="/study/protocol/:id">{({ id }) => <ProtocolPage key={id} id={id} />}</Route>
        <Route path="/study/observers" component={ObserversPage} />
        <Route path="/study/settings" component={SettingsPage} />
        <Route path="/study/files" component={Files} />
        <Route path="/study/methods" component={Methods} />
        <Route>
          <NotHere />
        </Route>
      </Switch>
    </FarewellContext>
  );
}
