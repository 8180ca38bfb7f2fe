import type { Format } from '../format.ts';

type F = Format;

/** A place of the schedule: by the clock, else by the time since the start, else by its number. */
interface Where {
  readonly number: number;
  readonly wall: string | null;
  readonly at: number | null;
}

export interface Span {
  readonly from: Where;
  readonly to: Where | null;
  readonly fromStart: boolean;
}

const place = ({ number, wall, at }: Where, f: F): string =>
  wall !== null
    ? f.time(wall)
    : at !== null
      ? `${f.clock(at)} after the start`
      : `interval ${f.whole(number)}`;

/** `about`: the ends are estimates. */
const span = ({ from, to, fromStart }: Span, f: F, about = ''): string => {
  const [first, last] = [place(from, f), to === null ? '' : place(to, f)];
  if (fromStart) return to === null ? 'all through' : `until ${about}${last}`;
  if (to === null) return `from ${about}${first} on`;
  return first === last ? `around ${first}` : `from ${about}${first} until ${about}${last}`;
};

const places = (n: number): string => (n === 1 ? 'One place off' : 'Two places off');
const phaseIn = (phase: string | null): string => (phase === null ? '' : `, ${phase}`);

const ofAgreed = ({ same, compared }: { same: number; compared: number }, f: F): string =>
  `${f.whole(same)} of ${f.whole(compared)}`;

interface SignCounts {
  readonly missed: number;
  readonly late: number;
  readonly corrected: number;
}

const signs = ({ missed, late, corrected }: SignCounts, f: F): string => {
  const said = [
    missed === 0 ? '' : `${f.whole(missed)} without a mark`,
    late === 0 ? '' : `${f.whole(late)} late`,
    corrected === 0 ? '' : `${f.whole(corrected)} corrected`,
  ].filter((text) => text !== '');
  return f.list(said);
};

/** Whether two observers ran in step: the verdict, what to do about it, and the figures behind it. */
export const inStepWords = {
  stepTitle: 'Were they in step?',
  stepIn: ({ phase }: { phase: string | null }) => `In step${phaseIn(phase)}.`,
  stepApart: ({ seconds, phase, ...stretch }: Span & { seconds: number; phase: string | null }, f: F) =>
    `${f.fixed(Math.abs(seconds), 1)} s apart${stretch.fromStart && stretch.to === null ? '' : ` ${span(stretch, f)}`}${phaseIn(phase)}.`,
  stepPlaceLost: ({ places: n, phase, ...stretch }: Span & { places: number; phase: string | null }, f: F) =>
    `${places(n)} ${span(stretch, f, 'about ')}${phaseIn(phase)}.`,
  stepDisagreeing: ({ phase }: { phase: string | null }) =>
    `In step, and simply disagreeing${phaseIn(phase)}.`,
  stepUnknown: ({ phase }: { phase: string | null }) =>
    `Whether they were in step cannot be told${phaseIn(phase)}.`,

  stepClocks: ({ seconds, by }: { seconds: number; by: 'cues' | 'starts' }, f: F) =>
    by === 'cues'
      ? `By the tablets’ clocks their prompts came ${f.fixed(Math.abs(seconds), 1)} s apart.`
      : `By the times in the tables their intervals began ${f.fixed(Math.abs(seconds), 1)} s apart.`,
  stepNoClocks: 'At least one record has no prompt times (a table, or typed in from paper).',
  stepNoLostPlace: 'No shift of the marks agrees better, so nobody seems to have lost the place.',
  stepNotSearched: ({ reason }: { reason: 'tooFew' | 'orderUnknown' | 'notIntervals' }) =>
    ({
      tooFew:
        'There are too few looks that both scored to see from the marks whether one of them lost the place.',
      orderUnknown:
        'The order of the intervals is not known (a number stands for several children), so the marks do not show whether one of them lost the place.',
      notIntervals: 'Such records have no places to lose.',
    })[reason],
  stepLater: (
    { later, earlier, seconds, kappa }: { later: string; earlier: string; seconds: number; kappa: number },
    f: F,
  ) =>
    `The prompts of ${later} came ${f.fixed(Math.abs(seconds), 1)} s after those of ${earlier}. Two people who never err would reach a kappa of ${f.kappa(kappa)} at best, that far apart in a lively class: the differences say little about how these two code.`,
  stepNoTick:
    'Neither record holds a tick check, so it may be the tablets’ clocks that differ and not the schedules.',
  stepPlaceDetail: (
    {
      later,
      places: n,
      unshifted,
      shifted,
      ...stretch
    }: Span & {
      later: string;
      places: number;
      unshifted: { same: number; compared: number };
      shifted: { same: number; compared: number };
    },
    f: F,
  ) => {
    const where = span(stretch, f, 'about ');
    return `${where.charAt(0).toUpperCase()}${where.slice(1)}: the same at ${ofAgreed(unshifted, f)} as the marks stand, and at ${ofAgreed(shifted, f)} when those of ${later} are read ${n === 1 ? 'one place' : 'two places'} earlier.`;
  },
  stepWho: ({ observer, other, ...counts }: SignCounts & { observer: string; other: string }, f: F) =>
    `Just there ${observer} has ${signs(counts, f)}, ${other} nothing of the kind.`,
  stepWhoUnknown: 'It was one of the two; the marks cannot tell which.',
  stepPlaceCalm: ({ seconds }: { seconds: number }, f: F) =>
    `It is not the clocks: the prompts came ${f.fixed(Math.abs(seconds), 1)} s apart.`,
  stepSame: 'Where they differ, they saw the same moment differently.',

  // what to do
  doApart:
    'Next time bring both tablets together with the tick check and start at an agreed second. Do not retrain anybody on these figures.',
  doPlaceLost:
    'Ask both what happened then. Whoever remembers can correct those looks in their own record, with the reason; else say beside the figures that the place was lost. Nothing is moved by itself.',
  doDisagreeing: 'Go through the differences with both of them, beside the definitions of the codes.',
  doUnknown:
    'A difference may come from the moment of looking as well as from the coding. Two tablets that keep their prompt times can tell.',
  doUnknownFew: 'Record twenty looks or more together, and it can be told.',

  stepFigures: (
    {
      cues,
      median,
      largest,
      by,
      phase,
      first,
      second,
    }: {
      cues: number;
      median: number;
      largest: number;
      by: 'cues' | 'starts';
      phase: string | null;
      first: string;
      second: string;
    },
    f: F,
  ) =>
    `${phase === null ? '' : `${phase}: `}${f.whole(cues)} ${by === 'cues' ? f.plural(cues, { one: 'prompt', other: 'prompts' }) : f.plural(cues, { one: 'start', other: 'starts' })} compared, median ${f.fixed(median, 1)} s, farthest ${f.fixed(largest, 1)} s (${second} less ${first}).`,
  stepCourse: ({ first, last }: { first: number; last: number }, f: F) =>
    `It went from ${f.fixed(first, 1)} s in the first five minutes to ${f.fixed(last, 1)} s in the last.`,
  stepNudges: ({ nudges }: { nudges: readonly { observer: string; ms: number }[] }, f: F) =>
    `Tick check: ${f.list(nudges.map(({ observer, ms }) => `${observer} ${f.points(ms).replace(/\.0$/, '')} ms`))}.`,
  stepHow:
    'Marks were compared one and two places off, whole and by stretches. Fewer than 1 in 100 pairs in step are called lost by chance; a place lost for less than some fifteen looks often goes unseen.',
} as const;
