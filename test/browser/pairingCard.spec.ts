import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Locator, Page } from '@playwright/test';
import type { SessionHeader } from '../../src/model/session.ts';
import { expectAccessible } from './support/accessible.ts';
import { sessionOf } from './support/kept.ts';
import { goInAs, lookingAt, start, touch } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

const address = (page: Page, hash: string) => `${page.url().split('#')[0]}#${hash}`;

/** The header of a session as it lies in the tablet's database. */
async function headerOnDisk(page: Page, session: string): Promise<SessionHeader> {
  const found = await page.evaluate(async (id) => {
    const done = <T>(request: IDBRequest<T>): Promise<T> =>
      new Promise((resolve, reject) => {
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error);
      });
    const db = await done(indexedDB.open('lookbell'));
    const row = (await done(db.transaction('headers').objectStore('headers').get(id))) as { sealed: unknown };
    db.close();
    return row.sealed;
  }, session);
  return found as SessionHeader;
}

/** A screenshot of each picture of the card, stepped by hand. */
async function photographs(
  page: Page,
  take: (shown: Locator) => Promise<Buffer> = (shown) => shown.screenshot(),
): Promise<Buffer[]> {
  const dialog = page.getByRole('dialog');
  const shown = dialog.getByRole('img');
  await expect(shown).toBeVisible();
  await dialog.getByRole('button', { name: 'Stay at this one' }).click();
  const of = Number(/ of (\d+)$/.exec((await shown.getAttribute('aria-label')) ?? '')?.[1]);
  const taken: Buffer[] = [];
  for (let i = 0; i < of; i++) {
    taken.push(await take(shown));
    const now = await shown.getAttribute('aria-label');
    await dialog.getByRole('button', { name: 'Next' }).click();
    await expect(shown).not.toHaveAttribute('aria-label', now ?? '');
  }
  return taken;
}

