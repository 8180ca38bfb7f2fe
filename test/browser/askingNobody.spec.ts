import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Page } from '@playwright/test';
import { expect, test } from './support/test.ts';

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
