/** What was tapped first and waits for its counterpart: a child of the list, or a seat. */
export type Waiting =
  | { readonly kind: 'child'; readonly child: string }
  | { readonly kind: 'seat'; readonly seat: string; readonly child: string | null };

/** What a tap brings about: a child (or nobody) on a seat; null: nothing yet. */
export interface Seating {
  readonly seat: string;
  readonly child: string | null;
}

export interface Tapped {
  readonly waiting: Waiting | null;
  readonly seating: Seating | null;
}

/** A child of the list of those without a seat was tapped. */
export function tappedChild(waiting: Waiting | null, child: string): Tapped {
  if (waiting?.kind === 'seat') return { waiting: null, seating: { seat: waiting.seat, child } };
  if (waiting?.child === child) return { waiting: null, seating: null };
  return { waiting: { kind: 'child', child }, seating: null };
}

/** A seat was tapped: it takes the waiting child, lets its own child go, or waits itself. */
export function tappedSeat(
  waiting: Waiting | null,
  seat: { readonly id: string; readonly child: string | null },
): Tapped {
  if (waiting?.kind === 'child') return { waiting: null, seating: { seat: seat.id, child: waiting.child } };
  if (waiting?.seat === seat.id)
    return { waiting: null, seating: seat.child === null ? null : { seat: seat.id, child: null } };
  if (waiting !== null && waiting.child !== null)
    return { waiting: null, seating: { seat: seat.id, child: waiting.child } };
  // An empty seat was waiting, and a child on another seat was tapped: that child moves there.
  if (waiting !== null && seat.child !== null)
    return { waiting: null, seating: { seat: waiting.seat, child: seat.child } };
  return { waiting: { kind: 'seat', seat: seat.id, child: seat.child }, seating: null };
}
