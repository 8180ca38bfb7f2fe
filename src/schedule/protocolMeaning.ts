import type { Protocol } from '../model/protocol.ts';
import { layOut } from './layOut.ts';

type Recipe = Pick<
  Protocol,
  'method' | 'intervalMs' | 'observeMs' | 'rotation' | 'partLength' | 'childrenToDraw'
>;

export type ProtocolWarning = 'longInterval' | 'longObserve' | 'fewLooks' | 'sweepTooLong' | 'shortPart';

export interface ProtocolMeaning {
  /** Intervals of one part, all children together. */
  readonly intervals: number;
  /**
   * Milliseconds from the beginning of a part to the end of its last full interval; a sweep that begins when that
   * interval ends comes after it.
   */
  readonly lengthMs: number;
  /** Children who are watched in one part; 0 for a headcount, which looks at everybody. */
  readonly watched: number;
  /** Looks in one part at the child who gets fewest and at the one who gets most (a headcount: scans). */
  readonly fewest: number;
  readonly most: number;
  /** What makes figures weak; it is said and never stops anybody. */
  readonly warnings: readonly ProtocolWarning[];
}

/**
 * What a protocol comes to in one part with all children present.
 * Warnings: a momentary interval over 30 s, more than 10 s watched in partial or whole intervals, fewer than 10
 * looks at a child (limits as the field uses them: common practice, no single source), a sweep that needs more time
 * than an interval has, a part shorter than the two minutes that a session is made for. With turns by chance each round, counts are those of a listed order: they differ by at most
 * one round that is cut short.
 */
export function protocolMeaning(recipe: Recipe): ProtocolMeaning {
  const { method, rotation } = recipe;
  const children = Array.from({ length: recipe.childrenToDraw }, (_, i) => `${i + 1}`);
  // When looks come within an interval makes no difference to how many there are.
  const lines = layOut({ ...recipe, lookAt: 'start' }, [''], children);
  const looks = new Map<string | null, number>();
  for (const { child } of lines) looks.set(child, (looks.get(child) ?? 0) + 1);
  const turnless = method === 'headcount' || method === 'duration';
  // A child whose turn does not come within the part is not watched, and still belongs to the drawn ones.
  const unseen = !turnless && rotation.kind !== 'one' && looks.size < children.length;
  const counts = [...looks.values()];
  const fewest = unseen || counts.length === 0 ? 0 : Math.min(...counts);
  const lengthMs = lines.at(-1)?.endMs ?? 0;
  const warnings: ProtocolWarning[] = [];
  if (method === 'momentary' && recipe.intervalMs > 30_000) warnings.push('longInterval');
  if ((method === 'partial' || method === 'whole') && recipe.observeMs > 10_000) warnings.push('longObserve');
  if (method !== 'duration' && fewest < 10) warnings.push('fewLooks');
  if (!turnless && rotation.kind === 'sweep' && rotation.eachMs * children.length > recipe.intervalMs)
    warnings.push('sweepTooLong');
  if (lengthMs > 0 && lengthMs < 120_000) warnings.push('shortPart');
  return {
    intervals: lines.length,
    lengthMs,
    watched:
      method === 'headcount' ? 0 : method === 'duration' || rotation.kind === 'one' ? 1 : children.length,
    fewest,
    most: Math.max(0, ...counts),
    warnings,
  };
}
