import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join, relative } from 'node:path';
import type { Page } from '@playwright/test';
import { expectAccessible } from './support/accessible.ts';
import { savedFile } from './support/files.ts';
import { listen, listening, soundsOf } from './support/hearing.ts';
import { picture } from './support/picture.ts';
import { browserPid, isAlive } from './support/processes.ts';
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
      .filter((file) => !/^(sw|workbox-[^/]+)\.js$/.test(file));
    expect(urls.sort()).toEqual(files.sort());
  });

  test('the demo study is brought along, each of its files', async ({ site }) => {
    const { files } = await (await fetch(`${site.url}demo-sessions/index.json`)).json();
    const made = existsSync('demo-sessions') ? readdirSync('demo-sessions') : [];
    expect(files).toEqual(made.filter((name) => /\.(json|csv)$/.test(name)).sort());
  });
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

test.describe('asking nobody', () => {
  /** A stranger on another port that counts who comes. */
  const stranger = async (use: (url: string) => Promise<void>) => {
    const calls: string[] = [];
    const server = createServer((request, response) => {
      calls.push(request.url ?? '');
      response.setHeader('Access-Control-Allow-Origin', '*').end('hello');
    });
    await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
    await use(`http://127.0.0.1:${(server.address() as AddressInfo).port}/`);
    server.closeAllConnections();
    await new Promise((done) => server.close(done));
    return calls;
  };

  const ways: Record<string, (page: Page, url: string) => Promise<unknown>> = {
    fetch: (page, url) => page.evaluate((to) => fetch(to).then(String, () => 'refused'), url),
    beacon: (page, url) => page.evaluate((to) => navigator.sendBeacon(to, 'x'), url),
    image: (page, url) =>
      page.evaluate((to) => {
        const image = new Image();
        const over = new Promise((done) => {
          image.onerror = done;
          image.onload = done;
        });
        image.src = to;
        return over.then(() => undefined);
      }, url),
    script: (page, url) =>
      page.evaluate((to) => {
        const script = document.createElement('script');
        const over = new Promise((done) => {
          script.onerror = done;
          script.onload = done;
        });
        script.src = to;
        document.head.append(script);
        return over.then(() => undefined);
      }, url),
  };

  test('the policy lets nothing through to another host', async ({ tablet }) => {
    const page = await tablet.openApp();
    const calls = await stranger(async (url) => {
      for (const [name, way] of Object.entries(ways)) {
        const violated = page.evaluate(
          () =>
            new Promise<string>((done) => {
              const options = { once: true };
              document.addEventListener(
                'securitypolicyviolation',
                (event) => done(event.blockedURI),
                options,
              );
            }),
        );
        await way(page, url + name);
        expect(await violated).toContain(url);
      }
    });
    expect(calls).toEqual([]);
    tablet.foreignRequests.length = 0;
  });

  test('the listener hears a request to another host', async ({ tablet }) => {
    const calls = await stranger(async (url) => {
      const page = await tablet.context.newPage();
      await page.goto(url);
    });
    expect(calls).toContain('/');
    expect(tablet.foreignRequests.length).toBeGreaterThan(0);
    tablet.foreignRequests.length = 0;
  });

  test('the policy is sent, and written into the page for hosts that send none', async ({ site }) => {
    const response = await fetch(site.url);
    const sent = response.headers.get('content-security-policy') ?? '';
    const [, written = ''] = /Content-Security-Policy" content="([^"]+)"/.exec(await response.text()) ?? [];
    expect(written.replaceAll('&#39;', "'")).toBe(sent.replace("; frame-ancestors 'none'", ''));
    expect(sent).not.toMatch(/unsafe|\*|https?:/);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    expect(response.headers.get('permissions-policy')).toContain('microphone=()');
  });

  test('the console has nothing to say against the headers', async ({ tablet }) => {
    const said: string[] = [];
    tablet.context.on('console', (message) => {
      if (message.type() === 'error' || message.type() === 'warning') said.push(message.text());
    });
    await tablet.visitOnce();
    expect(said).toEqual([]);
  });
});

test.describe('the helpers', () => {
  test('a killed browser is gone at once and comes back with what was kept', async ({ tablet }) => {
    const page = await tablet.visitOnce();
    await page.evaluate(
      () =>
        new Promise<void>((done) => {
          const opening = indexedDB.open('harness', 1);
          opening.onupgradeneeded = () => opening.result.createObjectStore('rows');
          opening.onsuccess = () => {
            const transaction = opening.result.transaction('rows', 'readwrite', { durability: 'strict' });
            transaction.objectStore('rows').put('kept', 1);
            transaction.oncomplete = () => done();
          };
        }),
    );
    const pid = browserPid(tablet.profile);
    await tablet.kill();
    expect(pid && isAlive(pid)).toBeFalsy();
    await tablet.launch();
    const again = await tablet.openApp();
    const row = await again.evaluate(
      () =>
        new Promise((done) => {
          const opening = indexedDB.open('harness', 1);
          opening.onsuccess = () => {
            const reading = opening.result.transaction('rows').objectStore('rows').get(1);
            reading.onsuccess = () => done(reading.result);
          };
        }),
    );
    expect(row).toBe('kept');
  });

  test('two tablets know nothing of each other', async ({ tablet, anotherTablet }) => {
    const second = await anotherTablet({ viewport: { width: 800, height: 1280 } });
    const [one, two] = [await tablet.openApp(), await second.openApp()];
    await one.evaluate(() => localStorage.setItem('harness', 'one'));
    expect(await two.evaluate(() => localStorage.getItem('harness'))).toBeNull();
    expect(two.viewportSize()).toEqual({ width: 800, height: 1280 });
  });

  test('pictures are taken at every size in both themes', async ({ tablet }) => {
    const page = await tablet.openApp();
    const files = await picture(page, 'harness');
    expect(files).toHaveLength(6);
    const widths = files.map((file) => readFileSync(file).readUInt32BE(16));
    expect(widths).toEqual([1366, 1366, 800, 800, 390, 390]);
    expect(files.every((file) => existsSync(file))).toBe(true);
  });

  test('axe passes the page and reports a planted fault', async ({ tablet }) => {
    const page = await tablet.openApp();
    await expectAccessible(page);
    await page.evaluate(() => document.querySelector('main')?.append(document.createElement('button')));
    await expect(expectAccessible(page)).rejects.toThrow('button-name');
  });

  test('a handed out file is read', async ({ tablet }) => {
    const page = await tablet.openApp();
    const { name, bytes } = await savedFile(page, () =>
      page.evaluate(() => {
        const link = document.createElement('a');
        link.href = URL.createObjectURL(new Blob(['a,b']));
        link.download = 'harness.csv';
        link.click();
      }),
    );
    expect([name, bytes.toString()]).toEqual(['harness.csv', 'a,b']);
  });

  test.describe('hearing', () => {
    test.use({ tabletOptions: { bypassPolicy: true, prepare: (context) => listen(context) } });

    test('notes by the sample what is played, without network', async ({ tablet }) => {
      await tablet.visitOnce();
      await tablet.goOffline();
      const page = await tablet.openApp();
      await page.evaluate(() => {
        Object.assign(globalThis, { audio: new AudioContext() });
      });
      await listening(page);
      const planned = await page.evaluate(async () => {
        const { audio } = globalThis as unknown as { audio: AudioContext };
        await audio.resume();
        const from = audio.currentTime + 0.3;
        const times = [0, 0.2, 0.4].map((later) => from + later);
        times.forEach((time, index) => {
          const tone = audio.createOscillator();
          const side = audio.createStereoPanner();
          side.pan.value = index - 1;
          tone.connect(side).connect(audio.destination);
          tone.start(time);
          tone.stop(time + 0.05);
        });
        return times.map((time) => Math.round(time * audio.sampleRate));
      });
      const sounds = await soundsOf(page, 3);
      sounds.forEach(({ onset, end, sampleRate }, index) => {
        // The first sample of a tone is a zero crossing, so it is heard one or two samples late.
        expect(Math.abs(onset - (planned[index] ?? 0))).toBeLessThanOrEqual(3);
        expect(Math.abs(end - onset - 0.05 * sampleRate)).toBeLessThanOrEqual(4);
      });
      expect(sounds.map(({ left, right }) => [left > 0.1, right > 0.1])).toEqual([
        [true, false],
        [true, true],
        [false, true],
      ]);
    });
  });
});
