import type { Page } from '@playwright/test';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { start, touch } from './support/observing.ts';
import type { Tablet } from './support/tablet.ts';
import { expect, test } from './support/test.ts';

/*
 * Each method by the way that an observer takes: protocol form, visit, checks, recording, figure; offline. Figures are
 * worked out by hand beside the touches.
 */

/** A study with one class of four children, as it stands before the first protocol. */
async function studyOfFour(tablet: Tablet): Promise<Page> {
  const page = await tablet.visitOnce();
  await tablet.goOffline();
  await page.getByRole('link', { name: 'The study', exact: true }).click();
  await page.getByLabel(/Name of the study/).fill('Methods');
  await page.getByRole('button', { name: 'Begin this study' }).click();
  await page.getByLabel('Name of the class').fill('Otter');
  await page.getByRole('button', { name: 'Add this class' }).click();
  await page.getByText('From a list').click();
  const lines = ['1', '2', '3', '4'].map((n) => `Otter-0${n},yes,,`);
  await page.getByLabel('Lines').fill(['child,consent,stratum,seat', ...lines].join('\n'));
  await page.getByRole('button', { name: 'Take over the lines' }).click();
  await expect(page.getByText('4 children written down.', { exact: false })).toBeVisible();
  return page;
}

const open = (page: Page, hash: string) => page.goto(`${page.url().split('#')[0]}#${hash}`);

/** Fills the form of a protocol, keeps it, and goes through the door with it. */
async function goInWith(page: Page, method: string, fill: (page: Page) => Promise<void>): Promise<string> {
  await open(page, '/study/protocols/new');
  await page.getByLabel('Name of the protocol').fill(`By ${method}`);
  await page.getByRole('radio', { name: new RegExp(`^${method}`) }).check();
  await fill(page);
  await page.getByRole('button', { name: 'Keep this protocol' }).click();
  await expect(page.getByText(`By ${method} is kept as version 1.`)).toBeVisible();
  await open(page, '/before');
  await page.getByRole('radio', { name: new RegExp(`^By ${method}`) }).check();
  await page.getByRole('radio', { name: 'only before' }).check();
  const draw = page.getByRole('button', { name: /^Draw \d at random/ });
  if ((await draw.count()) > 0) await draw.click();
  await page.getByRole('button', { name: 'Prepare the visit' }).click();
  await page.getByRole('button', { name: 'Choose' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Name of the observer').fill('Quill');
  await dialog.getByRole('button', { name: 'Add' }).click();
  await dialog.getByRole('radio', { name: /nobody/ }).check();
  await dialog.getByRole('button', { name: 'Done' }).click();
  await page.getByRole('button', { name: /^Go in/ }).click();
  await page.waitForURL(/#\/room\/./);
  const session = sessionOf(page);
  await start(page);
  return session;
}

/** Waits for a cue: the line above the child's name says what is to be done now. */
const cue = (page: Page, what: RegExp) =>
  expect(page.locator('.look-lead', { hasText: what })).toBeVisible({ timeout: 20_000 });

async function figure(page: Page): Promise<string> {
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 40_000 });
  await page.getByRole('button', { name: 'Go to its figures' }).click();
  await page.getByRole('button', { name: 'Show the figures' }).click();
  const sentence = (await page.getByRole('heading', { level: 1 }).textContent()) ?? '';
  // Numbers and their signs are joined by spaces that do not break.
  return sentence.replace(/\s/g, ' ');
}

const oneRoundOf = (interval: string) => async (page: Page) => {
  await page.getByLabel('Interval, in seconds').fill(interval);
  await page.getByLabel('Grace, in seconds').fill('0');
  await page.getByText('by rounds').click();
  await page.getByLabel('Rounds a part').fill('1');
};

test('momentary, all children in one sweep', async ({ tablet }) => {
  const page = await studyOfFour(tablet);
  const session = await goInWith(page, 'momentary', async () => {
    await oneRoundOf('12')(page);
    await page.getByRole('radio', { name: /^all children, one after the other/ }).check();
    await page.getByLabel('Children to draw').fill('4');
  });
  for (const [place, code] of [
    ['1 of 4', 'on-task'],
    ['2 of 4', 'off-task'],
    ['3 of 4', 'on-task'],
  ] as const) {
    await cue(page, new RegExp(place));
    await touch(page, code);
  }
  // Two of three looks; the fourth child was missed.
  expect(await figure(page)).toContain('67 %');
  const journal = await journalOnDisk(page, session);
  const cues = journal.flatMap((entry) => (entry.kind === 'cued' ? [[entry.cue, entry.planned]] : []));
  expect(cues).toEqual([
    ['look', 12_000],
    ['next', 15_000],
    ['next', 18_000],
    ['next', 21_000],
  ]);
});

test('whole interval, three seconds watched and three to record', async ({ tablet }) => {
  const page = await studyOfFour(tablet);
  await goInWith(page, 'whole interval', async () => {
    await page.getByLabel('Seconds of watching').fill('3');
    await page.getByLabel('Seconds for recording').fill('3');
    await page.getByLabel('Children to draw').fill('3');
    await page.getByText('by rounds').click();
    await page.getByLabel('Rounds a part').fill('1');
  });
  for (const code of ['on-task', 'none of these', 'on-task']) {
    await cue(page, /watch/);
    await cue(page, /record/);
    await touch(page, code);
  }
  expect(await figure(page)).toContain('67 %');
});

test('headcount: everybody, nobody, and one scan that was missed', async ({ tablet }) => {
  const page = await studyOfFour(tablet);
  await goInWith(page, 'headcount', async () => {
    await page.getByLabel('Interval, in seconds').fill('4');
    await page.getByLabel('Grace, in seconds').fill('0');
    await page.getByText('by rounds').click();
    await page.getByLabel('Rounds a part').fill('3');
  });
  await cue(page, /How many/);
  await touch(page, 'one more');
  await expect(page.locator('h1', { hasText: '1 of 4' })).toBeVisible();
  // A second target within 80 ms counts as the same hand: touched as a person would, until it is taken.
  await expect(async () => {
    await touch(page, 'all on-task');
    await expect(page.locator('h1', { hasText: '4 of 4' })).toBeVisible({ timeout: 1500 });
  }).toPass();
  await expect(page.locator('h1', { hasText: '– of 4' })).toBeVisible({ timeout: 10_000 });
  await touch(page, 'nobody on-task');
  // Four and none of eight children counted.
  expect(await figure(page)).toContain('50 %');
});

test('duration: one child, on and off to the millisecond of the touch', async ({ tablet }) => {
  const page = await studyOfFour(tablet);
  const session = await goInWith(page, 'duration', async () => {
    await page.getByLabel('Minutes a part').fill('0.25');
  });
  await cue(page, /watch/);
  await touch(page, 'on-task');
  await expect(page.getByText(/for 0:(0[4-9]|1\d)/)).toBeVisible({ timeout: 20_000 });
  await touch(page, 'off-task');
  const sentence = await figure(page);
  const touches = (await journalOnDisk(page, session)).flatMap((e) => (e.kind === 'marked' ? [e.at] : []));
  const [on = 0, off = 0] = touches;
  expect(touches).toHaveLength(2);
  const percent = Math.round((100 * (off - on)) / (15_000 - on));
  expect(sentence).toContain(`${percent} %`);
});
