import { useState } from 'react';
import { recordingFacts } from '../../journal/headerFacts.ts';
import type { StoredSession } from '../../journal/stored.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import type { SessionAnswer } from '../../worker/questions.ts';
import { HandOverNotice } from '../files/HandOverNotice.tsx';
import { useServices } from '../services.ts';
import { Completeness } from './Completeness.tsx';
import { HeldBackPage } from './HeldBack.tsx';
import { LookCorrection } from './LookCorrection.tsx';
import { NotesSheet } from './NotesSheet.tsx';
import { PageFoot } from './PageFoot.tsx';
import { PhaseFigures } from './PhaseFigures.tsx';
import { PurposeLines } from './PurposeLines.tsx';
import { Scans } from './Scans.tsx';
import { SheetPicture } from './SheetPicture.tsx';
import { Stretches } from './Stretches.tsx';
import { Timing } from './Timing.tsx';
import { useFigures } from './useFigures.ts';
import { useListed } from './useListed.ts';
import { useWatched } from './useWatched.ts';
import { WarningLines } from './WarningLines.tsx';
import { Working } from './Working.tsx';

/** One record: first how complete it is; the figures wait behind one tap. */
export function SessionPage({ id }: { readonly id: string }) {
  const { words, useStored } = useServices();
  const stored = useStored((store) => store.readSession(id), [id]);
  const listed = useListed(stored?.ok ? stored.value?.header.study : undefined);
  const entries = stored?.ok ? stored.value?.journal.length : undefined;
  const open = listed?.held.has(id) === false;
  const figures = useFigures({ kind: 'session', session: id }, open ? entries?.toString() : undefined);
  if (stored === undefined) return <p className="second">{words.common.loading}</p>;
  if (!stored.ok) return <Notice kind="hold">{say(words.problems, stored.problem)}</Notice>;
  if (stored.value === null) {
    return (
      <div className="stack">
        <PageHead>{words.afterwards.noSession}</PageHead>
        <PageFoot />
      </div>
    );
  }
  if (listed === undefined) return <p className="second">{words.common.loading}</p>;
  if (!open) return <HeldBackPage />;
  const session = stored.value;
  return <Working figures={figures}>{(answer) => <Session session={session} answer={answer} />}</Working>;
}

function Session({ session, answer }: { readonly session: StoredSession; readonly answer: SessionAnswer }) {
  const { words } = useServices();
  const [shown, setShown] = useState(false);
  const { header, journal } = session;
  const { details, sheets } = answer;
  const facts = recordingFacts(header);
  const { method } = facts;
  const about = words.afterwards.sessionAbout({
    klass: header.classroom.name,
    date: header.date ?? journal[0]?.wall.slice(0, 10) ?? null,
    observer: header.observer.name,
    phases: details.phases.flatMap(({ row }) => row.phase ?? []),
  });
  const how = (
    <p className="second small how">
      {words.afterwards.how({
        method,
        seconds: facts.intervalMs === null ? null : facts.intervalMs / 1000,
        observed: facts.observeMs === null ? null : facts.observeMs / 1000,
        lookAt: facts.lookAt,
        codeSet: header.schedule.kind === 'laid' ? facts.codeSet.name : null,
        children: header.children.length,
      })}
    </p>
  );
  const foot = (
    <>
      <LookCorrection session={session} sheets={sheets} />
      <NotesSheet session={session} />
      {how}
      <p className="small">{words.afterwards.caution}</p>
      {header.schedule.kind === 'laid' && (
        <p className="not-in-print">
          <a href={`#/before/paper/${encodeURIComponent(header.id)}`}>{words.paper.printAgain}</a>
        </p>
      )}
      <PageFoot />
    </>
  );
  const time = useWatched(details);
  // Stretches of a table may lack their times; then they are counted as intervals.
  const continuous = method === 'duration' && time !== null;
  if (!shown) {
    const reasons = details.missingBy.map(({ reason, n }) => ({ reason: words.missing[reason], n }));
    return (
      <div className="stack">
        <PageHead about={about} note={continuous ? time.note : words.afterwards.missingBy({ reasons })}>
          {continuous
            ? time.title
            : method === 'headcount'
              ? words.afterwards.completeScans(details)
              : words.afterwards.completeTitle({
                  scored: details.scored,
                  planned: details.planned,
                  method,
                })}
        </PageHead>
        <PurposeLines header={header} />
        <HandOverNotice study={header.study} />
        <WarningLines warnings={details.warnings} continuous={continuous} />
        <Sheet title={words.afterwards.figuresWaitTitle}>
          <div className="row">
            <p className="grow second">{words.afterwards.figuresWaitText}</p>
            <Button look="main" onClick={() => setShown(true)}>
              {words.afterwards.showFigures}
            </Button>
          </div>
        </Sheet>
        <Completeness details={details} method={method} timed={header.fromPaper !== true} />
        <Timing details={details} fromPaper={header.fromPaper === true} />
        {foot}
      </div>
    );
  }
  const phases = details.phases.flatMap(({ row }) =>
    row.percentOnTask === null
      ? []
      : [{ phase: row.phase, percent: row.percentOnTask, lower: row.lower, upper: row.upper }],
  );
  const missing = continuous ? time.note : words.afterwards.missingShare({ ...details, method });
  return (
    <div className="stack">
      <PageHead about={about} note={`${missing} ${words.afterwards.onTaskNote({ method })}`}>
        {phases.length === 0
          ? words.afterwards.nothingTitle
          : words.afterwards.onTaskTitle({ method, phases })}
      </PageHead>
      <PurposeLines header={header} />
      <HandOverNotice study={header.study} />
      <div className="not-in-print">
        <Button onClick={() => setShown(false)}>{words.afterwards.hideFigures}</Button>
      </div>
      <WarningLines warnings={details.warnings} continuous={continuous} />
      {continuous && <Stretches session={session} />}
      {method === 'headcount' && <Scans session={session} />}
      {method !== 'headcount' && !continuous && (
        <Sheet title={words.afterwards.roundSheet}>
          <SheetPicture
            sheets={sheets}
            codeSet={facts.codeSet}
            klass={header.classroom.name}
            observers={[header.observer.name]}
          />
        </Sheet>
      )}
      <div className="phases">
        {details.phases.map((phase) => (
          <PhaseFigures key={phase.row.phase ?? ''} phase={phase} alone={details.phases.length === 1} />
        ))}
      </div>
      <Timing details={details} fromPaper={header.fromPaper === true} />
      {foot}
    </div>
  );
}
