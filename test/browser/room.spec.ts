import { journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, lookingAt, start, touch } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

test('partial interval by keyboard: codes add up, nothing of it is an answer too, and no key works while a note is typed', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  const protocol = { method: 'partial', observeMs: 2000, partLength: { kind: 'rounds', rounds: 1 } } as const;
  await goIn(page, await shortVisitFile({ key: 'partial', protocol }));
  const session = sessionOf(page);
  await start(page);
  const watching = (child: string) =>
    expect(page.locator('h1.look-name', { hasText: child })).toBeVisible({ timeout: 20_000 });
  await expect(page.locator('.look-lead', { hasText: 'watch' })).toBeVisible({ timeout: 20_000 });
  await watching('Otter-01');
  await page.keyboard.press('2');
  // A second key within 80 ms counts as the same hand: pressed as a person would, until it is taken.
  await expect(async () => {
    await page.keyboard.press('1');
    await expect(page.getByRole('button', { name: /^on-task/, pressed: true })).toBeVisible({
      timeout: 1500,
    });
  }).toPass();
  await watching('Otter-02');
  await page.keyboard.press('n');
  await watching('Otter-03');
  await page.getByRole('button', { name: /^note/ }).click();
  await page.getByLabel('What happened? No names.').fill('1 2 1 2');
  await page.getByLabel('What happened? No names.').press('2');
  await page.getByRole('button', { name: 'Keep the note' }).click();
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 30_000 });
  const journal = await journalOnDisk(page, session);
  const marks = journal.flatMap((entry) => (entry.kind === 'marked' ? [[entry.interval, entry.code]] : []));
  expect(marks).toEqual([
    [1, 'off'],
    [1, 'on'],
    [2, null],
  ]);
  expect(journal.flatMap((entry) => (entry.kind === 'noted' ? [entry.text] : []))).toEqual(['1 2 1 22']);
  // Two cues an interval, told apart: observe and record.
  const cues = journal.flatMap((entry) =>
    entry.kind === 'cued' && entry.interval <= 2 ? [`${entry.interval} ${entry.cue} ${entry.planned}`] : [],
  );
  expect(cues).toEqual(['1 observe 0', '1 record 2000', '2 observe 3000', '2 record 5000']);
});

test('a tablet that refuses to write says how much is kept, and catches up', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  await goIn(page, await shortVisitFile({ key: 'refused' }));
  const session = sessionOf(page);
  await start(page);
  await lookingAt(page, 'Otter-01');
  await touch(page, 'on-task');
  await page.evaluate(() => {
    const real = IDBObjectStore.prototype.put;
    const add = IDBObjectStore.prototype.add;
    const full = () => {
      throw new DOMException('no room', 'QuotaExceededError');
    };
    IDBObjectStore.prototype.put = full;
    IDBObjectStore.prototype.add = full;
    Object.assign(window, {
      writeAgain: () => {
        IDBObjectStore.prototype.put = real;
        IDBObjectStore.prototype.add = add;
      },
    });
  });
  await lookingAt(page, 'Otter-02');
  await touch(page, 'off-task');
  // What the screen promises and what it knows to be missing are two numbers now.
  await expect
    .poll(async () => {
      const [, of, kept] =
        (await page.locator('.room-kept').textContent())?.match(/^(\d+) entries, (\d+) kept$/) ?? [];
      return Number(of) - Number(kept);
    })
    .toBeGreaterThan(0);
  await expect(page.getByText(/^Kept \d+ of \d+ entries\./)).toBeVisible();
  await page.evaluate(() => (window as unknown as { writeAgain(): void }).writeAgain());
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 30_000 });
  await expect(page.getByText(/^All kept/)).toBeVisible({ timeout: 20_000 });
  const journal = await journalOnDisk(page, session);
  expect(journal.map((entry) => entry.seq)).toEqual(journal.map((_, i) => i));
  expect(journal.flatMap((entry) => (entry.kind === 'marked' ? [entry.code] : []))).toEqual(['on', 'off']);
});
