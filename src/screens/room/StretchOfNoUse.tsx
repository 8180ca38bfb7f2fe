import { useState } from 'react';
import type { MissingReason } from '../../model/missing.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/Field.tsx';
import { Ring } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import { LookList } from './LookList.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

/** Why a stretch may be of no use: what happens to the class or the observer, not to a single child. */
const reasons: readonly MissingReason[] = ['class interrupted', 'missed', 'out of view', 'other'];
const lastMinutes = [1, 2, 5];

interface Stretch {
  /** What was touched: so many minutes, or since a look of that number. */
  readonly name: string;
  readonly from: number;
  readonly to: number;
}

interface Props {
  readonly onClose: () => void;
}

/** A stretch up to now that is of no use: since when, why, and what it takes. It stands still once it is chosen. */
export function StretchOfNoUse({ onClose }: Props) {
  const live = useLive();
  const { room, missing } = useCoreWords();
  const { unit } = useFacts();
  const looks = useRoom((s) => s.lastRound);
  const [stretch, setStretch] = useState<Stretch | null>(null);
  const [choosing, setChoosing] = useState(false);
  const [reason, setReason] = useState<MissingReason | null>(null);
  const [words, setWords] = useState('');
  const choose = (name: string, since: (now: number) => number): void => {
    const { now } = live.snapshot();
    setStretch({ name, from: Math.max(0, Math.round(since(now))), to: Math.floor(now) + 1 });
    setChoosing(false);
  };
  const takeOut = (): void => {
    if (stretch === null || reason === null) return;
    const said = words.trim();
    live.unusable({ from: stretch.from, to: stretch.to }, reason, said === '' ? undefined : said);
    onClose();
  };
  if (choosing)
    return (
      <Panel key="since" title={room.stretchSinceWhich} onClose={() => setChoosing(false)}>
        <LookList looks={looks} onChoose={({ number, cueAt }) => choose(`look ${number}`, () => cueAt)} />
      </Panel>
    );
  return (
    <Panel
      key="stretch"
      title={room.stretchTitle}
      onClose={onClose}
      actions={
        <Button look="main" disabled={stretch === null || reason === null} onClick={takeOut}>
          {room.stretchDo}
        </Button>
      }
    >
      <div className="stack-tight">
        <div className="panel-choices">
          {lastMinutes.map((minutes) => (
            <Button
              key={minutes}
              aria-pressed={stretch?.name === `${minutes}`}
              onClick={() => choose(`${minutes}`, (now) => now - minutes * 60_000)}
            >
              {room.stretchLast({ minutes })}
            </Button>
          ))}
          {unit !== 'time' && looks.length > 0 && (
            <Button
              aria-pressed={stretch?.name.startsWith('look') ?? false}
              onClick={() => setChoosing(true)}
            >
              {unit === 'scan' ? room.stretchSinceScan : room.stretchSince}
            </Button>
          )}
        </div>
        <h3>{room.stretchWhy}</h3>
        <div className="panel-choices">
          {reasons.map((one) => (
            <Button key={one} aria-pressed={reason === one} onClick={() => setReason(one)}>
              <Ring size={18} />
              {missing[one]}
            </Button>
          ))}
        </div>
        <TextField
          label={room.stretchWords}
          maxLength={500}
          value={words}
          onChange={(event) => setWords(event.target.value)}
        />
        <p className="will-be">{stretch !== null && <Takes stretch={stretch} />}</p>
      </div>
    </Panel>
  );
}

/** What would be missing. */
function Takes({ stretch: { from, to } }: { readonly stretch: Stretch }) {
  const { room } = useCoreWords();
  const { unit } = useFacts();
  const { n, marked } = useRoom((s) => {
    const inside = s.intervals.filter(
      ({ status, cueAt }) => status !== 'waiting' && cueAt >= from && cueAt < to,
    );
    return { n: inside.length, marked: inside.filter(({ status }) => status === 'scored').length };
  });
  if (unit === 'time') return room.stretchTakesTime({ from, to: to - 1 });
  return room.stretchTakes({ n, marked, scans: unit === 'scan', from, to: to - 1 });
}
