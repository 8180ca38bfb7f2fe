/** What JSON can hold. */
export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };

/** A JSON value without what cannot be made shorter by compressing, and that by itself. */
export interface CompactTree {
  readonly tree: Json;
  /** Identifiers in the order of their first appearance, each once. */
  readonly ids: readonly string[];
}

const uuid = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;
const mark = '~';

/**
 * Takes the UUIDs out of a JSON value and turns lists of like objects by columns, so that a packer finds what repeats.
 * Nothing is known of the value's members: whatever JSON holds comes back by `expandTree`, the order of members aside.
 *
 * In the tree a UUID is `~` at its first appearance and `~n` (base 36) later; a text that begins with `~` has one more
 * of them. A list of two or more objects with the same members is `{ "~": [names, column, …] }`, and a member whose
 * name begins with `~` has one more of them.
 */
export function compactTree(value: Json): CompactTree {
  const places = new Map<string, number>();
  const walk = (one: Json): Json => {
    if (typeof one === 'string') return text(one);
    if (one === null || typeof one !== 'object') return one;
    if (!isList(one)) {
      return Object.fromEntries(namesOf(one).map((name) => [marked(name), walk(one[name] as Json)]));
    }
    const names = namesInCommon(one);
    if (names === null) return one.map(walk);
    const columns = names.map((name) => walk(one.map((row) => (row as Members)[name] as Json)));
    return { [mark]: [names, ...columns] };
  };
  const text = (one: string): string => {
    if (!uuid.test(one)) return marked(one);
    const place = places.get(one);
    if (place !== undefined) return mark + place.toString(36);
    places.set(one, places.size);
    return mark;
  };
  return { tree: walk(value), ids: [...places.keys()] };
}

/** The value that `compactTree` was given; null for a tree that it cannot have made. */
export function expandTree({ tree, ids }: CompactTree): { readonly value: Json } | null {
  let next = 0;
  const walk = (one: Json): Json => {
    if (typeof one === 'string') return text(one);
    if (one === null || typeof one !== 'object') return one;
    if (isList(one)) return one.map(walk);
    const table = one[mark];
    if (table !== undefined) return rows(table);
    // In the order of the names as they were: the order in which identifiers were met.
    const names = Object.keys(one).map((name) => [unmarked(name), name] as const);
    names.sort(([a], [b]) => byUnits(a, b));
    return Object.fromEntries(names.map(([name, written]) => [name, walk(one[written] as Json)]));
  };
  const rows = (table: Json): Json => {
    if (!isList(table)) throw new Strange();
    const [names, ...written] = table;
    if (!isList(names) || names.length !== written.length) throw new Strange();
    const columns = written.map((column) => {
      const cells = walk(column);
      if (!isList(cells)) throw new Strange();
      return cells;
    });
    const count = columns[0]?.length ?? 0;
    if (columns.some((column) => column.length !== count)) throw new Strange();
    return Array.from({ length: count }, (_, row) =>
      Object.fromEntries(names.map((name, i) => [String(name), columns[i]?.[row] as Json])),
    );
  };
  const text = (one: string): string => {
    if (!one.startsWith(mark)) return one;
    if (one.startsWith(mark + mark)) return one.slice(1);
    const id = ids[one === mark ? next++ : Number.parseInt(one.slice(1), 36)];
    if (id === undefined) throw new Strange();
    return id;
  };
  try {
    return { value: walk(tree) };
  } catch (error) {
    if (error instanceof Strange) return null;
    throw error;
  }
}

class Strange extends Error {}

type Members = { readonly [key: string]: Json };
const isList = (one: Json | undefined): one is readonly Json[] => Array.isArray(one);
const byUnits = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
const namesOf = (one: Members): string[] => Object.keys(one).sort(byUnits);
const marked = (text: string): string => (text.startsWith(mark) ? mark + text : text);
const unmarked = (text: string): string => (text.startsWith(mark) ? text.slice(1) : text);

/** The members that all items of a list have, when they are objects with the same ones. */
function namesInCommon(list: readonly Json[]): string[] | null {
  const [first] = list;
  if (list.length < 2 || first === undefined || first === null || typeof first !== 'object' || isList(first))
    return null;
  const names = namesOf(first);
  if (names.length === 0) return null;
  const same = list.every((one) => {
    if (one === null || typeof one !== 'object' || isList(one)) return false;
    const own = namesOf(one);
    return own.length === names.length && own.every((name, i) => name === names[i]);
  });
  return same ? names : null;
}
