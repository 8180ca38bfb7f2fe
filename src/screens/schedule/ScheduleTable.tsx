import type { Seen } from '../../schedule/whenSeen.ts';
import { type Column, Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly seen: readonly Seen[];
  readonly phases: readonly string[];
  readonly nameOf: (child: string | null) => string;
  readonly looksHead: string;
  /** Whether there are looks to count, and time to add up. */
  readonly looked: boolean;
  readonly timed: boolean;
}

/** When each child is seen, in numbers: minutes and seconds from the beginning of the phase. */
export function ScheduleTable({ seen, phases, nameOf, looksHead, looked, timed }: Props) {
  const { study, f } = useWords();
  const time = (ms: number | null): string => study.scheduleSeen({ ms });
  const number = (key: string, head: string, cell: (row: Seen) => string): Column<Seen> => ({
    key,
    head,
    number: true,
    cell,
  });
  return (
    <Table
      caption={study.scheduleCaption}
      captionHidden
      rows={seen}
      rowKey={(row) => `${row.child} ${row.part}`}
      columns={[
        { key: 'child', head: study.scheduleChild, rowHead: true, cell: (row) => nameOf(row.child) },
        ...(phases.length > 1
          ? [{ key: 'phase', head: study.schedulePhase, cell: (row: Seen) => phases[row.part] ?? '' }]
          : []),
        ...(looked ? [number('looks', looksHead, (row) => f.whole(row.looks.length))] : []),
        ...(timed
          ? [
              number('watched', study.scheduleWatched, (row) =>
                study.scheduleMinutesOf({ ms: row.watchedMs ?? 0 }),
              ),
            ]
          : []),
        ...(looked
          ? [
              number('first', study.scheduleFirst, (row) => time(row.firstMs)),
              number('last', study.scheduleLast, (row) => time(row.lastMs)),
              number('longest', study.scheduleLongest, (row) => time(row.longestMs)),
            ]
          : []),
      ]}
    />
  );
}
