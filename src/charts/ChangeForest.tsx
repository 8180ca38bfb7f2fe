import { scaleLinear } from 'd3-scale';
import type { Palette } from './palette.ts';
import { textWidth } from './textWidth.ts';

export interface ForestRow {
  readonly label: string;
  readonly estimate: number;
  /** null where no interval can be given. */
  readonly lower: number | null;
  readonly upper: number | null;
  /** The figures as text, at the right edge. */
  readonly figures: string;
}

export interface PooledRow extends ForestRow {
  /** Where the next class would lie. */
  readonly predictionLower: number | null;
  readonly predictionUpper: number | null;
}

export interface ForestGroup {
  /** The condition; null where there is only one. */
  readonly name: string | null;
  readonly rows: readonly ForestRow[];
  readonly pooled: PooledRow | null;
}

interface Props {
  readonly width: number;
  readonly palette: Palette;
  readonly label: string;
  readonly groups: readonly ForestGroup[];
  readonly tick: (points: number) => string;
  /** Under the axis: what the numbers are. */
  readonly axis: string;
}

const rowHeight = 42;
type Line =
  | { readonly kind: 'name'; readonly text: string }
  | { readonly kind: 'row'; readonly row: ForestRow }
  | { readonly kind: 'pooled'; readonly row: PooledRow };

/** Each class a square with its interval, the classes together a diamond with its prediction interval as a thin line. */
export function ChangeForest({ width, palette, label, groups, tick, axis }: Props) {
  const lines = groups.flatMap((group): Line[] => [
    ...(group.name === null ? [] : [{ kind: 'name' as const, text: group.name }]),
    ...group.rows.map((row) => ({ kind: 'row' as const, row })),
    ...(group.pooled === null ? [] : [{ kind: 'pooled' as const, row: group.pooled }]),
  ]);
  const rows = lines.flatMap((one) => (one.kind === 'name' ? [] : [one.row]));
  const left = Math.min(width * 0.3, Math.max(60, ...rows.map((row) => textWidth(row.label, 16.5))) + 18);
  const figures = Math.max(0, ...rows.map((row) => textWidth(row.figures, 14)));
  const beside = width - left - figures > 240;
  const right = beside ? width - figures - 20 : width - 20;
  const ends = rows.flatMap((row) => [
    row.estimate,
    ...(row.lower === null ? [] : [row.lower]),
    ...(row.upper === null ? [] : [row.upper]),
    ...('predictionLower' in row ? predictionOf(row as PooledRow) : []),
  ]);
  const x = scaleLinear([Math.min(0, ...ends), Math.max(0, ...ends)], [left + 12, right]).nice(6);
  const pitch = beside ? rowHeight : rowHeight + 16;
  const bottom = lines.length * pitch + 8;
  const height = bottom + 56;
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
      <line
        x1={x(0)}
        x2={x(0)}
        y1={4}
        y2={bottom}
        stroke={palette.ink2}
        strokeWidth={1.6}
        strokeDasharray="2 5"
      />
      {x.ticks(Math.max(3, Math.floor((right - left) / 80))).map((n) => (
        <text key={n} x={x(n)} y={bottom + 20} textAnchor="middle" fontSize={14} fill={palette.ink2}>
          {tick(n)}
        </text>
      ))}
      <text x={(left + 12 + right) / 2} y={bottom + 44} textAnchor="middle" fontSize={14} fill={palette.ink2}>
        {axis}
      </text>
      {lines.map((one, k) => {
        const y = k * pitch + rowHeight / 2;
        if (one.kind === 'name')
          return (
            <text
              // biome-ignore lint/suspicious/noArrayIndexKey: lines stand by place
              key={k}
              x={0}
              y={y + 4}
              dominantBaseline="central"
              fontSize={14}
              fill={palette.ink2}
            >
              {one.text}
            </text>
          );
        const { row } = one;
        return (
          // biome-ignore lint/suspicious/noArrayIndexKey: lines stand by place
          <g key={k}>
            <text
              x={0}
              y={y}
              dominantBaseline="central"
              fontSize={16.5}
              fontWeight={one.kind === 'pooled' ? 680 : 420}
              fill={palette.ink}
            >
              {row.label}
            </text>
            {one.kind === 'pooled' ? (
              <Diamond row={one.row} x={x} y={y} palette={palette} />
            ) : (
              <g fill={palette.ink} stroke={palette.ink}>
                {row.lower !== null && row.upper !== null && (
                  <line x1={x(row.lower)} x2={x(row.upper)} y1={y} y2={y} strokeWidth={2.4} />
                )}
                <rect x={x(row.estimate) - 6} y={y - 6} width={12} height={12} rx={1.5} stroke="none" />
              </g>
            )}
            <text
              x={beside ? width : left + 12}
              y={beside ? y : y + 22}
              dominantBaseline="central"
              textAnchor={beside ? 'end' : 'start'}
              fontSize={14}
              fill={palette.ink2}
              stroke={palette.sheet}
              strokeWidth={5}
              paintOrder="stroke"
            >
              {row.figures}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

interface DiamondProps {
  readonly row: PooledRow;
  readonly x: (points: number) => number;
  readonly y: number;
  readonly palette: Palette;
}

function Diamond({ row, x, y, palette }: DiamondProps) {
  const lower = row.lower ?? row.estimate;
  const upper = row.upper ?? row.estimate;
  return (
    <>
      {row.predictionLower !== null && row.predictionUpper !== null && (
        <line
          x1={x(row.predictionLower)}
          x2={x(row.predictionUpper)}
          y1={y}
          y2={y}
          stroke={palette.blue}
          strokeWidth={1.4}
        />
      )}
      <path
        d={`M${x(lower)} ${y}L${x(row.estimate)} ${y - 10}L${x(upper)} ${y}L${x(row.estimate)} ${y + 10}Z`}
        fill={palette.blue}
        stroke={palette.blue}
        strokeWidth={1}
        strokeLinejoin="round"
      />
    </>
  );
}

const predictionOf = (row: PooledRow): number[] =>
  row.predictionLower === null || row.predictionUpper === null
    ? []
    : [row.predictionLower, row.predictionUpper];
