import type { Palette } from './palette.ts';

/** Kinds of off-task that hatching can tell apart; further kinds share the densest. */
export const hatchKinds = 4;

/** The id of the hatching for the n-th kind of off-task (1, 2 …), strong or soft. */
export function hatchId(scope: string, nth: number, soft = false): string {
  return `${scope}-hatch-${Math.min(Math.max(nth, 1), hatchKinds)}${soft ? '-soft' : ''}`;
}

interface Props {
  readonly scope: string;
  readonly palette: Palette;
  /** How many kinds are needed. */
  readonly kinds: number;
}

/**
 * Hatchings of one chart, denser with each kind and turned for every second one, so that they differ in grey and
 * side by side. `scope` keeps the ids of several charts on one page apart.
 */
export function Hatches({ scope, palette, kinds }: Props) {
  const wanted = Array.from({ length: Math.min(kinds, hatchKinds) }, (_, k) => k + 1);
  return (
    <defs>
      {wanted.flatMap((nth) =>
        [false, true].map((soft) => {
          const gap = [8, 5, 4, 3][nth - 1] ?? 3;
          const colour = soft ? palette.ochreSoft : palette.ochre;
          return (
            <pattern
              key={`${nth}${soft}`}
              id={hatchId(scope, nth, soft)}
              width={gap}
              height={gap}
              patternUnits="userSpaceOnUse"
              patternTransform={`rotate(${nth % 2 === 1 ? 45 : -45})`}
            >
              <rect width={gap} height={gap} fill={palette.sheet} />
              <line x1={0} y1={0} x2={0} y2={gap} stroke={colour} strokeWidth={3} />
            </pattern>
          );
        }),
      )}
    </defs>
  );
}
