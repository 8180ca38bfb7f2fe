import { type ReactNode, useState } from 'react';
import type { CueSettings } from '../../model/protocol.ts';
import { Button } from '../../ui/Button.tsx';
import { useServices } from '../services.ts';
import { CheckRow } from './CheckRow.tsx';

/** What the observer said of the test tone. */
export type Heard = 'not asked' | 'playing' | 'stuck' | 'ear' | 'nothing' | 'loud';

interface Props {
  readonly cues: CueSettings;
  readonly heard: Heard;
  readonly onHeard: (heard: Heard) => void;
  /** What is said of the words ahead of a look. */
  readonly headsUp?: ReactNode;
}

/** Only the observer's ear can tell whether the sound comes out where it should. */
export function SoundCheck({ cues, heard, onHeard, headsUp }: Props) {
  const { words, device } = useServices();
  const [output, setOutput] = useState('');
  const [lateMs, setLateMs] = useState<number | null>(null);
  const play = async () => {
    const tone = await device.playTestTone(cues);
    setOutput(tone.output ?? '');
    setLateMs(tone.latencyMs);
    onHeard(tone.played ? 'playing' : 'stuck');
  };
  const text = {
    'not asked': words.before.soundAsk,
    playing: words.before.soundPlayed,
    stuck: words.before.soundStuck,
    ear: words.before.soundHeard({ output }),
    nothing: words.before.soundNotHeard,
    loud: words.before.soundLoud,
  }[heard];
  return (
    <CheckRow
      name={words.before.sound}
      state={heard === 'ear' ? 'ready' : 'hold'}
      actions={
        heard === 'playing' ? (
          <>
            <Button onClick={() => onHeard('ear')}>{words.before.soundYes}</Button>
            <Button onClick={() => onHeard('loud')}>{words.before.soundAll}</Button>
            <Button onClick={() => onHeard('nothing')}>{words.before.soundNo}</Button>
          </>
        ) : (
          <Button onClick={play}>
            {heard === 'not asked' ? words.before.soundPlay : words.before.soundAgain}
          </Button>
        )
      }
    >
      <p>{text}</p>
      {lateMs !== null && lateMs >= 80 && <p className="small">{words.before.soundLate({ ms: lateMs })}</p>}
      {headsUp}
      {!device.tellsOutputChanges && <p className="small">{words.before.soundBlind}</p>}
    </CheckRow>
  );
}
