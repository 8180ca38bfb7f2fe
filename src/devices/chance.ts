import type { Random } from '../kernel/random.ts';

/** Numbers in [0, 1) from the browser's cryptographic source: for identifiers and for seeds. */
export const chance: Random = () => {
  const [word = 0] = crypto.getRandomValues(new Uint32Array(1));
  return word / 4294967296;
};
