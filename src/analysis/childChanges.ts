import type { Method } from '../model/protocol.ts';
import { byChild } from './byChild.ts';
import { byText } from './order.ts';
import type { SessionRecord } from './sessionRecord.ts';
import { addTallies, noLooks, percentOf, type Tally, tallyOf } from './tally.ts';
import { type Way, waysOf } from './waysOf.ts';

/** One child in both phases: percentages 0–100 of what was scored in all sessions of a phase together, and how many looks. */
export interface ChildLine {
  readonly child: string;
  /** null where the child was not scored in that phase. */
  readonly before: number | null;
  readonly after: number | null;
  readonly looksBefore: number;
  readonly looksAfter: number;
}

/** What one class gave in the two phases under one condition. */
export interface ClassData {
  readonly className: string | null;
  /** null also where the condition changes with the phase: the change is then not one within a condition. */
  readonly condition: string | null;
  /** Every condition that this class's sessions name. */
  readonly conditions: readonly string[];
  /** Every child that was scored in either phase, in code-point order. */
  readonly lines: readonly ChildLine[];
  /** All looks of everybody in a phase together; the only figures that a headcount has. */
  readonly together: { readonly before: Tally; readonly after: Tally };
  readonly methods: readonly Method[];
  readonly ways: readonly Way[];
  readonly sessions: readonly string[];
}

interface Sides {
  before: Tally;
  after: Tally;
}

/**
 * Gathers records class by class, in code-point order: one for each condition that the class was seen under in both
 * phases, one for the class where no condition has both.
 */
export function classData(
  records: readonly SessionRecord[],
  phases: { readonly before: string; readonly after: string },
): ClassData[] {
  const relevant = records.filter(({ phase }) => phase === phases.before || phase === phases.after);
  const names = [...new Set(relevant.map(({ className }) => className))].sort(byText);
  return names.flatMap((name) => {
    const own = relevant.filter(({ className }) => className === name);
    const conditions = [...new Set(own.flatMap(({ condition }) => condition ?? []))].sort(byText);
    const under = (condition: string): SessionRecord[] =>
      own.filter((record) => record.condition === condition);
    const inBoth = conditions.some(
      (condition) => new Set(under(condition).map(({ phase }) => phase)).size === 2,
    );
    // One named condition also covers sessions that do not name theirs.
    if (conditions.length < 2) return [oneClass(own, phases.before, conditions[0] ?? null, conditions)];
    if (!inBoth) return [oneClass(own, phases.before, null, conditions)];
    const groups = conditions.map((condition) =>
      oneClass(under(condition), phases.before, condition, conditions),
    );
    const rest = own.filter(({ condition }) => condition === null);
    return rest.length === 0 ? groups : [...groups, oneClass(rest, phases.before, null, conditions)];
  });
}

function oneClass(
  records: readonly SessionRecord[],
  before: string,
  condition: string | null,
  conditions: readonly string[],
): ClassData {
  const children = new Map<string, Sides>();
  const together: Sides = { before: noLooks, after: noLooks };
  for (const record of records) {
    const side = record.phase === before ? 'before' : 'after';
    together[side] = addTallies(together[side], tallyOf(record.looks, record.method));
    for (const { child, looks } of byChild(record)) {
      const sides = children.get(child) ?? { before: noLooks, after: noLooks };
      sides[side] = addTallies(sides[side], tallyOf(looks, record.method));
      children.set(child, sides);
    }
  }
  const lines = [...children]
    .map(([child, sides]) => lineOf(child, sides))
    .filter(({ before, after }) => before !== null || after !== null)
    .sort((a, b) => byText(a.child, b.child));
  return {
    className: records[0]?.className ?? null,
    condition,
    conditions,
    lines,
    together,
    methods: [...new Set(records.map(({ method }) => method))].sort(),
    ways: waysOf(records),
    sessions: [...new Set(records.map(({ session }) => session))],
  };
}

function lineOf(child: string, { before, after }: Sides): ChildLine {
  const percent = (tally: Tally): number | null => {
    const value = percentOf(tally);
    return Number.isFinite(value) ? value : null;
  };
  return {
    child,
    before: percent(before),
    after: percent(after),
    looksBefore: before.scored,
    looksAfter: after.scored,
  };
}

/** The children with both phases: their percentages before and after, in the same order. */
export function pairedScores(lines: readonly ChildLine[]): { before: number[]; after: number[] } {
  const both = lines.filter(({ before, after }) => before !== null && after !== null);
  return {
    before: both.map((line) => line.before as number),
    after: both.map((line) => line.after as number),
  };
}
