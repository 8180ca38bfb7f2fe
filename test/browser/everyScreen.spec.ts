import type { Page } from '@playwright/test';
import { expectAccessible } from './support/accessible.ts';
import { picture } from './support/picture.ts';
import { expect, test } from './support/test.ts';

/** Every page beside the recording itself (observer.spec.ts), with the demo study open. */
const screens: readonly { name: string; hash: string; waitFor: RegExp }[] = [
  { name: 'before', hash: '/before', waitFor: /Prepare the visit/ },
  { name: 'door', hash: '/room', waitFor: /Nothing is being recorded/ },
  { name: 'afterwards', hash: '/afterwards', waitFor: /11 scored|scored/ },
  { name: 'agreement-all', hash: '/afterwards/agreement', waitFor: /Quill/ },
  { name: 'change', hash: '/afterwards/change', waitFor: /points/ },
  { name: 'study', hash: '/study', waitFor: /Otter/ },
  { name: 'observers', hash: '/study/observers', waitFor: /Marsh/ },
  { name: 'protocol-new', hash: '/study/protocols/new', waitFor: /What can be recorded/ },
  { name: 'settings', hash: '/study/settings', waitFor: /Safeguarding/ },
  { name: 'files', hash: '/study/files', waitFor: /Study file/ },
  { name: 'methods', hash: '/study/methods', waitFor: /Wilson/ },
];

const go = (page: Page, hash: string) => page.goto(`${page.url().split('#')[0]}#${hash}`);

async function openDemo(page: Page): Promise<void> {
  await go(page, '/study');
  await page.getByRole('button', { name: 'Open the demo study' }).click();
  await expect(page.getByText('Heron').first()).toBeVisible();
}

test('a newcomer gets from nothing to the change of the demo classes in three taps, offline', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  await tablet.goOffline();
  await expect(page.getByRole('heading', { level: 1, name: 'First, a study.' })).toBeVisible();
  await picture(page, 'first-start');
  await expectAccessible(page);
  await openDemo(page);
  await page.getByRole('link', { name: 'Afterwards' }).click();
  await page.getByRole('link', { name: /^Change from before to after/ }).click();
  const sentence = page.getByRole('heading', { level: 1 });
  await expect(sentence).toContainText('points');
  await expect(page.getByText(/Heron/).first()).toBeVisible();
});

test('no screen breaks a rule of axe, and each is pictured at three sizes in two themes', async ({
  tablet,
}) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  await openDemo(page);
  for (const { name, hash, waitFor } of screens) {
    await test.step(name, async () => {
      await go(page, hash);
      await expect(page.getByText(waitFor).first()).toBeVisible();
      await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1);
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme });
        await expectAccessible(page);
      }
      await picture(page, name);
    });
  }
  // Pages of one class, one protocol, one visit.
  const follow = async (from: string, link: string | RegExp, name: string, waitFor: RegExp) => {
    await go(page, from);
    await page.getByRole('link', { name: link }).first().click();
    await expect(page.getByText(waitFor).first()).toBeVisible();
    await expectAccessible(page);
    await picture(page, name);
  };
  await follow('/study', /Otter/, 'class', /Otter-01/);
  await page
    .getByRole('link', { name: /seating plan/i })
    .first()
    .click();
  await expect(page.getByRole('heading', { name: /Where does everybody sit/ })).toBeVisible();
  await expectAccessible(page);
  await picture(page, 'seats');
  await follow('/study', /every 15 seconds/, 'protocol', /What it comes to/);
  await follow('/afterwards', /Compare the two/, 'visit-agreement', /They agree on/);
  await follow('/afterwards/change', /Heron/, 'change-of-a-class', /Heron/);
});

test('nothing on a page runs over its edge at any size', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  await openDemo(page);
  const over: string[] = [];
  for (const size of [
    { width: 1366, height: 1024 },
    { width: 800, height: 1280 },
    { width: 390, height: 844 },
    { width: 320, height: 640 },
  ]) {
    await page.setViewportSize(size);
    for (const { name, hash, waitFor } of screens) {
      await go(page, hash);
      await expect(page.getByText(waitFor).first()).toBeVisible();
      const width = await page.evaluate(() => document.documentElement.scrollWidth);
      if (width > size.width) over.push(`${name} at ${size.width}: ${width}`);
    }
  }
  expect(over).toEqual([]);
});
