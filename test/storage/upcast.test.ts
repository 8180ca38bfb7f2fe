import { expect, it } from 'vitest';
import { memoryRows } from '../../src/storage/memoryRows.ts';
import { StoreFailure } from '../../src/storage/problems.ts';
import type { RecordRow } from '../../src/storage/rows.ts';
import { storeOver } from '../../src/storage/storeOver.ts';
import { steps, upcast, versionOf } from '../../src/storage/upcast.ts';
import { headerOf } from '../support/session.ts';
import { given, journalOf, studyOf } from './samples.ts';

const codeOfThrown = (work: () => unknown): string => {
  try {
    work();
  } catch (error) {
    if (error instanceof StoreFailure) return error.problem.code;
  }
  return 'nothing';
};

it('leads an older value step by step to today’s form', () => {
  const all = {
    ...steps,
    study: [
      (value: unknown) => ({ ...(value as object), criterion: { agreement: 0.85, kappa: 0.6 } }),
      (value: unknown) => ({ ...(value as object), pairings: [] }),
    ],
  };
  expect(versionOf('study', all)).toBe(3);
  const { criterion: _c, pairings: _p, ...first } = studyOf();
  expect(upcast('study', 1, first, 'k', all)).toEqual(studyOf());
  expect(upcast('study', 3, studyOf(), 'k', all)).toEqual(studyOf());
});

it('refuses what a newer build wrote and what is not what it says, naming the place', () => {
  expect(codeOfThrown(() => upcast('study', 2, studyOf(), 'k'))).toBe('store.newerRow');
  expect(codeOfThrown(() => upcast('study', 1, { ...studyOf(), phases: 'x' }, 'k'))).toBe('store.unreadable');
  expect(codeOfThrown(() => upcast('journal', 1, 'x', 'k'))).toBe('store.unreadable');
  expect(codeOfThrown(() => upcast('entry', 1, null, 'k'))).toBe('store.unreadable');
  const [entry] = journalOf('session-1', 0, false);
  expect(codeOfThrown(() => upcast('journal', 1, [{ ...entry, checks: 1 }], 'k'))).toBe('store.unreadable');
  const broken = { ...steps, study: [() => (undefined as unknown as { x: object }).x] };
  expect(codeOfThrown(() => upcast('study', 1, {}, 'k', broken))).toBe('store.unreadable');
});

it('keeps members that this build does not know', () => {
  const later = { ...studyOf(), motto: 'look up' };
  expect(upcast('study', 1, later, 'k')).toBe(later);
});

it('answers a damaged row with a problem, and reads the others', async () => {
  const rows = memoryRows();
  const store = storeOver(rows);
  given(await store.createSession(headerOf()));
  given(await store.put({ studies: [{ record: studyOf(), previous: null }] }));
  await rows.write(['records'], async (writer) => {
    const [row] = await writer.all('records');
    await writer.put('records', [{ ...(row as RecordRow), sealed: { name: 7 } }]);
  });
  expect(await store.study('study-1')).toMatchObject({ ok: false, problem: { code: 'store.unreadable' } });
  expect(given(await store.readSession('session-1'))?.header).toEqual(headerOf());
});
