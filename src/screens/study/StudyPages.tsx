import { Route, Switch } from 'wouter';
import { AddClass } from './classroom/AddClass.tsx';
import { ClassPage } from './classroom/ClassPage.tsx';
import { AtAGlance } from './glance/AtAGlance.tsx';
import { ObserversPage } from './observers/ObserversPage.tsx';
import { NewProtocolPage } from './protocol/NewProtocolPage.tsx';
import { ProtocolPage } from './protocol/ProtocolPage.tsx';
import { NotHere } from './Stored.tsx';
import { SeatsPage } from './seats/SeatsPage.tsx';
import { SettingsPage } from './settings/SettingsPage.tsx';
import './study.css';

/** The study: classes, children, seats, protocols, observers, settings. */
export function StudyPages() {
  return (
    <Switch>
      <Route path="/study" component={AtAGlance} />
      <Route path="/study/class/new" component={AddClass} />
      <Route path="/study/class/:id">{({ id }) => <ClassPage key={id} id={id} />}</Route>
      <Route path="/study/class/:id/seats">{({ id }) => <SeatsPage key={id} id={id} />}</Route>
      <Route path="/study/protocols/new" component={NewProtocolPage} />
      <Route path="/study/protocol/:id">{({ id }) => <ProtocolPage key={id} id={id} />}</Route>
      <Route path="/study/observers" component={ObserversPage} />
      <Route path="/study/settings" component={SettingsPage} />
      <Route>
        <NotHere />
      </Route>
    </Switch>
  );
}
