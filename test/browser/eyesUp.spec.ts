import type { Page } from '@playwright/test';
import type { Protocol } from '../../src/model/protocol.ts';
import { expectAccessible } from './support/accessible.ts';
import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, start, touch } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';
import { threeCodes } from './support/threeCodes.ts';

/** The sizes of the room's pictures: tablets across and upright, phones upright and across, the smallest there is. */
const glasses = [
  { width: 1366, height: 1024 },
  { width: 800, height: 1280 },
  { width: 390, height: 844 },
  { width: 844, height: 390 },
  { width: 320, height: 640 },
];

/** Into the room, through the count-in, to a look that stays open for two minutes. */
async function begin(page: Page, key: string, protocol: Partial<Protocol> = {}): Promise<string> {
  const long = { lookAt: 'start', intervalMs: 120_000, observeMs: 120_000 } as const;
  const partLength = { kind: 'minutes', minutes: 30 } as const;
  await goIn(
    page,
    await shortVisitFile({ key, children: 12, protocol: { ...long, partLength, ...protocol } }),
  );
  await start(page);
  await expect(page.locator('h1.look-name')).toHaveText('Otter-01', { timeout: 20_000 });
  await expect(page.locator('.look-lead')).not.toHaveText('first', { timeout: 20_000 });
  return sessionOf(page);
}

async function like(page: Page, ...choices: RegExp[]): Promise<void> {
  await page.getByRole('button', { name: /^layout/ }).click();
  for (const name of choices) await page.getByRole('radio', { name }).check();
  await expect(page.getByText('Kept for this observer.')).toBeVisible();
  await page.getByRole('button', { name: 'Close' }).click();
}

/** Nothing runs over, at any size, and every button lies wholly on the glass. */
async function expectFits(page: Page, what: string): Promise<void> {
  const before = page.viewportSize();
  const faults: string[] = [];
  for (const size of glasses) {
    await page.setViewportSize(size);
    const off = await page.evaluate(() =>
      [...document.querySelectorAll('main button')].flatMap((button) => {
        const { left, top, right, bottom, width } = button.getBoundingClientRect();
        const fits = left >= -1 && top >= -1 && right <= innerWidth + 1 && bottom <= innerHeight + 1;
        return width === 0 || fits ? [] : [button.textContent ?? ''];
      }),
    );
    const width = await page.evaluate(() => document.documentElement.scrollWidth);
    if (off.length > 0 || width > size.width)
      faults.push(`${what} at ${size.width}: ${off.join(', ')} ${width}`);
  }
  if (before !== null) await page.setViewportSize(before);
  expect(faults).toEqual([]);
}

const placesOf = (page: Page) =>
  page.evaluate(() =>
    [...document.querySelectorAll('.zone')].map((zone) => {
      const { x, y, width, height } = zone.getBoundingClientRect();
      return { name: zone.querySelector('.target-label')?.firstChild?.textContent, x, y, width, height };
    }),
  );

test('everyScreen: eyes-up with two codes, marked without looking, and covered', async ({ tablet }) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  const session = await begin(page, 'eyes-up');
  await expectFits(page, 'plan');
  await like(page, /^eyes-up/);
  await expect(page.locator('main.glass-dim')).toBeVisible();
  await expectAccessible(page);
  await expectFits(page, 'eyes-up');
  await picture(page, 'eyes-up', { sizes: glasses, themes: ['light'] });

  // From edge to edge, and nothing between the two thin lines but places.
  const places = await placesOf(page);
  const { width, height } = page.viewportSize() ?? { width: 0, height: 0 };
  const [on, off, cannotSee] = places;
  expect(places.map(({ name }) => name)).toEqual(['on-task', 'off-task', 'cannot see']);
  expect(on?.x).toBe(0);
  expect((off?.x ?? 0) + (off?.width ?? 0)).toBe(width);
  expect(cannotSee?.width).toBe(width);
  const covers = places.reduce((sum, place) => sum + place.width * place.height, 0);
  expect(covers / (width * height)).toBeGreaterThan(0.8);

  // Far from the words, at the very corner of its half.
  await page.touchscreen.tap(width - 4, (off?.y ?? 0) + 4);
  await expect(page.getByRole('button', { name: /^off-task/, pressed: true })).toBeVisible();

  await page.getByRole('button', { name: 'cover' }).click();
  await expect(page.locator('.zones-covered .target-label').first()).toHaveCSS('opacity', '0');
  expect(await placesOf(page)).toEqual(places);
  await expectAccessible(page);
  await expectFits(page, 'cover');
  await picture(page, 'cover', { sizes: glasses, themes: ['light'] });
  await page.touchscreen.tap(4, (on?.y ?? 0) + 4);
  await expect
    .poll(async () =>
      (await journalOnDisk(page, session)).flatMap((entry) => (entry.kind === 'marked' ? [entry.code] : [])),
    )
    .toEqual(['off', 'on']);

  // Held, the corner turns the page.
  const corner = await page.getByRole('button', { name: 'Uncover: hold' }).boundingBox();
  if (corner === null) throw new Error('no corner');
  await page.mouse.move(corner.x + corner.width - 10, corner.y + corner.height - 10);
  await page.mouse.down();
  await expect(page.getByRole('button', { name: 'cover' })).toBeVisible();
  await page.mouse.up();
});

