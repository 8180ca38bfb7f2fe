import type { CueSettings } from '../../../model/protocol.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';

interface Props {
  readonly cues: CueSettings;
  /** The interval: the words have to come after the look before. */
  readonly withinMs: number;
  readonly onChange: (cues: CueSettings) => void;
}

const usualAheadMs = 3000;

/** Whether, what and how far ahead the earpiece says whose look comes. */
export function HeadsUpFields({ cues, withinMs, onChange }: Props) {
  const { study } = useWords();
  const { headsUp, ...quiet } = cues;
  const most = Math.max(1, Math.min(10, Math.ceil(withinMs / 1000) - 1));
  return (
    <>
      <Choice<'off' | 'child' | 'seat'>
        legend={study.headsUp}
        value={headsUp?.says ?? 'off'}
        onChange={(says) =>
          onChange(
            says === 'off'
              ? quiet
              : {
                  ...quiet,
                  headsUp: { says, aheadMs: headsUp?.aheadMs ?? Math.min(usualAheadMs, most * 1000) },
                },
          )
        }
        options={[
          { value: 'off', label: study.headsUpOff },
          { value: 'child', label: study.headsUpChild },
          { value: 'seat', label: study.headsUpSeat },
        ]}
      />
      <p className="second small recipe-note">{study.headsUpHint}</p>
      {headsUp !== undefined && (
        <NumberField
          label={study.headsUpAhead}
          hint={study.headsUpAheadHint}
          min={1}
          max={most}
          value={headsUp.aheadMs / 1000}
          onValue={(seconds) => onChange({ ...quiet, headsUp: { ...headsUp, aheadMs: seconds * 1000 } })}
        />
      )}
    </>
  );
}
