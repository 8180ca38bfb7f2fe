import { useState } from 'react';
import { useLocation } from 'wouter';
import { addClass, type ClassWish } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Form } from '../../../ui/Form.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useCurrentStudy } from '../../useCurrentStudy.ts';
import { NotHere } from '../Stored.tsx';
import { useDoing } from '../useDoing.tsx';
import { ClassFields } from './ClassFields.tsx';

/** /study/class/new: a name and a condition, then straight to its children. */
export function AddClass() {
  const { words, deps } = useServices();
  const [, go] = useLocation();
  const study = useCurrentStudy();
  const [wish, setWish] = useState<ClassWish>({ name: '', condition: null });
  const { run, notice, busy } = useDoing();
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  if (study === null) return <NotHere />;
  const add = async () => {
    const made = await run(addClass(deps, study.id, wish));
    if (made.ok) go(`/study/class/${made.value.id}`);
  };
  return (
    <>
      <PageHead about={study.name} note={words.study.newClassNote}>
        {words.study.newClassTitle}
      </PageHead>
      <Sheet>
        <Form className="stack" onSubmit={add}>
          <ClassFields study={study} value={wish} onChange={setWish} />
          {notice}
          <div className="row">
            <Button type="submit" look="main" disabled={busy}>
              {words.study.addThisClass}
            </Button>
            <a className="button button-quiet" href="#/study">
              {words.common.cancel}
            </a>
          </div>
        </Form>
      </Sheet>
    </>
  );
}
