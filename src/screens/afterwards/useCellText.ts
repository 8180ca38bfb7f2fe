import type { CellMark } from '../../analysis/index.ts';
import { useWords } from '../services.ts';

/** What one observer said of a look, in words. */
export function useCellText(): (mark: CellMark) => string {
  const words = useWords();
  return ({ state, codes, counts, missing, late, amended }) => {
    if (counts !== null) return words.agreement.counts(counts);
    return words.afterwards.cell({
      codes,
      missing:
        missing !== null ? words.missing[missing] : state === 'missing' ? words.afterwards.keyMissing : null,
      late,
      amended,
    });
  };
}
