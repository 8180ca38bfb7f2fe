import { useState } from 'react';
import type { AwayReason } from '../../journal/entry.ts';
import type { SessionChild } from '../../model/session.ts';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { PlanView } from '../plan/PlanView.tsx';
import { usePlanNow } from './LessonPlan.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

/** A child left, came back, or sits elsewhere: first who, then what. */
export function ChildPanel({ onClose }: { readonly onClose: () => void }) {
  const { room, missing } = useCoreWords();
  const { header } = useFacts();
  const away = useRoom((s) => s.away);
  const [child, setChild] = useState<SessionChild | null>(null);
  if (child !== null) return <AboutChild child={child} onClose={onClose} />;
  return (
    <Panel title={room.childTitle} onClose={onClose}>
      <div className="panel-choices">
        {header.children.map((one) => {
          const reason = away.get(one.id);
          return (
            <Button key={one.id} onClick={() => setChild(one)}>
              {reason === undefined
                ? one.pseudonym
                : room.childAway({ child: one.pseudonym, reason: missing[reason] })}
            </Button>
          );
        })}
      </div>
    </Panel>
  );
}

function AboutChild({ child, onClose }: { readonly child: SessionChild; readonly onClose: () => void }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const plan = usePlanNow();
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
    </Panel>
  );
}
