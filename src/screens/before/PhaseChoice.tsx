import { Choice } from '../../ui/Choice.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly phases: readonly string[];
  /** `all`, one of them, or null where nobody has said yet. */
  readonly value: string | null;
  readonly onChange: (value: string) => void;
}

/** Which phases of the study a lesson has: all in one sitting, or one of them. */
export function PhaseChoice({ phases, value, onChange }: Props) {
  const { before } = useWords();
  const all = { value: 'all', label: before.phasesAll({ phases }), hint: before.phasesAllHint };
  return (
    <Choice
      legend={before.phases}
      value={value}
      onChange={onChange}
      options={[
        ...(phases.length > 1 ? [all] : []),
        ...phases.map((phase) => ({
          value: phases.length === 1 ? 'all' : phase,
          label: before.phasesOne({ phase }),
        })),
      ]}
    />
  );
}
