import { useState } from 'react';
import { sheetLabel } from '../../schedule/sheetLabel.ts';
import { type PaperDraft, savePaper } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { useSettings } from '../useCurrentStudy.ts';
import { ChooseSheet } from './ChooseSheet.tsx';
import { TypeIn } from './TypeIn.tsx';
import './typing.css';

/** A written sheet comes back: first which one, then line by line. What was begun is there again after a reload. */
export function TypePage() {
  const { words, deps } = useServices();
  const settings = useSettings();
  const [away, setAway] = useState<PaperDraft | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  if (settings === undefined) return <p className="second">{words.common.loading}</p>;
  const { paper } = settings;
  if (paper !== null) return <TypeIn key={paper.session} first={paper} onAway={setAway} />;
  const undo = async () => {
    const back = await savePaper(deps, away);
    setProblem(back.ok ? null : say(words.problems, back.problem));
  };
  return (
    <div className="stack">
      {away !== null && (
        <Notice kind="done" actions={<Button onClick={undo}>{words.common.undo}</Button>}>
          {words.paper.putAwayDone({ label: sheetLabel(away.plan) })}
        </Notice>
      )}
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <ChooseSheet settings={settings} />
    </div>
  );
}
