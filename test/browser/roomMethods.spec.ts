import type { Page } from '@playwright/test';
import type { Protocol } from '../../src/model/protocol.ts';
import { expectAccessible } from './support/accessible.ts';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, start, touch } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';
import { threeCodes } from './support/threeCodes.ts';

/** Into the room with this protocol, and through the count-in. */
async function begin(page: Page, key: string, protocol: Partial<Protocol>, children = 15): Promise<string> {
  await goIn(page, await shortVisitFile({ key, children, protocol: { codeSet: threeCodes, ...protocol } }));
  const session = sessionOf(page);
  await start(page);
  await expect(page.locator('.look-count')).toHaveCount(0, { timeout: 20_000 });
  return session;
}

const heading = (page: Page, text: string | RegExp) =>
  expect(page.locator('h1.look-name')).toHaveText(text, { timeout: 30_000 });

async function endEarly(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^end/ }).click();
  await page.getByRole('button', { name: 'End the session' }).click();
  await page.getByRole('button', { name: 'Go to its figures' }).click();
}

/** No hand touches two places within 80 ms: quicker ones count as one palm. The page itself lets the time go by. */
const handMoves = (page: Page): Promise<void> =>
  page.evaluate(() => new Promise((moved) => setTimeout(moved, 120)));

const marksOf = async (page: Page, session: string) =>
  (await journalOnDisk(page, session)).flatMap((entry) => (entry.kind === 'marked' ? [entry] : []));

test('headcount: seats, steps and one-touch answers, kept as counts, with its figure afterwards', async ({
  tablet,
}) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  const session = await begin(page, 'heads', {
    method: 'headcount',
    lookAt: 'start',
    intervalMs: 120_000,
    observeMs: 120_000,
    partLength: { kind: 'minutes', minutes: 6 },
  });
  await heading(page, /– of 15$/);
  await picture(page, 'room-headcount-empty', { sizes: [{ width: 1366, height: 1024 }], themes: ['light'] });
  for (const child of ['Otter-01', 'Otter-07', 'Otter-09', 'Otter-10']) {
    await touch(page, child);
    await handMoves(page);
  }
  await touch(page, 'one more');
  await heading(page, '5 of 15');
  await handMoves(page);
  await touch(page, 'fewer present');
  await heading(page, '5 of 14');
  await expectAccessible(page);
  await picture(page, 'room-headcount');
  await page.getByRole('button', { name: /^correct/ }).click();
  await page.getByRole('button', { name: 'one of the last scans …' }).click();
  await page.getByRole('button', { name: /^1/ }).last().click();
  await page.getByRole('button', { name: 'fewer on-task' }).click();
  await expectAccessible(page);
  await picture(page, 'room-correct-count', { themes: ['light'] });
  await page.getByRole('button', { name: 'Correct it' }).click();
  await heading(page, '4 of 14');
  await expect
    .poll(async () => (await marksOf(page, session)).map((entry) => entry.counts).slice(-2))
    .toEqual([
      { on: 5, present: 15 },
      { on: 5, present: 14 },
    ]);
  await endEarly(page);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('scan');
  await picture(page, 'session-headcount', { fullPage: true, themes: ['light'] });
  await page.getByRole('button', { name: 'Show the figures' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('29');
  await picture(page, 'session-headcount-figures', { fullPage: true, themes: ['light'] });
});

test('duration: the touch latches, is shown with its time, and comes back as seconds', async ({ tablet }) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  const session = await begin(page, 'long', {
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 5 },
  });
  await expect(page.getByText('Nothing is in force. Touch what the child does now.')).toBeVisible();
  await picture(page, 'room-duration-nothing', { sizes: [{ width: 1366, height: 1024 }], themes: ['light'] });
  await touch(page, 'on-task');
  await expect(page.getByText(/^on-task since/)).toBeVisible();
  await expectAccessible(page);
  await expect(page.getByText(/for 0:(0[2-9]|[1-5]\d)/)).toBeVisible();
  await touch(page, 'off-task, with others');
  await expect(page.getByText(/for 0:(0[2-9]|[1-5]\d)/)).toBeVisible();
  await picture(page, 'room-duration');
  await page.getByRole('button', { name: /^correct/ }).click();
  await page.getByRole('button', { name: 'a stretch is of no use …' }).click();
  await page.getByRole('button', { name: 'the last minute' }).click();
  await expectAccessible(page);
  await picture(page, 'room-stretch-time', { themes: ['light'] });
  await page.getByRole('button', { name: 'Cancel' }).click();
  await expect
    .poll(async () => (await marksOf(page, session)).map((entry) => entry.code))
    .toEqual(['on', 'others']);
  await endEarly(page);
  await expect(page.getByText(/Show the figures/)).toBeVisible();
  await picture(page, 'session-duration', { fullPage: true, themes: ['light'] });
  await page.getByRole('button', { name: 'Show the figures' }).click();
  await picture(page, 'session-duration-figures', { fullPage: true, themes: ['light'] });
});

test('sweep: how far it is, calm in between; a look is corrected and two children are swapped', async ({
  tablet,
}) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  const session = await begin(
    page,
    'sweep',
    {
      lookAt: 'start',
      intervalMs: 100_000,
      observeMs: 100_000,
      rotation: { kind: 'sweep', eachMs: 5000 },
      partLength: { kind: 'minutes', minutes: 10 },
    },
    6,
  );
  await heading(page, 'Otter-01');
  await touch(page, 'on-task');
  await heading(page, 'Otter-02');
  await touch(page, 'off-task, with others');
  await heading(page, 'Otter-03');
  await expect(page.locator('.look-lead')).toHaveText('look at · 3 of 6');
  await page.screenshot({ path: 'pictures/room-sweep.png' });
  await touch(page, 'cannot see');
  await heading(page, 'Otter-04');
  await touch(page, 'on-task');
  await heading(page, 'This sweep is done.');
  await expectAccessible(page);
  await picture(page, 'room-sweep-between');
  await page.getByRole('button', { name: /^correct/ }).click();
  await picture(page, 'room-correct-menu', { sizes: [{ width: 1366, height: 1024 }], themes: ['light'] });
  await page.getByRole('button', { name: 'one of the last looks …' }).click();
  await expectAccessible(page);
  await picture(page, 'room-correct-list', { themes: ['light'] });
  await page.getByRole('button', { name: /^4 · Otter-04/ }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'off-task, by oneself' }).click();
  await picture(page, 'room-correct-look');
  await page.getByRole('button', { name: 'Correct it' }).click();
  await page.getByRole('button', { name: /^correct/ }).click();
  await page.getByRole('button', { name: /taken for each other/ }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Otter-01' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Otter-02' }).click();
  await expectAccessible(page);
  await picture(page, 'room-swap', { themes: ['light'] });
  await page.getByRole('button', { name: 'Swap 1 pair' }).click();
  await page.getByRole('button', { name: /^correct/ }).click();
  await page.getByRole('button', { name: 'a stretch is of no use …' }).click();
  await page.getByRole('button', { name: 'the last minute' }).click();
  await picture(page, 'room-stretch', { themes: ['light'] });
  await page.getByRole('button', { name: 'Cancel' }).click();
  await expect
    .poll(async () => {
      const kinds = (await journalOnDisk(page, session)).map((entry) => entry.kind);
      return kinds.filter((kind) => kind === 'corrected' || kind === 'swapped');
    })
    .toEqual(['corrected', 'swapped']);
  await endEarly(page);
});
