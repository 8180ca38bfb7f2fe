import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { wakeLock } from '../../src/devices/wakeLock.ts';

/** The browser's side: a document that is seen or hidden, and a lock that it gives, refuses and takes away. */
class Browser {
  readonly page = Object.assign(new EventTarget(), { visibilityState: 'visible' });
  refuses = false;
  asked = 0;
  given: (EventTarget & { release: () => Promise<void>; released: boolean })[] = [];
  readonly wakeLock = {
    request: async () => {
      this.asked += 1;
      if (this.refuses || this.page.visibilityState !== 'visible') throw new Error('not allowed');
      const lock = Object.assign(new EventTarget(), {
        released: false,
        release: async () => {
          lock.released = true;
          lock.dispatchEvent(new Event('release'));
        },
      });
      this.given.push(lock);
      return lock;
    },
  };

  show(visible: boolean): void {
    this.page.visibilityState = visible ? 'visible' : 'hidden';
    if (!visible) for (const lock of this.given.splice(0)) void lock.release();
    this.page.dispatchEvent(new Event('visibilitychange'));
  }
}

let browser: Browser;
beforeEach(() => {
  browser = new Browser();
  vi.stubGlobal('document', browser.page);
  vi.stubGlobal('navigator', { wakeLock: browser.wakeLock });
});
afterEach(() => vi.unstubAllGlobals());

const soon = async (): Promise<void> => {
  for (let i = 0; i < 8; i++) await Promise.resolve();
};

describe('the wake lock', () => {
  it('is held on request, lost with a hidden page, and asked for again when it is seen', async () => {
    const port = wakeLock();
    const told: string[] = [];
    port.subscribe(() => told.push(port.state()));
    port.hold();
    await soon();
    browser.show(false);
    await soon();
    browser.show(true);
    await soon();
    expect(told).toEqual(['held', 'refused', 'held']);
    expect(browser.asked).toBe(2);
  });

  it('says when it is refused, and takes the next chance', async () => {
    browser.refuses = true;
    const port = wakeLock();
    port.hold();
    await soon();
    expect(port.state()).toBe('refused');
    browser.refuses = false;
    browser.show(true);
    await soon();
    expect(port.state()).toBe('held');
  });

  it('is let go for good, also when it comes after that', async () => {
    const port = wakeLock();
    port.hold();
    port.letGo();
    await soon();
    expect(port.state()).toBe('idle');
    expect(browser.given.every(({ released }) => released)).toBe(true);
    browser.show(false);
    browser.show(true);
    await soon();
    expect(browser.asked).toBe(1);
  });

  it('says when the browser has none', async () => {
    vi.stubGlobal('navigator', {});
    const port = wakeLock();
    port.hold();
    await soon();
    expect(port.state()).toBe('missing');
  });
});
