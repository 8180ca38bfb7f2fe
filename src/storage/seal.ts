import type { Sealed } from './rows.ts';

/**
 * Stands between rows and store. Asynchronous, since the vault will encrypt; therefore sealing is done before a
 * transaction opens and opening after it is over: a transaction does not outlive a foreign promise.
 */
export interface Seal {
  seal(value: unknown): Promise<Sealed>;
  open(sealed: Sealed): Promise<unknown>;
}

/** Rows as they are. */
export const identitySeal: Seal = {
  seal: (value) => Promise.resolve(value),
  open: (sealed) => Promise.resolve(sealed),
};
