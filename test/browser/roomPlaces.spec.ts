import type { Page } from '@playwright/test';
import { goIn, lookingAt, start, touch } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

const glasses = [
  { width: 1366, height: 1024 },
  { width: 1024, height: 768 },
  { width: 800, height: 1280 },
  { width: 390, height: 844 },
];
const hands = ['right', 'left'];

/** Long enough for a test that looks around; its looks come every 15 seconds. */
const visit = {
  phases: ['before', 'after'],
  protocol: {
    intervalMs: 15_000,
    observeMs: 15_000,
    lookAt: 'start',
    partLength: { kind: 'rounds', rounds: 6 },
  },
} as const;

/** Where each button of the bottom row stands, at every glass and for both hands. */
async function places(page: Page): Promise<Record<string, string[]>> {
  const all: Record<string, string[]> = {};
  for (const glass of glasses) {
    await page.setViewportSize(glass);
    for (const hand of hands)
      all[`${glass.width} ${hand}`] = await page.evaluate((side) => {
        document.querySelector<HTMLElement>('.room')?.setAttribute('data-hand', side);
        return [...document.querySelectorAll('.room-bottom button')].map((button) => {
          const { x, y, width, height } = button.getBoundingClientRect();
          return [x, y, width, height].map(Math.round).join(' ');
        });
      }, hand);
  }
  return all;
}

test('every button of the bottom row keeps its place, whatever goes on', async ({ tablet }) => {
  test.setTimeout(120_000);
  const page = await tablet.visitOnce();
  await goIn(page, await shortVisitFile({ key: 'places', ...visit }));
  const press = (name: string) => page.getByRole('button', { name, exact: true }).click();
  await start(page);
  await expect(page.locator('.look-count')).toBeVisible();
  const first = await places(page);
  // Thirteen, and "more", which is not there on wide glass.
  expect(new Set(first['1366 right']).size).toBe(14);
  const same = async (when: string) => {
    await page.mouse.move(0, 0);
    expect(await places(page), when).toEqual(first);
    await page.setViewportSize({ width: 1366, height: 1024 });
  };
  await lookingAt(page, 'Otter-01');
  await same('at work');
  await touch(page, 'on-task');
  await press('silence');
  await same('marked, and silent');
  await press('class interrupted');
  await expect(page.getByRole('heading', { name: 'The class is interrupted.' })).toBeVisible();
  await same('interrupted');
  await press('The class goes on');
  await press('pause');
  await expect(page.getByRole('heading', { name: 'Paused.' })).toBeVisible();
  await same('paused');
  await press('Go on');
  await press('lesson part …');
  await same('a panel is open');
  await press('individual');
  await same('a lesson part was said');
  await press('break started');
  await expect(page.getByRole('button', { name: 'First task given' })).toBeVisible();
  await same('in the break');
  await press('First task given');
  await expect(page.getByRole('button', { name: 'break started' })).toHaveAttribute('aria-disabled', 'true');
  await same('in the last part');
});

/** What keeps a panel from being worked: cut off, over the plan, or over the codes. */
async function troubles(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const found: string[] = [];
    const box = (element: Element) => element.getBoundingClientRect();
    const panel = document.querySelector('.panel');
    if (panel === null) return ['no panel'];
    const inside = (a: DOMRect, b: { left: number; top: number; right: number; bottom: number }) =>
      a.left >= b.left - 1 && a.top >= b.top - 1 && a.right <= b.right + 1 && a.bottom <= b.bottom + 1;
    const apart = (a: DOMRect, b: DOMRect) =>
      a.right <= b.left + 1 || b.right <= a.left + 1 || a.bottom <= b.top + 1 || b.bottom <= a.top + 1;
    const glass = { left: 0, top: 0, right: innerWidth, bottom: innerHeight };
    if (!inside(box(panel), glass)) found.push('the panel runs over the glass');
    if (panel.scrollWidth > panel.clientWidth + 1) found.push('the panel is cut off at its side');
    panel.scrollTop = panel.scrollHeight;
    const last = [...panel.querySelectorAll('button')].at(-1);
    if (last === undefined || !inside(box(last), box(panel))) found.push('its last button is out of reach');
    panel.scrollTop = 0;
    for (const seat of document.querySelectorAll('.lesson-plan .seat')) {
      if (seat.getBoundingClientRect().width === 0) found.push('no plan');
      if (!apart(box(seat), box(panel))) found.push('the panel lies over a seat');
      if (!inside(box(seat), glass)) found.push('a seat runs over the glass');
    }
    for (const target of document.querySelectorAll('.target')) {
      const { x, y, width, height } = box(target);
      const there = document.elementFromPoint(x + width / 2, y + height / 2);
      if (there === null || !target.contains(there)) found.push(`${target.textContent} cannot be touched`);
      if (height < 44) found.push(`${target.textContent} is ${height} high`);
    }
    return [...new Set(found)];
  });
}

test('a panel stands beside the plan, can be worked to its last button, and leaves the codes free', async ({
  tablet,
}) => {
  test.setTimeout(120_000);
  const page = await tablet.visitOnce();
  await goIn(page, await shortVisitFile({ key: 'panels', children: 8, ...visit }));
  await start(page);
  await lookingAt(page, 'Otter-01');
  await touch(page, 'on-task');
  const open = async (name: string) => {
    const here = page.getByRole('button', { name, exact: true });
    if (!(await here.isVisible())) await page.getByRole('button', { name: 'more …' }).click();
    await here.click();
  };
  const found: Record<string, string[]> = {};
  const look = async (what: string) => {
    const { width = 0 } = page.viewportSize() ?? {};
    found[`${what} at ${width}`] = await troubles(page);
  };
  for (const glass of glasses) {
    await page.setViewportSize(glass);
    await open('correct …');
    await look('what was wrong');
    await page.getByRole('button', { name: 'one of the last looks …' }).click();
    await look('which look');
    await page.getByRole('button', { name: /^1 · Otter-01/ }).click();
    await look('what it should be');
    // The plan says whom it is about.
    await expect(page.locator('.lesson-plan .seat-chosen')).toHaveText('Otter-01');
    const code = page.locator('.target', { hasText: glass.width > 900 ? 'off-task' : 'on-task' });
    await code.tap();
    await expect(code).toHaveAttribute('aria-pressed', 'true');
    await page.getByRole('button', { name: 'Cancel' }).click();
    await open('child …');
    await look('which child');
    await page.getByRole('button', { name: 'Cancel' }).click();
    await open('layout …');
    await look('layout');
    await page.getByRole('button', { name: 'Close' }).click();
  }
  expect(found).toEqual(Object.fromEntries(Object.keys(found).map((what) => [what, []])));
});
