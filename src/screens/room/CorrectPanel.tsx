import { useMemo, useState } from 'react';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { CorrectLook } from './CorrectLook.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { StretchOfNoUse } from './StretchOfNoUse.tsx';
import { SwapChildren } from './SwapChildren.tsx';
import { useRoom } from './useRoom.ts';
import './corrections.css';

interface Props {
  readonly onClose: () => void;
}

/** What was wrong after the fact: one look, two children taken for each other, or a stretch that is of no use. */
export function CorrectPanel({ onClose }: Props) {
  const { room, common } = useCoreWords();
  const { unit, plan } = useFacts();
  const [what, setWhat] = useState<'look' | 'swap' | 'stretch' | null>(null);
  const looked = useRoom((s) => s.intervals.some(({ status }) => status !== 'waiting'));
  const inTurn = useMemo(() => new Set(plan.intervals.map(({ child }) => child)).size > 1, [plan]);
  if (what === 'look') return <CorrectLook onClose={onClose} />;
  if (what === 'swap') return <SwapChildren onClose={onClose} />;
  if (what === 'stretch') return <StretchOfNoUse onClose={onClose} />;
  return (
    <Panel title={room.correctWhat} closeLabel={common.cancel} onClose={onClose}>
      {looked ? (
        <div className="panel-choices">
          {unit !== 'time' && (
            <Button onClick={() => setWhat('look')}>
              {unit === 'scan' ? room.correctScan : room.correctLook}
            </Button>
          )}
          {unit === 'look' && inTurn && <Button onClick={() => setWhat('swap')}>{room.correctSwap}</Button>}
          <Button onClick={() => setWhat('stretch')}>{room.correctStretch}</Button>
        </div>
      ) : (
        <p>{room.correctNothing}</p>
      )}
      {unit === 'time' && <p className="second correct-why">{room.correctNotTime}</p>}
    </Panel>
  );
}
