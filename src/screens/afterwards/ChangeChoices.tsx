import { useLocation } from 'wouter';
import { SelectField } from '../../ui/Field.tsx';
import { useWords } from '../services.ts';

export interface Chosen {
  /** Empty: as the data say. */
  readonly before: string;
  readonly after: string;
  readonly control: string;
}

interface Props {
  readonly chosen: Chosen;
  readonly onChosen: (chosen: Chosen) => void;
  readonly phases: readonly string[];
  readonly conditions: readonly string[];
  readonly classes: readonly string[];
  readonly klass: string | null;
}

/** Which phases, which class, and what the others are compared with. */
export function ChangeChoices({ chosen, onChosen, phases, conditions, classes, klass }: Props) {
  const words = useWords();
  const [, go] = useLocation();
  return (
    <div className="columns">
      <SelectField
        label={words.change.klass}
        value={klass ?? ''}
        onChange={(event) => {
          const next = event.target.value;
          go(next === '' ? '/afterwards/change' : `/afterwards/change/${encodeURIComponent(next)}`);
        }}
      >
        <option value="">{words.change.allClasses}</option>
        {classes.map((name) => (
          <option key={name} value={name}>
            {name}
          </option>
        ))}
      </SelectField>
      {(['before', 'after'] as const).map((side) => (
        <SelectField
          key={side}
          label={words.change[side]}
          value={chosen[side]}
          onChange={(event) => onChosen({ ...chosen, [side]: event.target.value })}
        >
          <option value="">{words.change.asRecorded}</option>
          {phases.map((phase) => (
            <option key={phase} value={phase}>
              {phase}
            </option>
          ))}
        </SelectField>
      ))}
      {conditions.length > 1 && klass === null && (
        <SelectField
          label={words.change.control}
          value={chosen.control}
          onChange={(event) => onChosen({ ...chosen, control: event.target.value })}
        >
          <option value="">{words.change.controlNone}</option>
          {conditions.map((condition) => (
            <option key={condition} value={condition}>
              {condition}
            </option>
          ))}
        </SelectField>
      )}
    </div>
  );
}
