import { describe, expect, test } from 'vitest';
import type { ObserverSide, SeatingPlan } from '../../../src/model/seatingPlan.ts';
import { headsUpWords } from '../../../src/screens/plan/headsUpWords.ts';
import { seatPlace } from '../../../src/screens/plan/seatPlace.ts';
import { wordsFor } from '../../../src/words/words.ts';

// Four columns with an aisle in the second, three rows with an aisle in the middle, front on top:
//   A . B C
//   . . . .
//   D . E .
const room = (observerSide: ObserverSide): SeatingPlan => ({
  columns: 4,
  rows: 3,
  observerSide,
  seats: (
    [
      ['A', 0, 0],
      ['B', 2, 0],
      ['C', 3, 0],
      ['D', 0, 2],
      ['E', 2, 2],
    ] as const
  ).map(([id, column, row]) => ({ id, column, row, table: 0, child: null })),
});
const place = (side: ObserverSide, seat: string) => {
  const { row, place, of } = seatPlace(room(side), seat) ?? { row: 0, place: 0, of: 0 };
  return `${row}:${place}/${of}`;
};

describe('where the observer sees a seat', () => {
  test('rows count from the observer, places from the left, aisles not at all', () => {
    expect(['A', 'B', 'C', 'D', 'E'].map((seat) => place('back', seat))).toEqual([
      '2:1/3',
      '2:2/3',
      '2:3/3',
      '1:1/2',
      '1:2/2',
    ]);
  });

  test('from the front everything is the other way round', () => {
    expect(['A', 'C', 'D', 'E'].map((seat) => place('front', seat))).toEqual([
      '1:3/3',
      '1:1/3',
      '2:2/2',
      '2:1/2',
    ]);
  });

  test('from the left the columns are the rows', () => {
    expect(['A', 'D', 'B', 'C'].map((seat) => place('left', seat))).toEqual([
      '1:1/2',
      '1:2/2',
      '2:1/2',
      '3:1/1',
    ]);
  });

  test('a seat that is not there has no place', () => {
    expect(seatPlace(room('back'), 'Z')).toBeNull();
  });
});

describe('what is spoken ahead of a look', () => {
  const words = wordsFor();
  const lesson = {
    children: [
      { id: 'c1', pseudonym: 'Otter-07' },
      { id: 'c2', pseudonym: 'Otter_10' },
      { id: 'c3', pseudonym: 'B200' },
    ],
    reserves: [{ id: 'c4', pseudonym: 'Newt 004' }],
    plan: room('back'),
  };
  const child = headsUpWords('child', lesson, words);
  const seat = headsUpWords('seat', lesson, words);

  test('a pseudonym as one says it, a reserve’s too', () => {
    expect(['c1', 'c2', 'c3', 'c4'].map((id) => child({ child: id, seat: 'A' }))).toEqual([
      'Otter 7',
      'Otter 10',
      'B 200',
      'Newt 4',
    ]);
  });

  test('a seat as the observer sees it', () => {
    expect(seat({ child: 'c1', seat: 'C' })).toBe('row 2, third from the left');
    const fromTheLeft = headsUpWords('seat', { ...lesson, plan: room('left') }, words);
    expect(fromTheLeft({ child: 'c1', seat: 'C' })).toBe('row 3');
  });

  test('the pseudonym where no seat is known; nothing where no child is', () => {
    expect(seat({ child: 'c1', seat: null })).toBe('Otter 7');
    expect(seat({ child: 'c1', seat: 'Z' })).toBe('Otter 7');
    expect(headsUpWords('seat', { ...lesson, plan: null }, words)({ child: 'c2', seat: 'A' })).toBe(
      'Otter 10',
    );
    expect(child({ child: null, seat: null })).toBeNull();
    expect(child({ child: 'c9', seat: null })).toBeNull();
  });
});
