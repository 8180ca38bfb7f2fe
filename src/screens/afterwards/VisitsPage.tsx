import { useState } from 'react';
import { heldBack } from '../../journal/heldBack.ts';
import { pairVisit } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { BringIn } from '../files/BringIn.tsx';
import { HandOverNotice } from '../files/HandOverNotice.tsx';
import '../files/files.css';
import { useServices } from '../services.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { PairingDialog } from './PairingDialog.tsx';
import { useFigures } from './useFigures.ts';
import { useStamp } from './useStamp.ts';
import { VisitRow } from './VisitRow.tsx';
import { type VisitGroup, visitDays } from './visitGroups.ts';

interface Pairing {
  readonly session: string;
  readonly observer: string;
  readonly visit: VisitGroup;
}

/** The visits of the study by day, newest first, and the ways to what they say. */
export function VisitsPage() {
  const { words, deps, useStored } = useServices();
  const study = useCurrentStudy();
  const listed = useStored(
    (store) => (study ? store.listSessions(study.id) : Promise.resolve({ ok: true as const, value: [] })),
    [study?.id],
  );
  const stamp = useStamp(study?.id);
  const { pending } = useFigures({ kind: 'study', study: study?.id ?? '' }, study ? stamp : undefined);
  const [asked, setAsked] = useState<Pairing | null>(null);
  const [undo, setUndo] = useState<{ session: string; observer: string; visit: string | null } | null>(null);
  const [problem, setProblem] = useState<string | null>(null);

  if (study === undefined || listed === undefined) return <p className="second">{words.common.loading}</p>;
  if (!listed.ok) return <Notice kind="hold">{say(words.problems, listed.problem)}</Notice>;
  const lines = pending.state === 'answered' && pending.answer.ok ? pending.answer.value.visits : [];
  const pairings = study?.pairings ?? [];
  const days = visitDays(listed.value, lines, pairings);
  const held = heldBack(listed.value, pairings);
  const visits = days.flatMap((day) => day.visits);
  const latest = days.find(({ date }) => date !== null)?.date ?? null;

  const pair = async (session: string, observer: string, visit: string | null) => {
    const before = pairings.find((one) => one.session === session)?.visit ?? null;
    const done = await pairVisit(deps, session, visit);
    setAsked(null);
    setProblem(done.ok ? null : say(words.problems, done.problem));
    setUndo(done.ok && before !== visit ? { session, observer, visit: before } : null);
  };

  return (
    <div className="stack">
      <PageHead about={study === null ? undefined : words.afterwards.listAbout({ study: study.name })}>
        {visits.length === 0
          ? words.afterwards.noVisitsTitle
          : words.afterwards.visitsTitle({ visits: visits.length, latest })}
      </PageHead>
      {study !== null && <HandOverNotice study={study.id} />}
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      {undo !== null && (
        <Notice
          kind="done"
          actions={
            <Button
              onClick={() => {
                pair(undo.session, undo.observer, undo.visit).then(() => setUndo(null));
              }}
            >
              {words.afterwards.undo}
            </Button>
          }
        >
          {words.afterwards.pairingDone({ observer: undo.observer })}
        </Notice>
      )}
      {visits.length > 0 && (
        <nav className="ways" aria-label={words.afterwards.ways}>
          <a href="#/afterwards/agreement">
            <strong>{words.afterwards.agreement}</strong>
            <span className="second small">{words.afterwards.agreementHint}</span>
          </a>
          <a href="#/afterwards/change">
            <strong>{words.afterwards.change}</strong>
            <span className="second small">{words.afterwards.changeHint}</span>
          </a>
          <a href="#/study/files">
            <strong>{words.afterwards.files}</strong>
            <span className="second small">{words.afterwards.filesHint}</span>
          </a>
        </nav>
      )}
      {visits.length === 0 && (
        <div className="row">
          <p className="grow second">
            {study === null ? words.afterwards.noStudy : words.afterwards.noVisitsText}
          </p>
          {study === null && (
            <a className="button" href="#/study">
              {words.afterwards.toStudy}
            </a>
          )}
        </div>
      )}
      <Sheet title={words.files.in}>
        <div className="stack-tight">
          <p className="second">{words.files.inText}</p>
          <BringIn study={study?.id ?? null} />
          {study !== null && (
            <p>
              <a className="button" href="#/before/paper/type">
                {words.paper.typeLink}
              </a>
            </p>
          )}
        </div>
      </Sheet>
      {days.length > 0 && (
        <Sheet flush>
          <ul className="days">
            {days.map((day) => (
              <li key={day.date ?? ''} className="day">
                <h2>{day.date === null ? words.afterwards.withoutDate : words.f.day(day.date)}</h2>
                <ul className="day-visits">
                  {day.visits.map((visit) => (
                    <VisitRow
                      key={visit.key}
                      visit={visit}
                      held={held}
                      byHand={(session) => pairings.some((one) => one.session === session)}
                      onPair={(session, observer) => setAsked({ session, observer, visit })}
                    />
                  ))}
                </ul>
              </li>
            ))}
          </ul>
        </Sheet>
      )}
      {asked !== null && (
        <PairingDialog
          observer={asked.observer}
          visit={asked.visit}
          others={visits.filter(
            (other) => other.key !== asked.visit.key && other.klass === asked.visit.klass,
          )}
          onChoose={(visit) => pair(asked.session, asked.observer, visit)}
          onClose={() => setAsked(null)}
        />
      )}
    </div>
  );
}
