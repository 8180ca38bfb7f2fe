import type { PairDetails } from '../../analysis/index.ts';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** The sentences of a pair's page: heading, what to know before believing it, and how it was measured. */
export function usePairSentences(pairs: readonly PairDetails[]): {
  readonly about: string;
  readonly title: string;
  readonly note: string;
  readonly how: string;
} {
  const words = useWords();
  const rows = pairs.map((pair) => pair.row);
  const [first] = pairs;
  const compared = rows.reduce((sum, row) => sum + row.compared, 0);
  const differ = pairs.reduce((sum, pair) => sum + pair.differences.length, 0);
  const alone = rows.length === 1;
  const title =
    compared === 0
      ? words.agreement.nothingTitle
      : words.agreement.title({
          agreed: compared - differ,
          compared,
          looks: first?.method === 'momentary',
          kappas: rows.flatMap(({ phase, kappa, lower, upper }) =>
            kappa === null ? [] : [{ phase, kappa, lower, upper }],
          ),
        });
  const undefinedKappa = rows.flatMap(({ phase, why }) =>
    why.kappa === undefined
      ? []
      : [
          words.agreement.kappaUndefined({
            phase: alone ? null : phase,
            reason: say(words.why, { code: why.kappa, values: {} }),
          }),
        ],
  );
  return {
    about: words.agreement.about({
      klass: first?.row.class ?? '',
      date: first?.date ?? null,
      phases: rows.flatMap(({ phase }) => phase ?? []),
      observers: first?.row.observers ?? [],
    }),
    title,
    note: [...undefinedKappa, prevalence()].filter((text) => text !== '').join(' '),
    how: words.agreement.how({
      ways: first?.ways ?? [],
      compared,
      excluded: rows.reduce((sum, row) => sum + row.excluded, 0),
    }),
  };

  /** Of the phase with the most compared looks: one sentence, not one a phase. */
  function prevalence(): string {
    const [fullest] = [...pairs].sort((a, b) => b.row.compared - a.row.compared);
    if (fullest === undefined || fullest.prevalence === null) return '';
    const percent = fullest.prevalence.mean;
    const chance = fullest.row.chanceAgreement;
    return chance === null || fullest.row.kappa === null
      ? words.agreement.prevalenceOnly({ percent })
      : words.agreement.prevalence({ percent, chance });
  }
}
