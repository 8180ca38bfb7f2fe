import type { Said } from '../../src/analysis/likeness.ts';
import type { Random } from '../../src/kernel/random.ts';
import { simulateLesson } from '../../src/stats/simulateLesson.ts';

export interface Scene {
  readonly looks: number;
  /** Seconds from one look to the next. */
  readonly every?: number;
  readonly children?: number;
  /** Looks in a row at each child; with one child any. */
  readonly block?: number;
  readonly meanBout: number;
  readonly meanGap: number;
  /** Share of looks at which an observer says what comes to mind, not what is to be seen. */
  readonly slips: number;
  /** How many seconds sooner or later than the prompt an observer looks, at most. */
  readonly jitter?: number;
  /** Share of looks that depend on the whole class instead of the child. */
  readonly classWide?: number;
  /** Kinds of off-task; each bout has one. */
  readonly kinds?: number;
}

/** The second observer is off by `places` from look `from` for `looks` looks: writes what was seen so many lines later (or earlier). */
export interface Loss {
  readonly from: number;
  readonly looks: number;
  readonly places: number;
}

/** Two observers who look at the same children at the same prompts and never speak to each other. */
export function simulatedPair(scene: Scene, random: Random, loss?: Loss): [Said[], Said[]] {
  const { looks, every = 15, children = 6, block = 1, slips, jitter = 0, classWide = 0, kinds = 1 } = scene;
  const seconds = looks * every + 60;
  const lives = Array.from({ length: children + 1 }, () =>
    simulateLesson({ ...scene, seconds, random }).map((bout) => ({
      ...bout,
      kind: Math.floor(random() * kinds),
    })),
  );
  const common = Array.from({ length: looks }, () => random() < classWide);
  const share = scene.meanBout / (scene.meanBout + scene.meanGap);
  const offKind = (): string => `off ${Math.floor(random() * kinds)}`;
  const seen = (i: number): Said => {
    if (random() < slips) return random() < share ? 'on' : offKind();
    const child = common[i] === true ? children : Math.floor(i / block) % children;
    const time = 30 + i * every + (2 * random() - 1) * jitter;
    const bouts = lives[child] ?? [];
    if (bouts.some(({ on, off }) => on <= time && time < off)) return 'on';
    // The kind of a gap is that of the bout before it.
    const before = bouts.findLast(({ off }) => off <= time);
    return `off ${before?.kind ?? 0}`;
  };
  const a = Array.from({ length: looks }, (_, i) => seen(i));
  const real = Array.from({ length: looks }, (_, i) => seen(i));
  if (loss === undefined) return [a, real];
  const b = real.map((own, i) => {
    const inside = i >= loss.from && i < loss.from + loss.looks;
    return inside ? (real[i - loss.places] ?? own) : own;
  });
  return [a, b];
}

export interface Crowd {
  readonly counts: number;
  readonly children: number;
  /** Correlation of the class's share with that at the next prompt. */
  readonly lasting: number;
  /** How far the class's share strays from its mean (standard deviation, 0–1). */
  readonly spread: number;
  /** Most heads by which an observer miscounts. */
  readonly miscount: number;
}

/** Two observers who count the same class at the same prompts: shares 0–1 around 75 %. */
export function simulatedCounts(
  { counts, children, lasting, spread, miscount }: Crowd,
  random: Random,
  loss?: Loss,
): [Said[], Said[]] {
  const normal = (): number => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
  let level = normal();
  const truth = Array.from({ length: counts }, () => {
    level = lasting * level + Math.sqrt(1 - lasting * lasting) * normal();
    return Math.max(0, Math.min(1, 0.75 + spread * level));
  });
  const counted = (share: number): number => {
    const wrong = Math.floor(random() * (2 * miscount + 1)) - miscount;
    return Math.max(0, Math.min(children, Math.round(share * children) + wrong)) / children;
  };
  const a = truth.map(counted);
  const b = truth.map((own, i) => {
    const inside = loss !== undefined && i >= loss.from && i < loss.from + loss.looks;
    return counted(inside ? (truth[i - loss.places] ?? own) : own);
  });
  return [a, b];
}
