import type { CueSettings } from '../../../model/protocol.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check, Choice } from '../../../ui/Choice.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { HeadsUpFields } from './HeadsUpFields.tsx';

interface Props {
  readonly cues: CueSettings;
  /** A heads-up comes after the look before; null where there is nobody to tell apart. */
  readonly headsUpWithinMs: number | null;
  readonly onChange: (cues: CueSettings) => void;
}

/** How prompts reach the observer and nobody else. */
export function CuesSheet({ cues, headsUpWithinMs, onChange }: Props) {
  const { words, device } = useServices();
  const { study, f } = words;
  const { hold, forget, notice } = useDoing();
  const play = async () => {
    const { played } = await device.playTestTone(cues);
    if (played) forget();
    else hold(study.cueSilent);
  };
  return (
    <Sheet title={study.cues}>
      <div className="stack">
        <Choice
          legend={study.channel}
          value={cues.channel}
          onChange={(channel) => onChange({ ...cues, channel })}
          options={[
            { value: 'both', label: study.channelBoth },
            { value: 'left', label: study.channelLeft },
            { value: 'right', label: study.channelRight },
          ]}
        />
        <TextField
          label={`${study.volume} ${f.percent(cues.volume * 100)}`}
          hint={study.volumeHint}
          type="range"
          min={0}
          max={1}
          step={0.05}
          value={cues.volume}
          onChange={(event) => onChange({ ...cues, volume: Number(event.target.value) })}
        />
        <div className="choice-options">
          <Check
            label={study.flash}
            checked={cues.flash}
            onChange={(flash) => onChange({ ...cues, flash })}
          />
          <Check
            label={study.vibration}
            {...(device.vibrates ? {} : { hint: study.noVibration })}
            checked={cues.vibration}
            onChange={(vibration) => onChange({ ...cues, vibration })}
          />
        </div>
        {headsUpWithinMs !== null && (
          <HeadsUpFields cues={cues} withinMs={headsUpWithinMs} onChange={onChange} />
        )}
        {notice}
        <div className="row">
          <Button onClick={play}>{study.playCue}</Button>
        </div>
      </div>
    </Sheet>
  );
}
