import { describe, expect, test } from 'vitest';
import { type Count, type CountStep, counted } from '../../../src/screens/room/countSteps.ts';

const empty: Count = { on: null, present: 4, last: 3, tapped: new Set() };
/** What several touches one after the other come to. */
function steps(start: Count, ...all: CountStep[]) {
  let count = start;
  for (const step of all) count = { ...count, ...counted(count, step) };
  const { on, present, tapped } = count;
  return { on, present, tapped: [...tapped].sort() };
}
const seat = (child: string): CountStep => ({ kind: 'seat', child });

describe('stepping', () => {
  test('up begins with one, down with all but one', () => {
    expect(steps(empty, { kind: 'more' })).toMatchObject({ on: 1, present: 4 });
    expect(steps(empty, { kind: 'fewer' })).toMatchObject({ on: 3, present: 4 });
  });

  test('on-task stays between nobody and everybody present', () => {
    expect(counted({ ...empty, on: 4 }, { kind: 'more' })).toBeNull();
    expect(counted({ ...empty, on: 0 }, { kind: 'fewer' })).toBeNull();
    expect(counted({ ...empty, present: 0 }, { kind: 'more' })).toBeNull();
  });

  test('present never falls below on-task', () => {
    expect(counted({ ...empty, on: 4 }, { kind: 'gone' })).toBeNull();
    expect(steps({ ...empty, on: 3 }, { kind: 'gone' })).toMatchObject({ on: 3, present: 3 });
    expect(steps(empty, { kind: 'arrived' })).toMatchObject({ on: null, present: 5 });
    expect(counted({ ...empty, present: 0 }, { kind: 'gone' })).toBeNull();
  });
});

describe('whole answers', () => {
  test('nobody, everybody, as last time', () => {
    expect(steps(empty, { kind: 'nobody' })).toEqual({ on: 0, present: 4, tapped: [] });
    expect(steps(empty, { kind: 'all', seated: ['a', 'b'] })).toEqual({
      on: 4,
      present: 4,
      tapped: ['a', 'b'],
    });
    expect(steps(empty, { kind: 'same' })).toMatchObject({ on: 3 });
    expect(counted({ ...empty, last: null }, { kind: 'same' })).toBeNull();
  });

  test('last time’s figure is cut to those who are present now', () => {
    expect(steps({ ...empty, present: 2 }, { kind: 'same' })).toMatchObject({ on: 2, present: 2 });
  });
});

describe('seats', () => {
  test('each touch counts a child on-task, the next no longer', () => {
    expect(steps(empty, seat('a'), seat('b'))).toEqual({ on: 2, present: 4, tapped: ['a', 'b'] });
    expect(steps(empty, seat('a'), seat('b'), seat('a'))).toEqual({ on: 1, present: 4, tapped: ['b'] });
  });

  test('steps and seats add up', () => {
    expect(steps(empty, seat('a'), { kind: 'more' }, seat('b'))).toMatchObject({ on: 3 });
  });

  test('all but one: everybody, then that one’s seat', () => {
    expect(steps(empty, { kind: 'all', seated: ['a', 'b', 'c', 'd'] }, seat('c'))).toEqual({
      on: 3,
      present: 4,
      tapped: ['a', 'b', 'd'],
    });
  });

  test('stepping below the seats touched forgets them: nobody knows who is meant', () => {
    expect(steps(empty, seat('a'), seat('b'), { kind: 'fewer' })).toEqual({
      on: 1,
      present: 4,
      tapped: [],
    });
  });

  test('more seats than were said to be present show that more are there', () => {
    expect(steps({ ...empty, present: 1 }, seat('a'), seat('b'))).toMatchObject({ on: 2, present: 2 });
    expect(counted({ ...empty, on: 4 }, seat('a'))).toBeNull();
  });
});
