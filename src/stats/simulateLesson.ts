import type { About } from './about.ts';
import { type BehaviourInBouts, requireBouts } from './expectedProportion.ts';
import { requireThat } from './requireThat.ts';

/** One bout of the behaviour, in seconds from the start of the lesson. */
export interface Bout {
  readonly on: number;
  readonly off: number;
}

export interface LessonOptions extends BehaviourInBouts {
  readonly seconds: number;
  /** Numbers in [0, 1), one after the other. */
  readonly random: () => number;
}

/**
 * The bouts of one child in one simulated lesson: exponential bouts and gaps in turn, begun in equilibrium (already
 * in a bout with probability μ/(μ + λ)), cut at 0 and at `seconds`. Sorted, apart from each other, none empty.
 *
 * Source: Kulkarni 2010, Modeling and analysis of stochastic systems, 2nd ed. (alternating renewal process).
 *
 * @example simulateLesson({ meanBout: 40, meanGap: 10, seconds: 60, random: () => 0.5 })[0].off // → 27.7259
 */
export function simulateLesson({ meanBout, meanGap, seconds, random }: LessonOptions): Bout[] {
  requireBouts({ meanBout, meanGap });
  requireThat(typeof random === 'function', 'random', 'must be a generator of numbers in [0, 1)');
  requireThat(seconds >= 0 && Number.isFinite(seconds), 'seconds', 'must not be negative');
  const bouts: Bout[] = [];
  let isOn = random() < meanBout / (meanBout + meanGap);
  let time = 0;
  // The rest of an exponential bout has the same distribution as a whole one, so no first bout needs special care.
  while (time < seconds) {
    const until = Math.min(seconds, time - (isOn ? meanBout : meanGap) * Math.log1p(-random()));
    if (isOn && until > time) bouts.push({ on: time, off: until });
    time = until;
    isOn = !isOn;
  }
  return bouts;
}

export const about: About = {
  name: 'simulateLesson',
  sentence: 'Invented behaviour with known bouts and gaps, to see what a way of recording makes of it.',
  formula: 'bouts ~ Exp(μ), gaps ~ Exp(λ), started on with probability μ/(μ + λ)',
  source: 'Kulkarni 2010, Modeling and analysis of stochastic systems, 2nd ed.',
  check: {
    input: 'simulateLesson({ meanBout: 40, meanGap: 10, seconds: 60, random: () => 0.5 })[0].off',
    expected: 40 * Math.LN2,
    source: 'by hand: the median of an exponential bout of mean 40',
    tolerance: 1e-12,
  },
  recompute: () =>
    simulateLesson({ meanBout: 40, meanGap: 10, seconds: 60, random: () => 0.5 })[0]?.off ?? Number.NaN,
};
