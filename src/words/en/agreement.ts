import type { Format } from '../format.ts';
import { upperFirst, type Way, waysText } from './ways.ts';

type F = Format;

/** Agreement of two observers, and of all pairs. */
export const agreement = {
  about: (
    {
      klass,
      date,
      phases,
      observers,
    }: { klass: string; date: string | null; phases: readonly string[]; observers: readonly string[] },
    f: F,
  ) =>
    [klass, date === null ? '' : f.day(date), f.list(phases), f.list(observers)]
      .filter((s) => s !== '')
      .join(' · '),
  title: (
    {
      agreed,
      compared,
      looks,
      kappas,
    }: {
      agreed: number;
      compared: number;
      looks: boolean;
      kappas: readonly { phase: string | null; kappa: number; lower: number | null; upper: number | null }[];
    },
    f: F,
  ) => {
    const unit = looks
      ? f.plural(compared, { one: 'look', other: 'looks' })
      : f.plural(compared, { one: 'interval', other: 'intervals' });
    const each = kappas.map(
      ({ phase, kappa, lower, upper }) =>
        `${f.kappa(kappa)}${kappas.length > 1 && phase !== null ? ` ${phase}` : ''}${
          // No error at all comes of perfect agreement, not of certainty; above 1 there is no kappa.
          lower === null || upper === null || lower === upper
            ? ''
            : `, between ${f.kappa(lower)} and ${f.kappa(Math.min(1, upper))}`
        }`,
    );
    const kappa = each.length === 0 ? '' : ` Kappa ${each.join('; ')}.`;
    return `They agree on ${f.whole(agreed)} of ${f.whole(compared)} ${unit}.${kappa}`;
  },
  nothingTitle: 'The two records have no look in common.',
  aloneTitle: 'Only one observer was here.',
  aloneText:
    'Agreement needs two records of one visit. Bring in the other tablet’s file, or say by hand which visit a record belongs to.',
  prevalence: ({ percent, chance }: { percent: number; chance: number }, f: F) => {
    const often = percent >= 60 ? 'common' : percent <= 40 ? 'rare' : 'about as common as not';
    return `On-task was ${often} (${f.percent(percent)}), so two people guessing would agree on ${f.percent(chance)}; kappa takes that luck out.`;
  },
  prevalenceOnly: ({ percent }: { percent: number }, f: F) =>
    `On-task in ${f.percent(percent)} of these intervals.`,
  kappaUndefined: ({ phase, reason }: { phase: string | null; reason: string }) =>
    `Kappa is not defined${phase === null ? '' : ` ${phase}`}: ${reason}.`,
  keyDiffers: ({ first, second }: { first: string; second: string }) =>
    `they differ (${first} upper left, ${second} lower right)`,
  keyMissing: 'one of them has no mark',
  figuresOf: ({ phase }: { phase: string | null }) => (phase === null ? 'Figures' : `Figures, ${phase}`),
  intervalByInterval: 'interval by interval',
  onTaskAgreed: 'on-task agreed',
  offTaskAgreed: 'off-task agreed',
  kappa: 'kappa',
  durations: ({ phase }: { phase: string | null }) =>
    phase === null ? 'Second by second' : `Second by second, ${phase}`,
  secondBySecond: 'same code in the same second',
  secondsCompared: ({ compared, excluded }: { compared: number; excluded: number }, f: F) =>
    `${f.whole(compared)} ${f.plural(compared, { one: 'second', other: 'seconds' })} that both watched; ${f.whole(excluded)} that not both did. Neighbouring seconds are no separate looks, so kappa has no range here.`,
  totals: 'How long each saw it, in minutes and seconds',
  totalRatio: 'smaller of larger',
  totalsFlatter: 'Totals may agree although the moments do not: believe the seconds first.',
  highestKappa: 'kappa, the highest it could be',
  ac1: 'AC1',
  notDefined: 'not defined',
  because: ({ figure, reason }: { figure: string; reason: string }) => `${figure}: ${reason}.`,
  criterion: 'criterion',
  meets: 'meets it',
  below: 'below it',
  unknown: 'cannot be told',
  criterionIs: ({ agreement: share, kappa }: { agreement: number; kappa: number }, f: F) =>
    `The study asks for ${f.percent(100 * share)} agreement and kappa ${f.kappa(kappa)}.`,
  tableTitle: 'What each of them said',
  tableCaption: ({ phase, first, second }: { phase: string | null; first: string; second: string }) =>
    `${phase === null ? '' : `${phase}: `}rows ${first}, columns ${second}`,
  tableNone: ({ reason }: { reason: string }) => `There is no table of codes: ${reason}.`,
  codesCaption: ({ phase }: { phase: string | null }) =>
    `${phase === null ? '' : `${phase}: `}each code against all others`,
  code: 'code',
  figuresCaption: 'Agreement, phase by phase',
  occurrence: 'agreed where either said it',
  nonOccurrence: 'agreed where either did not',
  excludedTitle: 'Left out',
  excludedNone: 'Both scored every look.',
  excluded: (
    { observer, reasons }: { observer: string; reasons: readonly { reason: string | null; n: number }[] },
    f: F,
  ) => `${observer}: ${f.list(reasons.map((r) => `${r.reason ?? 'not in the record'} (${f.whole(r.n)})`))}.`,
  differencesTitle: ({ n }: { n: number }, f: F) =>
    n === 0
      ? 'They differ nowhere'
      : `The ${f.plural(n, { one: 'difference', other: `${f.whole(n)} differences` })}`,
  differencesOpen: ({ n }: { n: number }, f: F) =>
    `Go through the ${f.plural(n, { one: 'difference', other: `${f.whole(n)} differences` })}`,
  differencesCaption: 'Every look on which they differ',
  phase: 'phase',
  at: 'at',
  child: 'child',
  interval: 'interval',
  counts: ({ on, present }: { on: number; present: number }, f: F) => `${f.whole(on)} of ${f.whole(present)}`,
  none: 'none',
  how: ({ ways, compared, excluded }: { ways: readonly Way[]; compared: number; excluded: number }, f: F) =>
    `${upperFirst(waysText(ways), f)}; the same child at the same interval, both scored: ${f.whole(compared)}, left out ${f.whole(excluded)}. Kappa after Cohen (1960) with the large-sample interval of Fleiss, Cohen and Everitt (1969); looks of one child follow one another, so it is rather too narrow.`,

  // all pairs
  allTitle: (
    {
      pairs,
      percent,
      compared,
      kappa,
    }: { pairs: number; percent: number | null; compared: number; kappa: number | null },
    f: F,
  ) => {
    const who = `In ${f.whole(pairs)} ${f.plural(pairs, { one: 'comparison', other: 'comparisons' })} the observers agree`;
    if (percent === null)
      return `${f.whole(pairs)} ${f.plural(pairs, { one: 'comparison', other: 'comparisons' })}, and no interval that both scored.`;
    return `${who} on ${f.percent(percent)} of ${f.whole(compared)} intervals${kappa === null ? '' : `; kappa over all ${f.kappa(kappa)}`}.`;
  },
  noPairsTitle: 'No visit has two observers yet.',
  noPairsText:
    'A second observer takes the visit file and records the same children at the same moments. Their file, brought in here, finds its visit by itself.',
  forTheRecord: 'for the record',
  practice: 'practice',
  whichSessions: 'Sessions',
  sharesTitle: 'How much was double-coded',
  share: (
    {
      phase,
      doubleCoded,
      visits,
      percent,
    }: { phase: string | null; doubleCoded: number; visits: number; percent: number },
    f: F,
  ) =>
    `${phase === null ? '' : `${phase}: `}${f.whole(doubleCoded)} of ${f.whole(visits)} ${f.plural(visits, { one: 'visit', other: 'visits' })}, ${f.percent(percent)}`,
  enough: 'enough (20 % or more)',
  tooLittle: 'under 20 %',
  pairsTitle: 'Every pair',
  pairsCaption: 'Agreement of every pair, phase by phase',
  visit: 'visit',
  observers: 'observers',
  compared: 'compared',
  agreed: 'agreed',
  between: 'between',
  betweenFigures: ({ lower, upper }: { lower: number; upper: number }, f: F) =>
    `${f.kappa(lower)} and ${f.kappa(upper)}`,
  alpha: ({ alpha }: { alpha: number }, f: F) => `Krippendorff’s alpha ${f.kappa(alpha)}.`,
  overallHow:
    'Kappa over all pairs is pooled after De Vries, Elliott, Kanouse and Teleki (2008); the share double-coded follows Kratochwill et al. (2010): at least 20 % in each phase.',
} as const;
