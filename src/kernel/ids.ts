import { v5 } from 'uuid';
import type { Random } from './random.ts';

/** A UUID, version 4 where it is made on a tablet, version 5 where it is made from content. */
export type Id = string;

/** Lookbell's own namespace for identifiers made from content (a random UUID, fixed for good). */
const namespace = '5d7c1f0e-8a43-4d7b-9a55-2b8f4f6f3c11';

/** A new UUID version 4 from a random source (the app passes one that is cryptographically strong). */
export function newId(random: Random): Id {
  const hex = Array.from({ length: 32 }, () => Math.floor(random() * 16).toString(16));
  hex[12] = '4';
  hex[16] = (8 + Math.floor(random() * 4)).toString(16);
  const s = hex.join('');
  return `${s.slice(0, 8)}-${s.slice(8, 12)}-${s.slice(12, 16)}-${s.slice(16, 20)}-${s.slice(20)}`;
}

/** The UUID version 5 of a list of texts: reading the same table twice gives the same identifiers. */
export function idFromContent(...parts: readonly string[]): Id {
  return v5(JSON.stringify(parts), namespace);
}
