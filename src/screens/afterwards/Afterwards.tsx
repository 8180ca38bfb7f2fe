import { Route, Switch } from 'wouter';
import { AgreementPage } from './AgreementPage.tsx';
import { ChangePage } from './ChangePage.tsx';
import { SessionPage } from './SessionPage.tsx';
import { VisitPage } from './VisitPage.tsx';
import { VisitsPage } from './VisitsPage.tsx';
import './afterwards.css';

/** Afterwards: what was recorded, how far two observers agree, what changed. */
export function Afterwards() {
  return (
    <Switch>
      <Route path="/afterwards/session/:id">{({ id }) => <SessionPage key={id} id={id} />}</Route>
      <Route path="/afterwards/visit/:id">{({ id }) => <VisitPage key={id} id={id} />}</Route>
      <Route path="/afterwards/agreement" component={AgreementPage} />
      <Route path="/afterwards/change/:klass">{({ klass }) => <ChangePage klass={klass} />}</Route>
      <Route path="/afterwards/change">{() => <ChangePage klass={null} />}</Route>
      <Route component={VisitsPage} />
    </Switch>
  );
}
