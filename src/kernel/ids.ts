import type { Random } from './random.ts';

/** A UUID, version 4 where it is made on a tablet, version 5 where it is made from content. */
export type Id = string;

/** A new UUID version 4 from a random source (the app passes one that is cryptographically strong). */
export function newId(random: Random): Id {
  const hex = Array.from({ length: 32 }, () => Math.floor(random() * 16).toString(16));
  hex[12] = '4';
  hex[16] = (8 + Math.floor(random() * 4)).toString(16);
  const s = hex.join('');
  return `${s.slice(0, 8)}-${s.slice(8, 12)}-${s.slice(12, 16)}-${s.slice(16, 20)}-${s.slice(20)}`;
}
