import { useState } from 'react';
import { useLocation } from 'wouter';
import type { Classroom } from '../../../model/classroom.ts';
import type { Study } from '../../../model/study.ts';
import { removeClass, saveClass } from '../../../tasks/index.ts';
import { restoreClass } from '../../../tasks/restore.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useFarewell } from '../farewell.ts';
import { useDoing } from '../useDoing.tsx';
import { ConditionChoice } from './ConditionChoice.tsx';

/** Name and condition of the class, and its way off the list. */
export function ClassFacts({ classroom, study }: { readonly classroom: Classroom; readonly study: Study }) {
  const { words, deps } = useServices();
  const [, go] = useLocation();
  const farewell = useFarewell();
  const [name, setName] = useState(classroom.name);
  const [condition, setCondition] = useState(classroom.condition);
  const { run, tell, notice, busy } = useDoing();
  const save = async () => {
    const [oldName, oldCondition] = [classroom.name, classroom.condition];
    const kept = await run(saveClass(deps, classroom.id, { name, condition }));
    if (!kept.ok) return;
    setName(kept.value.name);
    tell(words.study.taken, async () => {
      const back = await saveClass(deps, classroom.id, { name: oldName, condition: oldCondition });
      if (back.ok) {
        setName(oldName);
        setCondition(oldCondition);
      }
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
      <form
        className="stack-tight"
        onSubmit={(event) => {
          event.preventDefault();
          void save();
        }}
      >
        <TextField
          label={words.study.className}
          maxLength={200}
          value={name}
          onChange={(event) => setName(event.target.value)}
        />
        <ConditionChoice study={study} value={condition} onChange={setCondition} />
        {notice}
        <div className="row">
          <Button type="submit" disabled={busy}>
            {words.common.save}
          </Button>
          <Button look="quiet" disabled={busy} onClick={remove}>
            {words.study.removeClass}
          </Button>
        </div>
      </form>
    </Sheet>
  );
}
