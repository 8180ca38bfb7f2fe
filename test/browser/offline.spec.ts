import type { Page } from '@playwright/test';
import { expect, test } from './support/test.ts';

const versionOf = (page: Page) => page.evaluate(() => document.documentElement.dataset.version);

/** The newest worker waits; resolves when the page's registration has one. */
const waiting = (page: Page) =>
  page.evaluate(async () => {
    const registration = await navigator.serviceWorker.ready;
    await registration.update();
    const worker = registration.waiting ?? registration.installing;
    if (!worker) return 'none';
    while (worker.state === 'installing') {
      await new Promise((done) => worker.addEventListener('statechange', done, { once: true }));
    }
    return worker.state;
  });

test.describe('offline', () => {
  test('starts without network and without server after one visit, also as a new process', async ({
    tablet,
  }) => {
    await tablet.visitOnce();
    await tablet.goOffline();
    await expect(fetch(tablet.site.url)).rejects.toThrow();
    await tablet.openApp();
    await tablet.close();
    await tablet.launch();
    await tablet.context.setOffline(true);
    const page = await tablet.openApp();
    expect(await page.evaluate(() => navigator.serviceWorker.controller !== null)).toBe(true);
    expect(tablet.foreignRequests).toEqual([]);
  });

  test('everything that is kept can be read without network', async ({ tablet }) => {
    const page = await tablet.visitOnce();
    await tablet.goOffline();
    const statuses = await page.evaluate(async () => {
      const names = await caches.keys();
      const kept = await Promise.all(names.map(async (name) => (await caches.open(name)).keys()));
      return Promise.all(kept.flat().map(async ({ url }) => (await fetch(url.split('?')[0] ?? url)).status));
    });
    expect(statuses.length).toBeGreaterThan(5);
    expect(new Set(statuses)).toEqual(new Set([200]));
  });

  test.describe('below a folder of some host', () => {
    test.use({ base: '/some/folder/' });

    test('works there as well', async ({ tablet }) => {
      await tablet.visitOnce();
      await tablet.goOffline();
      const page = await tablet.openApp();
      expect(new URL(page.url()).pathname).toBe('/some/folder/');
    });
  });
});

test.describe('updating', () => {
  test('a new version waits, also over a reload, and comes when it is let in', async ({ tablet, site }) => {
    const page = await tablet.visitOnce();
    site.publish('next');
    expect(await waiting(page)).toBe('installed');
    await page.reload();
    expect(await versionOf(page)).toBeUndefined();
    await page.evaluate(async () => {
      const { waiting: next } = await navigator.serviceWorker.ready;
      const changed = new Promise((done) => {
        navigator.serviceWorker.addEventListener('controllerchange', done, { once: true });
      });
      next?.postMessage({ type: 'SKIP_WAITING' });
      await changed;
    });
    await page.goto(site.url);
    await expect.poll(() => versionOf(page)).toBe('next');
  });
});
