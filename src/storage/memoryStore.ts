import type { Store } from '../tasks/ports.ts';
import { memoryRows } from './memoryRows.ts';
import type { Seal } from './seal.ts';
import { storeOver } from './storeOver.ts';

/** A store that forgets everything when it goes: the twin of the real one in tests. `refuse` names a problem to give. */
export function memoryStore(
  options: { readonly refuse?: () => string | null; readonly seal?: Seal } = {},
): Store {
  return storeOver(memoryRows(options), options.seal);
}
