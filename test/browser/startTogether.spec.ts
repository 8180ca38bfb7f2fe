import type { Page } from '@playwright/test';
import { epochOf } from '../../src/kernel/wallTime.ts';
import { expectAccessible } from './support/accessible.ts';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

/** The second tablet's clock is slow by so much. */
const slowMs = 3480;

async function openCheck(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Tick check' }).click();
  await page.getByRole('button', { name: 'Start the ticks' }).click();
  await expect(page.getByRole('button', { name: 'Stop the ticks' })).toBeVisible();
}

/** Types the second that lies so far ahead, and starts; returns it as it is said. */
async function startIn(page: Page, seconds: number): Promise<string> {
  const agreed = Math.ceil(Date.now() / 1000 + seconds) * 1000;
  const time = new Date(agreed).toLocaleTimeString('en-GB', { timeZone: 'Europe/London' });
  await page.getByRole('textbox', { name: 'Agreed second' }).fill(time);
  await page.getByRole('button', { name: `Start at ${time}` }).click();
  await expect(page.getByText(`The schedule begins at ${time}, in`)).toBeVisible();
  return time;
}

/** When each interval's cue came by this tablet's clock, moved by its nudge. */
async function cueMoments(page: Page): Promise<number[]> {
  const journal = await journalOnDisk(page, sessionOf(page));
  const nudge = journal.reduce((sum, entry) => sum + (entry.kind === 'clockNudged' ? entry.by : 0), 0);
  return journal.flatMap((entry) =>
    entry.kind === 'cued' && entry.delivered !== null
      ? [epochOf(entry.wall) + nudge + (entry.delivered - entry.at)]
      : [],
  );
}

test('two tablets whose clocks are apart are nudged into one and begin at the agreed second', async ({
  tablet,
  anotherTablet,
}) => {
  test.setTimeout(150_000);
  const slow = await anotherTablet({
    prepare: async (context) => {
      await context.addInitScript((ms) => {
        const real = Date.now;
        Date.now = () => real() - ms;
      }, slowMs);
    },
  });
  const [one, two] = [await tablet.openApp(), await slow.openApp()];
  const file = await shortVisitFile({
    key: 'start',
    protocol: { partLength: { kind: 'rounds', rounds: 1 } },
  });
  await goIn(one, file, { observer: 'Quill', beside: /a second observer checks mine/ });
  await goIn(two, file, { observer: 'Marsh', beside: /I check the first observer/ });
  await expectAccessible(one);

  // Both tick; the second observer alone nudges, by keys: three seconds and 24 times 20 ms.
  await openCheck(one);
  await openCheck(two);
  await expectAccessible(two);
  await picture(two, 'tick-check');
  for (let i = 0; i < 3; i++) await two.keyboard.press('ArrowUp');
  for (let i = 0; i < 24; i++) await two.keyboard.press('ArrowRight');
  await expect(two.getByText('3.48 s later than it shows')).toBeVisible();
  for (const page of [one, two]) await page.getByRole('button', { name: 'The ticks are one' }).click();

  // They agree on a second that both type.
  const agreed = Math.ceil((Date.now() + 15_000) / 1000) * 1000;
  const time = new Date(agreed).toLocaleTimeString('en-GB', { timeZone: 'Europe/London' });
  for (const page of [one, two]) {
    await page.getByRole('textbox', { name: 'Agreed second' }).fill(time);
    await expectAccessible(page);
    await picture(page, page === one ? 'agreed-second' : 'agreed-second-checked');
    await page.getByRole('button', { name: `Start at ${time}` }).click();
    await expect(page.getByText(`The schedule begins at ${time}, in`)).toBeVisible();
  }
  await picture(one, 'waits-for-second');
  for (const page of [one, two])
    await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({
      timeout: 60_000,
    });

  const [first, second] = [await cueMoments(one), await cueMoments(two)];
  expect(first.length).toBe(3);
  expect(second.length).toBe(3);
  for (const [i, moment] of first.entries()) {
    expect(Math.abs(moment - (agreed + 3000 * (i + 1)))).toBeLessThan(60);
    expect(Math.abs(moment - (second[i] ?? Number.NaN))).toBeLessThan(60);
  }
  const journal = await journalOnDisk(two, sessionOf(two));
  expect(journal.slice(0, 2)).toMatchObject([
    { kind: 'started', agreedStart: expect.stringContaining(`T${time}.000`) },
    { kind: 'clockNudged', by: slowMs },
  ]);
});

test('a start that is called off leaves the nudge and the session as they were, also on a page that is loaded again', async ({
  tablet,
}) => {
  test.setTimeout(120_000);
  const page = await tablet.openApp();
  const protocol = { partLength: { kind: 'rounds', rounds: 1 } } as const;
  await goIn(page, await shortVisitFile({ key: 'called off', protocol }), {
    beside: /a second observer checks mine/,
  });
  await openCheck(page);
  await page.keyboard.press('ArrowRight');
  await page.getByRole('button', { name: 'The ticks are one' }).click();
  const nudged = page.getByText('This tablet’s clock is read 0.02 s later than it shows.');
  await expect(nudged).toBeVisible();
  await startIn(page, 300);
  await picture(page, 'waits-and-may-be-called-off');
  await page.getByRole('button', { name: 'Call this start off' }).click();
  await expect(page.getByRole('heading', { name: 'Agree on a second.' })).toBeVisible();
  await expect(nudged).toBeVisible();
  await page.reload();
  await expect(nudged).toBeVisible();
  const time = await startIn(page, 10);
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 60_000 });
  const journal = await journalOnDisk(page, sessionOf(page));
  expect(journal.slice(0, 6)).toMatchObject([
    { kind: 'started' },
    { kind: 'clockNudged', by: 20 },
    { kind: 'withdrawn' },
    { kind: 'withdrawn' },
    { kind: 'started', agreedStart: expect.stringContaining(`T${time}.000`) },
    { kind: 'clockNudged', by: 20 },
  ]);
  expect(journal.filter(({ kind }) => kind === 'cued').length).toBe(3);
});
