import type { Pair } from './threeLevelLikelihood.ts';

export interface Surface {
  readonly logLikelihood: number;
  readonly gradient: Pair;
}

export interface Climb {
  readonly at: Pair;
  readonly converged: boolean;
}

/**
 * The highest point of a smooth surface over two numbers that are 0 or more, from the best point of a coarse grid by
 * Newton steps on the given derivatives. A number that wants to fall below 0 is held at 0. `unit` is the size in
 * which both numbers are measured; converged = steps smaller than 1e-11 of it, with the derivatives near 0.
 */
export function climb(surface: (at: Pair) => Surface, unit: number): Climb {
  let at = bestOfGrid(surface, unit);
  let here = surface(at);
  for (let round = 0; round < 200; round++) {
    const step = newtonStep(surface, at, here.gradient, unit);
    let scale = 1;
    let next: Pair = at;
    let there = here;
    // A step that overshoots is halved until it climbs; at the very top, nothing climbs any more.
    for (; scale > 1e-12; scale /= 2) {
      next = [Math.max(0, at[0] + scale * step[0]), Math.max(0, at[1] + scale * step[1])];
      there = surface(next);
      if (there.logLikelihood >= here.logLikelihood - 1e-13 * Math.abs(here.logLikelihood)) break;
    }
    const moved = Math.max(Math.abs(next[0] - at[0]), Math.abs(next[1] - at[1]));
    at = next;
    here = there;
    if (moved <= 1e-11 * Math.max(unit * 1e-3, at[0], at[1]))
      return { at, converged: isTop(at, here.gradient, unit) };
  }
  return { at, converged: false };
}

function bestOfGrid(surface: (at: Pair) => Surface, unit: number): Pair {
  const steps = [0, ...Array.from({ length: 22 }, (_, i) => unit * 10 ** ((i - 18) / 4))];
  let best: Pair = [0, 0];
  let height = Number.NEGATIVE_INFINITY;
  for (const first of steps) {
    for (const second of steps) {
      const { logLikelihood } = surface([first, second]);
      if (logLikelihood > height) {
        height = logLikelihood;
        best = [first, second];
      }
    }
  }
  return best;
}

function newtonStep(surface: (at: Pair) => Surface, at: Pair, gradient: Pair, unit: number): Pair {
  const free = [0, 1].filter((i) => (at[i] as number) > 0 || (gradient[i] as number) > 0);
  const curve = curvature(surface, at, unit);
  const uphill: Pair = [
    free.includes(0) ? Math.sign(gradient[0]) * 0.1 * Math.max(at[0], unit * 1e-3) : 0,
    free.includes(1) ? Math.sign(gradient[1]) * 0.1 * Math.max(at[1], unit * 1e-3) : 0,
  ];
  if (free.length === 2) {
    const determinant = curve[0][0] * curve[1][1] - curve[0][1] * curve[1][0];
    // Not a hilltop shape: a cautious step uphill instead.
    if (!(determinant > 0 && curve[0][0] < 0)) return uphill;
    return [
      -(curve[1][1] * gradient[0] - curve[0][1] * gradient[1]) / determinant,
      -(curve[0][0] * gradient[1] - curve[1][0] * gradient[0]) / determinant,
    ];
  }
  const only = free[0];
  if (only === undefined) return [0, 0];
  const bend = (curve[only] as Pair)[only] as number;
  if (!(bend < 0)) return uphill;
  const step = -(gradient[only] as number) / bend;
  return only === 0 ? [step, 0] : [0, step];
}

/** Second derivatives, from differences of the first. */
function curvature(surface: (at: Pair) => Surface, at: Pair, unit: number): [Pair, Pair] {
  return [0, 1].map((i): Pair => {
    const reach = 1e-4 * Math.max(at[i] as number, unit * 1e-3);
    const low = Math.max(0, (at[i] as number) - reach);
    const high = (at[i] as number) + reach;
    const move = (to: number): Pair => (i === 0 ? [to, at[1]] : [at[0], to]);
    const below = surface(move(low)).gradient;
    const above = surface(move(high)).gradient;
    return [(above[0] - below[0]) / (high - low), (above[1] - below[1]) / (high - low)];
  }) as [Pair, Pair];
}

function isTop(at: Pair, gradient: Pair, unit: number): boolean {
  return [0, 1].every((i) => {
    const slope = (gradient[i] as number) * unit;
    return (at[i] as number) > 0 ? Math.abs(slope) < 1e-5 : slope < 1e-5;
  });
}
