import type { KnownEntry } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { expectHeardAsTold } from './support/heardAsTold.ts';
import { listenSource, type Sound } from './support/hearing.ts';
import { HideablePage } from './support/hideable.ts';
import { headerOnDisk, journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn } from './support/observing.ts';
import {
  cuedOf,
  cuesWritten,
  expectOnGrid,
  type Gap,
  gapsOf,
  interval,
  prompts,
  visit,
} from './support/promptsTold.ts';
import { rememberContexts, stopSound } from './support/soundSource.ts';
import type { Tablet } from './support/tablet.ts';
import { expect, test } from './support/test.ts';

/** A page in the room, not under Playwright, whose session has begun. */
async function recording(tablet: Tablet, key: string) {
  const page = await tablet.visitOnce();
  await goIn(page, await visit(key));
  const session = sessionOf(page);
  const url = page.url();
  await tablet.close();
  const hideable = await HideablePage.launch(tablet.profile, [listenSource(200), rememberContexts]);
  await hideable.goto(url);
  await hideable.press('Start');
  // Three ticks and two prompts are over before anything happens.
  await heardAtLeast(hideable, 5);
  return { page: hideable, session };
}

const heardAtLeast = (page: HideablePage, count: number) =>
  page.until(
    (least: number) =>
      (globalThis as unknown as { heard: { sounds: unknown[] } }).heard.sounds.length >= least,
    count,
  );

const heardIn = (page: HideablePage): Promise<Sound[]> =>
  page.evaluate(() => (globalThis as unknown as { heard: { sounds: Sound[] } }).heard.sounds);

/** Waits at most two seconds for the gap with this cause; the journal then. */
async function gapTold(page: HideablePage, session: string, cause: Gap['cause']): Promise<KnownEntry[]> {
  let journal: KnownEntry[] = [];
  await expect
    .poll(
      async () => {
        journal = await journalOnDisk(page, session);
        return gapsOf(journal).map((gap) => gap.cause);
      },
      { timeout: 2000, intervals: [50] },
    )
    .toContain(cause);
  return journal;
}

test('prompts go on in the ear while the page is hidden, and the stretch is told on return', async ({
  tablet,
}) => {
  const { page, session } = await recording(tablet, 'hidden');
  try {
    const before = cuedOf(await journalOnDisk(page, session)).length;
    await page.hide();
    const since = (await heardIn(page)).length;
    // Nine seconds, three prompts, counted by what is heard.
    await heardAtLeast(page, since + 3);
    expect(await page.evaluate(() => document.visibilityState)).toBe('hidden');
    await page.show();
    const told = await gapTold(page, session, 'hidden');
    expectOnGrid(told);
    await cuesWritten(page, session, before + 6);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    const by = cuedOf(journal).map((entry) => entry.by.join(' '));
    expect(by.slice(0, before)).toEqual(Array.from({ length: before }, () => 'sound screen'));
    expect(by.slice(before, before + 3)).toEqual(['sound', 'sound', 'sound']);
    expect(by.at(-1)).toBe('sound screen');
    const [gap] = gapsOf(journal);
    // Every prompt was heard: the stretch costs nothing.
    expect((gap?.to ?? 0) - (gap?.from ?? 0)).toBe(0);
    const heard = prompts(await heardIn(page), 0, true);
    expectHeardAsTold(heard, journal);
  } finally {
    await page.close();
  }
});

test('what is neither heard nor shown while the page is hidden is missing, and never given afterwards', async ({
  tablet,
}) => {
  const { page, session } = await recording(tablet, 'hidden and silent');
  try {
    const before = cuedOf(await journalOnDisk(page, session)).length;
    await page.hide();
    await page.evaluate(stopSound);
    const at = await page.evaluate(() => performance.now());
    await page.until((end: number) => performance.now() > end, at + 3 * interval);
    const silent = (await heardIn(page)).length;
    const written = (await journalOnDisk(page, session)).length;
    await page.show();
    await gapTold(page, session, 'hidden');
    await gapTold(page, session, 'sound');
    await cuesWritten(page, session, before + 6);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    const lost = cuedOf(journal).filter(({ by }) => by.length === 0);
    expect(lost.length).toBeGreaterThanOrEqual(2);
    expect(lost.every(({ delivered }) => delivered === null)).toBe(true);
    const records = readOut(fold(await headerOnDisk(page, session), journal));
    const failed = records.filter(({ missing }) => missing === 'prompt failed').map(({ number }) => number);
    expect(failed).toEqual(lost.map((cue) => cue.interval));
    // On return one prompt at a time, on the grid: nothing is made up for.
    const after = (await heardIn(page)).slice(silent);
    expect(after.length).toBeGreaterThanOrEqual(2);
    expectHeardAsTold(after, journal.slice(written));
    expect(cuedOf(journal).at(-1)?.by).toEqual(['sound', 'screen']);
  } finally {
    await page.close();
  }
});
