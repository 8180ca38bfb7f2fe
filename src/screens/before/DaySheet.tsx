import { useMemo } from 'react';
import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import { hasTarget, looksAtEverybody, orderOfDay, watchesOne } from '../../schedule/orderOfDay.ts';
import { protocolMeaning } from '../../schedule/protocolMeaning.ts';
import { SchedulePicture } from '../schedule/SchedulePicture.tsx';
import { useServices } from '../services.ts';
import { Attendance, NotDrawn } from './Attendance.tsx';
import { TargetChoice } from './TargetChoice.tsx';

interface Props {
  readonly classroom: Classroom;
  readonly protocol: Protocol;
  readonly phases: readonly string[];
  readonly orderSeed: string;
  readonly absent: ReadonlySet<string>;
  readonly first: string | null;
  readonly onAbsent: (absent: ReadonlySet<string>) => void;
  readonly onFirst: (first: string | null) => void;
}

/** Who is watched today, what that comes to, and the schedule as it will be: nothing of it is frozen yet. */
export function DaySheet(props: Props) {
  const { classroom, protocol, phases, orderSeed, absent, first } = props;
  const { words } = useServices();
  const [day, byItself] = useMemo(() => {
    const wish = { absent, orderSeed, parts: phases.length };
    const asGiven = orderOfDay(protocol, classroom, { ...wish, first: null });
    return [first === null ? asGiven : orderOfDay(protocol, classroom, { ...wish, first }), asGiven];
  }, [protocol, classroom, absent, orderSeed, phases.length, first]);
  const watched = useMemo(
    () =>
      day.children.map((id) => ({
        id,
        label: classroom.children.find((child) => child.id === id)?.pseudonym ?? id,
      })),
    [day, classroom],
  );
  const nobodyDrawn = classroom.draw === null && !looksAtEverybody(protocol);
  const somebody = classroom.children.some((child) => !child.removed);
  return (
    <div className="stack">
      <Attendance {...{ classroom, protocol, day, absent }} onChange={props.onAbsent} />
      {nobodyDrawn && !(watchesOne(protocol) && first !== null) && (
        <NotDrawn classroom={classroom} protocol={protocol} />
      )}
      {hasTarget(protocol) && somebody && !(nobodyDrawn && !watchesOne(protocol)) && (
        <TargetChoice {...{ classroom, protocol, byItself, absent, first }} onChange={props.onFirst} />
      )}
      {watched.length > 0 && (
        <div className="stack-tight">
          <h2 className="choice-legend">{words.before.scheduleTitle}</h2>
          <p className="second">{meaningOf()}</p>
          <SchedulePicture protocol={protocol} phases={phases} watched={watched} turns={day.turns} />
        </div>
      )}
    </div>
  );

  function meaningOf(): string {
    const { lengthMs, fewest, most, intervals } = protocolMeaning({
      ...protocol,
      childrenToDraw: watched.length,
    });
    const minutes = lengthMs / 60_000;
    const parts = phases.length;
    if (looksAtEverybody(protocol))
      return words.before.meaningCounts({ counts: intervals, children: watched.length, minutes, parts });
    if (protocol.method === 'duration') return words.before.meaningDuration({ minutes, parts });
    if (hasTarget(protocol) && !watchesOne(protocol))
      return words.before.meaningTarget({ target: most, fewest, peers: watched.length - 1, minutes, parts });
    return words.before.meaning({ fewest, most, minutes, children: watched.length, parts });
  }
}
