import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { JournalEntry, KnownEntry } from '../../src/journal/entry.ts';
import type { SessionSummary, Store } from '../../src/tasks/ports.ts';
import {
  bundleOf,
  classOf,
  codeOf,
  given,
  journalOf,
  plainJoin,
  revision,
  studyOf,
} from '../storage/samples.ts';
import { headerOf, protocolOf } from '../support/session.ts';

export interface Opened {
  readonly store: Store;
  /** All rows as one text. */
  readonly dump: () => Promise<string>;
}

/** What every store must do, whatever it keeps its rows in. */
export function storeContract(name: string, open: () => Promise<Opened>): void {
  describe(`${name} keeps the contract of the store`, () => {
    let store: Store;
    let dump: Opened['dump'];
    beforeEach(async () => {
      ({ store, dump } = await open());
      return () => store.close();
    });

    const began = async (id = 'session-1'): Promise<void> => {
      given(await store.createSession(headerOf({}, ['before'], { id })));
    };
    const summary = async (id = 'session-1'): Promise<SessionSummary> => {
      const found = given(await store.session(id));
      if (found === null) throw new Error('no such session');
      return found;
    };

    it('gives a kept record back and lists it by name, removed ones left out', async () => {
      const other = studyOf({ id: 'study-2', name: 'Brook school' });
      const gone = studyOf({ id: 'study-3', name: 'Acorn school', removed: true });
      const studies = [studyOf(), other, gone].map((record) => ({ record, previous: null }));
      given(await store.put({ studies }));
      expect(given(await store.study('study-1'))).toEqual(studyOf());
      expect(given(await store.study('study-3'))?.removed).toBe(true);
      expect(given(await store.study('study-9'))).toBeNull();
      expect(given(await store.studies()).map((study) => study.name)).toEqual([
        'Brook school',
        'Hedge school',
      ]);
    });

    it('refuses an edit that was made on another state, and keeps none of what came with it', async () => {
      given(await store.put({ studies: [{ record: studyOf(), previous: null }] }));
      given(
        await store.put({ studies: [{ record: studyOf({ revision: revision(1) }), previous: revision(0) }] }),
      );
      const before = await dump();
      const late = studyOf({ name: 'Late', revision: revision(1) });
      const refused = await store.put({
        classes: [{ record: classOf(), previous: null }],
        studies: [{ record: late, previous: revision(0) }],
      });
      expect(codeOf(refused)).toBe('store.changedMeanwhile');
      expect(await dump()).toBe(before);
      const again = await store.put({ studies: [{ record: studyOf(), previous: null }] });
      expect(codeOf(again)).toBe('store.changedMeanwhile');
      const unknown = await store.put({ classes: [{ record: classOf(), previous: revision(0) }] });
      expect(codeOf(unknown)).toBe('store.changedMeanwhile');
    });

    it('keeps each version of a protocol and lists the newest', async () => {
      const versions = [1, 2].map((version) => protocolOf({ version, name: `Recipe ${version}` }));
      given(await store.put({ protocols: versions.map((record) => ({ record, previous: null })) }));
      expect(given(await store.protocols('study-1')).map((one) => one.name)).toEqual(['Recipe 2']);
      expect(given(await store.protocolVersions('protocol-1')).map((one) => one.version)).toEqual([1, 2]);
      expect(given(await store.protocol('protocol-1'))?.version).toBe(2);
      expect(given(await store.protocol('protocol-1', 1))?.name).toBe('Recipe 1');
      const gone = {
        ...protocolOf({ version: 2, name: 'Recipe 2' }),
        removed: true,
        revision: revision(1, 'w'),
      };
      given(await store.put({ protocols: [{ record: gone, previous: revision(0, 'w') }] }));
      expect(given(await store.protocols('study-1'))).toEqual([]);
    });

    it('creates a session once, and refuses another header under its id', async () => {
      await began();
      const before = await dump();
      await began();
      expect(await dump()).toBe(before);
      const other = headerOf({}, ['after']);
      expect(codeOf(await store.createSession(other))).toBe('store.sessionExists');
      expect(await dump()).toBe(before);
    });

    it('keeps entries once, however often they are sent', async () => {
      await began();
      const journal = journalOf('session-1', 3, false);
      given(await store.appendEntries('session-1', journal.slice(0, 2)));
      given(await store.appendEntries('session-1', journal));
      given(await store.appendEntries('session-1', journal));
      expect(given(await store.readSession('session-1'))).toEqual({ header: headerOf(), journal });
      expect(await summary()).toMatchObject({ entries: 4, own: 4, here: true, ended: null });
    });

    it('refuses an identity with other content, an unknown session, and keeps nothing of that call', async () => {
      await began();
      const [first, second] = journalOf('session-1', 1, false) as [KnownEntry, KnownEntry];
      given(await store.appendEntries('session-1', [first]));
      const before = await dump();
      const other: JournalEntry = { ...first, at: 7 as typeof first.at };
      expect(codeOf(await store.appendEntries('session-1', [second, other]))).toBe('store.entryTaken');
      expect(codeOf(await store.appendEntries('session-9', [{ ...first, session: 'session-9' }]))).toBe(
        'store.noSession',
      );
      expect(codeOf(await store.appendEntries('session-2', [first]))).toBe('store.wrongSession');
      expect(await dump()).toBe(before);
    });

    it('packs a thousand entries and reads them back equal, also with later ones beside the pack', async () => {
      await began();
      const journal = journalOf('session-1', 998, true);
      expect(journal).toHaveLength(1000);
      given(await store.appendEntries('session-1', journal));
      const before = given(await store.readSession('session-1'));
      const listed = await summary();
      given(await store.pack('session-1'));
      expect(given(await store.readSession('session-1'))).toEqual(before);
      expect(before?.journal).toEqual(journal);
      expect(await summary()).toEqual(listed);
      const packed = await dump();
      given(await store.pack('session-1'));
      expect(await dump()).toBe(packed);

      const noted: KnownEntry = {
        ...(journal[0] as KnownEntry),
        writer: 'desk',
        kind: 'noted',
        text: 'late bell',
      } as KnownEntry;
      given(await store.appendEntries('session-1', [noted, journal[5] as KnownEntry]));
      expect((await summary()).entries).toBe(1001);
      const other = { ...(journal[5] as KnownEntry), at: 1 } as KnownEntry;
      expect(codeOf(await store.appendEntries('session-1', [other]))).toBe('store.entryTaken');
      given(await store.pack('session-1'));
      expect(given(await store.readSession('session-1'))?.journal).toHaveLength(1001);
    });

    it('keeps an entry of a kind that it does not know, with all its members', async () => {
      await began();
      const strange = {
        ...journalOf('session-1', 0, false)[0],
        kind: 'hummed',
        tune: ['a', 1],
      } as JournalEntry;
      given(await store.appendEntries('session-1', [strange]));
      given(await store.pack('session-1'));
      expect(given(await store.readSession('session-1'))?.journal).toEqual([strange]);
    });

    it('offers sessions that were begun here and not ended; an undone end opens one again', async () => {
      await began();
      await began('session-2');
      given(await store.appendEntries('session-1', journalOf('session-1', 2, true)));
      const open = async () => given(await store.unfinishedSessions()).map(({ id }) => id);
      expect(await open()).toEqual(['session-2']);
      const undo: KnownEntry = {
        ...(journalOf('session-1', 0, false)[0] as KnownEntry),
        seq: 4,
        kind: 'withdrawn',
        target: { writer: 'run-1', seq: 3 },
      } as KnownEntry;
      given(await store.appendEntries('session-1', [undo]));
      expect((await open()).sort()).toEqual(['session-1', 'session-2']);
      expect((await summary()).ended).toBeNull();
    });

    it('lists sessions of one study, oldest first, without opening journals', async () => {
      await began('session-2');
      await began('session-1');
      given(await store.createSession(headerOf({}, ['before'], { id: 'other', study: 'study-2' })));
      const late = journalOf('session-1', 1, false).map((entry) => ({
        ...entry,
        wall: '2026-12-24T09:00:00+00:00',
      }));
      given(await store.appendEntries('session-1', late as KnownEntry[]));
      given(await store.appendEntries('session-2', journalOf('session-2', 1, true)));
      const listed = given(await store.listSessions('study-1'));
      expect(listed.map(({ id }) => id)).toEqual(['session-2', 'session-1']);
      expect(listed[0]).toMatchObject({
        observer: { id: 'observer-1', name: 'Quill' },
        classroom: { id: 'class-1', name: 'Class Otter' },
        protocol: { id: 'protocol-1', version: 1 },
        method: 'momentary',
        phases: ['before'],
        children: 3,
        ended: 'complete',
      });
    });

    it('knows what has left the tablet: a later entry has not', async () => {
      await began();
      const journal = journalOf('session-1', 2, true);
      given(await store.appendEntries('session-1', journal));
      expect((await summary()).handedOver).toBe(false);
      given(
        await store.markHandedOver([
          { session: 'session-1', own: 4 },
          { session: 'gone', own: 1 },
        ]),
      );
      expect((await summary()).handedOver).toBe(true);
      const noted = { ...(journal[0] as KnownEntry), writer: 'desk', kind: 'noted', text: '' } as KnownEntry;
      given(await store.appendEntries('session-1', [noted]));
      expect((await summary()).handedOver).toBe(false);
      given(await store.markHandedOver([{ session: 'session-1', own: 4 }]));
      expect((await summary()).handedOver).toBe(false);
    });

    it('applies a bundle as a whole, and the same one again changes nothing', async () => {
      given(await store.applyBundles([bundleOf()], plainJoin));
      expect(given(await store.bundle('study-1'))).toEqual(bundleOf());
      expect(await summary()).toMatchObject({
        here: false,
        own: 0,
        handedOver: true,
        ended: 'complete',
        entries: 5,
      });
      const before = await dump();
      given(await store.applyBundles([bundleOf(), bundleOf()], plainJoin));
      expect(await dump()).toBe(before);
    });

    it('joins what comes in with what is recorded here, and remembers what was written here', async () => {
      await began();
      const journal = journalOf('session-1', 3, true);
      given(await store.appendEntries('session-1', journal.slice(0, 2)));
      const away = journalOf('session-1', 2, false, 'run-2');
      given(
        await store.applyBundles(
          [bundleOf({ sessions: [{ header: headerOf(), journal: away }] })],
          plainJoin,
        ),
      );
      expect(given(await store.readSession('session-1'))?.journal).toHaveLength(5);
      expect(await summary()).toMatchObject({ here: true, own: 2, entries: 5, handedOver: false });
      given(await store.appendEntries('session-1', journal));
      expect(await summary()).toMatchObject({ own: 5, entries: 8, ended: 'complete' });
    });

    it('keeps the newer record, whichever comes first, and the older ones as history', async () => {
      const states = [0, 1, 2].map((counter) =>
        bundleOf({ classes: [classOf({ name: `Class ${counter}`, revision: revision(counter) })] }),
      );
      const dumps = new Set<string>();
      for (const order of [
        [0, 1, 2],
        [2, 1, 0],
        [1, 0, 2],
      ]) {
        const other = await open();
        for (const i of order)
          given(await other.store.applyBundles([states[i] as (typeof states)[0]], plainJoin));
        expect(given(await other.store.classroom('class-1'))?.name).toBe('Class 2');
        dumps.add(withoutStamps(await other.dump()));
        other.store.close();
      }
      expect(dumps.size).toBe(1);
      expect(JSON.parse([...dumps][0] ?? '').history).toHaveLength(2);
    });

    it('changes nothing when a join fails half way', async () => {
      given(await store.applyBundles([bundleOf()], plainJoin));
      const before = await dump();
      const broken = bundleOf({ study: studyOf({ id: 'study-2' }), classes: [] });
      const failing = (): never => {
        throw new RangeError('a bug');
      };
      await expect(store.applyBundles([broken], failing)).rejects.toThrow('a bug');
      expect(await dump()).toBe(before);
    });

    it('removes a study with all that is in it; a union does not bring it back unless asked', async () => {
      given(await store.applyBundles([bundleOf()], plainJoin));
      const other = bundleOf({
        study: studyOf({ id: 'study-2' }),
        classes: [classOf({ id: 'class-2', study: 'study-2', children: [] })],
        sessions: [],
      });
      given(await store.applyBundles([other], plainJoin));
      const tombstone = studyOf({ removed: true, revision: revision(1) });
      expect(codeOf(await store.removeStudy({ record: tombstone, previous: revision(5) }))).toBe(
        'store.changedMeanwhile',
      );
      expect(given(await store.bundle('study-1'))).not.toBeNull();
      given(await store.removeStudy({ record: tombstone, previous: revision(0) }));
      expect(given(await store.bundle('study-1'))).toBeNull();
      expect(given(await store.readSession('session-1'))).toBeNull();
      expect(await dump()).not.toContain('Otter-01');
      expect(given(await store.bundle('study-2'))).toEqual(other);
      const before = await dump();
      given(await store.applyBundles([bundleOf()], plainJoin));
      expect(await dump()).toBe(before);
      given(await store.applyBundles([bundleOf()], plainJoin, { revive: ['study-1'] }));
      expect(given(await store.bundle('study-1'))).toEqual(bundleOf());
    });

    it('keeps settings apart from each other, with defaults for the rest', async () => {
      expect(given(await store.settings())).toMatchObject({ theme: 'system', study: null, prepared: null });
      given(await store.saveSettings({ theme: 'dim' }));
      given(await store.saveSettings({ study: 'study-1' }));
      expect(given(await store.settings())).toMatchObject({ theme: 'dim', study: 'study-1' });
    });

    it('tells who watches of each change, and nobody after they stopped', async () => {
      const seen: string[][] = [];
      const stop = store.watch(
        (reader) => reader.studies(),
        (answer) => seen.push(given(answer).map(({ name }) => name)),
      );
      await vi.waitFor(() => expect(seen).toEqual([[]]));
      given(await store.put({ studies: [{ record: studyOf(), previous: null }] }));
      await vi.waitFor(() => expect(seen.at(-1)).toEqual(['Hedge school']));
      stop();
      const count = seen.length;
      given(await store.put({ studies: [{ record: studyOf({ id: 'study-2' }), previous: null }] }));
      expect(given(await store.studies())).toHaveLength(2);
      expect(seen).toHaveLength(count);
    });

    it('follows a query that reads one thing after another', async () => {
      await began();
      const seen: number[] = [];
      const stop = store.watch(
        async (reader) => {
          const studies = await reader.studies();
          const session = await reader.session('session-1');
          return studies.ok ? session : studies;
        },
        (answer) => seen.push(given(answer)?.entries ?? -1),
      );
      await vi.waitFor(() => expect(seen).toEqual([0]));
      given(await store.appendEntries('session-1', journalOf('session-1', 3, true)));
      await vi.waitFor(() => expect(seen.at(-1)).toBe(5));
      stop();
    });

    it('does one thing after the other when many ask at once', async () => {
      await began();
      const journal = journalOf('session-1', 40, true);
      const part = bundleOf({ sessions: [{ header: headerOf(), journal: journal.slice(0, 3) }] });
      const done = await Promise.all([
        ...journal.map((entry) => store.appendEntries('session-1', [entry])),
        store.pack('session-1'),
        store.applyBundles([part], plainJoin),
      ]);
      expect(done.map(codeOf).filter((code) => code !== 'ok')).toEqual([]);
      expect(given(await store.readSession('session-1'))?.journal).toEqual(journal);
      expect(await summary()).toMatchObject({ entries: 42, ended: 'complete' });
    });
  });
}

/** Rows but for the marks that every write makes anew. */
export const withoutStamps = (dump: string): string => dump.replace(/"stamp":"[^"]*"/g, '"stamp":""');
