import { useMemo, useState } from 'react';
import { useLocation } from 'wouter';
import { layOutSchedule } from '../../schedule/layOut.ts';
import { sheetLabel } from '../../schedule/sheetLabel.ts';
import { hasStandIns, keepPaperSession, type PaperDraft, savePaper } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { methodSentence } from '../study/methodSentence.ts';
import { HeadFields } from './HeadFields.tsx';
import { Lines } from './Lines.tsx';
import { Onsets } from './Onsets.tsx';
import { StandIns } from './StandIns.tsx';
import { useTyping } from './useTyping.ts';

interface Props {
  readonly first: PaperDraft;
  /** The sheet was put away as it stood. */
  readonly onAway: (draft: PaperDraft) => void;
}

/** One sheet, typed in: its head, its lines, and the session that it becomes. */
export function TypeIn({ first, onAway }: Props) {
  const { words, deps } = useServices();
  const { paper } = words;
  const [, go] = useLocation();
  const typing = useTyping(first);
  const [problem, setProblem] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const { draft } = typing;
  const { plan } = draft;
  const { protocol } = plan.schedule;
  const intervals = useMemo(
    () =>
      layOutSchedule(
        plan.schedule,
        plan.children.map(({ id }) => id),
      ),
    [plan],
  );
  const duration = protocol.method === 'duration';
  const done = Object.keys(draft.answers).length;
  const keep = async () => {
    setBusy(true);
    await typing.settled();
    const kept = await keepPaperSession(deps, draft);
    setBusy(false);
    if (!kept.ok) return setProblem(say(words.problems, kept.problem));
    go(`/afterwards/session/${kept.value.id}`);
  };
  const putAway = async () => {
    await typing.settled();
    const away = await savePaper(deps, null);
    if (away.ok) onAway(draft);
    else setProblem(say(words.problems, away.problem));
  };
  return (
    <div className="stack">
      <PageHead
        about={paper.typeAbout({
          klass: plan.classroom.name,
          protocol: paper.protocolLine({
            name: protocol.name,
            version: protocol.version,
            method: methodSentence(words, protocol),
          }),
        })}
      >
        {paper.typeTitle({ label: sheetLabel(plan) })}
      </PageHead>
      <Sheet title={paper.headTitle}>
        <HeadFields typing={typing} last={intervals.length} />
      </Sheet>
      {hasStandIns(plan) && (
        <Sheet title={paper.standInTitle}>
          <StandIns typing={typing} intervals={intervals} />
        </Sheet>
      )}
      <Sheet title={paper.linesTitle}>
        {duration ? (
          <Onsets typing={typing} intervals={intervals} />
        ) : (
          <Lines typing={typing} intervals={intervals} />
        )}
      </Sheet>
      {typeof typing.kept === 'object' && <Notice kind="hold">{say(words.problems, typing.kept)}</Notice>}
      <Sheet title={paper.finishTitle}>
        <div className="stack-tight">
          <p>{duration ? paper.finishOnsets : paper.finishText({ empty: intervals.length - done })}</p>
          {problem !== null && <Notice kind="hold">{problem}</Notice>}
          <div className="row">
            <Button look="main" disabled={busy} onClick={keep}>
              {paper.keep}
            </Button>
            <Button look="quiet" disabled={busy} onClick={putAway}>
              {paper.putAway}
            </Button>
          </div>
        </div>
      </Sheet>
    </div>
  );
}
