import { lineAt } from './decodeText.ts';
import { jsonFault } from './jsonFault.ts';
import { jsonPath } from './jsonPath.ts';
import { excerpt, type Fault, fault } from './problemValues.ts';

export type ParsedJson =
  | { readonly ok: true; readonly value: unknown }
  | { readonly ok: false; readonly fault: Fault; readonly line?: number; readonly path?: string };

/** Deeper than any of our forms nests; keeps damaged or hostile files from exhausting the stack. */
const deepest = 64;

/** JSON with the line of the first fault; refuses NUL in texts and senseless depth. */
export function parseJson(text: string): ParsedJson {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    const { offset, cutOff } = jsonFault(text);
    const line = lineAt(text, offset);
    const found = excerpt(text.slice(offset, offset + 20).split(/[\r\n]/, 1)[0] ?? '');
    return { ok: false, fault: cutOff ? fault('json.cutOff', {}) : fault('json.notJson', { found }), line };
  }
  // A NUL can only be there if its escape is; the walk that finds its path is then worth its time.
  const search = text.includes('\\u0000');
  const bad = firstBad(value, search, []);
  if (bad === null) return { ok: true, value };
  const path = jsonPath(bad.path);
  return {
    ok: false,
    path,
    fault: bad.deep ? fault('json.tooDeep', { path, most: deepest }) : fault('json.nul', { path }),
  };
}

function firstBad(
  value: unknown,
  search: boolean,
  path: (string | number)[],
): { path: (string | number)[]; deep: boolean } | null {
  if (typeof value === 'string')
    return search && value.includes('\u0000') ? { path: [...path], deep: false } : null;
  if (value === null || typeof value !== 'object') return null;
  if (path.length >= deepest) return { path: path.slice(0, 4), deep: true };
  const members = Array.isArray(value) ? value.entries() : Object.entries(value);
  for (const [key, member] of members) {
    if (typeof member !== 'object' && !search) continue;
    path.push(key);
    const bad = firstBad(member, search, path);
    if (bad !== null) return bad;
    path.pop();
  }
  return null;
}
