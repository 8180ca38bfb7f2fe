import { textWidth } from './textWidth.ts';

/** Places items with labels in lines of at most `width`, left to right. */
export function flowItems(
  labels: readonly string[],
  width: number,
  { size, lead, gap }: { readonly size: number; readonly lead: number; readonly gap: number },
): { readonly places: readonly { readonly x: number; readonly line: number }[]; readonly lines: number } {
  let x = 0;
  let line = 0;
  const places = labels.map((label) => {
    const needs = lead + textWidth(label, size);
    if (x > 0 && x + needs > width) {
      x = 0;
      line += 1;
    }
    const place = { x, line };
    x += needs + gap;
    return place;
  });
  return { places, lines: labels.length === 0 ? 0 : line + 1 };
}
