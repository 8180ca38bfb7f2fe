import type { Id } from '../kernel/ids.ts';
import { seededRandom, shuffled } from '../kernel/random.ts';
import type { Child, Draw } from '../model/classroom.ts';
import type { Protocol } from '../model/protocol.ts';
import type { LaidSchedule } from '../model/session.ts';
import { intervalsInPart, type LayOutRecipe } from './layOut.ts';
import { type Attendance, replaceAbsent } from './replaceAbsent.ts';
import { drawTurns } from './turns.ts';

type Recipe = LayOutRecipe & Pick<Protocol, 'order' | 'childrenToDraw'>;

export interface DayWish {
  /** Children who are not there today. */
  readonly absent: ReadonlySet<Id>;
  /** The child that was chosen to be the target, or the only one; null leaves it to the order. */
  readonly first: Id | null;
  readonly orderSeed: string;
  readonly parts: number;
}

export interface OrderOfDay {
  /** Who is watched, in the order of the schedule. Empty where nobody is there or nobody was drawn. */
  readonly children: readonly Id[];
  /** Who may still step in, in order. */
  readonly reserves: readonly Id[];
  readonly replaced: Attendance['replaced'];
  /** The seed of the order; null where chance has no part in it. */
  readonly orderSeed: string | null;
  readonly turns: LaidSchedule['turns'];
}

/** Headcounts look at everybody of the class, so that nobody has to be drawn for them. */
export const looksAtEverybody = ({ method }: Pick<Protocol, 'method'>): boolean => method === 'headcount';

/** One child is watched throughout: its rotation says so, or its method (duration) does. */
export const watchesOne = ({ method, rotation }: Pick<Protocol, 'method' | 'rotation'>): boolean =>
  method === 'duration' || (method !== 'headcount' && rotation.kind === 'one');

/** One child stands out and may be chosen by name: the target among its peers, or the only one. */
export const hasTarget = (recipe: Pick<Protocol, 'method' | 'rotation'>): boolean =>
  watchesOne(recipe) || (!looksAtEverybody(recipe) && recipe.rotation.kind === 'target');

/**
 * Who of a class is watched today, and in which order: the drawn children, reserves in the places of absent ones, put
 * in order by chance with the seed (or as drawn). A chosen first child goes before all others; where it was not among
 * today's children the last drawn one makes room. Where one child is watched the others wait as reserves.
 */
export function orderOfDay(
  protocol: Recipe,
  { draw, children }: { readonly draw: Draw | null; readonly children: readonly Child[] },
  { absent, first, orderSeed, parts }: DayWish,
): OrderOfDay {
  const here = children.filter((child) => !child.removed);
  const present = here.filter(({ id }) => !absent.has(id)).map(({ id }) => id);
  if (looksAtEverybody(protocol))
    return { children: present, reserves: [], replaced: [], orderSeed: null, turns: undefined };
  const chosen = first !== null && hasTarget(protocol) && present.includes(first) ? first : null;
  const today: Attendance =
    draw === null
      ? { children: [], replaced: [] }
      : replaceAbsent(upTo(draw, protocol.childrenToDraw), absent, here);
  const seed = protocol.order === 'listed' ? null : orderSeed;
  const others = today.children.filter((id) => id !== chosen);
  const beside = chosen === null ? others : others.slice(0, Math.max(0, protocol.childrenToDraw - 1));
  // The seed gives the same order of the same children, whoever of them is put first afterwards.
  const mixing = chosen === null || !today.children.includes(chosen) ? beside : today.children;
  const mixed = seed === null ? mixing : shuffled(mixing, seededRandom(seed));
  const order = chosen === null ? mixed : [chosen, ...mixed.filter((id) => id !== chosen)];
  const watched = watchesOne(protocol) ? order.slice(0, 1) : order;
  const eachRound = seed !== null && protocol.order === 'random each round' && !watchesOne(protocol);
  const intervals = intervalsInPart(protocol.partLength, protocol, watched.length);
  return {
    children: watched,
    reserves: waiting(draw, order.slice(watched.length), watched, new Set(present)),
    replaced: today.replaced,
    orderSeed: seed,
    turns: eachRound ? drawTurns(protocol, watched.length, intervals, parts, seed) : undefined,
  };
}

/** Those who are there and were not needed: first those who were in today's order, then as drawn. */
function waiting(
  draw: Draw | null,
  next: readonly Id[],
  watched: readonly Id[],
  present: ReadonlySet<Id>,
): Id[] {
  const drawn = draw === null ? [] : [...draw.chosen, ...draw.reserves];
  return [...new Set([...next, ...drawn])].filter((id) => present.has(id) && !watched.includes(id));
}

/** A protocol that watches fewer children than were drawn takes the first ones; the others are its first reserves. */
function upTo(draw: Draw, count: number): Draw {
  return {
    ...draw,
    chosen: draw.chosen.slice(0, count),
    reserves: [...draw.chosen.slice(count), ...draw.reserves],
  };
}
