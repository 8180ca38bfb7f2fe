import type { KnownEntry } from '../../../src/journal/entry.ts';
import type { Sound } from './hearing.ts';
import { expect } from './test.ts';

type Cued = Extract<KnownEntry, { kind: 'cued' }>;

/** One render quantum: sound is made in blocks of so many frames. */
const quantum = 128;

/**
 * By how much a prompt may lie off on the page's clock. The recorder lets the audio clock be 60 ms off before it lays its
 * sounds anew, and a browser tells how the two clocks stand in steps of 10 to 20 ms.
 */
const pageMs = 85;

/** How often the audio clock slipped, as the journal tells it. */
const slips = (journal: readonly KnownEntry[]): number =>
  journal.filter((entry) => entry.kind === 'gap' && entry.cause === 'sound').length;

/**
 * Prompts were heard when the journal says so: the distances between them are exact to a render quantum of the audio
 * clock. A machine under load may let the audio clock itself stand still for a moment: the journal has to tell it, one
 * prompt may fall into it, and all others have to come by the page's clock as if nothing had been.
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
  const slipped = slips(journal);
  const heard = sounds.slice(0, told.length).map((sound, i) => ({ ...sound, told: told[i] ?? Number.NaN }));
  const [first] = heard;
  if (first === undefined) return;
  // Where most of them lie: any single reading, the first one as well, may be the one that fell into a slip.
  const shifts = heard.map(({ page, told: at }) => page - at);
  const middle = [...shifts].sort((a, b) => a - b)[shifts.length >> 1] ?? Number.NaN;
  const off = shifts.filter((shift) => !(Math.abs(shift - middle) <= pageMs));
  expect(off.length).toBeLessThanOrEqual(slipped);
  const bent = heard.filter(({ onset, sampleRate, told: at }, i) => {
    const last = heard[i - 1] ?? first;
    return i > 0 && !(Math.abs(onset - last.onset - ((at - last.told) * sampleRate) / 1000) <= quantum);
  });
  // The way to a prompt that fell into a slip, and the way from it.
  expect(bent.length).toBeLessThanOrEqual(2 * slipped);
}
