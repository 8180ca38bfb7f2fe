import { type Problem, problem, type Result } from '../kernel/result.ts';

/** Text as it is kept: one kind of accents, single spaces, no space at the ends. */
export const cleaned = (text: string): string => text.normalize('NFC').replace(/\s+/gu, ' ').trim();

/** A name that people typed, 1 to 200 characters. `what` says which field it was. */
export function nameFrom(text: string, what: string): Result<string, Problem> {
  const name = cleaned(text);
  if (name === '') return problem('task.nameMissing', { what });
  if (name.length > 200) return problem('task.nameTooLong', { what, most: 200 });
  return { ok: true, value: name };
}

/** Names that people would take for the same one. */
export const sameName = (a: string, b: string): boolean => alike(a) === alike(b);
const alike = (text: string): string => cleaned(text).toLowerCase();

/** Several names, without empty and repeated ones. */
export function namesFrom(texts: readonly string[], what: string): Result<string[], Problem> {
  const names: string[] = [];
  for (const text of texts) {
    if (cleaned(text) === '') continue;
    const name = nameFrom(text, what);
    if (!name.ok) return name;
    if (!names.some((other) => sameName(other, name.value))) names.push(name.value);
  }
  return { ok: true, value: names };
}
