import { useId } from 'react';
import { Hatches, hatchId } from './Hatch.tsx';
import type { Palette } from './palette.ts';
import { textWidth } from './textWidth.ts';

export interface Share {
  readonly label: string;
  /** Any unit; the bar shows shares of the sum. */
  readonly size: number;
}

interface Props {
  readonly width: number;
  readonly palette: Palette;
  readonly label: string;
  /** The first share is hatched widest, and so on; sizes of 0 are left out. */
  readonly shares: readonly Share[];
}

const size = 15;

/** What off-task was made of: one bar, its parts hatched and labelled where they stand. */
export function Composition({ width, palette, label, shares }: Props) {
  const scope = useId();
  const sum = shares.reduce((total, share) => total + share.size, 0);
  let x = 1;
  const parts = shares.map((share, k) => {
    const part = { ...share, nth: k + 1, x, w: sum === 0 ? 0 : ((width - 2) * share.size) / sum };
    x += part.w;
    return part;
  });
  const shown = parts.filter((part) => part.w > 0);
  // A label stands under the left end of its part, or further left where it would not fit. They are laid from the
  // right, each on the first line that is free, so that no label is crossed by another's leader.
  const starts: number[] = [];
  const placed = shown
    .toReversed()
    .map((part) => {
      const w = textWidth(part.label, size) + 16;
      const left = Math.max(0, Math.min(part.x, width - w));
      let line = starts.findIndex((start) => left + w <= start);
      if (line === -1) line = starts.length;
      starts[line] = left;
      return { ...part, left, line };
    })
    .toReversed();
  const height = 44 + starts.length * 26 + 8;
  return (
    <svg
      xmlns="http://www.w3.org/2000/svg"
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      role="img"
      aria-label={label}
      fontFamily={palette.font}
    >
      <Hatches scope={scope} palette={palette} kinds={shares.length} />
      {placed.map((part) => (
        <g key={part.label}>
          <line
            x1={part.x + Math.min(8, part.w / 2)}
            x2={part.x + Math.min(8, part.w / 2)}
            y1={38}
            y2={52 + part.line * 26}
            stroke={palette.ink2}
            strokeWidth={1}
          />
          <rect
            x={part.x}
            y={1}
            width={part.w}
            height={38}
            fill={`url(#${hatchId(scope, part.nth)})`}
            stroke={palette.ochre}
            strokeWidth={2}
          />
          <text
            x={part.left + 14}
            y={56 + part.line * 26}
            fontSize={size}
            fill={palette.ink}
            dominantBaseline="central"
          >
            {part.label}
          </text>
        </g>
      ))}
    </svg>
  );
}
