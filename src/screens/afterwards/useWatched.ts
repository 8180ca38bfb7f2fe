import type { SessionDetails } from '../../analysis/index.ts';
import { useWords } from '../services.ts';

/** How much of a duration record was watched, in a sentence and a note; null where its stretches have no times. */
export function useWatched({
  phases,
  missingBy,
}: SessionDetails): { readonly title: string; readonly note: string } | null {
  const words = useWords();
  let [watched, missing] = [0, 0];
  for (const { row } of phases) {
    if (row.scored === null || row.missing === null) return null;
    watched += row.scored * 1000;
    missing += row.missing * 1000;
  }
  return {
    title: words.afterwards.completeTime({ watched, planned: watched + missing }),
    note: words.afterwards.missingTime({
      ms: missing,
      reasons: missingBy.map(({ reason }) => words.missing[reason]),
    }),
  };
}
