import type { Page } from '@playwright/test';
import { seededRandom } from '../../src/kernel/random.ts';
import type { Method, Protocol } from '../../src/model/protocol.ts';
import { durabilities, journalOnDisk, sessionOf, watchDurability } from './support/kept.ts';
import { goIn, start } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

test.use({ tabletOptions: { prepare: watchDurability } });

/** Writes down, outside the browser, every number that the screen has ever shown as kept. */
async function shownAsKept(page: Page): Promise<{ most: number }> {
  const shown = { most: 0 };
  await page.exposeFunction('keptShown', (n: number) => {
    shown.most = Math.max(shown.most, n);
  });
  await page.evaluate(() => {
    const tell = () => {
      const sign = document.querySelector('.room-kept')?.textContent;
      const [, of, kept] = sign?.match(/([\d,]+) entr(?:y|ies), (all|[\d,]+) kept/) ?? [];
      const text = kept === 'all' ? of : kept;
      if (text !== undefined)
        (window as unknown as { keptShown(n: number): void }).keptShown(Number(text.replace(',', '')));
    };
    new MutationObserver(tell).observe(document.body, {
      subtree: true,
      childList: true,
      characterData: true,
    });
    tell();
  });
  return shown;
}

/** Touches one target after the other until the browser is gone, faster than any observer. */
function hammer(page: Page, targets: readonly string[]): Promise<unknown> {
  return page
    .evaluate(async (names) => {
      for (let i = 0; ; i++) {
        const name = names[i % names.length] ?? '';
        const button = [...document.querySelectorAll('button')].find((b) => b.textContent?.startsWith(name));
        const box = button?.getBoundingClientRect();
        if (button && box) {
          const at = {
            clientX: box.x + 9,
            clientY: box.y + 9,
            bubbles: true,
            pointerId: 1,
            isPrimary: true,
            cancelable: true,
          };
          button.dispatchEvent(new PointerEvent('pointerdown', at));
          button.dispatchEvent(new PointerEvent('pointerup', at));
        }
        await new Promise((next) => setTimeout(next, 40));
      }
    }, targets)
    .catch(() => undefined);
}

interface Killed {
  readonly method: Method;
  readonly kills: number;
  readonly targets: readonly string[];
  /** What stands above the name once the schedule runs. */
  readonly lead: RegExp;
  readonly protocol?: Partial<Protocol>;
}

const codes = ['off-task', 'on-task'];
const everyMethod: readonly Killed[] = [
  { method: 'momentary', kills: 20, targets: codes, lead: /look at/ },
  { method: 'partial', kills: 3, targets: codes, lead: /watch/ },
  { method: 'whole', kills: 3, targets: codes, lead: /watch/ },
  { method: 'headcount', kills: 3, targets: ['one more', 'all on-task', 'one fewer'], lead: /How many/ },
  {
    method: 'duration',
    kills: 3,
    targets: codes,
    lead: /watch/,
    protocol: { rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 60 } },
  },
];

