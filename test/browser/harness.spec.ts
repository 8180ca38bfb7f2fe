import { existsSync, readFileSync } from 'node:fs';
import { expectAccessible } from './support/accessible.ts';
import { savedFile } from './support/files.ts';
import { listen, listening, soundsOf } from './support/hearing.ts';
import { picture } from './support/picture.ts';
import { browserPid, isAlive } from './support/processes.ts';
import { expect, test } from './support/test.ts';

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
    // The first page, not the word about opening it.
    await expect(page.getByRole('heading', { level: 1, name: 'First, a study.' })).toBeVisible();
    await expectAccessible(page);
    await page.evaluate(() => document.querySelector('main')?.append(document.createElement('button')));
    await expect(expectAccessible(page)).rejects.toThrow('button-name');
  });

  test('a module of the project runs alone in a page', async ({ tablet, site }) => {
    const module = await site.bundle('test/browser/support/fixtures/twice.ts');
    const page = await tablet.context.newPage();
    await page.goto(site.emptyPage);
    expect(await page.evaluate(async (url) => (await import(url)).twice(21), module)).toBe(42);
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
