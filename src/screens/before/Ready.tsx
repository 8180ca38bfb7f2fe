import { useState } from 'react';
import { useLocation } from 'wouter';
import type { Role } from '../../model/session.ts';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { likelyObserver, startSession } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { HeldButton } from '../../ui/HeldButton.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { methodSentence } from '../study/methodSentence.ts';
import { useSettings } from '../useCurrentStudy.ts';
import { CheckRow } from './CheckRow.tsx';
import { useTabletFacts } from './checks.ts';
import { FrozenSchedule } from './FrozenSchedule.tsx';
import { HandVisit } from './HandVisit.tsx';
import { HeadsUpCheck } from './HeadsUpCheck.tsx';
import { ObserverCheck, type Who } from './ObserverCheck.tsx';
import { type Heard, SoundCheck } from './SoundCheck.tsx';
import { TabletChecks, useTabletLines } from './TabletChecks.tsx';

/** The last page before the classroom door: what would spoil the visit. */
export function Ready({ as = null }: { readonly as?: Role | null }) {
  const { words } = useServices();
  const settings = useSettings();
  if (settings === undefined) return <p className="second">{words.common.loading}</p>;
  if (settings.prepared === null) {
    return (
      <>
        <PageHead>{words.before.nothingPrepared}</PageHead>
        <a className="button" href="#/before">
          {words.before.toPrepare}
        </a>
      </>
    );
  }
  return <Checks key={settings.prepared.visit} plan={settings.prepared} as={as} />;
}

function Checks({ plan, as }: { readonly plan: VisitPlan; readonly as: Role | null }) {
  const { words, deps, store, recorder, useStored } = useServices();
  const [, go] = useLocation();
  const answer = useStored((reader) => reader.observers(plan.study.id), [plan.study.id]);
  const recorded = useStored((reader) => reader.listSessions(plan.study.id), [plan.study.id]);
  const observers = answer?.ok ? answer.value : [];
  const likely = likelyObserver(observers, recorded?.ok ? recorded.value : [], {
    visit: plan.visit,
    second: as === 'second',
  });
  const [chosen, choose] = useState<Who>({ observer: null, role: as, purpose: 'record' });
  const who: Who = { ...chosen, observer: chosen.observer ?? likely?.id ?? null };
  const [choosing, setChoosing] = useState(false);
  const [heard, setHeard] = useState<Heard>('not asked');
  const [present, setPresent] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const { facts, again } = useTabletFacts();
  const lines = useTabletLines(facts);
  const { protocol } = plan.schedule;

  const onHold = [
    ...(who.observer === null ? ['observer'] : []),
    ...(heard === 'ear' ? [] : ['sound']),
    ...(present ? [] : ['children']),
    ...lines.filter((line) => line.state === 'hold').map((line) => line.check),
  ];

  if (answer === undefined || recorded === undefined) return <p className="second">{words.common.loading}</p>;

  const goIn = async () => {
    if (who.observer === null) return;
    setProblem(null);
    const header = await startSession(deps, plan, {
      observer: who.observer,
      role: who.role,
      practice: who.purpose === 'practice',
      familiarisation: who.purpose === 'familiarisation',
    });
    if (!header.ok) return setProblem(say(words.problems, header.problem));
    const opened = await recorder.open(header.value, { checks: onHold, anyway: onHold.length > 0 });
    if (!opened.ok) return setProblem(say(words.problems, opened.problem));
    await store.saveSettings({ prepared: null });
    go(`/room/${header.value.id}`);
  };

  return (
    <div className="stack">
      <PageHead
        about={words.before.readyAbout({
          klass: plan.classroom.name,
          protocol: protocol.name,
          how: methodSentence(words, protocol),
          phases: plan.schedule.phases,
        })}
      >
        {words.before.readyTitle({ n: onHold.length })}
      </PageHead>
      <Sheet flush>
        <ul>
          <ObserverCheck
            study={plan.study.id}
            observers={observers}
            who={who}
            why={chosen.observer === null ? (likely?.why ?? null) : null}
            open={choosing}
            onOpen={(open) => {
              setChoosing(open);
              // Who closes the dialog has seen who stands there.
              if (!open) choose((standing) => ({ ...standing, observer: standing.observer ?? who.observer }));
            }}
            onChange={choose}
          />
          <SoundCheck
            cues={protocol.cues}
            heard={heard}
            onHeard={setHeard}
            headsUp={<HeadsUpCheck visit={plan} />}
          />
          <CheckRow
            name={words.before.present}
            state={present ? 'ready' : 'hold'}
            actions={
              present ? undefined : (
                <>
                  <Button onClick={() => setPresent(true)}>{words.before.presentYes}</Button>
                  <a className="button" href="#/before">
                    {words.before.presentNo}
                  </a>
                </>
              )
            }
          >
            {words.before.presentList({ children: plan.children.map((child) => child.pseudonym) })}
            {!present && ` ${words.before.presentAsk}`}
          </CheckRow>
          <TabletChecks lines={lines} />
          {who.role === 'primary' && <HandVisit plan={plan} />}
        </ul>
      </Sheet>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <div className="row">
        <HeldButton
          look="main"
          why={who.observer === null ? words.before.goInNobody : null}
          onWhy={() => setChoosing(true)}
          onClick={goIn}
        >
          {onHold.length === 0 ? words.before.goIn : words.before.goInAnyway}
        </HeldButton>
        <Button look="quiet" onClick={again}>
          {words.before.again}
        </Button>
        {onHold.length > 0 && <p className="second small">{words.before.anywayNote}</p>}
      </div>
      <FrozenSchedule plan={plan} />
      <p>
        <a className="button" href="#/before/paper">
          {words.paper.printLink}
        </a>
      </p>
    </div>
  );
}
