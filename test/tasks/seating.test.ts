import fc from 'fast-check';
import { expect, it } from 'vitest';
import { seatingPlan } from '../../src/model/seatingPlan.ts';
import { addSeat, removeSeat, seatChild, setSeatingPlan, turnPlan } from '../../src/tasks/index.ts';
import { planFromPreset } from '../../src/tasks/planPresets.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, school } from './bench.ts';

it('lays every preset out inside the room, one chair a place, two chairs or four a table', () => {
  const kinds = fc.oneof(
    fc.record({
      kind: fc.constantFrom('pairs' as const, 'fours' as const),
      columns: fc.integer({ min: 1, max: 6 }),
      rows: fc.integer({ min: 1, max: 6 }),
    }),
    fc.record({ kind: fc.constant('horseshoe' as const), seats: fc.integer({ min: 1, max: 50 }) }),
  );
  fc.assert(
    fc.property(kinds, (preset) => {
      const plan = given(planFromPreset(preset, Math.random));
      expect(seatingPlan.safeParse(plan).success).toBe(true);
      const places = new Set(plan.seats.map(({ column, row }) => `${column} ${row}`));
      expect(places.size).toBe(plan.seats.length);
      const expected =
        preset.kind === 'horseshoe'
          ? preset.seats
          : preset.columns * preset.rows * (preset.kind === 'pairs' ? 2 : 4);
      expect(plan.seats).toHaveLength(expected);
      if (preset.kind !== 'horseshoe') {
        const tables = new Set(plan.seats.map(({ table }) => table));
        expect(tables.size).toBe(preset.columns * preset.rows);
      }
    }),
  );
  expect(codeOf(planFromPreset({ kind: 'pairs', columns: 9, rows: 2 }, Math.random))).toBe(
    'task.planTooLarge',
  );
  expect(codeOf(planFromPreset({ kind: 'fours', columns: 0, rows: 2 }, Math.random))).toBe('task.planEmpty');
});

it('seats children by tapping, lets two change places, and keeps them through another preset', async () => {
  const on = await bench();
  const { classroom } = await school(on, 4);
  const [otter, heron] = classroom.children.map(({ id }) => id) as [string, string];
  const planned = given(await setSeatingPlan(on.deps, classroom.id, { kind: 'pairs', columns: 2, rows: 1 }));
  const [first, second] = (planned.plan?.seats ?? []).map(({ id }) => id) as [string, string];
  given(await seatChild(on.deps, classroom.id, first, otter));
  given(await seatChild(on.deps, classroom.id, second, heron));
  const swapped = given(await seatChild(on.deps, classroom.id, first, heron));
  expect(swapped.plan?.seats.map(({ child }) => child)).toEqual([heron, otter, null, null]);
  const turned = given(await turnPlan(on.deps, classroom.id, 'left'));
  expect(turned.plan?.observerSide).toBe('left');
  const other = given(await setSeatingPlan(on.deps, classroom.id, { kind: 'horseshoe', seats: 5 }));
  expect(other.plan?.seats.map(({ child }) => child)).toEqual([heron, otter, null, null, null]);
  expect(other.plan?.observerSide).toBe('left');
  const emptied = given(await seatChild(on.deps, classroom.id, other.plan?.seats[0]?.id ?? '', null));
  expect(emptied.plan?.seats[0]?.child).toBeNull();
});

it('adds and removes single seats, and refuses what cannot stand', async () => {
  const on = await bench();
  const { classroom } = await school(on, 2);
  expect(codeOf(await addSeat(on.deps, classroom.id, { column: 0, row: 0 }))).toBe('task.noPlan');
  given(await setSeatingPlan(on.deps, classroom.id, { kind: 'pairs', columns: 1, rows: 1 }));
  const added = given(await addSeat(on.deps, classroom.id, { column: 4, row: 2 }));
  expect(added.plan).toMatchObject({ columns: 5, rows: 3 });
  expect(added.plan?.seats[2]).toMatchObject({ column: 4, row: 2, table: 1 });
  const before = await on.dump();
  expect(codeOf(await addSeat(on.deps, classroom.id, { column: 4, row: 2 }))).toBe('task.seatTaken');
  expect(codeOf(await addSeat(on.deps, classroom.id, { column: 20, row: 0 }))).toBe('task.planTooLarge');
  expect(codeOf(await removeSeat(on.deps, classroom.id, 'nothing'))).toBe('task.noSeat');
  const plan = added.plan;
  if (plan === null) throw new Error('no plan');
  const child = classroom.children[0]?.id ?? '';
  const twice = { ...plan, seats: plan.seats.map((seat) => ({ ...seat, child })) };
  expect(codeOf(await setSeatingPlan(on.deps, classroom.id, twice))).toBe('task.seatedTwice');
  const stranger = { ...plan, seats: plan.seats.map((seat) => ({ ...seat, child: 'stranger' })) };
  expect(codeOf(await setSeatingPlan(on.deps, classroom.id, stranger))).toBe('task.noChild');
  expect(await on.dump()).toBe(before);
  const removed = given(await removeSeat(on.deps, classroom.id, plan.seats[2]?.id ?? ''));
  expect(removed.plan?.seats).toHaveLength(2);
  expect(given(await setSeatingPlan(on.deps, classroom.id, null)).plan).toBeNull();
});
