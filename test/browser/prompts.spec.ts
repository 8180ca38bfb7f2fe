import type { Page } from '@playwright/test';
import { whatAudioPortsDo } from '../contract/audioPort.ts';
import { headerOf } from '../support/session.ts';
import { listen, type Sound, soundsOf } from './support/hearing.ts';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, start } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

/** One render quantum: sound is made in blocks of so many frames. */
const quantum = 128;

test('an hour of prompts, rendered offline at 8 kHz: every onset is exact to the sample', async ({
  tablet,
  site,
}) => {
  test.setTimeout(180_000);
  const module = await site.bundle('test/browser/support/fixtures/offlineHour.ts');
  const page = await tablet.context.newPage();
  await page.goto(site.emptyPage);
  const header = headerOf({
    method: 'partial',
    intervalMs: 5000,
    observeMs: 3500,
    partLength: { kind: 'minutes', minutes: 59 },
  });
  // The session's zero lies between two samples, as it does on a tablet.
  const { onsets, planned } = await page.evaluate(
    async ([url, given]) =>
      (await import(url)).renderCues(given, { seconds: 3600, sampleRate: 8000, origin: 17.320_508_075_7 }),
    [module, header] as const,
  );
  // Three ticks, and an observe and a record cue in each of 708 intervals.
  expect(planned).toHaveLength(3 + 2 * 708);
  expect(onsets).toEqual(planned);
});

test('the real audio port does what the one does that tests drive by hand', async ({ tablet, site }) => {
  const module = await site.bundle('test/browser/support/fixtures/realAudioPort.ts');
  const page = await tablet.context.newPage();
  await page.goto(site.emptyPage);
  const facts = await page.evaluate(async (url) => (await import(url)).askRealPort(), module);
  expect(facts).toEqual(whatAudioPortsDo);
});

test.describe('in the built app', () => {
  // 70 ms of silence lie within a cue: only more than that parts two.
  test.use({ tabletOptions: { bypassPolicy: true, prepare: (context) => listen(context, 200) } });

  /** A session of a minute with nobody touching anything; what was heard of it, and what the journal says. */
  async function listenToSession(page: Page, key: string, during: () => Promise<unknown>) {
    const file = await shortVisitFile({
      key,
      protocol: {
        method: 'partial',
        intervalMs: 4000,
        observeMs: 2500,
        partLength: { kind: 'rounds', rounds: 4 },
        cues: { channel: 'both', volume: 1, flash: true, vibration: false },
      },
    });
    await goIn(page, file);
    const session = sessionOf(page);
    await start(page);
    await during();
    await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({
      timeout: 90_000,
    });
    const sounds = await soundsOf(page);
    const journal = await journalOnDisk(page, session);
    const cued = journal.flatMap((entry) => (entry.kind === 'cued' ? [entry] : []));
    // The test tone before the lesson sounded on another context.
    const context = Math.max(...sounds.map((sound) => sound.context));
    return { cued, heard: sounds.filter((sound) => sound.context === context) };
  }

  /** How far each onset lies from its schedule, in frames, the first cue being the measure. */
  function offsets(heard: readonly Sound[], planned: readonly number[]): number[] {
    const first = heard[0];
    return heard.map((sound, i) => {
      const frames = (((planned[i] ?? Number.NaN) - (planned[0] ?? Number.NaN)) * sound.sampleRate) / 1000;
      return sound.onset - (first?.onset ?? Number.NaN) - frames;
    });
  }

  const blockPage = (page: Page) =>
    page.evaluate(() => {
      const block = (): void => {
        const until = performance.now() + 250;
        while (performance.now() < until);
        setTimeout(block, 50);
      };
      block();
    });

  for (const [how, key] of [
    ['left in peace', 'calm'],
    ['whose page is blocked 250 of every 300 ms', 'busy'],
  ] as const) {
    test(`prompts of a session ${how} lie within one render quantum of their schedule`, async ({
      tablet,
    }) => {
      test.setTimeout(180_000);
      const page = await tablet.visitOnce();
      await tablet.goOffline();
      const { cued, heard } = await listenToSession(page, key, () =>
        key === 'busy' ? blockPage(page) : Promise.resolve(),
      );
      const planned = cued.map((entry) => entry.planned);
      // Twelve intervals of four seconds, observe at their beginning, record after two and a half.
      expect(planned).toEqual(Array.from({ length: 12 }, (_, k) => [k * 4000, k * 4000 + 2500]).flat());
      expect(cued.every(({ by }) => by.includes('sound'))).toBe(true);
      expect(cued.map(({ delivered }) => delivered)).toEqual(planned);
      const ticks = [-3000, -2000, -1000];
      expect(heard).toHaveLength(ticks.length + planned.length);
      const off = offsets(heard, [...ticks, ...planned]);
      expect(Math.max(...off.map(Math.abs))).toBeLessThanOrEqual(quantum);
      test.info().annotations.push({ type: 'frames off', description: off.join(' ') });
      // Both ears, as the protocol says.
      expect(heard.every(({ left, right }) => left > 0.1 && right > 0.1)).toBe(true);
    });
  }
});
