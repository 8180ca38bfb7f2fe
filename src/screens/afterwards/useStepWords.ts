import type { InStep, LostPlace, PairDetails, StepCode } from '../../analysis/index.ts';
import { useWords } from '../services.ts';

export interface StepWords {
  readonly code: StepCode;
  readonly title: string;
  readonly sentences: readonly string[];
  /** One line for each stretch in which the place was lost. */
  readonly stretches: readonly string[];
  /** What to do about it; null where there is nothing to do. */
  readonly todo: string | null;
  readonly figures: readonly string[];
}

/** What matters most comes first: one verdict for all phases of a pair. */
const gravity: readonly StepCode[] = ['placeLost', 'apart', 'disagreeing', 'unknown', 'inStep'];

/** The verdict on whether two observers ran in step, in words. */
export function useStepWords(pairs: readonly PairDetails[]): StepWords | null {
  const { agreement: words } = useWords();
  const [worst] = [...pairs].sort(
    (x, y) => gravity.indexOf(x.step.code) - gravity.indexOf(y.step.code) || seconds(y) - seconds(x),
  );
  if (worst === undefined) return null;
  const { step, row } = worst;
  const [first, second] = row.observers;
  const alike = pairs.every((pair) => pair.step.code === step.code);
  // A verdict that holds in every phase needs no phase; a stretch always lies in one.
  const phase =
    pairs.length === 1 || (alike && step.far === null && step.lost.length === 0) ? null : row.phase;
  const common = { code: step.code, stretches: [], figures: figures() };
  const clocks =
    step.apart === null
      ? words.stepNoClocks
      : words.stepClocks({ ...step.apart, seconds: step.apart.median });
  const places =
    step.notSearched === null ? words.stepNoLostPlace : words.stepNotSearched({ reason: step.notSearched });
  switch (step.code) {
    case 'placeLost': {
      const [longest] = [...step.lost].sort((x, y) => y.intervals - x.intervals);
      if (longest === undefined) return null;
      return {
        ...common,
        title: words.stepPlaceLost({ ...longest, phase }),
        sentences: [
          who(longest),
          ...(step.apart === null ? [] : [words.stepPlaceCalm({ seconds: step.apart.median })]),
        ],
        stretches: step.lost.map((one) =>
          words.stepPlaceDetail({ ...one, later: one.later === 0 ? first : second }),
        ),
        todo: words.doPlaceLost,
      };
    }
    case 'apart': {
      if (step.far === null) return null;
      const [earlier, later] = step.far.seconds > 0 ? [first, second] : [second, first];
      const ticked = step.apart?.nudges.some((nudge) => nudge !== 0) ?? false;
      return {
        ...common,
        title: words.stepApart({ ...step.far, phase }),
        sentences: [
          words.stepLater({ earlier, later, seconds: step.far.seconds, kappa: step.kappaAtBest ?? 0 }),
          ...(ticked || step.apart?.by === 'starts' ? [] : [words.stepNoTick]),
        ],
        todo: words.doApart,
      };
    }
    case 'disagreeing':
      return {
        ...common,
        title: words.stepDisagreeing({ phase }),
        sentences: [clocks, places, words.stepSame],
        todo: words.doDisagreeing,
      };
    case 'unknown':
      return {
        ...common,
        title: words.stepUnknown({ phase }),
        sentences: [clocks, places],
        todo: step.lacking === 'tooFew' ? words.doUnknownFew : words.doUnknown,
      };
    case 'inStep':
      return { ...common, title: words.stepIn({ phase }), sentences: [clocks, places], todo: null };
  }

  function who({ who: whose, signs }: LostPlace): string {
    if (whose === null) return words.stepWhoUnknown;
    const [observer, other] = whose === 0 ? [first, second] : [second, first];
    return words.stepWho({ ...signs[whose], observer, other });
  }

  function figures(): string[] {
    const lines = pairs.flatMap(({ step: { apart }, row: { phase: own } }) =>
      apart === null
        ? []
        : [words.stepFigures({ ...apart, first, second, phase: pairs.length === 1 ? null : own })],
    );
    const course = step.apart?.course ?? [];
    const [begin, end] = [course[0]?.median ?? 0, course.at(-1)?.median ?? 0];
    const nudges = [first, second].flatMap((observer, k) => {
      const ms = step.apart?.nudges[k] ?? 0;
      return ms === 0 ? [] : [{ observer, ms }];
    });
    return [
      ...lines,
      ...(Math.abs(end - begin) >= courseShown ? [words.stepCourse({ first: begin, last: end })] : []),
      ...(nudges.length === 0 ? [] : [words.stepNudges({ nudges })]),
      ...(step.notSearched === null ? [words.stepHow] : []),
    ];
  }
}

/** Seconds by which the distance must change from the first to the last five minutes to be spoken of. */
const courseShown = 0.3;

const seconds = ({ step }: { readonly step: InStep }): number => Math.abs(step.far?.seconds ?? 0);
