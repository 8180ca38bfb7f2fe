import type { Page } from '@playwright/test';
import { expectAccessible } from './support/accessible.ts';
import { headerOnDisk, journalOnDisk } from './support/kept.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

/** Pages of a printed document and their sizes in points, read from its page objects. */
function pagesOf(pdf: Buffer): { count: number; sizes: string[] } {
  const text = pdf.toString('latin1');
  const boxes = [...text.matchAll(/\/MediaBox\s*\[([^\]]*)\]/g)].map(([, box]) =>
    (box ?? '')
      .trim()
      .split(/\s+/)
      .slice(2)
      .map((n) => Math.round(Number(n)))
      .join(' × '),
  );
  return { count: (text.match(/\/Type\s*\/Page\b(?!s)/g) ?? []).length, sizes: [...new Set(boxes)] };
}

/** The interval numbers on the sheets, in the order of the document, as they are laid out for print. */
const numbersOn = (page: Page): Promise<number[]> =>
  page
    .locator('[data-interval]')
    .evaluateAll((all) =>
      all.filter((one) => one.getClientRects().length > 0).map((one) => Number(one.textContent)),
    );

/** By how many pixels the content of a page is higher than the page; no row may be cut. */
const overflow = (page: Page): Promise<number> =>
  page
    .locator('.paper-page > section')
    .evaluateAll((all) =>
      Math.max(
        ...all.map((one) => Math.max(one.scrollHeight - one.clientHeight, one.scrollWidth - one.clientWidth)),
      ),
    );

/** The smallest side of a box to write in, in millimetres. */
const smallestBox = (page: Page): Promise<number> =>
  page.locator('.paper-box i, .paper-cell i').evaluateAll((all) => {
    const sides = all.map((one) => {
      const { width, height } = one.getBoundingClientRect();
      return Math.min(width, height);
    });
    return (Math.min(...sides) / 96) * 25.4;
  });

const from1to = (n: number): number[] => Array.from({ length: n }, (_, i) => i + 1);

async function prepared(page: Page, wish: Parameters<typeof shortVisitFile>[0]): Promise<void> {
  await page.goto(`${page.url().split('#')[0]}#/before`);
  await page.locator('input[type=file]').setInputFiles(await shortVisitFile(wish));
  await page.getByRole('link', { name: 'Print the schedule as a sheet' }).click();
  await expect(page.getByRole('heading', { name: 'The schedule on paper.' })).toBeVisible();
}

const sizes = { A4: '595 × 842', Letter: '612 × 792' } as const;

/** Prints in both sizes, each interval on it once; gives how many pages each took. */
async function expectPrinted(page: Page, intervals: number): Promise<number[]> {
  const counts: number[] = [];
  for (const size of ['A4', 'Letter'] as const) {
    await page.getByRole('radio', { name: size }).check();
    expect(await overflow(page)).toBeLessThanOrEqual(1);
    expect(await smallestBox(page)).toBeGreaterThanOrEqual(5.9);
    await page.emulateMedia({ media: 'print' });
    expect((await numbersOn(page)).sort((a, b) => a - b)).toEqual(from1to(intervals));
    const printed = pagesOf(await page.pdf({ preferCSSPageSize: true }));
    await page.emulateMedia({ media: null });
    const shown = await page.locator('.paper-page').count();
    expect(printed).toEqual({ count: shown, sizes: [sizes[size]] });
    await expect(page.getByText(`page ${shown} of ${shown}`)).toBeVisible();
    counts.push(shown);
  }
  return counts;
}

