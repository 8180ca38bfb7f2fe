import { describe, expect, test } from 'vitest';
import type { ObserverSide, SeatingPlan } from '../../../src/model/seatingPlan.ts';
import { onGlass, tracks, turned } from '../../../src/screens/plan/turned.ts';

// Three columns, two rows, front on top:
//   A B .
//   C . D
const room = (observerSide: ObserverSide): SeatingPlan => ({
  columns: 3,
  rows: 2,
  observerSide,
  seats: [
    { id: 'A', column: 0, row: 0, table: 0, child: null },
    { id: 'B', column: 1, row: 0, table: 0, child: null },
    { id: 'C', column: 0, row: 1, table: 1, child: null },
    { id: 'D', column: 2, row: 1, table: 2, child: null },
  ],
});

const drawn = (side: ObserverSide): string[] => {
  const { columns, rows, seats } = turned(room(side));
  return Array.from({ length: rows }, (_, y) =>
    Array.from({ length: columns }, (_, x) => seats.find((s) => s.x === x && s.y === y)?.id ?? '.').join(''),
  );
};

describe('the plan as the observer sees it', () => {
  test('from the back it is as seen from above', () => {
    expect(drawn('back')).toEqual(['AB.', 'C.D']);
    expect(turned(room('back')).front).toBe('top');
  });

  test('from the front everything is the other way round', () => {
    expect(drawn('front')).toEqual(['D.C', '.BA']);
    expect(turned(room('front')).front).toBe('bottom');
  });

  test('from the left the left column lies at the bottom and the front to the left', () => {
    expect(drawn('left')).toEqual(['.D', 'B.', 'AC']);
    expect(turned(room('left')).front).toBe('left');
  });

  test('from the right the right column lies at the bottom and the front to the right', () => {
    expect(drawn('right')).toEqual(['CA', '.B', 'D.']);
    expect(turned(room('right')).front).toBe('right');
  });

  test('seats are listed in reading order of the glass', () => {
    expect(turned(room('left')).seats.map((s) => s.id)).toEqual(['D', 'B', 'A', 'C']);
  });

  test('neighbours of one table are joined, neighbours of two tables are not', () => {
    const sides = (side: ObserverSide) =>
      Object.fromEntries(turned(room(side)).seats.map((s) => [s.id, s.joined]));
    expect(sides('back')).toEqual({ A: ['right'], B: ['left'], C: [], D: [] });
    expect(sides('left')).toEqual({ A: ['top'], B: ['bottom'], C: [], D: [] });
  });

  test('places beyond the plan turn along with it', () => {
    expect(onGlass(room('front'), { column: 3, row: 2 })).toEqual({ x: -1, y: -1 });
    expect(onGlass(room('left'), { column: -1, row: 0 })).toEqual({ x: 0, y: 3 });
  });

  test('an aisle is narrower than a seat', () => {
    expect(tracks(4, new Set([0, 1, 3]))).toEqual([1, 1, 0.4, 1]);
  });
});
