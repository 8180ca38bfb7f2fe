import type { Seal } from '../../src/storage/seal.ts';
import { openedIndexed, openedMemory } from '../storage/opened.ts';
import { storeContract } from './store.contract.ts';

/** A seal that takes its time and leaves nothing readable, as the vault's will. */
const slowSeal: Seal = {
  seal: async (value) => {
    await crypto.subtle.digest('SHA-256', new Uint8Array(1));
    return btoa(encodeURIComponent(JSON.stringify(value)));
  },
  open: async (sealed) => {
    await crypto.subtle.digest('SHA-256', new Uint8Array(1));
    return JSON.parse(decodeURIComponent(atob(sealed as string)));
  },
};

storeContract('The store in memory', () => openedMemory());
storeContract('The store in IndexedDB', () => openedIndexed());
storeContract('The store in IndexedDB under a seal', () => openedIndexed(slowSeal));
