import { expect, it } from 'vitest';
import { memoryStore, sessionStoreOf } from '../../src/storage/index.ts';
import { headerOf } from '../support/session.ts';
import { codeOf, given, journalOf } from './samples.ts';

it('refuses writes on demand, so that the recorder’s queue can be tried', async () => {
  let refuse: string | null = null;
  const store = memoryStore({ refuse: () => refuse });
  given(await store.createSession(headerOf()));
  const session = sessionStoreOf(store, 'session-1');
  const entries = journalOf('session-1', 2, true);
  refuse = 'store.full';
  expect(codeOf(await session.append(entries))).toBe('store.full');
  expect(given(await store.readSession('session-1'))?.journal).toEqual([]);
  refuse = null;
  given(await session.append(entries));
  given(await session.pack());
  expect(given(await store.readSession('session-1'))?.journal).toEqual(entries);
});

it('hands out copies: nobody changes what is kept by holding it', async () => {
  const store = memoryStore();
  const header = headerOf();
  given(await store.createSession(header));
  header.observer.name = 'Marsh';
  const read = given(await store.readSession('session-1'));
  expect(read?.header.observer.name).toBe('Quill');
});
