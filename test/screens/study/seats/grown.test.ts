import { describe, expect, it } from 'vitest';
import type { SeatingPlan } from '../../../../src/model/seatingPlan.ts';
import { grownFor, moved, tableBeside, trimmed } from '../../../../src/screens/study/seats/grown.ts';

const planOf = (columns: number, rows: number, ...places: [number, number, number][]): SeatingPlan => ({
  columns,
  rows,
  observerSide: 'back',
  seats: places.map(([column, row, table]) => ({
    id: `${column}-${row}`,
    column,
    row,
    table,
    child: null,
  })),
});

describe('A room that grows and is trimmed', () => {
  const plan = planOf(3, 1, [0, 0, 0], [2, 0, 1]);

  it('moves right and back for a place beyond its left or front edge, so that no place is below nought', () => {
    const grown = grownFor(plan, { column: -1, row: -1 });
    expect(grown.place).toEqual({ column: 0, row: 0 });
    expect([grown.plan.columns, grown.plan.rows]).toEqual([4, 2]);
    expect(grown.plan.seats.map(({ column, row }) => [column, row])).toEqual([
      [1, 1],
      [3, 1],
    ]);
  });

  it('stays as it is for a place inside or beyond its right or back edge', () => {
    expect(grownFor(plan, { column: 3, row: 1 })).toEqual({ plan, place: { column: 3, row: 1 } });
  });

  it('loses its empty edges and keeps the aisles inside', () => {
    const left = trimmed(planOf(6, 5, [2, 1, 0], [4, 3, 1]));
    expect([left.columns, left.rows]).toEqual([3, 3]);
    expect(left.seats.map(({ column, row }) => [column, row])).toEqual([
      [0, 0],
      [2, 2],
    ]);
  });

  it('says where a place went when the room moved', () => {
    const { plan: grown } = grownFor(plan, { column: -1, row: 0 });
    expect(moved(plan, grown, { column: 1, row: 0 })).toEqual({ column: 2, row: 0 });
    expect(moved(grown, plan, { column: 2, row: 0 })).toEqual({ column: 1, row: 0 });
  });

  it('lets a new seat join the table beside it, the one in its row before the one behind it', () => {
    const fours = planOf(4, 2, [0, 0, 7], [1, 1, 8]);
    expect(tableBeside(fours, { column: 1, row: 0 })).toBe(7);
    expect(tableBeside(fours, { column: 2, row: 1 })).toBe(8);
    expect(tableBeside(fours, { column: 3, row: 0 })).toBeUndefined();
  });
});
