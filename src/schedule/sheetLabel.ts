import { canonicalJson } from '../kernel/canonicalJson.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import type { VisitPlan } from '../model/visitPlan.ts';

/** Capitals and digits that are not mistaken for one another in handwriting. */
const signs = 'ACDEFHJKLMNPRTUVWXY34679';

/**
 * What a printed sheet is known by: six signs (24⁶ ≈ 190 million) made from the visit, its children and its schedule,
 * so that a sheet and a schedule that do not belong together do not have the same label.
 */
export function sheetLabel({ visit, children, schedule }: VisitPlan): string {
  const content = canonicalJson({ visit, children: children.map(({ id }) => id), schedule });
  let rest = BigInt(`0x${idFromContent('sheet', content).replaceAll('-', '')}`);
  let label = '';
  for (let k = 0; k < 6; k++) {
    label += signs[Number(rest % 24n)];
    rest /= 24n;
  }
  return `${label.slice(0, 3)}-${label.slice(3)}`;
}

/** A label as somebody typed it, in the form in which it is printed. */
export function tidyLabel(text: string): string {
  const bare = text.toUpperCase().replace(/[^A-Z0-9]/g, '');
  return bare.length <= 3 ? bare : `${bare.slice(0, 3)}-${bare.slice(3)}`;
}