test('everyScreen: eyes-up with corners, left-handed; keys work, and a panel leaves the places live', async ({
  tablet,
}) => {
  test.setTimeout(180_000);
  const page = await tablet.visitOnce();
  const session = await begin(page, 'corners', { codeSet: threeCodes, method: 'partial', observeMs: 60_000 });
  await like(page, /^left-handed/);
  await expectFits(page, 'plan, left-handed');
  await expectAccessible(page);
  await picture(page, 'room-left-hand', { sizes: glasses, themes: ['light'] });
  await like(page, /^eyes-up/);
  const places = await placesOf(page);
  expect(places.map(({ name }) => name)).toEqual([
    'on-task',
    'none of these',
    'off-task, by oneself',
    'off-task, with others',
    'cannot see',
  ]);
  // Mirrored: on-task lies on the right.
  expect(places[0]?.x).toBeGreaterThan(places[2]?.x ?? 0);
  await page.keyboard.press('PageDown');
  await expect(page.getByRole('button', { name: /^on-task/, pressed: true })).toBeVisible();
  // A second target within 80 ms counts as the same hand: touched as a person would, until it is taken.
  await expect(async () => {
    await touch(page, 'off-task, with others');
    await expect(page.getByRole('button', { pressed: true })).toHaveCount(2, { timeout: 1500 });
  }).toPass();
  await expectFits(page, 'eyes-up, corners');
  await expectAccessible(page);
  await picture(page, 'eyes-up-corners', { sizes: glasses, themes: ['light'] });
  await page.getByRole('button', { name: 'more …' }).click();
  await expectAccessible(page);
  await picture(page, 'eyes-up-more', { sizes: glasses, themes: ['light'] });
  await page.getByRole('dialog').getByRole('button', { name: 'Close' }).click();
  expect(await placesOf(page)).toEqual(places);
  await page.keyboard.press('c');
  await page.keyboard.press('Backspace');
  await page.keyboard.press('c');
  await expect(page.getByRole('button', { pressed: true })).toHaveCount(1);
  // What the screen shows at once is on the disk a moment later.
  await expect
    .poll(async () => {
      const kinds = (await journalOnDisk(page, session)).map((entry) => entry.kind);
      // A loaded machine may let the sound stand still for a moment, which is written down, too.
      return kinds.filter((kind) => kind !== 'cued' && kind !== 'gap');
    })
    .toEqual(['started', 'marked', 'marked', 'withdrawn']);
});

test('everyScreen: observers choose layout, hand and answers on their page', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  const at = (hash: string) => page.goto(`${page.url().split('#')[0]}#${hash}`);
  await at('/study');
  await page.getByRole('button', { name: 'Open the demo study' }).click();
  await expect(page.getByText('Heron').first()).toBeVisible();
  await at('/study/observers');
  await page.getByRole('button', { name: 'Layout and hand of Marsh' }).click();
  await page.getByRole('radio', { name: /^eyes-up/ }).click();
  await expect(page.getByText('Layout and answers are changed.')).toBeVisible();
  await expect(page.getByRole('checkbox', { name: /^Recall a prompt/ })).toBeChecked();
  await expectAccessible(page);
  await picture(page, 'observers-manner');
});
