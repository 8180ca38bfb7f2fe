import { lazy, Suspense, useEffect, useState } from 'react';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { type ExportedFile, exportVisit } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { HeldButton } from '../../ui/HeldButton.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { CheckRow } from './CheckRow.tsx';

const ShowCard = lazy(() => import('./card/ShowCard.tsx').then((m) => ({ default: m.ShowCard })));

/** The frozen schedule goes to the second tablet as a file, or as pictures that its camera reads. The bytes are ready before the tap: share sheets ask for that. */
export function HandVisit({ plan }: { readonly plan: VisitPlan }) {
  const { words, deps, device } = useServices();
  const [file, setFile] = useState<ExportedFile | null>(null);
  const [showing, show] = useState(false);
  const [said, setSaid] = useState<string | null>(null);
  useEffect(() => {
    let here = true;
    void exportVisit(deps, plan).then((made) => {
      if (!here) return;
      if (made.ok) setFile(made.value);
      else setSaid(say(words.problems, made.problem));
    });
    return () => {
      here = false;
    };
  }, [deps, plan, words]);
  const hand = async () => {
    if (file === null) return;
    const how = await device.handOver(file);
    if (how === 'again') setSaid(words.before.handAgain);
    else if (how !== 'cancelled') setSaid(words.before.handed);
  };
  return (
    <CheckRow
      name={words.before.secondTablet}
      state={said === words.before.handed || said === words.pairing.shown ? 'ready' : 'hold'}
      actions={
        <>
          <Button onClick={() => show(true)}>{words.pairing.show}</Button>
          <HeldButton why={file === null ? words.before.handMaking : null} onClick={hand}>
            {words.before.handVisit}
          </HeldButton>
        </>
      }
    >
      {said ?? words.before.secondTabletText}
      {showing && (
        <Suspense fallback={null}>
          <ShowCard
            plan={plan}
            onClose={() => {
              show(false);
              setSaid(words.pairing.shown);
            }}
          />
        </Suspense>
      )}
    </CheckRow>
  );
}
