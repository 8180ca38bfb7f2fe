import { useState } from 'react';
import type { Child } from '../../../model/classroom.ts';
import { renameChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

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
  const [pseudonym, setPseudonym] = useState(child.pseudonym);
  const [stratum, setStratum] = useState(child.stratum ?? '');
  const save = async () => {
    const kept = await run(
      renameChild(deps, classroom, child.id, {
        pseudonym,
        stratum: stratum.trim() === '' ? null : stratum,
      }),
    );
    if (kept.ok) onDone();
  };
  return (
    <form
      className="child-change stack-tight"
      aria-label={words.study.changeOf({ name: child.pseudonym })}
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onDone();
      }}
    >
      <TextField
        label={words.study.pseudonym}
        maxLength={200}
        autoFocus
        value={pseudonym}
        onChange={(event) => setPseudonym(event.target.value)}
      />
      <TextField
        label={words.study.stratum}
        hint={words.study.stratumHint}
        maxLength={200}
        value={stratum}
        onChange={(event) => setStratum(event.target.value)}
      />
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
    </form>
  );
}
