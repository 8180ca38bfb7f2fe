import type { Page } from '@playwright/test';
import { whatAudioPortsDo } from '../contract/audioPort.ts';
import { headerOf } from '../support/session.ts';
import { expectHeardAsTold } from './support/heardAsTold.ts';
import { listen, soundsOf } from './support/hearing.ts';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, start } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

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

  /** Keeps the page busy 250 of every 300 ms, for good. */
  const block = (page: Page) =>
    page.evaluate(() => {
      const busy = (): void => {
        const until = performance.now() + 250;
        while (performance.now() < until);
        setTimeout(busy, 50);
      };
      busy();
    });

  test('prompts lie within one render quantum of their schedule, also while the page is blocked', async ({
    tablet,
  }) => {
    const page = await tablet.visitOnce();
    await tablet.goOffline();
    const file = await shortVisitFile({
      key: 'prompts',
      children: 4,
      protocol: {
        method: 'partial',
        intervalMs: 3000,
        observeMs: 2000,
        partLength: { kind: 'rounds', rounds: 3 },
        cues: { channel: 'both', volume: 1, flash: true, vibration: false },
      },
    });
    await goIn(page, file);
    const session = sessionOf(page);
    await start(page);
    // Half of the session in peace, half of it on a page that is busy 250 of every 300 ms.
    await soundsOf(page, 1 + 3 + 12);
    await block(page);
    await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({
      timeout: 60_000,
    });

    const sounds = await soundsOf(page);
    const journal = await journalOnDisk(page, session);
    const cued = journal.flatMap((e) => (e.kind === 'cued' ? [e] : []));
    const planned = cued.map((entry) => entry.planned);
    // Twelve intervals of three seconds, observe at their beginning, record after two.
    expect(planned).toEqual(Array.from({ length: 12 }, (_, k) => [k * 3000, k * 3000 + 2000]).flat());
    expect(cued.every(({ by }) => by.includes('sound') && by.includes('screen'))).toBe(true);

    // The test tone before the lesson sounded on another context.
    const context = Math.max(...sounds.map((sound) => sound.context));
    const heard = sounds.filter((sound) => sound.context === context);
    expect(heard).toHaveLength(3 + planned.length);
    expectHeardAsTold(heard, journal, [-3000, -2000, -1000]);
    // Both ears, as the protocol says.
    expect(heard.every(({ left, right }) => left > 0.1 && right > 0.1)).toBe(true);
  });
});
