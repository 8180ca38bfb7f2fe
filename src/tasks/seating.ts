import { newId } from '../kernel/ids.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import { type ObserverSide, type Seat, type SeatingPlan, seatingPlan } from '../model/seatingPlan.ts';
import { editClassroom } from './edits.ts';
import { type PlanPreset, planFromPreset } from './planPresets.ts';
import type { Deps } from './ports.ts';

type Answer = Promise<Result<Classroom>>;

/** Another plan: a preset (children keep their order and go to its first seats), a plan as drawn, or none. */
export function setSeatingPlan(deps: Deps, classroom: string, plan: SeatingPlan | PlanPreset | null): Answer {
  return editClassroom(deps, classroom, (before) => {
    if (plan === null) return ok({ plan: null });
    if (!('kind' in plan)) return checkedPlan(before, plan);
    const empty = planFromPreset(plan, deps.random);
    if (!empty.ok) return empty;
    const seated = (before.plan?.seats ?? []).flatMap((seat) => (seat.child === null ? [] : [seat.child]));
    const seats = empty.value.seats.map((seat, i) => ({ ...seat, child: seated[i] ?? null }));
    const observerSide = before.plan?.observerSide ?? empty.value.observerSide;
    return ok({ plan: { ...empty.value, seats, observerSide } });
  });
}

/** One chair more where none stands; the plan grows to hold it. */
export function addSeat(
  deps: Deps,
  classroom: string,
  place: { readonly column: number; readonly row: number; readonly table?: number },
): Answer {
  return editPlan(deps, classroom, (plan, before) => {
    if (plan.seats.some((seat) => seat.column === place.column && seat.row === place.row))
      return problem('task.seatTaken');
    const lastTable = plan.seats.reduce((last, seat) => Math.max(last, seat.table), -1);
    const seat: Seat = {
      id: newId(deps.random),
      column: place.column,
      row: place.row,
      table: place.table ?? lastTable + 1,
      child: null,
    };
    return checkedPlan(before, {
      ...plan,
      columns: Math.max(plan.columns, place.column + 1),
      rows: Math.max(plan.rows, place.row + 1),
      seats: [...plan.seats, seat],
    });
  });
}

export function removeSeat(deps: Deps, classroom: string, seat: string): Answer {
  return editPlan(deps, classroom, (plan) => {
    if (!plan.seats.some((one) => one.id === seat)) return problem('task.noSeat');
    return ok({ plan: { ...plan, seats: plan.seats.filter((one) => one.id !== seat) } });
  });
}

/** Puts a child on a seat; whoever sat there takes the child's old seat, or none. Null empties the seat. */
export function seatChild(deps: Deps, classroom: string, seat: string, child: string | null): Answer {
  return editPlan(deps, classroom, (plan, before) => {
    const target = plan.seats.find((one) => one.id === seat);
    if (target === undefined) return problem('task.noSeat');
    if (child !== null && !before.children.some((one) => one.id === child && !one.removed))
      return problem('task.noChild');
    const seats = plan.seats.map((one) => {
      if (one.id === seat) return { ...one, child };
      return child !== null && one.child === child ? { ...one, child: target.child } : one;
    });
    return ok({ plan: { ...plan, seats } });
  });
}

/** Where the observer sits: screens turn the plan so that this side is at the bottom. */
export function turnPlan(deps: Deps, classroom: string, side: ObserverSide): Answer {
  return editPlan(deps, classroom, (plan) => ok({ plan: { ...plan, observerSide: side } }));
}

function editPlan(
  deps: Deps,
  classroom: string,
  change: (plan: SeatingPlan, before: Classroom) => Result<{ plan: SeatingPlan }>,
): Answer {
  return editClassroom(deps, classroom, (before) =>
    before.plan === null ? problem('task.noPlan') : change(before.plan, before),
  );
}

/** A plan with one chair a place, and every child of the class at most once. */
function checkedPlan(before: Classroom, plan: SeatingPlan): Result<{ plan: SeatingPlan }, Problem> {
  if (!seatingPlan.safeParse(plan).success) return problem('task.planTooLarge', { most: 20 });
  const outside = plan.seats.some((seat) => seat.column >= plan.columns || seat.row >= plan.rows);
  const places = new Set(plan.seats.map((seat) => `${seat.column} ${seat.row}`));
  if (outside || places.size < plan.seats.length) return problem('task.seatTaken');
  const here = new Set(before.children.filter((child) => !child.removed).map((child) => child.id));
  const seated = plan.seats.flatMap((seat) => (seat.child === null ? [] : [seat.child]));
  if (seated.some((child) => !here.has(child))) return problem('task.noChild');
  if (new Set(seated).size < seated.length) return problem('task.seatedTwice');
  return ok({ plan });
}
