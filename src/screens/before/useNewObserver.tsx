import { type ReactNode, useState } from 'react';
import type { Observer } from '../../model/observer.ts';
import { addObserver } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/Field.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

interface NewObserver {
  /** Where the name is typed, and the button that adds it. */
  readonly field: ReactNode;
  /** Adds whom the field names, if it names anybody; false where that cannot be, which the field then says. */
  readonly take: () => Promise<boolean>;
}

/** Somebody who is not on the study's list of observers yet, added where an observer is asked for. */
export function useNewObserver(study: string, onAdded: (observer: Observer) => void): NewObserver {
  const { words, deps } = useServices();
  const [name, setName] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const add = async (): Promise<boolean> => {
    // Out of the field at once, so that a quick "Done" after "Add" does not add it twice.
    setName('');
    const added = await addObserver(deps, study, name.trim());
    setProblem(added.ok ? null : say(words.problems, added.problem));
    if (added.ok) onAdded(added.value);
    else setName(name);
    return added.ok;
  };
  return {
    field: (
      <div className="row">
        <div className="grow">
          <TextField
            label={words.before.addObserver}
            hint={words.before.addObserverHint}
            maxLength={200}
            value={name}
            problem={problem}
            onChange={(event) => setName(event.target.value)}
            onKeyDown={(event) => {
              if (event.key !== 'Enter') return;
              event.preventDefault();
              void add();
            }}
          />
        </div>
        <Button onClick={add}>{words.common.add}</Button>
      </div>
    ),
    take: async () => name.trim() === '' || (await add()),
  };
}
