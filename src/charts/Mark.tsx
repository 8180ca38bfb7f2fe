import { hatchId } from './Hatch.tsx';
import type { Palette } from './palette.ts';

/** What stands in a cell: on-task, the n-th kind of off-task, a code that is neither, nothing occurred, missing. */
export type CellMark =
  | { readonly kind: 'on' }
  | { readonly kind: 'off'; readonly nth: number }
  | { readonly kind: 'other' }
  | { readonly kind: 'none' }
  | { readonly kind: 'missing' };

interface Shape {
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly palette: Palette;
  readonly scope: string;
  /** Paler, where the differences of two observers are what matters. */
  readonly soft?: boolean;
}

/** One code (or several that occurred in one interval, as bands) in a square. */
export function Mark({ marks, ...shape }: Shape & { readonly marks: readonly CellMark[] }) {
  const { x, y, size } = shape;
  const first = marks[0];
  if (first === undefined || marks.length === 1)
    return <Square mark={first ?? { kind: 'none' }} width={size} {...shape} />;
  const width = size / marks.length;
  return marks.map((mark, k) => (
    // biome-ignore lint/suspicious/noArrayIndexKey: fixed order, no identity
    <Square key={k} mark={mark} {...shape} x={x + k * width} y={y} width={width} />
  ));
}

function Square({ mark, x, y, size, width, palette, scope, soft = false }: SquareProps) {
  const r = Math.min(4, size / 6);
  const line = soft ? palette.ochreSoft : palette.ochre;
  const inner = { x: x + 0.75, y: y + 0.75, width: width - 1.5, height: size - 1.5, rx: r };
  switch (mark.kind) {
    case 'on':
      return (
        <rect x={x} y={y} width={width} height={size} rx={r} fill={soft ? palette.blueSoft : palette.blue} />
      );
    case 'off':
      return (
        <rect {...inner} fill={`url(#${hatchId(scope, mark.nth, soft)})`} stroke={line} strokeWidth={1.5} />
      );
    case 'other':
      return (
        <>
          <rect {...inner} fill="none" stroke={palette.ink2} strokeWidth={1.5} />
          <circle cx={x + width / 2} cy={y + size / 2} r={size / 9} fill={palette.ink2} />
        </>
      );
    case 'none':
      return <rect {...inner} fill="none" stroke={palette.ruleStrong} strokeWidth={1} />;
    case 'missing':
      return (
        <circle
          cx={x + width / 2}
          cy={y + size / 2}
          r={Math.max(2.5, size * 0.15)}
          fill="none"
          stroke={palette.ink2}
          strokeWidth={1.8}
        />
      );
  }
}

type SquareProps = Shape & { readonly mark: CellMark; readonly width: number };

/**
 * Two observers who differ: the first in the upper left half, the second in the lower right, in a dark frame. Each
 * half is one code (the first, where an interval has several).
 */
export function SplitMark({
  a,
  b,
  x,
  y,
  size,
  palette,
  scope,
}: Shape & { readonly a: CellMark; readonly b: CellMark }) {
  const upper = `M${x + 1} ${y + 1}H${x + size - 2}L${x + 1} ${y + size - 2}Z`;
  const lower = `M${x + size - 1} ${y + size - 1}V${y + 2}L${x + 2} ${y + size - 1}Z`;
  return (
    <>
      <Half mark={a} d={upper} cx={x + size * 0.3} cy={y + size * 0.3} {...{ size, palette, scope }} />
      <Half mark={b} d={lower} cx={x + size * 0.7} cy={y + size * 0.7} {...{ size, palette, scope }} />
      <rect
        x={x - 1.2}
        y={y - 1.2}
        width={size + 2.4}
        height={size + 2.4}
        rx={Math.min(6, size / 5)}
        fill="none"
        stroke={palette.ink}
        strokeWidth={2.4}
      />
    </>
  );
}

interface HalfProps {
  readonly mark: CellMark;
  readonly d: string;
  readonly cx: number;
  readonly cy: number;
  readonly size: number;
  readonly palette: Palette;
  readonly scope: string;
}

function Half({ mark, d, cx, cy, size, palette, scope }: HalfProps) {
  if (mark.kind === 'on') return <path d={d} fill={palette.blue} />;
  if (mark.kind === 'off')
    return (
      <path
        d={d}
        fill={`url(#${hatchId(scope, mark.nth)})`}
        stroke={palette.ochre}
        strokeWidth={1}
        strokeLinejoin="round"
      />
    );
  if (mark.kind === 'other') return <circle cx={cx} cy={cy} r={size / 9} fill={palette.ink2} />;
  return null;
}
