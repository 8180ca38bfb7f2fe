import type { Format } from '../../format.ts';
import { short } from './short.ts';

type F = Format;

/** The picture of a schedule before it is used, and its table. */
export const scheduleWords = {
  schedulePicture: ({ children, parts }: { children: number; parts: number }, f: F) =>
    `The schedule: one row ${children === 0 ? 'for everybody' : `for each of ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}`}, time across${parts > 1 ? `, ${f.whole(parts)} phases` : ''}, a mark at each look`,
  scheduleEverybody: 'everybody',
  scheduleTarget: ({ name }: { name: string }) => `${name}, target`,
  scheduleMinutes: 'min',
  scheduleLooks: 'looks',
  scheduleCounts: 'counts',
  scheduleInAll: 'in all',
  scheduleWatched: 'watched',
  scheduleTable: 'The same as a table',
  scheduleCaption: 'When each child is seen',
  scheduleChild: 'child',
  schedulePhase: 'phase',
  scheduleFirst: 'first',
  scheduleLast: 'last',
  scheduleLongest: 'longest between looks',
  scheduleSeen: ({ ms }: { ms: number | null }, f: F) => (ms === null ? '–' : f.clock(ms)),
  scheduleMinutesOf: ({ ms }: { ms: number }, f: F) => `${short(Math.round(ms / 6000) / 10, f)} min`,
} as const;
