import type { BrowserContext, Page } from '@playwright/test';
import type { KnownEntry } from '../../../src/journal/entry.ts';
import type { SessionHeader } from '../../../src/model/session.ts';

/** A page of Playwright's, or one that can be hidden. */
interface Evaluates {
  evaluate<Given, Answer>(work: (given: Given) => Answer, given: Given): Promise<Awaited<Answer>>;
}

/** The journal of a session as it lies in the tablet's database: packed and single rows together, by number. */
export async function journalOnDisk(page: Evaluates, session: string): Promise<KnownEntry[]> {
  const entries = await page.evaluate(async (id) => {
    const done = <T>(request: IDBRequest<T>): Promise<T> =>
      new Promise((resolve, reject) => {
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error);
      });
    const db = await done(indexedDB.open('lookbell'));
    const read = db.transaction(['packs', 'entries'], 'readonly');
    const packs = (await done(read.objectStore('packs').getAll())) as { key: string; sealed: unknown[] }[];
    const rows = (await done(read.objectStore('entries').getAll())) as { sealed: unknown }[];
    db.close();
    const all = [...packs.flatMap((pack) => pack.sealed), ...rows.map((row) => row.sealed)];
    return (all as { session: string }[]).filter((entry) => entry.session === id);
  }, session);
  return (entries as unknown as KnownEntry[]).sort((a, b) =>
    a.writer === b.writer ? a.seq - b.seq : a.wall < b.wall ? -1 : 1,
  );
}

/** The header of a session as it lies in the tablet's database. */
export async function headerOnDisk(page: Evaluates, session: string): Promise<SessionHeader> {
  const row = await page.evaluate(async (id) => {
    const done = <T>(request: IDBRequest<T>): Promise<T> =>
      new Promise((resolve, reject) => {
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error);
      });
    const db = await done(indexedDB.open('lookbell'));
    const found = await done(db.transaction('headers').objectStore('headers').get(id));
    db.close();
    return found as { sealed: unknown };
  }, session);
  return row.sealed as SessionHeader;
}

/** The session whose room is open. */
export function sessionOf(page: Page): string {
  return page.url().split('#/room/')[1] ?? '';
}

/** Makes every page write down the durability of each of its writing transactions; read by `durabilities`. */
export async function watchDurability(context: BrowserContext): Promise<void> {
  await context.addInitScript(() => {
    const seen: string[] = [];
    Object.assign(window, { durabilitiesSeen: seen });
    const original = IDBDatabase.prototype.transaction;
    IDBDatabase.prototype.transaction = function (...parameters) {
      const transaction = original.apply(this, parameters);
      if (transaction.mode === 'readwrite') seen.push(transaction.durability);
      return transaction;
    };
  });
}

export function durabilities(page: Page): Promise<string[]> {
  return page.evaluate(() => (window as unknown as { durabilitiesSeen: string[] }).durabilitiesSeen);
}