test('a prepared visit prints in both sizes, is typed in offline from pencil, and its figure is there', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  await tablet.goOffline();
  await prepared(page, {
    key: 'paper',
    phases: ['before', 'after'],
    protocol: { intervalMs: 15_000, observeMs: 15_000, partLength: { kind: 'rounds', rounds: 2 } },
  });
  expect(await expectPrinted(page, 12)).toEqual([1, 1]);
  await page.getByRole('radio', { name: /Round sheet/ }).check();
  expect(await expectPrinted(page, 12)).toEqual([1, 1]);
  await expectAccessible(page);
  await picture(page, 'sheet-print');
  const label =
    /Sheet (\w{3}-\w{3})/.exec((await page.locator('.paper-label').textContent()) ?? '')?.[1] ?? '';
  // What the browser would print is its own affair; the button keeps the schedule for the day it is typed in.
  await page.evaluate(() => Object.assign(window, { print: () => undefined }));
  await page.getByRole('button', { name: 'Print it' }).click();

  // An observer to have written it, in the study that the visit brought along.
  await page.getByRole('link', { name: 'Back to the checks' }).click();
  await page.getByRole('button', { name: 'Choose' }).click();
  await page.getByRole('dialog').getByLabel('Name of the observer').fill('Quill');
  await page.getByRole('dialog').getByRole('button', { name: 'Add' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Done' }).click();

  await page.goto(`${page.url().split('#')[0]}#/before/paper/type`);
  await expect(page.getByText(`Class Otter, sheet ${label}`)).toBeVisible();
  await expectAccessible(page);
  await picture(page, 'sheet-choose');
  await page.getByLabel('Label of the sheet').fill(label.toLowerCase().replace('-', ''));
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: `Sheet ${label}.` })).toBeVisible();

  await page.getByLabel('Observer', { exact: true }).selectOption({ label: 'Quill' });
  await page.getByLabel('Date').fill('2026-11-03');
  await page.getByLabel('Started at').fill('1041');
  await page.getByLabel('Break started').fill('10:43');
  await page.getByLabel(/^First task given/).fill('10.52.30');
  const number = page.getByLabel('Number on this line');
  await number.focus();
  // on, off, on, on, (empty), cannot see: half of a sheet, then the tablet is closed.
  for (const key of ['1', '2', '1', '1', 'Enter', '0']) await page.keyboard.press(key);
  await expect(page.getByText('5 of 12 lines typed, kept as you type')).toBeVisible();
  await expectAccessible(page);
  await picture(page, 'sheet-type');
  await page.reload();
  await expect(page.getByText('5 of 12 lines typed, kept as you type')).toBeVisible();
  await expect(page.getByText('No. 7 · 0:15 · Otter-01')).toBeVisible();
  await number.focus();
  // A wrong one, taken back; then off, on, left the room, on, on, off.
  for (const key of ['1', 'Control+z', '2', '1', '5', '1', '1', '2']) await page.keyboard.press(key);
  await expect(page.getByText('11 of 12 lines typed, kept as you type')).toBeVisible();
  await expect(page.getByText('1 line is empty and will count as missing.')).toBeVisible();
  await page.getByLabel('Started at').fill('10:50');
  await page.getByRole('button', { name: 'Keep as a session' }).click();
  await expect(page.getByRole('alert')).toContainText('The break cannot have started at 10:43');
  await page.getByLabel('Started at').fill('10:41');
  await page.getByRole('button', { name: 'Keep as a session' }).click();
  await page.waitForURL(/#\/afterwards\/session\//);
  await expect(page.getByText(/From paper: typed in from a sheet/)).toBeVisible();
  await page.getByRole('button', { name: 'Show the figures' }).click();
  // Before: three of four on-task; after: three of five.
  const sentence = page.getByRole('heading', { level: 1 });
  await expect(sentence).toContainText('75');
  await expect(sentence).toContainText('60');
  await expectAccessible(page);
  await picture(page, 'sheet-session');

  const session = page.url().split('/session/')[1] ?? '';
  expect(await headerOnDisk(page, session)).toMatchObject({ fromPaper: true, date: '2026-11-03' });
  const journal = await journalOnDisk(page, session);
  expect(journal.some(({ kind }) => kind === 'cued')).toBe(false);
  expect(journal.filter(({ kind }) => kind === 'marked')).toHaveLength(9);
  await page.getByRole('link', { name: 'Afterwards' }).click();
  await expect(page.getByText(/from paper/)).toBeVisible();
});

test('seven hundred and twenty lines go over many pages, and no row is cut', async ({ tablet }) => {
  const page = await tablet.openApp({ hash: '/before' });
  await prepared(page, {
    key: 'long paper',
    children: 12,
    protocol: { intervalMs: 15_000, observeMs: 15_000, partLength: { kind: 'rounds', rounds: 60 } },
  });
  const [rows] = await expectPrinted(page, 720);
  expect(rows).toBeGreaterThan(8);
  await page.getByRole('radio', { name: /Round sheet/ }).check();
  const [rounds] = await expectPrinted(page, 720);
  expect(rounds).toBeLessThan(6);
});

test('where reserves step in, a sheet has lines for it with room to write, and nothing of them is cut', async ({
  tablet,
}) => {
  const page = await tablet.openApp({ hash: '/before' });
  for (const reserves of [2, 24]) {
    await prepared(page, {
      key: `reserves ${reserves}`,
      reserves,
      protocol: {
        intervalMs: 15_000,
        observeMs: 15_000,
        partLength: { kind: 'rounds', rounds: 3 },
        reservesStepIn: true,
      },
    });
    await expectPrinted(page, 9);
    const lines = page.locator('.paper-stand-ins');
    await expect(lines).toContainText(`Otter-${3 + reserves}`);
    const cut = await lines.locator('p').evaluate((text) => text.scrollHeight - text.clientHeight);
    expect(cut).toBeLessThanOrEqual(1);
    const head = await page
      .locator('.paper-head')
      .first()
      .evaluate((one) => one.scrollHeight - one.clientHeight);
    expect(head).toBeLessThanOrEqual(1);
    await expect(lines.locator('tbody tr')).toHaveCount(Math.min(4, reserves + 1));
    const box = await lines.locator('td').first().boundingBox();
    expect(((box?.height ?? 0) / 96) * 25.4).toBeGreaterThan(6.5);
    await picture(page, `sheet-reserves-${reserves}`);
  }
});
