import { useMemo, useRef, useState } from 'react';
import { useLocation } from 'wouter';
import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import type { Study } from '../../model/study.ts';
import { hasTarget } from '../../schedule/orderOfDay.ts';
import { lastTime, newSeed, prepareVisit, type SessionSummary } from '../../tasks/index.ts';
import { Choice } from '../../ui/Choice.tsx';
import { TextField } from '../../ui/Field.tsx';
import { HeldButton } from '../../ui/HeldButton.tsx';
import { leadTo } from '../../ui/leadTo.ts';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { OpenDemo } from '../study/glance/OpenDemo.tsx';
import { methodSentence } from '../study/methodSentence.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { DaySheet } from './DaySheet.tsx';
import { PreparedNotice, UnfinishedNotice } from './notices.tsx';
import { PhaseChoice } from './PhaseChoice.tsx';
import { TakeVisitFile } from './TakeVisitFile.tsx';
import { TryShort } from './TryShort.tsx';
import { placeOf, whatIsMissing } from './whatIsMissing.ts';

const none: readonly string[] = [];

/** Before the visit: which class, how, and who is there today. */
export function Prepare() {
  const { words } = useServices();
  const study = useCurrentStudy();
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  return (
    <div className="stack">
      <UnfinishedNotice />
      <PreparedNotice />
      {study === null ? <NoStudy /> : <Choosing key={study.id} study={study} />}
      <TakeVisitFile />
      <p className="second small">{words.before.cautions}</p>
      {study !== null && <p className="second small">{words.before.appIs}</p>}
    </div>
  );
}

function NoStudy() {
  const { words } = useServices();
  return (
    <>
      <PageHead about={words.before.appIs} note={words.before.noStudyText}>
        {words.before.noStudyTitle}
      </PageHead>
      <div className="row">
        <a className="button button-main" href="#/study">
          {words.before.toStudy}
        </a>
        <OpenDemo />
      </div>
    </>
  );
}

function Choosing({ study }: { readonly study: Study }) {
  const { words, useStored } = useServices();
  const classes = useStored((store) => store.classes(study.id), [study.id]);
  const protocols = useStored((store) => store.protocols(study.id), [study.id]);
  const sessions = useStored((store) => store.listSessions(study.id), [study.id]);
  if (classes === undefined || protocols === undefined || sessions === undefined)
    return <p className="second">{words.common.loading}</p>;
  if (!classes.ok) return <Notice kind="hold">{say(words.problems, classes.problem)}</Notice>;
  if (!protocols.ok) return <Notice kind="hold">{say(words.problems, protocols.problem)}</Notice>;
  if (!sessions.ok) return <Notice kind="hold">{say(words.problems, sessions.problem)}</Notice>;
  return <Form study={study} classes={classes.value} protocols={protocols.value} sessions={sessions.value} />;
}

interface FormProps {
  readonly study: Study;
  readonly classes: readonly Classroom[];
  readonly protocols: readonly Protocol[];
  readonly sessions: readonly SessionSummary[];
}

