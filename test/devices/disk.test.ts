import { afterEach, expect, it, vi } from 'vitest';
import { disk } from '../../src/devices/disk.ts';

afterEach(() => vi.unstubAllGlobals());
const given = (storage: unknown): void => void vi.stubGlobal('navigator', { storage });

it('says how much is free', async () => {
  given({ estimate: async () => ({ quota: 1000, usage: 400 }) });
  expect(await disk.free()).toBe(600);
  given({ estimate: async () => ({ quota: 1000 }) });
  expect(await disk.free()).toBe(1000);
});

it('never says less than nothing, though a browser may count more than it promised', async () => {
  given({ estimate: async () => ({ quota: 1000, usage: 1400 }) });
  expect(await disk.free()).toBe(0);
});

it('asks to keep what is stored, and takes no for an answer', async () => {
  const persist = vi.fn(async () => false);
  given({ persist, persisted: async () => true });
  expect(await disk.kept()).toBe(true);
  expect(persist).not.toHaveBeenCalled();
  expect(await disk.askToKeep()).toBe(false);
});

it.each([
  ['has no storage to ask', undefined],
  ['has none of the questions', {}],
  [
    'answers by an exception',
    {
      estimate: () => Promise.reject(new TypeError('opaque origin')),
      persist: () => {
        throw new TypeError('opaque origin');
      },
      persisted: () => Promise.reject(new TypeError('opaque origin')),
    },
  ],
  ['knows no quota', { estimate: async () => ({}) }],
])('does not know where the browser %s', async (_, storage) => {
  given(storage);
  expect([await disk.free(), await disk.kept(), await disk.askToKeep()]).toEqual([null, null, null]);
});
