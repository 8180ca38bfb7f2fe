import { describe, expect, it } from 'vitest';
import type { SessionHeader } from '../../src/model/session.ts';
import { exportStudy, exportTable, finishUnfinished, importFiles } from '../../src/tasks/index.ts';
import { joinBundles } from '../../src/tasks/joinBundles.ts';
import { askDirectly } from '../../src/worker/client.ts';
import { bundleOf, codeOf, given, journalOf } from '../storage/samples.ts';
import { headerOf } from '../support/session.ts';
import { bench } from '../tasks/bench.ts';

/** Quill records here; Marsh's record of the same visit, ended, comes in by a file. */
async function besideMarsh(own: Partial<SessionHeader> = {}, marsh: Partial<SessionHeader> = {}) {
  const on = await bench();
  const { store } = on.deps;
  const other = headerOf({}, ['before'], {
    id: 'marsh',
    role: 'second',
    observer: { id: 'observer-2', name: 'Marsh' },
    ...marsh,
  });
  const brought = bundleOf({ sessions: [{ header: other, journal: journalOf('marsh', 6, true, 'run-2') }] });
  given(await store.applyBundles([brought], joinBundles));
  const header = headerOf({}, ['before'], own);
  given(await store.createSession(header));
  const journal = journalOf(header.id, 3, false);
  given(await store.appendEntries(header.id, journal));
  return { ...on, ask: askDirectly(store), header };
}

describe('the other observer’s record', () => {
  it('is in no answer while one’s own of the visit has not ended, and in all of them after', async () => {
    const { deps, ask, header } = await besideMarsh();
    const study = 'study-1';
    const answers = async () => ({
      session: codeOf(await ask({ kind: 'session', session: 'marsh' })),
      own: codeOf(await ask({ kind: 'session', session: header.id })),
      observers: given(await ask({ kind: 'study', study })).visits.flatMap(({ observers }) => observers),
      onTask: given(await ask({ kind: 'study', study })).onTask.sessions.length,
      pairs: given(await ask({ kind: 'agreement', study })).pairs.length,
      ofVisit: given(await ask({ kind: 'agreement', study, visit: 'marsh' })).pairs.length,
    });
    expect(await answers()).toEqual({
      session: 'ask.heldBack',
      own: 'ok',
      observers: ['Quill'],
      onTask: 1,
      pairs: 0,
      ofVisit: 0,
    });
    given(await finishUnfinished(deps, header.id));
    expect(await answers()).toEqual({
      session: 'ok',
      own: 'ok',
      observers: ['Marsh', 'Quill'],
      onTask: 2,
      pairs: 1,
      ofVisit: 1,
    });
  });

  it('is shown where it belongs to another visit', async () => {
    const { ask } = await besideMarsh({ visit: 'visit-2' });
    expect(codeOf(await ask({ kind: 'session', session: 'marsh' }))).toBe('ok');
    expect(given(await ask({ kind: 'study', study: 'study-1' })).visits).toHaveLength(2);
  });

  it('leaves the tablet with the study file all the same: nothing is lost', async () => {
    const { deps } = await besideMarsh();
    const file = given(await exportStudy(deps, 'study-1'));
    const there = await bench('tablet-b');
    const preview = given(await importFiles(there.deps, [{ name: file.name, bytes: file.bytes }]));
    expect(preview.bundles[0]?.sessions.map(({ header }) => header.id).sort()).toEqual([
      'marsh',
      'session-1',
    ]);
  });
});

describe('a familiarisation visit', () => {
  it('is in no figure unless asked for; its own page and its flag stay', async () => {
    const { deps, ask, header } = await besideMarsh({ familiarisation: true }, { familiarisation: true });
    const study = 'study-1';
    given(await finishUnfinished(deps, header.id));
    expect(given(await deps.store.session('marsh'))).toMatchObject({ familiarisation: true });
    expect(given(await ask({ kind: 'study', study }))).toMatchObject({ visits: [], doubleCoded: [] });
    expect(given(await ask({ kind: 'agreement', study })).pairs).toEqual([]);
    expect(
      given(await ask({ kind: 'agreement', study, practice: true, familiarisation: true })).pairs,
    ).toEqual([]);
    expect(given(await ask({ kind: 'agreement', study, familiarisation: true })).pairs).toHaveLength(1);
    expect(given(await ask({ kind: 'session', session: header.id })).details.scored).toBe(3);
  });

  it('is left out of the interval table, and keeps its flag in the study file', async () => {
    const { deps } = await besideMarsh({ familiarisation: true });
    const rows = new TextDecoder().decode(given(await exportTable(deps, 'study-1')).bytes).split('\n');
    expect(rows.some((row) => row.includes('Marsh'))).toBe(true);
    expect(rows.some((row) => row.includes('Quill'))).toBe(false);
    const file = given(await exportStudy(deps, 'study-1'));
    const there = await bench('tablet-b');
    const preview = given(await importFiles(there.deps, [{ name: file.name, bytes: file.bytes }]));
    expect(
      preview.bundles[0]?.sessions.map(({ header }) => [header.observer.name, header.familiarisation]).sort(),
    ).toEqual([
      ['Marsh', undefined],
      ['Quill', true],
    ]);
  });
});
