/** Order of texts by code point, the same on every device and in every language. */
export function byCodePoint(a: string, b: string): number {
  if (a === b) return 0;
  const left = Array.from(a, (character) => character.codePointAt(0) ?? 0);
  const right = Array.from(b, (character) => character.codePointAt(0) ?? 0);
  for (const [i, point] of left.entries()) {
    const other = right[i];
    if (other === undefined) return 1;
    if (point !== other) return point - other;
  }
  return -1;
}
