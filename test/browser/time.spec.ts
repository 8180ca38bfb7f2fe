import type { CDPSession, Page } from '@playwright/test';
import type { KnownEntry } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { expectHeardAsTold } from './support/heardAsTold.ts';
import { listen, listenSource, type Sound, soundsOf } from './support/hearing.ts';
import { HideablePage } from './support/hideable.ts';
import { headerOnDisk, journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, lookingAt, start } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import {
  contextsMade,
  holdSoundDown,
  movableWallClock,
  moveWallClock,
  rememberContexts,
  stopSound,
} from './support/soundSource.ts';
import { expect, test } from './support/test.ts';

const interval = 3000;

/** A long session of the shortest intervals, heard in both ears. */
const visit = (key: string) =>
  shortVisitFile({
    key,
    protocol: {
      partLength: { kind: 'rounds', rounds: 100 },
      lookAt: 'start',
      cues: { channel: 'both', volume: 1, flash: true, vibration: false },
    },
  });

type Cued = Extract<KnownEntry, { kind: 'cued' }>;
type Gap = Extract<KnownEntry, { kind: 'gap' }>;
const cuedOf = (journal: readonly KnownEntry[]): Cued[] =>
  journal.flatMap((entry) => (entry.kind === 'cued' ? [entry] : []));
const gapsOf = (journal: readonly KnownEntry[]): Gap[] =>
  journal.flatMap((entry) => (entry.kind === 'gap' ? [entry] : []));

/** Planned on the grid, each cue told of exactly once and in its order, up to the last one. */
function expectOnGrid(journal: readonly KnownEntry[]): void {
  const cued = cuedOf(journal);
  expect(cued.map(({ interval }) => interval)).toEqual(cued.map((_, k) => k + 1));
  expect(cued.map(({ planned }) => planned)).toEqual(cued.map((_, k) => k * interval));
  expect(journal.map(({ seq }) => seq)).toEqual(journal.map((_, i) => i));
}

const clockGaps = (journal: readonly KnownEntry[]): Gap[] =>
  gapsOf(journal).filter(({ cause }) => cause === 'clock');

/** Delivered as planned, unless the audio clock slipped, which the journal tells. */
function expectPunctual(journal: readonly KnownEntry[]): void {
  const late = cuedOf(journal).filter(({ planned, delivered }) => planned !== delivered);
  const slips = gapsOf(journal).filter(({ cause }) => cause === 'sound');
  expect(late.length).toBeLessThanOrEqual(slips.length);
}

/** The prompts that a context gave, without the three ticks of the count-in, which lie a second apart. */
const prompts = (sounds: readonly Sound[], context: number, ticks: boolean): Sound[] =>
  sounds.filter((sound) => sound.context === context).slice(ticks ? 3 : 0);

