import type { Palette } from './palette.ts';
import {
  type ScheduleLayout,
  type SchedulePart,
  type ScheduleRow,
  type Span,
  type Stretch,
  scheduleLayout,
} from './scheduleLayout.ts';
import { textWidth } from './textWidth.ts';

interface Props {
  /** px; the time axis shrinks with it, letters do not. */
  readonly width: number;
  readonly palette: Palette;
  /** The accessible name: what the picture shows. */
  readonly label: string;
  /** One row a child; one row in all where everybody is looked at. */
  readonly rows: readonly ScheduleRow[];
  readonly parts: readonly SchedulePart[];
  /** Heads of the columns at the rows' ends. */
  readonly heads: readonly string[];
  /** The short name of the time axis' unit. */
  readonly unit: string;
}

const labelSize = 15;
const smallSize = 13;
const markHeight = 14;
const minute = 60_000;

/** A schedule before it is used: one row a child, time across, a mark at each look, parts beside one another. */
export function ScheduleChart({ width, palette, label, rows, parts, heads, unit }: Props) {
  const layout = scheduleLayout(width, rows, parts, heads, labelSize, labelSize);
  const { bands, head, rowPitch, endAt } = layout;
  const last = bands.length - 1;
  const middle = (row: number): number => head + row * rowPitch + rowPitch / 2;
  return (
    <svg
      xmlns="http://www.w3.org/2000/svg"
      viewBox={`0 0 ${width} ${layout.height}`}
      width={width}
      height={layout.height}
      role="img"
      aria-label={label}
      fontFamily={palette.font}
    >
      {bands.map(({ y, stretches }, b) => (
        <g key={y} transform={`translate(0 ${y})`}>
          {rows.map((row, r) => (
            <text
              // biome-ignore lint/suspicious/noArrayIndexKey: rows stand by place
              key={r}
              x={0}
              y={middle(r)}
              dominantBaseline="central"
              fontSize={labelSize}
              fontWeight={row.strong === true ? 680 : 400}
              fill={palette.ink}
            >
              {cut(row.label, layout.labelWidth - 10)}
            </text>
          ))}
          {stretches.map((stretch) => (
            <g key={`${stretch.part}-${stretch.fromMs}`} transform={`translate(${round(stretch.x)} 0)`}>
              {stretch.fromMs === 0 && (
                <text x={0} y={14} fontSize={smallSize + 1} fontWeight={600} fill={palette.ink2}>
                  {parts[stretch.part]?.name}
                </text>
              )}
              <TimeAxis
                {...{ stretch, layout, palette }}
                unit={stretch.fromMs === 0 ? ` ${unit}` : ''}
                rows={rows.length}
              />
              {rows.map((row, r) => (
                <path
                  // biome-ignore lint/suspicious/noArrayIndexKey: rows stand by place
                  key={r}
                  d={marks(row.spans[stretch.part] ?? [], stretch, layout, middle(r))}
                  fill={palette.ink}
                />
              ))}
            </g>
          ))}
          {b === last &&
            endAt.map((x, column) => (
              <g key={x} textAnchor="end" fontSize={labelSize} fill={palette.ink}>
                <text x={x} y={head - 10} fontSize={smallSize} fill={palette.ink2}>
                  {heads[column]}
                </text>
                {rows.map((row, r) => (
                  <text
                    // biome-ignore lint/suspicious/noArrayIndexKey: rows stand by place
                    key={r}
                    x={x}
                    y={middle(r)}
                    dominantBaseline="central"
                  >
                    {row.ends[column]}
                  </text>
                ))}
              </g>
            ))}
        </g>
      ))}
    </svg>
  );
}

interface AxisProps {
  readonly stretch: Stretch;
  readonly layout: ScheduleLayout;
  readonly palette: Palette;
  /** Stands after the first number. */
  readonly unit: string;
  readonly rows: number;
}

/** Minutes above the rows, a thin line down from each, and a line along each row. */
function TimeAxis({ stretch, layout, palette, unit, rows }: AxisProps) {
  const { pxPerMs, head, rowPitch, tickMinutes } = layout;
  const length = (stretch.toMs - stretch.fromMs) * pxPerMs;
  const first = Math.ceil(stretch.fromMs / minute / tickMinutes - 1e-9);
  const count = Math.floor(stretch.toMs / minute / tickMinutes + 1e-9) - first + 1;
  const ticks = Array.from({ length: Math.max(0, count) }, (_, k) => (first + k) * tickMinutes);
  const bottom = head + rows * rowPitch;
  return (
    <>
      <path
        d={Array.from({ length: rows }, (_, r) => `M0 ${head + (r + 0.5) * rowPitch}h${round(length)}`).join(
          '',
        )}
        stroke={palette.rule}
        strokeWidth={1}
        fill="none"
      />
      <path
        d={ticks
          .map((t) => `M${round((t * minute - stretch.fromMs) * pxPerMs)} ${head - 4}V${bottom}`)
          .join('')}
        stroke={palette.rule}
        strokeWidth={1}
        fill="none"
      />
      {ticks.map((t, k) => (
        <text
          key={t}
          x={round((t * minute - stretch.fromMs) * pxPerMs)}
          y={head - 10}
          fontSize={smallSize}
          fill={palette.ink2}
          textAnchor={k === 0 && t * minute - stretch.fromMs < 1 ? 'start' : 'middle'}
        >
          {k === 0 ? `${t}${unit}` : t}
        </text>
      ))}
    </>
  );
}

/** All marks of one row in one path: seven hundred looks are one element. */
function marks(looks: readonly Span[], { fromMs, toMs }: Stretch, layout: ScheduleLayout, y: number): string {
  const { pxPerMs, nearestPx } = layout;
  const thin = Math.min(3, Math.max(1, nearestPx * 0.5));
  const top = y - markHeight / 2;
  return looks
    .flatMap(([from, to]) => {
      // A look at the end of an interval stands at the end of its stretch, not at the beginning of the next.
      const moment = from === to;
      const within = moment ? from <= toMs && (from > fromMs || fromMs === 0) : to > fromMs && from < toMs;
      if (!within) return [];
      const width = moment
        ? thin
        : Math.max(thin, (Math.min(to, toMs) - Math.max(from, fromMs)) * pxPerMs - 1);
      const x = (Math.max(from, fromMs) - fromMs) * pxPerMs - (moment ? thin / 2 : 0);
      return [`M${round(x)} ${round(top)}h${round(width)}v${markHeight}h${round(-width)}z`];
    })
    .join('');
}

/** As much of a label as fits. */
function cut(label: string, room: number): string {
  if (textWidth(label, labelSize) <= room + 10) return label;
  const letters = [...label];
  while (letters.length > 1 && textWidth(`${letters.join('')}…`, labelSize) > room) letters.pop();
  return `${letters.join('')}…`;
}

const round = (px: number): number => Math.round(px * 10) / 10;
