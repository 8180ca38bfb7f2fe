import { existsSync, readdirSync } from 'node:fs';
import { join, relative } from 'node:path';
import { expect, test } from './support/test.ts';

test.describe('installing', () => {
  test('the manifest and its icons are what a tablet needs', async ({ site }) => {
    const manifest = await (await fetch(`${site.url}manifest.webmanifest`)).json();
    expect(manifest).toMatchObject({ name: 'Lookbell', display: 'standalone', start_url: './', scope: './' });
    const purposes = manifest.icons.map(({ purpose }: { purpose: string }) => purpose);
    expect(purposes).toContain('maskable');
    for (const { src, sizes, type } of manifest.icons) {
      const response = await fetch(new URL(src, site.url));
      expect(response.headers.get('content-type')).toBe(type);
      if (type !== 'image/png') continue;
      const bytes = Buffer.from(await response.arrayBuffer());
      expect(`${bytes.readUInt32BE(16)}x${bytes.readUInt32BE(20)}`).toBe(sizes);
    }
  });

  test('Chromium finds nothing that keeps the app from being installed', async ({ tablet }) => {
    const page = await tablet.visitOnce();
    const session = await tablet.context.newCDPSession(page);
    const { installabilityErrors } = await session.send('Page.getInstallabilityErrors');
    // A profile in a test is treated as a private one, which can install nothing.
    const real = installabilityErrors.filter(({ errorId }) => errorId !== 'in-incognito');
    expect(real).toEqual([]);
    const { errors } = await session.send('Page.getAppManifest');
    expect(errors).toEqual([]);
  });

  test('the first load is not under the service worker, the second is', async ({ tablet }) => {
    const page = await tablet.openApp();
    expect(await page.evaluate(() => navigator.serviceWorker.controller)).toBeNull();
    await tablet.visitOnce();
    expect(await page.evaluate(() => navigator.serviceWorker.controller?.state)).toBe('activated');
  });

  test('every built file is kept for offline use, and none twice', async ({ site }) => {
    const worker = await (await fetch(`${site.url}sw.js`)).text();
    const urls = [...worker.matchAll(/url:\s*"([^"]+)"/g)].map(([, url]) => url);
    const files = readdirSync('dist', { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => relative('dist', join(entry.parentPath, entry.name)))
      // The worker itself and its library are kept by the browser.
      .filter((file) => !/^(sw|workbox-[^/]+)\.js$/.test(file))
      // The list of what was built is for the tests, no part of the app.
      .filter((file) => file !== '.vite/manifest.json');
    expect(urls.sort()).toEqual(files.sort());
  });

  test('the demo study is brought along, each of its files', async ({ site }) => {
    const { files } = await (await fetch(`${site.url}demo-sessions/index.json`)).json();
    const made = existsSync('demo-sessions') ? readdirSync('demo-sessions') : [];
    expect(files).toEqual(made.filter((name) => /\.(json|csv)$/.test(name)).sort());
  });
});
