import { useState } from 'react';
import type { Child, Classroom } from '../../../model/classroom.ts';
import { renameChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

interface Props {
  readonly classroom: Classroom;
  readonly child: Child;
  readonly onWithdraw: () => void;
}

/** One child: pseudonym and stratum, to be changed in place. */
export function ChildRow({ classroom, child, onWithdraw }: Props) {
  const { words } = useServices();
  const [changing, setChanging] = useState(false);
  return (
    <li>
      {changing ? (
        <ChangeChild classroom={classroom} child={child} onDone={() => setChanging(false)} />
      ) : (
        <>
          <span className="grow">
            <strong>{child.pseudonym}</strong>
            {child.stratum !== null && <span className="second"> · {child.stratum}</span>}
          </span>
          <Button
            look="quiet"
            aria-label={words.study.changeOf({ name: child.pseudonym })}
            onClick={() => setChanging(true)}
          >
            {words.study.change}
          </Button>
          <Button
            look="quiet"
            aria-label={words.study.withdrawOf({ name: child.pseudonym })}
            onClick={onWithdraw}
          >
            {words.study.withdraw}
          </Button>
        </>
      )}
    </li>
  );
}

function ChangeChild({
  classroom,
  child,
  onDone,
}: Omit<Props, 'onWithdraw'> & { readonly onDone: () => void }) {
  const { words, deps } = useServices();
  const { run, notice } = useDoing();
  const [pseudonym, setPseudonym] = useState(child.pseudonym);
  const [stratum, setStratum] = useState(child.stratum ?? '');
  const save = async () => {
    const kept = await run(
      renameChild(deps, classroom.id, child.id, {
        pseudonym,
        stratum: stratum.trim() === '' ? null : stratum,
      }),
    );
    if (kept.ok) onDone();
  };
  return (
    <form
      className="stack-tight grow"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
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
        maxLength={200}
        value={stratum}
        onChange={(event) => setStratum(event.target.value)}
      />
      {notice}
      <div className="row">
        <Button type="submit">{words.common.save}</Button>
        <Button look="quiet" onClick={onDone}>
          {words.common.cancel}
        </Button>
      </div>
    </form>
  );
}