for (const { method, kills, targets, lead, protocol = {} } of everyMethod)
  test(`nothing of a ${method} record that was shown as kept is lost when the browser is killed at ${kills} random moments`, async ({
    tablet,
  }) => {
    test.setTimeout(240_000);
    const random = seededRandom(`kills ${method}`);
    let page = await tablet.visitOnce();
    await goIn(
      page,
      await shortVisitFile({
        key: `kills ${method}`,
        protocol: { method, partLength: { kind: 'rounds', rounds: 400 }, ...protocol },
      }),
    );
    const session = sessionOf(page);
    let before = 0;
    for (let kill = 0; kill < kills; kill++) {
      const shown = await shownAsKept(page);
      if (kill === 0) await start(page);
      else await page.getByRole('button', { name: 'Go on' }).click();
      // Only once the schedule runs are there marks to lose.
      await expect(page.locator('.look-lead', { hasText: lead })).toBeVisible({ timeout: 20_000 });
      void hammer(page, targets);
      const from = shown.most;
      // Codes that add up are entered once an interval, so that a record of them grows more slowly.
      const more = Math.floor(random() * (method === 'momentary' ? 12 : 5));
      await expect.poll(() => shown.most, { intervals: [5], timeout: 20_000 }).toBeGreaterThan(from + more);
      expect(new Set(await durabilities(page))).toEqual(new Set(['strict']));
      await tablet.kill();
      const promised = shown.most;

      await tablet.launch();
      page = await tablet.openApp({ hash: `/room/${session}` });
      await expect(page.getByRole('button', { name: 'Go on' })).toBeVisible();
      const journal = await journalOnDisk(page, session);
      expect(journal.length).toBeGreaterThanOrEqual(promised);
      expect(journal.length).toBeGreaterThan(before);
      expect(journal.map((entry) => entry.seq)).toEqual(journal.map((_, i) => i));
      before = journal.length;
    }
    const journal = await journalOnDisk(page, session);
    // The schedule never shifted: every cue was planned on the grid of three seconds.
    const first = method === 'momentary' || method === 'headcount' ? 1 : 0;
    const planned = journal.flatMap((entry) =>
      entry.kind === 'cued' && entry.cue !== 'record'
        ? [entry.planned - (entry.interval - 1 + first) * 3000]
        : [],
    );
    expect(new Set(planned)).toEqual(new Set([0]));
    // What fell in between is written down as gaps.
    expect(journal.filter((entry) => entry.kind === 'gap' && entry.cause === 'closed').length).toBe(
      kills - 1,
    );
  });

test('a session that was cut off is offered on the next start and can be closed for good', async ({
  tablet,
}) => {
  let page = await tablet.visitOnce();
  await goIn(page, await shortVisitFile({ key: 'cut off' }));
  const session = sessionOf(page);
  await start(page);
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible({ timeout: 20_000 });
  await tablet.kill();
  await tablet.launch();
  page = await tablet.openApp();
  await page.getByRole('link', { name: 'Look at it' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('A session was cut off.');
  await page.getByRole('button', { name: 'Close it for good' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Close it' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Nothing is being recorded.');
  const journal = await journalOnDisk(page, session);
  expect(journal.at(-1)?.kind).toBe('ended');
});

test('a second window of the tablet says that the first one records', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  await goIn(
    page,
    await shortVisitFile({ key: 'two windows', protocol: { partLength: { kind: 'rounds', rounds: 100 } } }),
  );
  await start(page);
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible({ timeout: 20_000 });
  await picture(page, 'room');
  const second = await tablet.openApp({ hash: '/before', newTab: true });
  await second
    .locator('input[type=file]')
    .setInputFiles(await shortVisitFile({ key: 'two windows, second' }));
  await expect(
    second.getByText('Another window of this tablet is recording. End it there first.'),
  ).toBeVisible();
  await second.goto(`${second.url().split('#')[0]}#/room/${sessionOf(page)}`);
  await second.getByRole('button', { name: 'Go on' }).click();
  await expect(second.getByRole('alert')).toBeVisible();
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible();
});

test('a new version waits while a session is recorded, and is offered after it', async ({ tablet, site }) => {
  const page = await tablet.visitOnce();
  await goIn(
    page,
    await shortVisitFile({ key: 'update', protocol: { partLength: { kind: 'rounds', rounds: 3 } } }),
  );
  await start(page);
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible({ timeout: 20_000 });
  await site.publish('v2');
  await page.evaluate(async () => {
    const registration = await navigator.serviceWorker.ready;
    await registration.update();
    const worker = registration.waiting ?? registration.installing;
    while (worker?.state === 'installing') {
      await new Promise((done) => worker.addEventListener('statechange', done, { once: true }));
    }
  });
  await expect(page.getByText('A new version is ready', { exact: false })).toHaveCount(0);
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 60_000 });
  expect(await page.evaluate(() => document.documentElement.dataset.version)).not.toBe('v2');
  await page.getByRole('button', { name: 'Go to its figures' }).click();
  await page.getByRole('button', { name: 'Put it in now' }).click();
  await expect
    .poll(() => page.evaluate(() => document.documentElement.dataset.version).catch(() => ''))
    .toBe('v2');
});
