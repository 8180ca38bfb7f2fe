import type { Study } from '../../../model/study.ts';
import type { ClassWish } from '../../../tasks/index.ts';
import { TextField } from '../../../ui/Field.tsx';
import { useWords } from '../../services.ts';
import { ConditionChoice } from './ConditionChoice.tsx';

interface Props {
  readonly study: Study;
  readonly value: ClassWish;
  readonly onChange: (value: ClassWish) => void;
}

/** What is asked of a class: its name and its condition. */
export function ClassFields({ study, value, onChange }: Props) {
  const words = useWords();
  return (
    <>
      <TextField
        label={words.study.className}
        maxLength={200}
        value={value.name}
        onChange={(event) => onChange({ ...value, name: event.target.value })}
      />
      <ConditionChoice
        study={study}
        value={value.condition}
        onChange={(condition) => onChange({ ...value, condition })}
      />
    </>
  );
}