test('a visit goes to a second tablet by pictures alone, with no network, and both record the same schedule', async ({
  tablet,
  anotherTablet,
}) => {
  const second = await anotherTablet({ viewport: { width: 800, height: 1280 } });
  const [one, two] = [await tablet.visitOnce(), await second.visitOnce()];
  await tablet.goOffline();
  await second.context.setOffline(true);

  await one.goto(address(one, '/before'));
  await one.locator('input[type=file]').setInputFiles(
    await shortVisitFile({
      key: 'card',
      children: 20,
      protocol: { partLength: { kind: 'rounds', rounds: 2 } },
    }),
  );
  await one.getByRole('button', { name: 'Choose' }).click();
  await one
    .getByRole('dialog')
    .getByRole('radio', { name: /a second observer checks mine/ })
    .check();
  await one.getByRole('dialog').getByRole('button', { name: 'Done' }).click();
  await one.getByRole('button', { name: 'Show the pairing card' }).click();
  const pictures = await photographs(one);
  expect(pictures.length).toBeGreaterThan(1);
  await expectAccessible(one);
  await picture(one, 'pairing-card');
  await one.getByRole('dialog').getByRole('button', { name: 'Done' }).click();
  await expect(one.getByText('The pairing card was shown.')).toBeVisible();

  await two.goto(address(two, '/before'));
  await two.getByRole('link', { name: 'Read a pairing card' }).click();
  await expect(two.getByRole('heading', { name: /^Read the pairing card/ })).toBeVisible();
  const give = (...some: Buffer[]) =>
    two
      .locator('input[type=file]')
      .setInputFiles(some.map((buffer, i) => ({ name: `photo-${i}.png`, mimeType: 'image/png', buffer })));
  // A picture of something else, then the last one, then the first one.
  await give(await two.screenshot());
  await expect(two.getByRole('alert')).toContainText('No square code was found in photo-0.png.');
  await give(...pictures.slice(1).reverse());
  await expect(two.getByRole('status').first()).toHaveText(
    `${pictures.length - 1} of ${pictures.length} pictures read.`,
  );
  await expectAccessible(two);
  await picture(two, 'pairing-read', { sizes: [{ width: 800, height: 1280 }] });
  await give(pictures[0] as Buffer);
  await expect(two.getByText(/^Class Otter: Otter-01, /)).toContainText(
    'in this order, by “Every three seconds”, with no agreed start.',
  );
  await two.getByRole('button', { name: 'Take this visit over' }).click();
  await two.waitForURL(/#\/before\/ready\/second$/);

  await goInAs(one, 'Quill', null);
  await goInAs(two, 'Marsh', null);
  const [mine, theirs] = [await headerOnDisk(one, sessionOf(one)), await headerOnDisk(two, sessionOf(two))];
  expect([mine.role, theirs.role]).toEqual(['primary', 'second']);
  expect([mine.observer.name, theirs.observer.name]).toEqual(['Quill', 'Marsh']);
  const shared = ({
    visit,
    study,
    classroom,
    condition,
    plannedStart,
    children,
    plan,
    draw,
    orderSeed,
    schedule,
  }: SessionHeader) => ({
    visit,
    study,
    classroom,
    condition,
    plannedStart,
    children,
    plan,
    draw,
    orderSeed,
    schedule,
  });
  expect(shared(theirs)).toEqual(shared(mine));
  expect(theirs.children.map(({ pseudonym }) => pseudonym)).toHaveLength(20);

  const record = async (page: Page) => {
    await start(page);
    await lookingAt(page, 'Otter-01');
    await touch(page, 'on-task');
    await lookingAt(page, 'Otter-02');
  };
  await Promise.all([record(one), record(two)]);
});

test('a text does what the pictures do, and a camera that is not there is told', async ({ tablet }) => {
  const page = await tablet.openApp({ hash: '/before' });
  await page.locator('input[type=file]').setInputFiles(await shortVisitFile({ key: 'text' }));
  await page.getByRole('button', { name: 'Choose' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('radio', { name: /a second observer checks mine/ }).check();
  await dialog.getByRole('button', { name: 'Done' }).click();
  await page.getByRole('button', { name: 'Show the pairing card' }).click();
  await dialog.getByRole('button', { name: 'Show the text' }).click();
  const text = (await dialog.getByLabel('The card as text').textContent()) ?? '';
  await picture(page, 'pairing-text', { sizes: [{ width: 800, height: 1280 }], themes: ['light'] });
  await page.goto(address(page, '/before/card'));
  await page.getByRole('button', { name: 'Open the camera' }).click();
  await expect(page.getByRole('alert')).toContainText(/No camera can be used here|camera is not allowed/);
  await page.getByLabel('Text of the card').fill(text.slice(0, -8));
  await page.getByRole('button', { name: 'Read the text' }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'ends in the middle' })).toBeVisible();
  await page.getByLabel('Text of the card').fill(text.toLowerCase());
  await page.getByRole('button', { name: 'Read the text' }).click();
  await expect(page.getByRole('heading', { name: 'The card is read.' })).toBeVisible();
});

test('the camera of the second tablet reads the card, which is shown in turn', async ({
  tablet,
  anotherTablet,
}) => {
  const one = await tablet.openApp({ hash: '/before' });
  await one.locator('input[type=file]').setInputFiles(await shortVisitFile({ key: 'film', children: 20 }));
  await one.getByRole('button', { name: 'Choose' }).click();
  await one
    .getByRole('dialog')
    .getByRole('radio', { name: /a second observer checks mine/ })
    .check();
  await one.getByRole('dialog').getByRole('button', { name: 'Done' }).click();
  await one.getByRole('button', { name: 'Show the pairing card' }).click();
  // What a camera before the first tablet would see: the square and some of what is around it.
  const pictures = await photographs(one, async (shown) => {
    const box = await shown.boundingBox();
    if (box === null) throw new Error('no picture');
    const clip = { x: Math.round(box.x) - 20, y: Math.round(box.y) - 20, width: 600, height: 640 };
    return one.screenshot({ type: 'jpeg', quality: 80, clip });
  });
  expect(pictures.length).toBeGreaterThan(1);

  // Motion JPEG: each picture stands for as long as on the glass, at the 30 pictures a second of Chromium's stand-in.
  const folder = mkdtempSync(join(tmpdir(), 'film-'));
  const film = join(folder, 'card.mjpeg');
  writeFileSync(film, Buffer.concat(pictures.flatMap((frame) => Array<Buffer>(45).fill(frame))));
  try {
    const second = await anotherTablet({
      switches: [
        '--use-fake-ui-for-media-stream',
        '--use-fake-device-for-media-stream',
        `--use-file-for-fake-video-capture=${film}`,
      ],
    });
    const two = await second.openApp({ hash: '/before/card' });
    await two.getByRole('button', { name: 'Open the camera' }).click();
    await expect(two.getByRole('heading', { name: 'The card is read.' })).toBeVisible({ timeout: 30_000 });
    await expect(two.getByText(/^Class Otter: Otter-01, /)).toContainText('Otter-20, in this order');
    await two.getByRole('button', { name: 'Take this visit over' }).click();
    await expect(two.getByText('Say who records.')).toBeVisible();
  } finally {
    rmSync(folder, { recursive: true });
  }
});
