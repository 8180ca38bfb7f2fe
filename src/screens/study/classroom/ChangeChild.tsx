import { useState } from 'react';
import type { Child } from '../../../model/classroom.ts';
import { renameChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Form } from '../../../ui/Form.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { ChildFields, childOf, type TypedChild } from './ChildFields.tsx';

interface Props {
  readonly classroom: string;
  readonly child: Child;
  readonly onWithdraw: () => void;
  /** Changed, or left as it was. */
  readonly onDone: () => void;
}

/** One child: pseudonym and stratum to be changed, or the child withdrawn. */
export function ChangeChild({ classroom, child, onWithdraw, onDone }: Props) {
  const { words, deps } = useServices();
  const { run, notice, busy } = useDoing();
  const [typed, setTyped] = useState<TypedChild>({
    pseudonym: child.pseudonym,
    stratum: child.stratum ?? '',
  });
  const save = async () => {
    const kept = await run(renameChild(deps, classroom, child.id, childOf(typed)));
    if (kept.ok) onDone();
  };
  return (
    <Form
      className="child-change stack-tight"
      aria-label={words.study.changeOf({ name: child.pseudonym })}
      onSubmit={save}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onDone();
      }}
    >
      <ChildFields value={typed} onChange={setTyped} autoFocus />
      {notice}
      <div className="row">
        <Button type="submit" disabled={busy}>
          {words.common.save}
        </Button>
        <Button look="quiet" onClick={onWithdraw}>
          {words.study.withdrawOf({ name: child.pseudonym })}
        </Button>
        <Button look="quiet" onClick={onDone}>
          {words.common.cancel}
        </Button>
      </div>
    </Form>
  );
}
