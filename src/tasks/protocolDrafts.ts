import type { CodeSet } from '../model/codeSet.ts';
import type { Protocol } from '../model/protocol.ts';

/** A protocol as a form holds it; `id` is null for a new one. */
export type ProtocolDraft = Omit<Protocol, 'id' | 'version' | 'removed' | 'revision'> & {
  readonly id: string | null;
};

/**
 * The defaults of a new protocol: momentary every 15 s looked at when the interval ends, or 10 s of watching and
 * 5 s of recording; six children in random order and two reserves, 15 minutes a phase.
 * Source: the field's usual choices (common practice, no single source).
 */
export function starterDraft(
  method: 'momentary' | 'partial' | 'whole',
  study: string,
  name: string,
  codeSet: CodeSet,
): ProtocolDraft {
  return {
    id: null,
    study,
    name,
    method,
    intervalMs: 15_000,
    observeMs: method === 'momentary' ? 15_000 : 10_000,
    lookAt: 'end',
    rotation: { kind: 'next' },
    partLength: { kind: 'minutes', minutes: 15 },
    order: 'random',
    childrenToDraw: 6,
    reserves: 2,
    graceMs: 400,
    codeSet,
    // Quiet at first: an earpiece is close to the ear, and a loud cue is heard by the children.
    cues: { channel: 'both', volume: 0.3, flash: false, vibration: false },
  };
}
