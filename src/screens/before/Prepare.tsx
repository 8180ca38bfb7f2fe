import { useMemo, useState } from 'react';
import { useLocation } from 'wouter';
import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import type { Study } from '../../model/study.ts';
import { hasTarget, looksAtEverybody, watchesOne } from '../../schedule/orderOfDay.ts';
import { newSeed, prepareVisit } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { methodSentence } from '../study/methodSentence.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { DaySheet } from './DaySheet.tsx';
import { PreparedNotice, UnfinishedNotice } from './notices.tsx';
import { TakeVisitFile } from './TakeVisitFile.tsx';

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
    </div>
  );
}

function NoStudy() {
  const { words } = useServices();
  return (
    <>
      <PageHead note={words.before.noStudyText}>{words.before.noStudyTitle}</PageHead>
      <p>
        <a className="button button-main" href="#/study">
          {words.before.toStudy}
        </a>
      </p>
    </>
  );
}

function Choosing({ study }: { readonly study: Study }) {
  const { words, useStored } = useServices();
  const classes = useStored((store) => store.classes(study.id), [study.id]);
  const protocols = useStored((store) => store.protocols(study.id), [study.id]);
  if (classes === undefined || protocols === undefined)
    return <p className="second">{words.common.loading}</p>;
  if (!classes.ok) return <Notice kind="hold">{say(words.problems, classes.problem)}</Notice>;
  if (!protocols.ok) return <Notice kind="hold">{say(words.problems, protocols.problem)}</Notice>;
  return <Form study={study} classes={classes.value} protocols={protocols.value} />;
}

interface FormProps {
  readonly study: Study;
  readonly classes: readonly Classroom[];
  readonly protocols: readonly Protocol[];
}

function Form({ study, classes, protocols }: FormProps) {
  const { words, deps, store, device } = useServices();
  const [, go] = useLocation();
  const [classId, chooseClass] = useState<string | null>(
    classes.length === 1 ? (classes[0]?.id ?? null) : null,
  );
  const [protocolId, chooseProtocol] = useState<string | null>(protocols[0]?.id ?? null);
  const [phaseChoice, choosePhases] = useState<string>('all');
  const [absent, setAbsent] = useState<ReadonlySet<string>>(new Set());
  const [chosen, choose] = useState<string | null>(null);
  // Tossed before the visit is frozen, so that the order can be looked at; it is kept with the schedule.
  const [orderSeed] = useState(() => newSeed(deps.random));
  const [start, setStart] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const classroom = classes.find((c) => c.id === classId) ?? null;
  const protocol = protocols.find((p) => p.id === protocolId) ?? null;
  const phases = useMemo(
    () => (phaseChoice === 'all' ? study.phases : [phaseChoice]),
    [phaseChoice, study.phases],
  );
  const there = classroom?.children.some((child) => child.id === chosen && !child.removed) === true;
  const first =
    protocol !== null && hasTarget(protocol) && there && chosen !== null && !absent.has(chosen)
      ? chosen
      : null;
  const undecided =
    classroom === null ||
    protocol === null ||
    (classroom.draw === null && !looksAtEverybody(protocol) && !(watchesOne(protocol) && first !== null));

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
          <div className="stack">
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
            <Choice
              legend={words.before.protocol}
              value={protocolId}
              onChange={chooseProtocol}
              options={protocols.map((p) => ({
                value: p.id,
                label: p.name,
                hint: methodSentence(words, p),
              }))}
            />
            <Choice
              legend={words.before.phases}
              value={phaseChoice}
              onChange={choosePhases}
              options={[
                ...(study.phases.length > 1
                  ? [
                      {
                        value: 'all',
                        label: words.before.phasesAll({ phases: study.phases }),
                        hint: words.before.phasesAllHint,
                      },
                    ]
                  : []),
                ...study.phases.map((phase) => ({
                  value: study.phases.length === 1 ? 'all' : phase,
                  label: words.before.phasesOne({ phase }),
                })),
              ]}
            />
            {classroom !== null && protocol !== null && (
              <DaySheet
                {...{ classroom, protocol, phases, orderSeed, absent, first }}
                onAbsent={setAbsent}
                onFirst={choose}
              />
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
              <Button look="main" disabled={undecided} onClick={prepare}>
                {words.before.prepare}
              </Button>
            </div>
          </div>
        </Sheet>
      )}
    </>
  );
}
