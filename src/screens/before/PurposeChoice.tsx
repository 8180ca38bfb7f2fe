import { Choice } from '../../ui/Choice.tsx';
import { useWords } from '../services.ts';

/** What a session is held for. */
export type Purpose = 'record' | 'practice' | 'familiarisation';

interface Props {
  readonly purpose: Purpose;
  readonly onChange: (purpose: Purpose) => void;
}

/** Whether a session counts; asked before the door, and of a sheet that is typed in. */
export function PurposeChoice({ purpose, onChange }: Props) {
  const { before } = useWords();
  return (
    <Choice
      legend={before.purpose}
      value={purpose}
      onChange={onChange}
      options={[
        { value: 'record', label: before.purposeRecord, hint: before.purposeRecordHint },
        { value: 'practice', label: before.purposePractice, hint: before.practiceHint },
        {
          value: 'familiarisation',
          label: before.purposeFamiliarisation,
          hint: before.purposeFamiliarisationHint,
        },
      ]}
    />
  );
}
