import type { ProtocolDraft } from '../../../tasks/index.ts';

/** Changes a part of the recipe that a form holds. */
export type Change = (changes: Partial<ProtocolDraft>) => void;
