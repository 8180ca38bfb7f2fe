import { useState } from 'react';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { Button } from '../../ui/Button.tsx';
import { headsUpWords } from '../plan/headsUpWords.ts';
import { useServices } from '../services.ts';

/** What will come ahead of each look on this tablet, a voice or tones; nothing where the protocol wants neither. */
export function HeadsUpCheck({ visit }: { readonly visit: VisitPlan }) {
  const { words, device } = useServices();
  const { before } = words;
  const [tried, setTried] = useState<'not yet' | 'voice' | 'tones' | 'nothing'>('not yet');
  const { cues } = visit.schedule.protocol;
  const child = visit.children[0]?.id;
  if (cues.headsUp === undefined || child === undefined) return null;
  const { says } = cues.headsUp;
  const seat = visit.plan?.seats.find((one) => one.child === child)?.id ?? null;
  const example = headsUpWords(says, visit, words)({ child, seat }) ?? '';
  const voice = tried === 'voice' || device.hasVoice();
  return (
    <div className="stack-tight">
      <p>
        {voice ? before.headsUpVoice({ example }) : before.headsUpNoVoice}
        {voice && says === 'seat' && seat !== null && ` ${before.headsUpRows}`}
        {tried === 'nothing' && ` ${before.headsUpStuck}`}
      </p>
      <div className="row">
        <Button onClick={async () => setTried(await device.tryHeadsUp(example, cues))}>
          {before.headsUpTry({ voice })}
        </Button>
      </div>
    </div>
  );
}
