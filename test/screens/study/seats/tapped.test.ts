import { describe, expect, it } from 'vitest';
import { tappedChild, tappedSeat, type Waiting } from '../../../../src/screens/study/seats/tapped.ts';

const free = { id: 'seat-1', child: null };
const taken = { id: 'seat-2', child: 'heron' };
const otter: Waiting = { kind: 'child', child: 'otter' };

describe('Two taps put a child on a seat', () => {
  it('in either order', () => {
    const first = tappedChild(null, 'otter');
    expect(first).toEqual({ waiting: otter, seating: null });
    expect(tappedSeat(first.waiting, free)).toEqual({
      waiting: null,
      seating: { seat: 'seat-1', child: 'otter' },
    });
    const seatFirst = tappedSeat(null, free);
    expect(seatFirst.seating).toBeNull();
    expect(tappedChild(seatFirst.waiting, 'otter')).toEqual({
      waiting: null,
      seating: { seat: 'seat-1', child: 'otter' },
    });
  });

  it('and the same tap twice lets go: of a child, of a free seat', () => {
    expect(tappedChild(otter, 'otter')).toEqual({ waiting: null, seating: null });
    expect(tappedSeat(tappedSeat(null, free).waiting, free)).toEqual({ waiting: null, seating: null });
  });

  it('and a taken seat tapped twice is empty again', () => {
    expect(tappedSeat(tappedSeat(null, taken).waiting, taken).seating).toEqual({
      seat: 'seat-2',
      child: null,
    });
  });

  it('and a seated child moves, whichever of the two seats is tapped first', () => {
    const move = { seat: 'seat-1', child: 'heron' };
    expect(tappedSeat(tappedSeat(null, taken).waiting, free).seating).toEqual(move);
    expect(tappedSeat(tappedSeat(null, free).waiting, taken).seating).toEqual(move);
  });

  it('and another child of the list takes the place of the one that waits', () => {
    expect(tappedChild(otter, 'wren').waiting).toEqual({ kind: 'child', child: 'wren' });
  });
});
