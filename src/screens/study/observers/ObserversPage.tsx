import { useState } from 'react';
import type { Observer } from '../../../model/observer.ts';
import type { Study } from '../../../model/study.ts';
import { addObserver, removeObserver } from '../../../tasks/index.ts';
import { restoreObserver } from '../../../tasks/restore.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Form } from '../../../ui/Form.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useCurrentStudy } from '../../useCurrentStudy.ts';
import { NotHere, Stored } from '../Stored.tsx';
import { useDoing } from '../useDoing.tsx';
import { ObserverRow } from './ObserverRow.tsx';

/** /study/observers: who observes, and with which keys. */
export function ObserversPage() {
  const { words } = useServices();
  const study = useCurrentStudy();
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  return study === null ? <NotHere /> : <Observers key={study.id} study={study} />;
}

function Observers({ study }: { readonly study: Study }) {
  const { words, deps, useStored } = useServices();
  const { run, tell, notice, busy } = useDoing();
  const [name, setName] = useState('');
  const answer = useStored((store) => store.observers(study.id), [study.id]);
  const add = async () => {
    const added = await run(addObserver(deps, study.id, name));
    if (added.ok) setName('');
  };
  const remove = async (observer: Observer) => {
    const removed = await run(removeObserver(deps, observer.id));
    if (removed.ok)
      tell(words.study.observerRemoved({ name: observer.name }), () => restoreObserver(deps, observer.id));
  };
  return (
    <Stored answer={answer}>
      {(observers) => (
        <div className="stack">
          <PageHead about={<a href="#/study">{study.name}</a>}>
            {words.study.observersTitle({ n: observers.length })}
          </PageHead>
          {notice}
          <Sheet flush>
            <ul className="lines">
              {observers.map((observer) => (
                <ObserverRow key={observer.id} observer={observer} onRemove={() => remove(observer)} />
              ))}
            </ul>
            <Form className="line-foot row row-end" onSubmit={add}>
              <TextField
                label={words.study.observerName}
                maxLength={200}
                value={name}
                onChange={(event) => setName(event.target.value)}
              />
              <Button type="submit" disabled={busy}>
                {words.study.addObserver}
              </Button>
            </Form>
          </Sheet>
        </div>
      )}
    </Stored>
  );
}
