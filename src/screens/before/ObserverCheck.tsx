import { useState } from 'react';
import type { Observer } from '../../model/observer.ts';
import type { Role } from '../../model/session.ts';
import { addObserver } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { TextField } from '../../ui/Field.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { CheckRow } from './CheckRow.tsx';
import { type Purpose, PurposeChoice } from './PurposeChoice.tsx';

/** Who records, beside whom, and whether it counts. */
export interface Who {
  readonly observer: string | null;
  readonly role: Role | null;
  readonly purpose: Purpose;
}

interface Props {
  readonly study: string;
  readonly observers: readonly Observer[];
  readonly who: Who;
  readonly onChange: (who: Who) => void;
}

export function ObserverCheck({ study, observers, who, onChange }: Props) {
  const { words } = useServices();
  const [open, setOpen] = useState(false);
  const observer = observers.find((o) => o.id === who.observer);
  const role = {
    alone: words.before.roleShortAlone,
    primary: words.before.roleShortPrimary,
    second: words.before.roleShortSecond,
  }[who.role ?? 'alone'];
  return (
    <CheckRow
      name={words.before.observer}
      state={observer === undefined ? 'hold' : 'ready'}
      actions={<Button onClick={() => setOpen(true)}>{words.before.observerChoose}</Button>}
    >
      {observer === undefined
        ? words.before.observerNobody
        : words.before.observerWho({ name: observer.name, role, purpose: who.purpose })}
      {open && (
        <WhoDialog
          study={study}
          observers={observers}
          who={who}
          onChange={onChange}
          onClose={() => setOpen(false)}
        />
      )}
    </CheckRow>
  );
}

function WhoDialog({ study, observers, who, onChange, onClose }: Props & { readonly onClose: () => void }) {
  const { words, deps } = useServices();
  const [name, setName] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const add = async (): Promise<boolean> => {
    // Out of the field at once, so that a quick "Done" after "Add" does not add it twice.
    setName('');
    const added = await addObserver(deps, study, name.trim());
    if (!added.ok) {
      setName(name);
      setProblem(say(words.problems, added.problem));
      return false;
    }
    setProblem(null);
    onChange({ ...who, observer: added.value.id });
    return true;
  };
  // A name that stands in the field is meant, whether "Add" was tapped or not.
  const done = async (): Promise<void> => {
    if (name.trim() === '' || (await add())) onClose();
  };
  return (
    <Dialog
      title={words.before.observerDialog}
      onClose={onClose}
      actions={<Button onClick={done}>{words.common.done}</Button>}
    >
      {observers.length > 0 && (
        <Choice
          legend={words.before.observer}
          value={who.observer}
          onChange={(observer) => onChange({ ...who, observer })}
          options={observers.map((o) => ({ value: o.id, label: o.name }))}
        />
      )}
      <div className="row">
        <div className="grow">
          <TextField
            label={words.before.addObserver}
            hint={words.before.addObserverHint}
            value={name}
            problem={problem}
            onChange={(event) => setName(event.target.value)}
          />
        </div>
        <Button disabled={name.trim() === ''} onClick={add}>
          {words.common.add}
        </Button>
      </div>
      <Choice
        legend={words.before.role}
        value={who.role ?? 'alone'}
        onChange={(role) => onChange({ ...who, role: role === 'alone' ? null : role })}
        options={[
          { value: 'alone', label: words.before.roleAlone, hint: words.before.roleAloneHint },
          { value: 'primary', label: words.before.rolePrimary, hint: words.before.rolePrimaryHint },
          { value: 'second', label: words.before.roleSecond, hint: words.before.roleSecondHint },
        ]}
      />
      <PurposeChoice purpose={who.purpose} onChange={(purpose) => onChange({ ...who, purpose })} />
    </Dialog>
  );
}
