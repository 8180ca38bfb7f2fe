import type { CodeSet } from '../model/codeSet.ts';
import type { Method, Protocol } from '../model/protocol.ts';

/** A protocol as a form holds it; `id` is null for a new one. */
export type ProtocolDraft = Omit<Protocol, 'id' | 'version' | 'removed' | 'revision'> & {
  readonly id: string | null;
};

type Times = Pick<ProtocolDraft, 'intervalMs' | 'observeMs'>;

/** The usual times of each method. Source: the field's usual choices (common practice, no single source). */
const usualTimes: Record<Method, Times> = {
  momentary: { intervalMs: 15_000, observeMs: 15_000 },
  partial: { intervalMs: 15_000, observeMs: 10_000 },
  whole: { intervalMs: 15_000, observeMs: 10_000 },
  headcount: { intervalMs: 60_000, observeMs: 60_000 },
  // A duration has no intervals: its part is one.
  duration: { intervalMs: 15_000, observeMs: 15_000 },
};

/**
 * The defaults of a new protocol: momentary every 15 s looked at when the interval ends, 10 s of watching and 5 s of
 * recording, or a headcount a minute; six children in random order and two reserves (a duration: one child), 15
 * minutes a phase. Source: the field's usual choices (common practice, no single source).
 */
export function starterDraft(method: Method, study: string, name: string, codeSet: CodeSet): ProtocolDraft {
  const draft: ProtocolDraft = {
    id: null,
    study,
    name,
    method,
    ...usualTimes[method],
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
  return withoutIdleParts(draft);
}

/**
 * The same recipe by another method, with that method's usual times. What the method has no use for is kept, for
 * whoever switches back; what it cannot do becomes its nearest.
 */
export function switchMethod(draft: ProtocolDraft, method: Method): ProtocolDraft {
  if (method === draft.method) return draft;
  const { rotation, partLength } = draft;
  return {
    ...draft,
    method,
    // Partial and whole interval divide their time alike: what was typed for one stands for the other.
    ...(watches(draft.method) && watches(method) ? {} : usualTimes[method]),
    rotation: rotation.kind === 'sweep' && method !== 'momentary' ? { kind: 'next' } : rotation,
    partLength:
      method === 'duration' && partLength.kind === 'rounds' ? { kind: 'minutes', minutes: 15 } : partLength,
  };
}

const watches = (method: Method): boolean => method === 'partial' || method === 'whole';

/** A recipe without what its method has no use for, so that nothing is kept that means nothing. */
export function withoutIdleParts<Recipe extends Omit<ProtocolDraft, 'id'>>(recipe: Recipe): Recipe {
  const { method, cues } = recipe;
  const turnless = method === 'headcount' || method === 'duration';
  const { headsUp: _headsUp, ...quiet } = cues;
  const { reservesStepIn: _reserves, ...rest } = recipe;
  const nobodyToName = turnless || recipe.rotation.kind === 'one';
  return {
    ...(turnless ? (rest as Recipe) : recipe),
    ...(nobodyToName ? { cues: quiet } : {}),
    ...(method === 'headcount' ? { rotation: { kind: 'next' }, reserves: 0 } : {}),
    ...(method === 'duration' ? { rotation: { kind: 'one' }, childrenToDraw: 1, afterPause: 'missing' } : {}),
  };
}
