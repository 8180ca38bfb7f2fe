import { useState } from 'react';
import type { AwayReason } from '../../journal/entry.ts';
import type { SessionChild } from '../../model/session.ts';
import { freeReserve } from '../../recorder/freeReserve.ts';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { PlanView } from '../plan/PlanView.tsx';
import { useIsAbout } from './aboutChildren.ts';
import { usePlanNow } from './LessonPlan.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';
import { useStandIns } from './useStandIns.ts';

/** A child left, came back, or sits elsewhere: first who, then what. */
export function ChildPanel({ onClose }: { readonly onClose: () => void }) {
  const { room, missing } = useCoreWords();
  const { header, pseudonyms } = useFacts();
  const away = useRoom((s) => s.away);
  const standIns = useStandIns();
  const [child, setChild] = useState<SessionChild | null>(null);
  // A reserve counts while it stands in, and one who left meanwhile may come back.
  const inPlace = new Set(standIns.values());
  const reserves = (header.reserves ?? []).filter(({ id }) => inPlace.has(id) || away.has(id));
  const nameOf = (id: string): string => pseudonyms.get(id) ?? id;
  const label = ({ id, pseudonym }: SessionChild): string => {
    const reason = away.get(id);
    const by = standIns.get(id);
    if (reason !== undefined)
      return by === undefined
        ? room.childAway({ child: pseudonym, reason: missing[reason] })
        : room.awayStoodIn({ child: pseudonym, reason: missing[reason], by: nameOf(by) });
    const instead = [...standIns].find(([, reserve]) => reserve === id)?.[0];
    return instead === undefined ? pseudonym : room.standsIn({ child: pseudonym, instead: nameOf(instead) });
  };
  if (child !== null) return <AboutChild child={child} onClose={onClose} />;
  return (
    <Panel title={room.childTitle} onClose={onClose}>
      <div className="panel-choices">
        {[...header.children, ...reserves].map((one) => (
          <Button key={one.id} onClick={() => setChild(one)}>
            {label(one)}
          </Button>
        ))}
      </div>
    </Panel>
  );
}

function AboutChild({ child, onClose }: { readonly child: SessionChild; readonly onClose: () => void }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const plan = usePlanNow();
  useIsAbout(child.id);
  const isAway = useRoom((s) => s.away.has(child.id));
  const [moving, setMoving] = useState(false);
  const left = (reason: AwayReason) => (): void => {
    live.childLeft(child.id, reason);
    onClose();
  };
  if (moving && plan !== null)
    return (
      <Panel title={room.childWhere({ child: child.pseudonym })} onClose={onClose}>
        <PlanView
          plan={plan}
          labels={pseudonyms}
          label={room.plan}
          fitHeight="40dvh"
          onSeat={(seat) => {
            live.childMoved(child.id, seat.id);
            onClose();
          }}
        />
      </Panel>
    );
  return (
    <Panel title={room.childWhat({ child: child.pseudonym })} onClose={onClose}>
      <div className="panel-choices">
        {isAway ? (
          <Button
            onClick={() => {
              live.childReturned(child.id);
              onClose();
            }}
          >
            {room.childBack}
          </Button>
        ) : (
          <>
            <Button onClick={left('left the room')}>{room.childLeftRoom}</Button>
            <Button onClick={left('with another adult')}>{room.childWithAdult}</Button>
            <Button onClick={left('not taking part')}>{room.childNotPart}</Button>
          </>
        )}
        {plan !== null && plan.seats.length > 0 && (
          <Button onClick={() => setMoving(true)}>{room.childMoved}</Button>
        )}
      </div>
      {!isAway && <WhoStepsIn child={child.id} />}
    </Panel>
  );
}

/** Who takes the child's turns if it leaves, where the protocol lets reserves step in. */
function WhoStepsIn({ child }: { readonly child: string }) {
  const { room } = useCoreWords();
  const { header, pseudonyms, method } = useFacts();
  const by = useRoom((s) => freeReserve(s.state, child));
  const { schedule } = header;
  if (schedule.kind !== 'laid' || schedule.protocol.reservesStepIn !== true || method === 'headcount')
    return null;
  const name = by === null ? undefined : pseudonyms.get(by);
  return (
    <p className="second steps-in">
      {name === undefined ? room.nobodyStepsIn : room.stepsIn({ child: name })}
    </p>
  );
}
