import type { Page } from '@playwright/test';
import { listen, listenSource, type Sound, soundsOf } from '../../test/browser/support/hearing.ts';
import { HideablePage } from '../../test/browser/support/hideable.ts';
import { goIn, start } from '../../test/browser/support/observing.ts';
import {
  contextsMade,
  holdSoundDown,
  movableWallClock,
  moveWallClock,
  rememberContexts,
  stopSound,
} from '../../test/browser/support/soundSource.ts';
import { test } from '../../test/browser/support/test.ts';
import { headerOf } from '../../test/support/session.ts';
import { every, longVisit } from './longVisit.ts';
import { quantile, say, sayDeviations } from './rows.ts';

const sounds = () => (globalThis as unknown as { heard: { sounds: Sound[] } }).heard.sounds;

/** Milliseconds by which each prompt lies off the grid of the first one, counted in samples. */
function offBySamples(prompts: readonly Sound[]): number[] {
  const [first] = prompts;
  return prompts.map(({ onset, sampleRate }) => {
    const ms = ((onset - (first?.onset ?? 0)) * 1000) / sampleRate;
    return ms - every * Math.round(ms / every);
  });
}

/** The same by the page's clock, against the middle of the first few: for sound that stood still in between. */
function offByPage(prompts: readonly Sound[], few: number): number[] {
  const [first] = prompts;
  const off = prompts.map(({ page }) => {
    const ms = page - (first?.page ?? 0);
    return ms - every * Math.round(ms / every);
  });
  const middle = quantile(off.slice(0, few), 0.5);
  return off.map((ms) => ms - middle);
}

test.describe('Prompts, how far off their plan', () => {
  test('rendered', async ({ tablet, site }) => {
    const module = await site.bundle('test/browser/support/fixtures/offlineHour.ts');
    const page = await tablet.context.newPage();
    await page.goto(site.emptyPage);
    const header = headerOf({
      intervalMs: 5000,
      observeMs: 5000,
      partLength: { kind: 'minutes', minutes: 59 },
    });
    const sampleRate = 8000;
    const { onsets, planned } = await page.evaluate(
      async ([url, given, rate]) =>
        (await import(url)).renderCues(given, { seconds: 3600, sampleRate: rate, origin: 17.320_508_075_7 }),
      [module, header, sampleRate] as const,
    );
    if (onsets.length !== planned.length) throw new Error('a prompt is missing');
    sayDeviations(
      'rendered, an hour',
      onsets.map((onset: number, i: number) => ((onset - planned[i]) * 1000) / sampleRate),
    );
  });

  test.describe('in the built app', () => {
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

    /** Into the room and begun; what is heard before the first prompt: the test tone, three ticks. */
    async function recording(page: Page, key: string): Promise<number> {
      await goIn(page, await longVisit(key));
      await start(page);
      const before = (await soundsOf(page)).length + 3;
      await soundsOf(page, before + 1);
      return before;
    }

    test('live', async ({ tablet }) => {
      const page = await tablet.visitOnce();
      const before = await recording(page, 'live');
      sayDeviations('live, a minute', offBySamples((await soundsOf(page, before + 20)).slice(before)));
    });

    test('throttled', async ({ tablet }) => {
      const page = await tablet.visitOnce();
      const before = await recording(page, 'throttled');
      const cdp = await tablet.context.newCDPSession(page);
      await cdp.send('Emulation.setCPUThrottlingRate', { rate: 20 });
      const heard = await soundsOf(page, before + 20);
      await cdp.send('Emulation.setCPUThrottlingRate', { rate: 1 });
      sayDeviations('processor 20 times slower, a minute', offBySamples(heard.slice(before)));
    });

    test('wall clock', async ({ tablet }) => {
      const page = await tablet.visitOnce();
      const before = await recording(page, 'wall clock');
      for (const [count, ms] of [
        [3, 3_600_000],
        [6, -7_200_000],
        [9, 86_400_000],
      ] as const) {
        await soundsOf(page, before + count);
        await page.evaluate(moveWallClock, ms);
      }
      const heard = await soundsOf(page, before + 12);
      sayDeviations('wall clock moved three times', offBySamples(heard.slice(before)));
    });

    test('standstill', async ({ tablet }) => {
      const page = await tablet.visitOnce();
      const before = await recording(page, 'standstill');
      for (const count of [5, 8, 11]) {
        await soundsOf(page, before + count);
        tablet.standStill(400);
      }
      const heard = await soundsOf(page, before + 14);
      sayDeviations('machine stood still three times, by the page clock', offByPage(heard.slice(before), 5));
    });

    test('sound stopped', async ({ tablet }) => {
      const page = await tablet.visitOnce();
      const before = await recording(page, 'sound stopped');
      await soundsOf(page, before + 5);
      await page.evaluate(stopSound);
      await soundsOf(page, before + 10);
      const contexts = await page.evaluate(contextsMade);
      await page.evaluate(holdSoundDown);
      const heard = await soundsOf(page, before + 15);
      const made = (await page.evaluate(contextsMade)) - contexts;
      sayDeviations('sound stopped from outside, by the page clock', offByPage(heard.slice(before), 5));
      say({ label: 'sound that stays away: new contexts', value: made, unit: '' });
    });
  });

  test('hidden', async ({ tablet }) => {
    const first = await tablet.visitOnce();
    await goIn(first, await longVisit('hidden'));
    const url = first.url();
    await tablet.close();
    const page = await HideablePage.launch(tablet.profile, [listenSource(200)]);
    try {
      await page.goto(url);
      await page.press('Start');
      const heard = (count: number) =>
        page.until(
          (least: number) =>
            (globalThis as unknown as { heard: { sounds: unknown[] } }).heard.sounds.length >= least,
          count,
          200_000,
        );
      await heard(3 + 2);
      await page.hide();
      await heard(3 + 2 + 120_000 / every);
      await page.show();
      await heard(3 + 2 + 120_000 / every + 2);
      sayDeviations('hidden for two minutes', offBySamples((await page.evaluate(sounds)).slice(3)));
    } finally {
      await page.close();
    }
  });
});