test.describe('in full view', () => {
  test.use({
    tabletOptions: {
      bypassPolicy: true,
      prepare: async (context) => {
        await listen(context, 200);
        await context.addInitScript(rememberContexts);
        await context.addInitScript(movableWallClock);
      },
    },
  });

  /** Into the room, and on until the first child is looked at. */
  async function recording(page: Page, key: string): Promise<string> {
    await goIn(page, await visit(key));
    await start(page);
    await lookingAt(page, 'Otter-01');
    return sessionOf(page);
  }

  /** Waits until the journal holds so many cues. */
  const cues = (page: Page, session: string, count: number) =>
    expect
      .poll(async () => cuedOf(await journalOnDisk(page, session)).length, {
        timeout: 60_000,
        intervals: [200],
      })
      .toBeGreaterThanOrEqual(count);

  test('sound that is stopped from outside comes back by itself; the screen cues meanwhile, nothing is missing', async ({
    tablet,
  }) => {
    const page = await tablet.visitOnce();
    const session = await recording(page, 'stopped');
    const contexts = await page.evaluate(contextsMade);
    await page.evaluate(stopSound);
    await cues(page, session, 5);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    expect(cuedOf(journal).every(({ by }) => by.includes('screen'))).toBe(true);
    expect(cuedOf(journal).at(-1)?.by).toEqual(['sound', 'screen']);
    // It was noticed and is over within two seconds, and no cue was lost to it.
    expect(gapsOf(journal)).toContainEqual(expect.objectContaining({ cause: 'sound', estimated: false }));
    expect(gapsOf(journal).filter(({ cause, from, to }) => cause !== 'sound' || to > from)).toEqual([]);
    expect(await page.evaluate(contextsMade)).toBe(contexts);
    const marked = readOut(fold(await headerOnDisk(page, session), journal));
    expect(marked.filter(({ missing }) => missing === 'prompt failed')).toEqual([]);
  });

  test('sound that never comes back is made anew, on the same grid', async ({ tablet }) => {
    const page = await tablet.visitOnce();
    const session = await recording(page, 'held down');
    const before = await page.evaluate(contextsMade);
    await page.evaluate(holdSoundDown);
    const held = (await journalOnDisk(page, session)).length;
    await page.waitForFunction(
      (count) => (window as unknown as { contexts: unknown[] }).contexts.length > count,
      before,
    );
    const told = cuedOf(await journalOnDisk(page, session)).length;
    await cues(page, session, told + 4);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    expect(new Set(gapsOf(journal).map(({ cause }) => cause))).toEqual(new Set(['sound']));
    expect(cuedOf(journal).at(-1)?.by).toEqual(['sound', 'screen']);
    expect(await page.evaluate(contextsMade)).toBe(before + 1);
    // The new context is heard, prompt by prompt.
    const fresh = prompts(await soundsOf(page), before, false);
    expect(fresh.length).toBeGreaterThanOrEqual(2);
    expectHeardAsTold(fresh, journal.slice(held));
  });

  test('a processor twenty times slower bends no prompt', async ({ tablet }) => {
    const page = await tablet.visitOnce();
    const session = await recording(page, 'slow');
    const cdp: CDPSession = await tablet.context.newCDPSession(page);
    await cdp.send('Emulation.setCPUThrottlingRate', { rate: 20 });
    const told = cuedOf(await journalOnDisk(page, session)).length;
    await cues(page, session, told + 4);
    await cdp.send('Emulation.setCPUThrottlingRate', { rate: 1 });
    await cues(page, session, told + 5);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    expectPunctual(journal);
    expect(gapsOf(journal).filter(({ cause }) => cause !== 'sound')).toEqual([]);
    const last = (await page.evaluate(contextsMade)) - 1;
    const heard = prompts(await soundsOf(page), last, true);
    expect(heard.length).toBeGreaterThanOrEqual(5);
    expectHeardAsTold(heard, journal);
  });

  test('a machine that stands still for a moment bends no prompt after it, and it is written down', async ({
    tablet,
  }) => {
    const page = await tablet.visitOnce();
    const session = await recording(page, 'standstill');
    // A test tone, three ticks and two prompts are over: none sounds meanwhile.
    await soundsOf(page, 1 + 3 + 2);
    tablet.standStill(400);
    await cues(page, session, 6);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    expect(gapsOf(journal).map(({ cause, from, to }) => [cause, to - from])).toContainEqual(['sound', 0]);
    expect(cuedOf(journal).every(({ by }) => by.includes('sound'))).toBe(true);
    const last = (await page.evaluate(contextsMade)) - 1;
    expectHeardAsTold(prompts(await soundsOf(page), last, true), journal);
  });

  test('a wall clock that is set forth and back shifts nothing, and is written down both times', async ({
    tablet,
  }) => {
    const page = await tablet.visitOnce();
    const session = await recording(page, 'wall clock');
    const noticed = (count: number) =>
      expect
        .poll(async () => clockGaps(await journalOnDisk(page, session)).length, {
          timeout: 2000,
          intervals: [50],
        })
        .toBe(count);
    await page.evaluate(moveWallClock, 3_600_000);
    await noticed(1);
    await cues(page, session, 3);
    await page.evaluate(moveWallClock, -7_200_000);
    await noticed(2);
    await cues(page, session, 6);
    const journal = await journalOnDisk(page, session);
    expectOnGrid(journal);
    expect(clockGaps(journal).map(({ from, to }) => to - from)).toEqual([0, 0]);
    expect(gapsOf(journal).filter(({ cause }) => cause !== 'sound')).toHaveLength(2);
    expectPunctual(journal);
    // Written as the clock stood: the journal is ordered by number.
    const walls = journal.map(({ wall }) => Date.parse(wall));
    expect(Math.max(...walls) - Math.min(...walls)).toBeGreaterThan(7_000_000);
    const last = (await page.evaluate(contextsMade)) - 1;
    expectHeardAsTold(prompts(await soundsOf(page), last, true), journal);
  });
});

test.describe('hidden', () => {
  /** A page in the room, not under Playwright, whose session has begun. */
  async function recording(tablet: import('./support/tablet.ts').Tablet, key: string) {
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

  async function cues(page: HideablePage, session: string, count: number): Promise<void> {
    await expect
      .poll(async () => cuedOf(await journalOnDisk(page, session)).length, {
        timeout: 60_000,
        intervals: [200],
      })
      .toBeGreaterThanOrEqual(count);
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
      await cues(page, session, before + 6);
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
      await cues(page, session, before + 6);
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
});
