/** Where a headcount stands at one prompt. */
export interface Count {
  /** Children on-task; null = nothing counted yet. */
  readonly on: number | null;
  readonly present: number;
  /** What the scan before counted on-task; null for none. */
  readonly last: number | null;
  /** Children whose seats were touched as on-task. */
  readonly tapped: ReadonlySet<string>;
}

/** What one touch does to a count. */
export type CountStep =
  | { readonly kind: 'more' | 'fewer' | 'same' | 'nobody' | 'arrived' | 'gone' }
  /** Everybody: the children named are those who have a seat. */
  | { readonly kind: 'all'; readonly seated: readonly string[] }
  | { readonly kind: 'seat'; readonly child: string };

type Counted = Pick<Count, 'on' | 'present' | 'tapped'>;

/**
 * The count after a touch; null where the touch changes nothing. On-task never exceeds present, and nobody counted on-task
 * is ever not present. Counting down begins with everybody.
 */
export function counted(count: Count, step: CountStep): Counted | null {
  const { on, present, last, tapped } = count;
  switch (step.kind) {
    case 'more':
      return (on ?? 0) < present ? { on: (on ?? 0) + 1, present, tapped } : null;
    case 'fewer': {
      const next = (on ?? present) - 1;
      return next < 0 ? null : { on: next, present, tapped: fitting(tapped, next) };
    }
    case 'same':
      return last === null ? null : { on: Math.min(last, present), present, tapped: new Set() };
    case 'nobody':
      return { on: 0, present, tapped: new Set() };
    case 'all':
      return { on: present, present, tapped: new Set(step.seated.slice(0, present)) };
    case 'arrived':
      return { on, present: present + 1, tapped };
    case 'gone':
      return present > (on ?? 0) && present > 0 ? { on, present: present - 1, tapped } : null;
    case 'seat':
      return touchedSeat(count, step.child);
  }
}

function touchedSeat({ on, present, tapped }: Count, child: string): Counted | null {
  const seats = new Set(tapped);
  if (seats.delete(child)) return { on: Math.max(0, (on ?? 0) - 1), present, tapped: seats };
  seats.add(child);
  if ((on ?? 0) < present) return { on: (on ?? 0) + 1, present, tapped: seats };
  // More seats than children present: the child is there for all to see, so the count of those present was short.
  return seats.size > present ? { on: seats.size, present: seats.size, tapped: seats } : null;
}

/** Who was touched can no longer be told when the figure falls below the seats touched. */
const fitting = (tapped: ReadonlySet<string>, on: number): ReadonlySet<string> =>
  tapped.size <= on ? tapped : new Set();
