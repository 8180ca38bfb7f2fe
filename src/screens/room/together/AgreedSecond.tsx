import { useState } from 'react';
import { type EpochMs, epochMs } from '../../../kernel/units.ts';
import { epochOf } from '../../../kernel/wallTime.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { useCoreServices } from '../../coreServices.ts';
import { secondOfDay, tooNearMs, typedSecond } from './agreedSecond.ts';

interface Props {
  /** This tablet's wall time, as nudged. */
  readonly now: string;
  readonly at: EpochMs;
  readonly onChange: (at: EpochMs) => void;
}

/** The second at which both begin: by steps, or typed. */
export function AgreedSecond({ now, at, onChange }: Props) {
  const { room } = useCoreServices().words;
  /** What is being typed; null while the field shows the second that stands. */
  const [typed, setTyped] = useState<string | null>(null);
  const left = at - epochOf(now);
  const none = typed !== null && typedSecond(typed, now) === null;
  const step = (ms: number): void => {
    setTyped(null);
    onChange(epochMs(at + ms));
  };
  return (
    <div className="stack-tight">
      <div className="together-second">
        <Button onClick={() => step(-10_000)}>{room.secondEarlier}</Button>
        <TextField
          label={room.agreedSecond}
          hint={room.agreedSecondHint}
          inputMode="numeric"
          value={typed ?? secondOfDay(at, now)}
          problem={none ? room.agreedNotATime : null}
          onChange={(event) => {
            const text = event.target.value;
            setTyped(text);
            const meant = typedSecond(text, now);
            if (meant !== null) onChange(meant);
          }}
          onBlur={() => setTyped(null)}
        />
        <Button onClick={() => step(10_000)}>{room.secondLater}</Button>
      </div>
      <p className="second">
        {left < tooNearMs ? room.secondGone : room.secondIn({ time: now.slice(11, 19), ms: left })}
      </p>
    </div>
  );
}