function Form({ study, classes, protocols, sessions }: FormProps) {
  const { words, deps, store, device } = useServices();
  const [, go] = useLocation();
  const [classId, chooseClass] = useState<string | null>(
    classes.length === 1 ? (classes[0]?.id ?? null) : null,
  );
  const [protocolChoice, chooseProtocol] = useState<string | null>(null);
  const [phaseChoice, choosePhases] = useState<string | null>(null);
  const [absent, setAbsent] = useState<ReadonlySet<string>>(new Set());
  const [chosen, choose] = useState<string | null>(null);
  // Tossed before the visit is frozen, so that the order can be looked at; it is kept with the schedule.
  const [orderSeed] = useState(() => newSeed(deps.random));
  const [start, setStart] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const classroom = classes.find((c) => c.id === classId) ?? null;
  const last = useMemo(() => lastTime(sessions, classId), [sessions, classId]);
  const protocol = protocols.find((p) => p.id === (protocolChoice ?? last?.protocol)) ?? protocols[0] ?? null;
  const asLast = protocolChoice === null && last !== null && protocol?.id === last.protocol;
  // A class that was last seen in one phase alone may be in another today: a wrong phase would be a wrong record.
  const onePhase = last?.ofClass === true && last.phases.length < study.phases.length;
  const phase = phaseChoice ?? (onePhase ? null : 'all');
  const phases = useMemo(
    () => (phase === null ? none : phase === 'all' ? study.phases : [phase]),
    [phase, study.phases],
  );
  const there = classroom?.children.some((child) => child.id === chosen && !child.removed) === true;
  const first =
    protocol !== null && hasTarget(protocol) && there && chosen !== null && !absent.has(chosen)
      ? chosen
      : null;
  const places = useRef<HTMLDivElement>(null);
  const missing = whatIsMissing({ classroom, protocol, phases, first });

  const prepare = async () => {
    if (classroom === null || protocol === null) return;
    const { wall } = device.now();
    const prepared = await prepareVisit(deps, {
      classroom: classroom.id,
      protocol: { id: protocol.id },
      phases,
      absent: [...absent],
      orderSeed,
      first,
      plannedStart: start === '' ? null : `${wall.slice(0, 10)}T${start}:00.000${wall.slice(23)}`,
    });
    if (!prepared.ok) return setProblem(say(words.problems, prepared.problem));
    const kept = await store.saveSettings({ prepared: prepared.value.plan });
    if (!kept.ok) return setProblem(say(words.problems, kept.problem));
    go('/before/ready');
  };

  return (
    <>
      <PageHead about={study.name}>{words.before.chooseTitle}</PageHead>
      {classes.length === 0 ? (
        <Notice
          kind="hold"
          actions={
            <a className="button" href="#/study">
              {words.before.toStudy}
            </a>
          }
        >
          {words.before.noClasses}
        </Notice>
      ) : (
        <Sheet>
          <div className="stack" ref={places}>
            <div data-place="class">
              <Choice
                legend={words.before.klass}
                value={classId}
                onChange={(id) => {
                  chooseClass(id);
                  setAbsent(new Set());
                  choose(null);
                }}
                options={classes.map((c) => ({
                  value: c.id,
                  label: c.name,
                  hint: words.before.klassHint({ n: c.children.filter((child) => !child.removed).length }),
                }))}
              />
            </div>
            <div className="stack-tight" data-place="protocol">
              <Choice
                legend={words.before.protocol}
                value={protocol?.id ?? null}
                onChange={chooseProtocol}
                options={protocols.map((p) => ({
                  value: p.id,
                  label: p.name,
                  hint: methodSentence(words, p),
                }))}
              />
              {asLast && (
                <p className="second small">{words.before.protocolAsLast({ ofClass: last.ofClass })}</p>
              )}
              {(study.demo || sessions.every(({ here }) => !here)) && (
                <TryShort
                  study={study.id}
                  onTake={({ id }) => {
                    chooseProtocol(id);
                    choosePhases(study.phases.length > 1 ? (study.phases[0] ?? 'all') : 'all');
                  }}
                />
              )}
              {protocols.length === 0 && (
                <p>
                  <a className="button" href="#/study/protocols/new">
                    {words.before.toProtocol}
                  </a>
                </p>
              )}
            </div>
            <div className="stack-tight" data-place="phases">
              <PhaseChoice phases={study.phases} value={phase} onChange={choosePhases} />
              {onePhase && <p className="second small">{words.before.phasesLast({ phases: last.phases })}</p>}
            </div>
            {classroom !== null && protocol !== null && phases.length > 0 && (
              <div data-place="day">
                <DaySheet
                  {...{ classroom, protocol, phases, orderSeed, absent, first }}
                  onAbsent={setAbsent}
                  onFirst={choose}
                />
              </div>
            )}
            <TextField
              label={words.before.start}
              hint={words.before.startHint}
              type="time"
              value={start}
              onChange={(event) => setStart(event.target.value)}
            />
            {problem !== null && <Notice kind="hold">{problem}</Notice>}
            <div className="row">
              <HeldButton
                look="main"
                why={missing === null ? null : words.before.firstOf({ missing })}
                onWhy={() =>
                  leadTo(places.current?.querySelector<HTMLElement>(`[data-place="${placeOf(missing)}"]`))
                }
                onClick={prepare}
              >
                {words.before.prepare}
              </HeldButton>
            </div>
          </div>
        </Sheet>
      )}
    </>
  );
}
