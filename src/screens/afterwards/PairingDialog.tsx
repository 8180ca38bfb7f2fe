import { useState } from 'react';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { useWords } from '../services.ts';
import type { VisitGroup } from './visitGroups.ts';

interface Props {
  readonly observer: string;
  readonly visit: VisitGroup;
  readonly others: readonly VisitGroup[];
  /** null lets the record find its visit by itself again. */
  readonly onChoose: (visit: string | null) => void;
  readonly onClose: () => void;
}

const itself = '(itself)';

/** A hand says which visit a record belongs to. */
export function PairingDialog({ observer, visit, others, onChoose, onClose }: Props) {
  const words = useWords();
  const [chosen, setChosen] = useState<string | null>(null);
  const options = [
    { value: itself, label: words.afterwards.pairingSelf },
    ...others.map((other) => ({
      value: other.pairAs,
      label: words.afterwards.pairingWith({
        day: other.date,
        time: other.sessions[0]?.summary.firstWall ?? null,
        observers: other.sessions.map(({ summary }) => summary.observer.name),
      }),
    })),
  ];
  return (
    <Dialog
      title={words.afterwards.pairingTitle({ observer, klass: visit.klass })}
      onClose={onClose}
      actions={
        <>
          <Button look="quiet" onClick={onClose}>
            {words.common.cancel}
          </Button>
          <Button
            look="main"
            disabled={chosen === null}
            onClick={() => onChoose(chosen === itself ? null : chosen)}
          >
            {words.common.save}
          </Button>
        </>
      }
    >
      <p className="second">{words.afterwards.pairingText}</p>
      {others.length === 0 && <p>{words.afterwards.pairingNone}</p>}
      <Choice
        legend={words.afterwards.pairing}
        legendHidden
        options={options}
        value={chosen}
        onChange={setChosen}
      />
    </Dialog>
  );
}
