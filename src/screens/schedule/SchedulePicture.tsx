import { memo, useMemo } from 'react';
import { screenPalette } from '../../charts/palette.ts';
import { ScheduleChart } from '../../charts/ScheduleChart.tsx';
import type { LaidSchedule } from '../../model/session.ts';
import { type LayOutRecipe, layOut, partMs } from '../../schedule/layOut.ts';
import { looksAtEverybody, watchesOne } from '../../schedule/orderOfDay.ts';
import { type Seen, whenSeen } from '../../schedule/whenSeen.ts';
import { Chart } from '../afterwards/Chart.tsx';
import { useWords } from '../services.ts';
import { ScheduleTable } from './ScheduleTable.tsx';
import './schedule.css';

export interface PicturedChild {
  readonly id: string;
  readonly label: string;
}

interface Props {
  readonly protocol: LayOutRecipe;
  readonly phases: readonly string[];
  /** In the order of the schedule. */
  readonly watched: readonly PicturedChild[];
  readonly turns: LaidSchedule['turns'];
}

/** When each child is seen: the picture, and the same as a table. */
export const SchedulePicture = memo(function SchedulePicture({ protocol, phases, watched, turns }: Props) {
  const words = useWords();
  const { study } = words;
  const seen = useMemo(() => {
    const ids = watched.map(({ id }) => id);
    return whenSeen(layOut(protocol, phases, ids, turns), protocol.method, ids, phases.length);
  }, [protocol, phases, watched, turns]);
  const target = protocol.rotation.kind === 'target' && !looksAtEverybody(protocol) && !watchesOne(protocol);
  const isTarget = (id: string | null): boolean => target && id === watched[0]?.id;
  const nameOf = (id: string | null): string =>
    id === null ? study.scheduleEverybody : (watched.find((child) => child.id === id)?.label ?? id);
  const rowName = (id: string | null): string =>
    isTarget(id) ? study.scheduleTarget({ name: nameOf(id) }) : nameOf(id);
  const counts = looksAtEverybody(protocol) ? study.scheduleCounts : study.scheduleLooks;
  const timed = seen.some(({ watchedMs }) => watchedMs !== null);
  const looked = protocol.method !== 'duration';
  const heads = [
    ...(looked ? [phases.length > 1 ? study.scheduleInAll : counts] : []),
    ...(timed ? [study.scheduleWatched] : []),
  ];
  const rows = byChild(seen, phases.length).map((parts) => ({
    label: nameOf(parts[0]?.child ?? null),
    strong: isTarget(parts[0]?.child ?? null),
    ends: [
      ...(looked ? [words.f.whole(sum(parts, ({ looks }) => looks.length))] : []),
      ...(timed ? [study.scheduleMinutesOf({ ms: sum(parts, ({ watchedMs }) => watchedMs ?? 0) })] : []),
    ],
    spans: parts.map(({ looks }) => looks),
  }));
  // The last sweep of a part may run on a little after its end.
  const lengthMs = Math.max(
    partMs(protocol.partLength, protocol, watched.length),
    ...seen.map(({ looks }) => looks.at(-1)?.[1] ?? 0),
  );
  return (
    <div className="schedule">
      <Chart>
        {(width) => (
          <ScheduleChart
            width={width}
            palette={screenPalette}
            label={study.schedulePicture({
              children: looksAtEverybody(protocol) ? 0 : watched.length,
              parts: phases.length,
            })}
            rows={rows}
            parts={phases.map((name) => ({ name, lengthMs }))}
            heads={heads}
            unit={study.scheduleMinutes}
          />
        )}
      </Chart>
      <details>
        <summary>{study.scheduleTable}</summary>
        <ScheduleTable {...{ seen, phases, looked, timed }} nameOf={rowName} looksHead={counts} />
      </details>
    </div>
  );
});

const sum = (parts: readonly Seen[], of: (part: Seen) => number): number =>
  parts.reduce((total, part) => total + of(part), 0);

function byChild(seen: readonly Seen[], parts: number): Seen[][] {
  return Array.from({ length: Math.ceil(seen.length / Math.max(1, parts)) }, (_, k) =>
    seen.slice(k * parts, (k + 1) * parts),
  );
}
