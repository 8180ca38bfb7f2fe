import { useState } from 'react';
import type { Observer } from '../../../model/observer.ts';
import { saveObserver } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Form } from '../../../ui/Form.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { KeyMapEditor } from './KeyMapEditor.tsx';
import { MannerEditor } from './MannerEditor.tsx';

interface Props {
  readonly observer: Observer;
  readonly onRemove: () => void;
}

/** One observer: name, keys, layout and hand, and the way off the list. */
export function ObserverRow({ observer, onRemove }: Props) {
  const { words } = useServices();
  const { study } = words;
  const [open, setOpen] = useState<'name' | 'keys' | 'manner' | null>(null);
  const { name } = observer;
  return (
    <li>
      {open === 'name' ? (
        <Rename observer={observer} onDone={() => setOpen(null)} />
      ) : (
        <>
          <strong className="grow">{name}</strong>
          <Button
            aria-label={study.keysOf({ name })}
            aria-expanded={open === 'keys'}
            onClick={() => setOpen(open === 'keys' ? null : 'keys')}
          >
            {open === 'keys' ? study.keysHide : study.keys}
          </Button>
          <Button
            aria-label={study.mannerOf({ name })}
            aria-expanded={open === 'manner'}
            onClick={() => setOpen(open === 'manner' ? null : 'manner')}
          >
            {open === 'manner' ? study.mannerHide : study.manner}
          </Button>
          <Button look="quiet" aria-label={study.renameOf({ name })} onClick={() => setOpen('name')}>
            {study.rename}
          </Button>
          <Button look="quiet" aria-label={study.removeOf({ name })} onClick={onRemove}>
            {words.common.remove}
          </Button>
          {open === 'keys' && <KeyMapEditor observer={observer} />}
          {open === 'manner' && <MannerEditor observer={observer} />}
        </>
      )}
    </li>
  );
}

function Rename({ observer, onDone }: { readonly observer: Observer; readonly onDone: () => void }) {
  const { words, deps } = useServices();
  const { run, notice } = useDoing();
  const [name, setName] = useState(observer.name);
  const save = async () => {
    const kept = await run(saveObserver(deps, observer.id, { name }));
    if (kept.ok) onDone();
  };
  return (
    <Form className="stack-tight grow" onSubmit={save}>
      <TextField
        label={words.study.observerName}
        maxLength={200}
        autoFocus
        value={name}
        onChange={(event) => setName(event.target.value)}
      />
      {notice}
      <div className="row">
        <Button type="submit">{words.common.save}</Button>
        <Button look="quiet" onClick={onDone}>
          {words.common.cancel}
        </Button>
      </div>
    </Form>
  );
}
