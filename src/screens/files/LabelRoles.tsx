import { useState } from 'react';
import type { ImportOptions } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { useWords } from '../services.ts';

type Role = 'on' | 'off' | 'other';

interface Props {
  readonly labels: readonly string[];
  readonly onTold: (told: Required<Pick<ImportOptions, Role>>) => void;
}

/** A table's codes that do not say whether they are on-task: somebody has to. */
export function LabelRoles({ labels, onTold }: Props) {
  const words = useWords();
  const [roles, setRoles] = useState<Readonly<Record<string, Role>>>({});
  const of = (role: Role): string[] => labels.filter((label) => roles[label] === role);
  const all = labels.every((label) => roles[label] !== undefined);
  return (
    <div className="stack-tight">
      <h3>{words.files.rolesTitle}</h3>
      <p className="second">{words.files.rolesText}</p>
      {labels.map((label) => (
        <Choice
          key={label}
          legend={label}
          value={roles[label] ?? null}
          options={[
            { value: 'on', label: words.files.on },
            { value: 'off', label: words.files.off },
            { value: 'other', label: words.files.neither },
          ]}
          onChange={(role) => setRoles((before) => ({ ...before, [label]: role }))}
        />
      ))}
      <div>
        <Button
          look="main"
          disabled={!all}
          onClick={() => onTold({ on: of('on'), off: of('off'), other: of('other') })}
        >
          {words.files.rolesDone}
        </Button>
      </div>
    </div>
  );
}
