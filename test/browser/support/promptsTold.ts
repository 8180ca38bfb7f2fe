import type { KnownEntry } from '../../../src/journal/entry.ts';
import type { Sound } from './hearing.ts';
import { journalOnDisk } from './kept.ts';
import { shortVisitFile } from './shortVisit.ts';
import { expect } from './test.ts';

/** The shortest interval there is (ms). */
export const interval = 3000;

/** A long session of the shortest intervals, heard in both ears. */
export const visit = (key: string) =>
  shortVisitFile({
    key,
    protocol: {
      partLength: { kind: 'rounds', rounds: 100 },
      lookAt: 'start',
      cues: { channel: 'both', volume: 1, flash: true, vibration: false },
    },
  });

type Cued = Extract<KnownEntry, { kind: 'cued' }>;
export type Gap = Extract<KnownEntry, { kind: 'gap' }>;
export const cuedOf = (journal: readonly KnownEntry[]): Cued[] =>
  journal.flatMap((entry) => (entry.kind === 'cued' ? [entry] : []));
export const gapsOf = (journal: readonly KnownEntry[]): Gap[] =>
  journal.flatMap((entry) => (entry.kind === 'gap' ? [entry] : []));

/** Planned on the grid, each cue told of exactly once and in its order, up to the last one. */
export function expectOnGrid(journal: readonly KnownEntry[]): void {
  const cued = cuedOf(journal);
  expect(cued.map(({ interval }) => interval)).toEqual(cued.map((_, k) => k + 1));
  expect(cued.map(({ planned }) => planned)).toEqual(cued.map((_, k) => k * interval));
  expect(journal.map(({ seq }) => seq)).toEqual(journal.map((_, i) => i));
}

export const clockGaps = (journal: readonly KnownEntry[]): Gap[] =>
  gapsOf(journal).filter(({ cause }) => cause === 'clock');

/** Delivered as planned, unless the audio clock slipped, which the journal tells. */
export function expectPunctual(journal: readonly KnownEntry[]): void {
  const late = cuedOf(journal).filter(({ planned, delivered }) => planned !== delivered);
  const slips = gapsOf(journal).filter(({ cause }) => cause === 'sound');
  expect(late.length).toBeLessThanOrEqual(slips.length);
}

/** The prompts that a context gave, without the three ticks of the count-in, which lie a second apart. */
export const prompts = (sounds: readonly Sound[], context: number, ticks: boolean): Sound[] =>
  sounds.filter((sound) => sound.context === context).slice(ticks ? 3 : 0);

/** Waits until the journal of a session holds so many cues. */
export const cuesWritten = (
  page: Parameters<typeof journalOnDisk>[0],
  session: string,
  count: number,
): Promise<void> =>
  expect
    .poll(async () => cuedOf(await journalOnDisk(page, session)).length, {
      timeout: 60_000,
      intervals: [200],
    })
    .toBeGreaterThanOrEqual(count);
