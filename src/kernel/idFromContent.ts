import { v5 } from 'uuid';
import type { Id } from './ids.ts';

/** Lookbell's own namespace for identifiers made from content (a random UUID, fixed for good). */
const namespace = '5d7c1f0e-8a43-4d7b-9a55-2b8f4f6f3c11';

/** The UUID version 5 of a list of texts: reading the same table twice gives the same identifiers. */
export function idFromContent(...parts: readonly string[]): Id {
  return v5(JSON.stringify(parts), namespace);
}
