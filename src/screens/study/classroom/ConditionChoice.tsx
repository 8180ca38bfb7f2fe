import type { Study } from '../../../model/study.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';

interface Props {
  readonly study: Study;
  readonly value: string | null;
  readonly onChange: (condition: string | null) => void;
}

/** One of the study's conditions, or none. */
export function ConditionChoice({ study: { conditions }, value, onChange }: Props) {
  const { study } = useWords();
  if (conditions.length === 0 && value === null) return null;
  // A condition's own word could be the word for none, so they are told apart by a letter in front.
  const known = value === null || conditions.includes(value) ? conditions : [...conditions, value];
  return (
    <Choice
      legend={study.classCondition}
      value={value === null ? 'none' : `c${value}`}
      onChange={(next) => onChange(next === 'none' ? null : next.slice(1))}
      options={[
        ...known.map((one) => ({ value: `c${one}`, label: one })),
        { value: 'none', label: study.noCondition },
      ]}
    />
  );
}
