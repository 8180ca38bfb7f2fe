import type { Id } from '../kernel/ids.ts';
import type { PartLength, Protocol } from '../model/protocol.ts';
import type { LaidSchedule } from '../model/session.ts';
import { intervalsInRound, listedTurns } from './turns.ts';

/** The prompt that opens an interval: a look; the next child of a sweep; or the beginning of watching. */
export type OpeningCue = 'look' | 'next' | 'observe';

/**
 * One line of the schedule. Times are milliseconds from the beginning of its part: a part begins at session
 * time 0 or, after a break, when the observer says so.
 */
export interface ScheduledInterval {
  /** 1, 2, 3 … through the whole session, all children and parts together. */
  readonly number: number;
  /** 0-based part; each part belongs to one phase. */
  readonly part: number;
  readonly phase: string;
  /** 1-based pass through all target children, counted within its part. */
  readonly round: number;
  /** null = everybody (headcount). */
  readonly child: Id | null;
  readonly openMs: number;
  /** Where the next interval of the part opens. */
  readonly endMs: number;
  readonly cue: OpeningCue;
  /** The look (momentary) or "observe" (partial, whole) cue: from here on a touch belongs to this interval. */
  readonly cueMs: number;
  /** The "record" cue, when behaviour stops counting; null without a record part. */
  readonly recordMs: number | null;
  /** Until here a touch belongs to this interval: the next cue, or one interval length after the last one. */
  readonly closeMs: number;
}

type Recipe = Pick<Protocol, 'method' | 'intervalMs' | 'rotation'>;

/** What of a protocol decides when whose intervals are. */
export type LayOutRecipe = Recipe & Pick<Protocol, 'observeMs' | 'lookAt' | 'partLength'>;

/** Milliseconds that one part takes at most (its last mark may come a little later). */
export function partMs(length: PartLength, recipe: Recipe, children: number): number {
  if (length.kind === 'minutes') return Math.round(length.minutes * 60_000);
  const prompts = recipe.rotation.kind === 'sweep' ? 1 : intervalsInRound(recipe, children);
  return length.rounds * prompts * recipe.intervalMs;
}

/** How many intervals one part has. A duration record is one interval; a sweep has one for each child at each prompt. */
export function intervalsInPart(length: PartLength, recipe: Recipe, children: number): number {
  const time = partMs(length, recipe, children);
  if (recipe.method === 'duration') return time > 0 ? 1 : 0;
  const prompts = Math.floor(time / recipe.intervalMs + 1e-9);
  return isSweep(recipe) ? prompts * children : prompts;
}

/** Headcounts and durations have no turns, whatever their protocol says of them. */
const isSweep = ({ method, rotation }: Recipe): boolean =>
  rotation.kind === 'sweep' && method !== 'headcount' && method !== 'duration';

/**
 * The intervals of a session, from its protocol, its phases and its children in order. They tile each part without gap
 * or overlap; every part begins anew. No children give no intervals, except in a headcount.
 * @param turns whose turn it is, part by part, where chance decided it; else the children keep their order
 */
export function layOut(
  protocol: LayOutRecipe,
  phases: readonly string[],
  children: readonly Id[],
  turns?: LaidSchedule['turns'],
): ScheduledInterval[] {
  const { method } = protocol;
  if (children.length === 0 && method !== 'headcount') return [];
  const perPart = intervalsInPart(protocol.partLength, protocol, children.length);
  const perRound = intervalsInRound(protocol, children.length);
  const listed = method === 'headcount' ? [] : listedTurns(protocol, children.length, perPart);
  const times = partTimes(protocol, children.length, perPart);
  return phases.flatMap((phase, part) =>
    times.map((time, k): ScheduledInterval => {
      const turn = turns?.[part]?.[k] ?? listed[k] ?? 0;
      return {
        number: part * perPart + k + 1,
        part,
        phase,
        round: Math.floor(k / perRound) + 1,
        child: method === 'headcount' ? null : (children[turn] ?? (children[0] as Id)),
        ...time,
      };
    }),
  );
}

type Times = Pick<ScheduledInterval, 'openMs' | 'endMs' | 'cue' | 'cueMs' | 'recordMs' | 'closeMs'>;

function partTimes(protocol: LayOutRecipe, children: number, perPart: number): Times[] {
  const { intervalMs: length, method, partLength } = protocol;
  if (method === 'duration') {
    const endMs = partMs(partLength, protocol, children);
    return [{ openMs: 0, endMs, cue: 'observe', cueMs: 0, recordMs: null, closeMs: endMs }];
  }
  const looks = method === 'momentary' || method === 'headcount';
  const atEnd = looks && protocol.lookAt === 'end';
  if (isSweep(protocol)) return sweepTimes(protocol, children, perPart, atEnd, looks);
  return Array.from({ length: perPart }, (_, k): Times => {
    const openMs = k * length;
    const endMs = openMs + length;
    const cueMs = atEnd ? endMs : openMs;
    return {
      openMs,
      endMs,
      cue: looks ? 'look' : 'observe',
      cueMs,
      recordMs: !looks && protocol.observeMs < length ? openMs + protocol.observeMs : null,
      closeMs: cueMs + length,
    };
  });
}

/**
 * At each prompt one child after the other has `eachMs`, less where that many children would not fit. Looking when
 * intervals end, the first child's interval takes what the sweep leaves over, and the prompt comes at its end; looking
 * when they start, the last one's does.
 */
function sweepTimes(
  protocol: LayOutRecipe,
  children: number,
  perPart: number,
  atEnd: boolean,
  looks: boolean,
): Times[] {
  const { intervalMs: length, rotation } = protocol;
  const wanted = rotation.kind === 'sweep' ? rotation.eachMs : length;
  const each = Math.min(wanted, Math.floor(length / children));
  const cueOf = (k: number): number => {
    const sweep = Math.floor(k / children);
    return (atEnd ? sweep + 1 : sweep) * length + (k % children) * each;
  };
  return Array.from({ length: perPart }, (_, k): Times => {
    const cueMs = cueOf(k);
    const next = cueOf(k + 1);
    return {
      openMs: !atEnd ? cueMs : k === 0 ? 0 : cueOf(k - 1),
      endMs: atEnd ? cueMs : next,
      cue: !looks ? 'observe' : k % children === 0 ? 'look' : 'next',
      cueMs,
      recordMs: null,
      closeMs: next,
    };
  });
}

/** The intervals of a frozen schedule. */
export function layOutSchedule(schedule: LaidSchedule, children: readonly Id[]): ScheduledInterval[] {
  return layOut(schedule.protocol, schedule.phases, children, schedule.turns);
}

/** Milliseconds from the beginning of a part until its last interval closes. */
export function partDuration(intervals: readonly ScheduledInterval[], part: number): number {
  return intervals.reduce(
    (latest, interval) => (interval.part === part ? Math.max(latest, interval.closeMs) : latest),
    0,
  );
}
