import type { AwayReason, EntryBody } from '../journal/entry.ts';
import { childAt } from '../journal/state.ts';
import { problem } from '../kernel/result.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { ScheduledInterval } from '../schedule/layOut.ts';
import type { Fault, PaperDraft, PaperStandIn } from './paperDraft.ts';

/** True where a sheet asks who stepped in for whom: the protocol has it, and somebody is in reserve. */
export function hasStandIns({ schedule: { protocol }, reserves = [] }: VisitPlan): boolean {
  const { method, reservesStepIn } = protocol;
  return reservesStepIn === true && reserves.length > 0 && method !== 'headcount' && method !== 'duration';
}

/** The reasons that a child can be away for. */
export const awayReasons: readonly AwayReason[] = ['left the room', 'with another adult', 'not taking part'];

/** The stand-ins in the order of their lines, each with the line at which it ends: where the child is back, or where another reserve takes over. */
function spans(standIns: readonly PaperStandIn[]): (PaperStandIn & { readonly to: number | null })[] {
  const sorted = [...standIns].sort((a, b) => a.from - b.from);
  return sorted.map((one, k) => ({
    ...one,
    to: one.until ?? sorted.slice(k + 1).find(({ child }) => child === one.child)?.from ?? null,
  }));
}

/** The first thing about the stand-ins of a sheet that cannot be, or null. */
export function standInsFault(
  { plan, standIns = [], stoppedAfter }: PaperDraft,
  intervals: readonly ScheduledInterval[],
): Fault | null {
  const last = stoppedAfter ?? intervals.length;
  const known = new Map([...plan.children, ...(plan.reserves ?? [])].map((one) => [one.id, one.pseudonym]));
  const isReserve = (id: string): boolean => (plan.reserves ?? []).some((one) => one.id === id);
  const all = spans(standIns);
  for (const [k, { child, by, from, until, to }] of all.entries()) {
    const [name, reserve] = [known.get(child) ?? child, known.get(by) ?? by];
    if (!known.has(child) || !isReserve(by) || by === child)
      return problem('paper.standInWho', { name, reserve });
    for (const found of until === null ? [from] : [from, until])
      if (!Number.isInteger(found) || found < 1 || found > last)
        return problem('paper.standInNowhere', { reserve, found, last });
    if (until !== null && until <= from) return problem('paper.standInBack', { name, from, until });
    const later = all.slice(k + 1).filter((one) => to === null || one.from < to);
    if (later.some((one) => one.child === child)) return problem('paper.standInAway', { name });
    if (later.some((one) => one.by === by)) return problem('paper.standInBusy', { reserve });
    if (all.every((one) => one.by !== child) && isReserve(child))
      return problem('paper.standInWho', { name, reserve });
  }
  return null;
}

/** What the journal says at a line: who is back from here on, and who is away, with the reserve who stands in. */
export function standInBodies(standIns: readonly PaperStandIn[], line: number): EntryBody[] {
  return [
    ...standIns.flatMap(({ child, until }): EntryBody[] =>
      until === line ? [{ kind: 'returned', child }] : [],
    ),
    ...standIns.flatMap(({ child, reason, by, from }): EntryBody[] =>
      from === line ? [{ kind: 'left', child, reason, by }] : [],
    ),
  ];
}

/** Who was really to be watched at a line of a sheet: the child that stands on it, or who stood in. */
export const watchedOnPaper = (standIns: readonly PaperStandIn[], child: string, line: number): string =>
  childAt({ standIns: spans(standIns) }, child, line);
