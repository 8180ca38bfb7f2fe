import { canonicalJson } from '../kernel/canonicalJson.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { Revision } from '../model/common.ts';
import { compareRevisions } from '../model/revision.ts';

export interface MergedRecords<Item> {
  /** The newest state of each, by identity in code-point order. Tombstones are states like others. */
  readonly records: Item[];
  /** States that share identity and revision and differ all the same, the one that is kept first. */
  readonly conflicts: { readonly id: string; readonly states: Item[] }[];
  /** States that a newer one replaced. */
  readonly older: Item[];
}

/**
 * Of several states of one record the highest revision; of one revision with two contents the first by canonical
 * JSON, so that the order of files decides nothing.
 * @param join puts two states together that are one (classes that several tables imply); null keeps them apart
 */
export function mergeRecords<Item>(
  items: readonly Item[],
  idOf: (item: Item) => string,
  revisionOf: (item: Item) => Revision | null,
  join: (a: Item, b: Item) => Item | null = () => null,
): MergedRecords<Item> {
  const groups = new Map<string, Map<string, Item>>();
  for (const item of items) {
    const states = groups.get(idOf(item)) ?? new Map<string, Item>();
    groups.set(idOf(item), states);
    const joined = [...states].find(([, state]) => join(state, item) !== null);
    const state = join(joined?.[1] ?? item, item) ?? item;
    if (joined !== undefined) states.delete(joined[0]);
    states.set(canonicalJson(state), state);
  }
  const result: MergedRecords<Item> = { records: [], conflicts: [], older: [] };
  for (const [id, states] of [...groups].sort(([a], [b]) => byCodePoint(a, b))) {
    const sorted = [...states]
      .map(([text, state]) => ({ text, state, revision: revisionOf(state) }))
      .sort((a, b) => newerFirst(a.revision, b.revision) || (a.text < b.text ? -1 : 1));
    const [first] = sorted;
    if (first === undefined) continue;
    result.records.push(first.state);
    const level = sorted.filter((other) => newerFirst(first.revision, other.revision) === 0);
    if (level.length > 1) result.conflicts.push({ id, states: level.map(({ state }) => state) });
    result.older.push(...sorted.slice(level.length).map(({ state }) => state));
  }
  return result;
}

function newerFirst(a: Revision | null, b: Revision | null): number {
  return a === null || b === null ? 0 : compareRevisions(b, a);
}
