import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { openStore } from '../../src/storage/index.ts';
import { openIndexedRows } from '../../src/storage/indexedRows.ts';
import { nativeVersion, schemaVersion } from '../../src/storage/openDatabase.ts';
import { storeOver } from '../../src/storage/storeOver.ts';
import type { Store, StoreNotice } from '../../src/tasks/ports.ts';
import { headerOf } from '../support/session.ts';
import { bundleOf, codeOf, given, journalOf, plainJoin, revision, studyOf } from './samples.ts';

interface Begun {
  readonly mode: IDBTransactionMode | undefined;
  readonly durability: string | undefined;
  readonly database: IDBDatabase;
}

let begun: Begun[];
let factory: IDBFactory;
/** What the next transactions fail with, in order. */
let failures: (Error | null)[];

beforeEach(() => {
  begun = [];
  failures = [];
  factory = new IDBFactory();
  const native = IDBDatabase.prototype.transaction;
  vi.spyOn(IDBDatabase.prototype, 'transaction').mockImplementation(function (
    this: IDBDatabase,
    names,
    mode,
    options,
  ) {
    begun.push({ mode, durability: options?.durability, database: this });
    const failure = failures.shift() ?? null;
    if (failure !== null) throw failure;
    return native.call(this, names, mode, options);
  });
});
afterEach(() => {
  vi.restoreAllMocks();
});

const open = async (onNotice?: (notice: StoreNotice) => void): Promise<Store> =>
  given(await openStore({ name: 'x', indexedDB: factory, ...(onNotice && { onNotice }) }));

/** The database as a later build opens it. */
const newerBuild = (): Promise<IDBDatabase> =>
  new Promise((resolve, reject) => {
    const request = factory.open('x', nativeVersion(schemaVersion + 1));
    request.onupgradeneeded = () => void request.result.createObjectStore('later', { keyPath: 'key' });
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });

it('asks for strict durability in every transaction that writes', async () => {
  const store = await open();
  begun.length = 0;
  given(await store.put({ studies: [{ record: studyOf(), previous: null }] }));
  given(await store.createSession(headerOf()));
  given(await store.appendEntries('session-1', journalOf('session-1', 3, true)));
  given(await store.pack('session-1'));
  given(await store.applyBundles([bundleOf({ sessions: [] })], plainJoin));
  given(await store.markHandedOver([{ session: 'session-1', own: 5 }]));
  given(await store.saveSettings({ theme: 'dim' }));
  given(
    await store.removeStudy({
      record: studyOf({ removed: true, revision: revision(1) }),
      previous: revision(0),
    }),
  );
  const writes = begun.filter(({ mode }) => mode === 'readwrite');
  expect(writes.length).toBeGreaterThanOrEqual(8);
  expect(writes.map(({ durability }) => durability)).toEqual(writes.map(() => 'strict'));
  store.close();
});

it('puts a whole queue of entries into one transaction', async () => {
  const store = await open();
  given(await store.createSession(headerOf()));
  begun.length = 0;
  given(await store.appendEntries('session-1', journalOf('session-1', 60, true)));
  expect(begun.filter(({ mode }) => mode === 'readwrite')).toHaveLength(1);
  store.close();
});

it.each(['InvalidStateError', 'UnknownError'])(
  'opens a lost connection (%s) once more and does the work again',
  async (name) => {
    const store = await open();
    given(await store.createSession(headerOf()));
    const [first] = begun.slice(-1);
    begun.length = 0;
    // The first transaction reads, the second writes: that one finds the connection gone.
    failures = [null, new DOMException('The database connection is closing.', name)];
    given(await store.appendEntries('session-1', journalOf('session-1', 1, false)));
    expect(begun.at(-1)?.database).not.toBe(first?.database);
    expect(given(await store.readSession('session-1'))?.journal).toHaveLength(2);
    expect(given(await store.session('session-1'))).toMatchObject({ own: 2, entries: 2 });
    store.close();
  },
);

it('says that the connection is lost when opening it again does not help, and works when it is back', async () => {
  const store = await open();
  given(await store.createSession(headerOf()));
  const gone = new DOMException('Connection to Indexed Database server lost.', 'UnknownError');
  failures = Array.from({ length: 12 }, () => gone);
  const entries = journalOf('session-1', 1, false);
  expect(codeOf(await store.appendEntries('session-1', entries))).toBe('store.lost');
  failures = [];
  given(await store.appendEntries('session-1', entries));
  expect(given(await store.readSession('session-1'))?.journal).toEqual(entries);
  store.close();
});

