import { newId } from '../kernel/ids.ts';

const strong = (): number => (crypto.getRandomValues(new Uint32Array(1))[0] ?? 0) / 2 ** 32;

/** A mark that no other write carries. */
export const newStamp = (): string => newId(strong);
