import { useState } from 'react';
import type { ImportOptions, ImportPreview } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Check, Choice } from '../../ui/Choice.tsx';
import { useWords } from '../services.ts';
import { FileLine } from './FileLine.tsx';
import { LabelRoles } from './LabelRoles.tsx';

interface Props {
  readonly preview: ImportPreview;
  readonly study: string | null;
  readonly onTake: (revive: readonly string[]) => void;
  readonly onRead: (options: ImportOptions) => void;
  readonly onLeave: () => void;
}

/** What chosen files would bring, and what has to be said before they can be taken in. */
export function ImportChoice({ preview, study, onTake, onRead, onLeave }: Props) {
  const words = useWords();
  const [revive, setRevive] = useState<readonly string[]>([]);
  const [home, setHome] = useState<'here' | 'own'>(study === null ? 'own' : 'here');
  const [roles, setRoles] = useState<Pick<ImportOptions, 'on' | 'off' | 'other'>>({});
  const takeable = preview.files.filter((file) => file.problems.length === 0).length;
  const removed = preview.files.flatMap((file) => file.studies.filter((one) => one.removedHere));
  const labels = [...new Set(preview.files.flatMap((file) => file.askRoles))];
  const tables = preview.files.some((file) => file.form === 'table' || file.askRoles.length > 0);
  const options = (next: 'here' | 'own', told: typeof roles): ImportOptions => ({
    ...told,
    ...(next === 'here' && study !== null && { study }),
  });
  return (
    <section className="stack-tight" aria-label={words.files.previewTitle}>
      <h3>{words.files.previewTitle}</h3>
      <ul className="file-lines">
        {preview.files.map((file, k) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: two files may have one name
          <FileLine key={k} file={file} />
        ))}
      </ul>
      {labels.length > 0 && (
        <LabelRoles
          labels={labels}
          onTold={(told) => {
            setRoles(told);
            onRead(options(home, told));
          }}
        />
      )}
      {tables && study !== null && (
        <Choice
          legend={words.files.intoStudy}
          value={home}
          options={[
            { value: 'here', label: words.files.thisStudy },
            { value: 'own', label: words.files.newStudy },
          ]}
          onChange={(next) => {
            setHome(next);
            onRead(options(next, roles));
          }}
        />
      )}
      {removed.map((one) => (
        <Check
          key={one.id}
          label={words.files.revive({ name: one.name })}
          checked={revive.includes(one.id)}
          onChange={(yes) =>
            setRevive((before) => (yes ? [...before, one.id] : before.filter((id) => id !== one.id)))
          }
        />
      ))}
      <div className="row">
        {takeable > 0 && (
          <Button look="main" onClick={() => onTake(revive)}>
            {words.files.take({ count: takeable })}
          </Button>
        )}
        <Button look="quiet" onClick={onLeave}>
          {words.files.leave}
        </Button>
      </div>
    </section>
  );
}
