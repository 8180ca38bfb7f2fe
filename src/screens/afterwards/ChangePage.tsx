import { useState } from 'react';
import type { Problem } from '../../kernel/result.ts';
import { isForTheRecord } from '../../model/forTheRecord.ts';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import type { Question } from '../../worker/questions.ts';
import { useServices } from '../services.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { AllChange } from './AllChange.tsx';
import { ChangeChoices, type Chosen } from './ChangeChoices.tsx';
import { ClassChangeView } from './ClassChangeView.tsx';
import { HeldBackNote } from './HeldBack.tsx';
import { PageFoot } from './PageFoot.tsx';
import { useFigures } from './useFigures.ts';
import { useListed } from './useListed.ts';
import { useStamp } from './useStamp.ts';
import { Working } from './Working.tsx';

/** Change from one phase to another: all classes, or the one that the address names. */
export function ChangePage({ klass }: { readonly klass: string | null }) {
  const { words } = useServices();
  const study = useCurrentStudy();
  const stamp = useStamp(study?.id);
  const [chosen, setChosen] = useState<Chosen>({ before: '', after: '', control: '' });
  const listed = useListed(study?.id);
  const sessions = (listed?.sessions ?? []).filter(
    (one) => isForTheRecord(one) && listed?.held.has(one.id) !== true,
  );
  const inData = [...new Set(sessions.flatMap(({ phases }) => phases.flatMap((phase) => phase ?? [])))];
  const phases = [...new Set([...(study?.phases ?? []), ...inData])].filter((phase) =>
    inData.includes(phase),
  );
  const classes = [...new Set(sessions.map(({ classroom }) => classroom.name))].sort();
  const conditions = [...new Set(sessions.flatMap(({ condition }) => condition ?? []))];
  const figures = useFigures(questionOf(study?.id ?? '', chosen), study ? stamp : undefined);
  if (study === null) return <PageHead>{words.afterwards.noStudy}</PageHead>;
  if (study === undefined || listed === undefined) return <p className="second">{words.common.loading}</p>;
  const instead = (problem: Problem) => (
    <Undecided problem={problem} phases={phases.length} sessions={sessions.length} />
  );
  return (
    <div className="stack">
      <Working figures={figures} otherwise={instead}>
        {(details) => {
          const own = klass === null ? undefined : details.classes.filter(({ row }) => row.class === klass);
          return own === undefined || own.length === 0 ? (
            <AllChange details={details} />
          ) : (
            <ClassChangeView details={details} own={own} />
          );
        }}
      </Working>
      <HeldBackNote listed={listed} />
      {phases.length > 1 && (
        <Sheet title={words.change.choices} className="not-in-print">
          <ChangeChoices
            chosen={chosen}
            onChosen={setChosen}
            phases={phases}
            conditions={conditions}
            classes={classes}
            klass={klass}
          />
        </Sheet>
      )}
      <p className="small">{words.change.caution}</p>
      <PageFoot />
    </div>
  );
}

const questionOf = (study: string, { before, after, control }: Chosen): Question<'change'> => ({
  kind: 'change',
  study,
  ...(before !== '' && { before }),
  ...(after !== '' && { after }),
  ...(control !== '' && { control }),
});

/** Which two phases are meant is not known, or there are not two: that is no fault, only a question. */
function Undecided({
  problem,
  phases,
  sessions,
}: {
  readonly problem: Problem;
  readonly phases: number;
  readonly sessions: number;
}) {
  const { words } = useServices();
  switch (problem.code) {
    case 'phasesToChoose':
    case 'phaseNotFound':
      return <PageHead note={words.change.undefinedText}>{words.change.phasesToChoose}</PageHead>;
    case 'tooFewPhases':
      return (
        <PageHead note={words.change.undefinedText}>
          {sessions === 0 || phases === 0 ? words.change.noVisits : words.change.tooFewPhases}
        </PageHead>
      );
    default:
      return <Notice kind="hold">{say(words.problems, problem)}</Notice>;
  }
}
