import type { KnownEntry } from '../../../src/journal/entry.ts';
import type { Sound } from './hearing.ts';
import { expect } from './test.ts';

type Cued = Extract<KnownEntry, { kind: 'cued' }>;

/** One render quantum: sound is made in blocks of so many frames. */
const quantum = 128;

/**
 * By how much two neighbouring prompts may lie nearer or further apart on the page's clock than the journal says. The
 * recorder lets the audio clock be 60 ms off before it lays its sounds anew, and a browser tells how the two clocks stand
 * in steps of 10 to 20 ms.
 */
const pageMs = 85;

/** How often the audio clock slipped, as the journal tells it. */
const slips = (journal: readonly KnownEntry[]): number =>
  journal.filter((entry) => entry.kind === 'gap' && entry.cause === 'sound').length;

/**
 * Prompts were heard when the journal says so: the distances between them are exact to a render quantum of the audio
 * clock. Where a machine under load lets the audio clock itself stand still for a moment, the journal has to tell it, and
 * the prompts have to go on by the page's clock as if nothing had been.
 *
 * @param sounds in order, nothing else than `before` and the prompts from the first that `journal` tells as heard
 * @param before session times of sounds before the first prompt
 */
export function expectHeardAsTold(
  sounds: readonly Sound[],
  journal: readonly KnownEntry[],
  before: readonly number[] = [],
): void {
  const prompts = journal
    .filter((entry): entry is Cued => entry.kind === 'cued' && entry.by.includes('sound'))
    .map(({ delivered }) => delivered ?? Number.NaN);
  const told = [...before, ...prompts];
  // The last one may still sound while the journal is read, and the other way round.
  expect(Math.abs(told.length - sounds.length)).toBeLessThanOrEqual(1);
  let bent = 0;
  for (const [i, sound] of sounds.slice(0, told.length).entries()) {
    const last = sounds[i - 1];
    if (last === undefined) continue;
    const ms = (told[i] ?? Number.NaN) - (told[i - 1] ?? Number.NaN);
    expect(Math.abs(sound.page - last.page - ms)).toBeLessThanOrEqual(pageMs);
    if (Math.abs(sound.onset - last.onset - (ms * sound.sampleRate) / 1000) > quantum) bent += 1;
  }
  expect(bent).toBeLessThanOrEqual(slips(journal));
}