it('says that the disk is full, keeps nothing of that call, and takes the same entries later', async () => {
  const store = await open();
  given(await store.createSession(headerOf()));
  const entries = journalOf('session-1', 2, false);
  const put = vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(() => {
    throw new DOMException('Encountered full disk while committing.', 'QuotaExceededError');
  });
  expect(codeOf(await store.appendEntries('session-1', entries))).toBe('store.full');
  put.mockRestore();
  expect(given(await store.readSession('session-1'))?.journal).toEqual([]);
  given(await store.appendEntries('session-1', entries));
  expect(given(await store.session('session-1'))).toMatchObject({ own: 3, entries: 3 });
  store.close();
});

it('refuses a database that a newer build has written, and leaves it as it is', async () => {
  (await newerBuild()).close();
  const opened = await openStore({ name: 'x', indexedDB: factory });
  expect(opened).toMatchObject({
    ok: false,
    problem: { code: 'store.newer', values: { found: schemaVersion + 1, expected: schemaVersion } },
  });
  const stands = await factory.databases();
  expect(stands).toMatchObject([{ name: 'x', version: (schemaVersion + 1) * 10 }]);
});

it('makes way for a newer build: it finishes, closes, tells, and writes no more', async () => {
  const notices: StoreNotice[] = [];
  const store = await open((notice) => notices.push(notice));
  given(await store.createSession(headerOf()));
  const entries = journalOf('session-1', 30, false);
  const writing = store.appendEntries('session-1', entries);
  const opening = newerBuild();
  const written = await writing;
  const newer = await opening;
  expect(notices).toEqual(['newerVersionWaits']);
  expect(['ok', 'store.closed']).toContain(codeOf(written));
  const count = await new Promise((done) => {
    const request = newer.transaction('entries').objectStore('entries').count();
    request.onsuccess = () => done(request.result);
  });
  expect(count).toBe(written.ok ? entries.length : 0);
  expect(codeOf(await store.appendEntries('session-1', entries))).toBe('store.closed');
  expect(codeOf(await store.readSession('session-1'))).toBe('store.closed');
  expect(newer.version).toBe(nativeVersion(schemaVersion + 1));
  newer.close();
});

it('says that storage is refused where there is none', async () => {
  const none = {
    open: () => {
      throw new DOMException('The operation is insecure.', 'SecurityError');
    },
  };
  const opened = await openStore({ name: 'x', indexedDB: none as unknown as IDBFactory });
  expect(codeOf(opened)).toBe('store.refused');
});

it('lets a second tab see what the first has kept, and refuses its stale edit', async () => {
  const [one, other] = [await open(), await open()];
  given(await one.put({ studies: [{ record: studyOf(), previous: null }] }));
  const seen = given(await other.study('study-1'));
  expect(seen).toEqual(studyOf());
  given(await one.put({ studies: [{ record: studyOf({ revision: revision(1) }), previous: revision(0) }] }));
  const late = await other.put({
    studies: [{ record: studyOf({ name: 'Late', revision: revision(1) }), previous: revision(0) }],
  });
  expect(codeOf(late)).toBe('store.changedMeanwhile');
  given(await one.createSession(headerOf()));
  const journal = journalOf('session-1', 20, true);
  await Promise.all([
    ...journal.slice(0, 11).map((entry) => one.appendEntries('session-1', [entry])),
    ...journal.slice(11).map((entry) => other.appendEntries('session-1', [entry])),
  ]);
  for (const entry of journal) given(await one.appendEntries('session-1', [entry]));
  expect(given(await other.session('session-1'))).toMatchObject({ entries: 22, own: 22, ended: 'complete' });
  one.close();
  other.close();
});

it('tells of its own closing', async () => {
  const notices: StoreNotice[] = [];
  const rows = await openIndexedRows({
    name: 'y',
    indexedDB: factory,
    onNotice: (notice) => notices.push(notice),
  });
  storeOver(rows).close();
  expect(notices).toEqual(['closed']);
});
