import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BrowserContext, chromium, type Page } from '@playwright/test';
import { chromiumFlags, findChromium } from '../../../tools/find-chromium.mjs';
import { browserPid, familyOf } from './processes.ts';
import type { Site } from './site.ts';

export interface TabletOptions {
  /** What is shown; default the 12-inch tablet held across. */
  viewport?: { width: number; height: number };
  timezoneId?: string;
  locale?: string;
  /** Lets test code into the page that the app's content security policy would stop; for `listen`. */
  bypassPolicy?: boolean;
  /** More switches of the browser, such as those of a camera that is none. */
  switches?: string[];
  /** Called with every new browser, before a page is opened: init scripts, routes. */
  prepare?: (context: BrowserContext) => Promise<void>;
}

/** A browser with a profile of its own, as it would be on one tablet: it can go offline, be killed and come back. */
export class Tablet {
  readonly profile = mkdtempSync(join(tmpdir(), 'tablet-'));
  /** Requests that went to anybody but the site. */
  readonly foreignRequests: string[] = [];
  /** Errors that nobody caught, in any page. */
  readonly pageErrors: string[] = [];
  private running: BrowserContext | undefined;

  constructor(
    readonly site: Site,
    private readonly options: TabletOptions = {},
  ) {}

  get context(): BrowserContext {
    if (!this.running) throw new Error('the browser is not running');
    return this.running;
  }

  /** Starts the browser on the tablet's profile, for the first time or again. */
  async launch(): Promise<BrowserContext> {
    const { path } = findChromium();
    const {
      viewport = { width: 1366, height: 1024 },
      timezoneId = 'Europe/London',
      locale = 'en-GB',
    } = this.options;
    // What a killed browser leaves behind: without it the profile counts as in use.
    for (const name of ['SingletonLock', 'SingletonCookie', 'SingletonSocket']) {
      rmSync(join(this.profile, name), { force: true });
    }
    const context = await chromium.launchPersistentContext(this.profile, {
      ...(path === undefined ? {} : { executablePath: path }),
      args: [...chromiumFlags, ...(this.options.switches ?? [])],
      viewport,
      hasTouch: true,
      timezoneId,
      locale,
      serviceWorkers: 'allow',
      acceptDownloads: true,
      bypassCSP: this.options.bypassPolicy ?? false,
    });
    const { origin } = this.site;
    context.on('request', (request) => {
      const url = new URL(request.url());
      if (/^(http|ws)/.test(url.protocol) && url.origin !== origin) this.foreignRequests.push(url.href);
    });
    context.on('weberror', (error) => this.pageErrors.push(String(error.error().stack ?? error.error())));
    this.running = context;
    await this.options.prepare?.(context);
    return context;
  }

  /**
   * Opens the app in the first tab, or in another one, and waits until it shows something.
   *
   * @param hash the screen's address after `#`
   */
  async openApp({ hash = '', newTab = false }: { hash?: string; newTab?: boolean } = {}): Promise<Page> {
    const page = (newTab ? undefined : this.context.pages()[0]) ?? (await this.context.newPage());
    await page.goto(`${this.site.url}${hash && `#${hash}`}`);
    await page.waitForSelector('#root > *');
    return page;
  }

  /** The first visit that a tablet needs before it can be without network; the page is then under the service worker. */
  async visitOnce(): Promise<Page> {
    const page = await this.openApp();
    await page.evaluate(async () => {
      const { active } = await navigator.serviceWorker.ready;
      if (!active || active.state === 'activated') return;
      await new Promise<void>((done) => {
        active.addEventListener('statechange', () => active.state === 'activated' && done());
      });
    });
    await page.reload();
    await page.waitForSelector('#root > *');
    const controlled = await page.evaluate(() => navigator.serviceWorker.controller !== null);
    if (!controlled) throw new Error('the second load is not under the service worker');
    return page;
  }

  /** No network: the browser is told so, and the site is gone (which `navigator.onLine` alone does not show). */
  async goOffline({ stopSite = true } = {}): Promise<void> {
    await this.context.setOffline(true);
    if (stopSite) await this.site.stop();
  }

  async goOnline(): Promise<void> {
    await this.site.start();
    await this.context.setOffline(false);
  }

  /** Nothing of the browser runs for so long, as on a machine that has too much to do. Blocks the test as well. */
  standStill(ms: number): void {
    const pid = browserPid(this.profile);
    if (pid === undefined) throw new Error('the browser is not running');
    const family = familyOf(pid);
    for (const one of family) process.kill(one, 'SIGSTOP');
    Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, ms);
    for (const one of family) process.kill(one, 'SIGCONT');
  }

  /** Ends the browser as a crash would: no handler runs, nothing is flushed. The profile stays. */
  async kill(): Promise<void> {
    const context = this.context;
    const pid = browserPid(this.profile);
    if (pid === undefined) throw new Error('no process runs on this profile');
    const gone = context.waitForEvent('close');
    process.kill(pid, 'SIGKILL');
    await gone;
    this.running = undefined;
  }

  /** Ends the browser properly. */
  async close(): Promise<void> {
    await this.running?.close();
    this.running = undefined;
  }

  async remove(): Promise<void> {
    await this.close();
    if (existsSync(this.profile)) rmSync(this.profile, { recursive: true, force: true, maxRetries: 5 });
  }
}
