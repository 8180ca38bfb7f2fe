import { useState } from 'react';
import type { PairDetails } from '../../analysis/index.ts';
import type { Study } from '../../model/study.ts';
import { Check, Choice } from '../../ui/Choice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { Table } from '../../ui/Table.tsx';
import type { AgreementAnswer } from '../../worker/questions.ts';
import { useServices } from '../services.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { HeldBackNote } from './HeldBack.tsx';
import { PageFoot } from './PageFoot.tsx';
import { useFigures } from './useFigures.ts';
import { useListed } from './useListed.ts';
import { useStamp } from './useStamp.ts';
import { WarningLines } from './WarningLines.tsx';
import { Working } from './Working.tsx';

/** All pairs of the study, against its own criterion, and how much was double-coded in each phase. */
export function AgreementPage() {
  const { words } = useServices();
  const study = useCurrentStudy();
  const stamp = useStamp(study?.id);
  const [practice, setPractice] = useState(false);
  const [familiarisation, setFamiliarisation] = useState(false);
  const listed = useListed(study?.id);
  const figures = useFigures(
    { kind: 'agreement', study: study?.id ?? '', practice, familiarisation },
    study ? stamp : undefined,
  );
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  if (study === null) return <PageHead>{words.afterwards.noStudy}</PageHead>;
  return (
    <div className="stack">
      <Working figures={figures}>{(answer) => <AllPairs answer={answer} study={study} />}</Working>
      <HeldBackNote listed={listed} />
      <Choice
        legend={words.agreement.whichSessions}
        value={practice ? 'practice' : 'record'}
        options={[
          { value: 'record', label: words.agreement.forTheRecord },
          { value: 'practice', label: words.agreement.practice },
        ]}
        onChange={(value) => setPractice(value === 'practice')}
      />
      {!practice && listed?.sessions.some((one) => one.familiarisation === true) && (
        <Check
          label={words.afterwards.withFamiliarisation}
          hint={words.afterwards.withFamiliarisationHint}
          checked={familiarisation}
          onChange={setFamiliarisation}
        />
      )}
      <PageFoot />
    </div>
  );
}

function AllPairs({ answer, study }: { readonly answer: AgreementAnswer; readonly study: Study }) {
  const { words } = useServices();
  const { overall } = answer.report;
  const { criterion } = study;
  return (
    <>
      <PageHead
        about={study.name}
        note={overall.pairs === 0 ? words.agreement.noPairsText : words.agreement.criterionIs(criterion)}
      >
        {overall.pairs === 0
          ? words.agreement.noPairsTitle
          : words.agreement.allTitle({
              pairs: overall.pairs,
              percent: overall.percentAgreement,
              compared: overall.compared,
              kappa: overall.kappa,
            })}
      </PageHead>
      <WarningLines remarks={[...answer.problems, ...answer.notices]} />
      {answer.doubleCoded.length > 0 && (
        <Sheet title={words.agreement.sharesTitle}>
          <ul className="stack-tight">
            {inOrder(answer.doubleCoded, study.phases).map((share) => (
              <li key={share.phase ?? ''} className="row">
                {share.enough ? <Tick /> : <Hold />}
                <span>
                  {words.agreement.share(share)}
                  {': '}
                  {share.enough ? words.agreement.enough : words.agreement.tooLittle}
                </span>
              </li>
            ))}
          </ul>
        </Sheet>
      )}
      {answer.pairs.length > 0 && (
        <Sheet title={words.agreement.pairsTitle}>
          <Pairs pairs={answer.pairs} />
        </Sheet>
      )}
      {overall.pairs > 0 && (
        <p className="second small how">
          {overall.alpha === null ? '' : `${words.agreement.alpha({ alpha: overall.alpha })} `}
          {words.agreement.overallHow}
        </p>
      )}
    </>
  );
}

/** Phases in the order in which they happen; what the study does not name comes last. */
function inOrder<T extends { readonly phase: string | null }>(
  shares: readonly T[],
  phases: readonly string[],
): T[] {
  const place = ({ phase }: T): number => {
    const at = phases.indexOf(phase ?? '');
    return at === -1 ? phases.length : at;
  };
  return [...shares].sort((a, b) => place(a) - place(b));
}

function Pairs({ pairs }: { readonly pairs: readonly PairDetails[] }) {
  const { words } = useServices();
  return (
    <Table
      caption={words.agreement.pairsCaption}
      captionHidden
      rows={pairs}
      rowKey={(pair) => pair.key}
      columns={[
        {
          key: 'visit',
          head: words.agreement.visit,
          rowHead: true,
          cell: (pair) => (
            <a className="row-link" href={`#/afterwards/visit/${encodeURIComponent(pair.sessionIds[0])}`}>
              {[pair.row.class, pair.date === null ? null : words.f.day(pair.date)]
                .filter((text) => text !== null)
                .join(', ')}
            </a>
          ),
        },
        { key: 'phase', head: words.agreement.phase, cell: (pair) => pair.row.phase },
        {
          key: 'observers',
          head: words.agreement.observers,
          cell: (pair) => words.f.list(pair.row.observers),
        },
        {
          key: 'compared',
          head: words.agreement.compared,
          number: true,
          cell: (pair) => words.f.whole(pair.row.compared),
        },
        {
          key: 'agreed',
          head: words.agreement.agreed,
          number: true,
          cell: (pair) =>
            pair.row.percentAgreement === null
              ? words.agreement.notDefined
              : words.f.percentFine(pair.row.percentAgreement),
        },
        {
          key: 'kappa',
          head: words.agreement.kappa,
          number: true,
          cell: (pair) =>
            pair.row.kappa === null ? words.agreement.notDefined : words.f.kappa(pair.row.kappa),
        },
        {
          key: 'between',
          head: words.agreement.between,
          number: true,
          cell: ({ row: { lower, upper } }) =>
            lower === null || upper === null ? '' : words.agreement.betweenFigures({ lower, upper }),
        },
        {
          key: 'criterion',
          head: words.agreement.criterion,
          cell: ({ criterionMet }) => (
            <span className="with-sign">
              {criterionMet === null ? (
                <Ring size={20} />
              ) : criterionMet ? (
                <Tick size={20} />
              ) : (
                <Hold size={20} />
              )}
              {criterionMet === null
                ? words.agreement.unknown
                : criterionMet
                  ? words.agreement.meets
                  : words.agreement.below}
            </span>
          ),
        },
      ]}
    />
  );
}
