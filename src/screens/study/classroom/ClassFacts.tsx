import { useState } from 'react';
import { useLocation } from 'wouter';
import type { Classroom } from '../../../model/classroom.ts';
import type { Study } from '../../../model/study.ts';
import { type ClassWish, removeClass, saveClass } from '../../../tasks/index.ts';
import { restoreClass } from '../../../tasks/restore.ts';
import { Button } from '../../../ui/Button.tsx';
import { Form } from '../../../ui/Form.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useFarewell } from '../farewell.ts';
import { useDoing } from '../useDoing.tsx';
import { ClassFields } from './ClassFields.tsx';

const factsOf = ({ name, condition }: Classroom): ClassWish => ({ name, condition });

/** Name and condition of the class, and its way off the list. */
export function ClassFacts({ classroom, study }: { readonly classroom: Classroom; readonly study: Study }) {
  const { words, deps } = useServices();
  const [, go] = useLocation();
  const farewell = useFarewell();
  const [wish, setWish] = useState<ClassWish>(factsOf(classroom));
  const { run, tell, notice, busy } = useDoing();
  const save = async () => {
    const standing = factsOf(classroom);
    const kept = await run(saveClass(deps, classroom.id, wish));
    if (!kept.ok) return;
    setWish(factsOf(kept.value));
    tell(words.study.taken, async () => {
      const back = await saveClass(deps, classroom.id, standing);
      if (back.ok) setWish(standing);
      return back;
    });
  };
  const remove = async () => {
    const removed = await run(removeClass(deps, classroom.id));
    if (!removed.ok) return;
    farewell.tell(words.study.classRemoved({ name: classroom.name }), () => restoreClass(deps, classroom.id));
    go('/study');
  };
  return (
    <Sheet title={words.study.aClass}>
      <Form className="stack-tight" onSubmit={save}>
        <ClassFields study={study} value={wish} onChange={setWish} />
        {notice}
        <div className="row">
          <Button type="submit" disabled={busy}>
            {words.common.save}
          </Button>
          <Button look="quiet" disabled={busy} onClick={remove}>
            {words.study.removeClass}
          </Button>
        </div>
      </Form>
    </Sheet>
  );
}
