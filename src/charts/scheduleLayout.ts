import { textWidth } from './textWidth.ts';

/** From when to when a child is watched, in ms from the beginning of its part. A moment is both. */
export type Span = readonly [from: number, to: number];

export interface ScheduleRow {
  readonly label: string;
  /** The child that stands out: its label is bold. */
  readonly strong?: boolean;
  /** What stands at the end of the row, column by column. */
  readonly ends: readonly string[];
  /** Part by part, in order of time. */
  readonly spans: readonly (readonly Span[])[];
}

export interface SchedulePart {
  /** The phase; may be empty where there is only one. */
  readonly name: string;
  readonly lengthMs: number;
}

/** A stretch of a part as it stands in one band. */
export interface Stretch {
  readonly part: number;
  readonly fromMs: number;
  readonly toMs: number;
  readonly x: number;
}

/** One strip of the picture: all rows, some of the time. */
export interface ScheduleBand {
  readonly y: number;
  readonly stretches: readonly Stretch[];
}

export interface ScheduleLayout {
  readonly labelWidth: number;
  /** Right edges of the columns at the rows' ends. */
  readonly endAt: readonly number[];
  readonly pxPerMs: number;
  /** How far apart, in px, the two nearest looks of a row are. */
  readonly nearestPx: number;
  readonly head: number;
  readonly rowPitch: number;
  readonly bands: readonly ScheduleBand[];
  /** Minutes from one number on the time axis to the next. */
  readonly tickMinutes: number;
  readonly height: number;
}

const partGap = 30;
const bandGap = 18;
const head = 44;
/** Looks nearer than this run into one another. */
const clearPx = 4;
/** A picture taller than this is scrolled, not seen. */
const tallest = 1300;
const minute = 60_000;
const bandMinutes = [1, 2, 3, 4, 5, 6, 8, 10, 12, 15, 20, 25, 30, 35, 40, 45, 50, 60, 75, 90, 120, 180];
const tickMinutes = [0.5, 1, 2, 3, 5, 10, 15, 20, 30, 45, 60, 90, 120, 180];

/**
 * Where the rows of a schedule stand, in px of `width`: all parts side by side in proportion to their length where
 * looks stay apart, else under one another, and a long part broken into bands of round minutes.
 */
export function scheduleLayout(
  width: number,
  rows: readonly ScheduleRow[],
  parts: readonly SchedulePart[],
  heads: readonly string[],
  labelSize: number,
  endSize: number,
): ScheduleLayout {
  const longest = Math.max(0, ...rows.map(({ label }) => textWidth(label, labelSize)));
  const labelWidth = Math.min(Math.ceil(longest) + 14, Math.round(width * 0.34));
  const endAt = columnsFromRight(width, rows, heads, endSize);
  const room = Math.max(80, (endAt[0] ?? width) - columnWidth(rows, heads, 0, endSize) - 14 - labelWidth);
  const rowPitch = rows.length > 12 ? 22 : 26;
  const bandHeight = head + rows.length * rowPitch + bandGap;
  const total = parts.reduce((sum, part) => sum + part.lengthMs, 0);
  const nearest = nearestLooks(rows);
  const beside = (room - partGap * (parts.length - 1)) / Math.max(1, total);
  const longestPart = Math.max(1, ...parts.map((part) => part.lengthMs));
  const least = parts.length > 1 ? minutesApart(beside) : 0;
  if (beside * nearest >= clearPx && least <= longestPart / 2 / minute)
    return laid(beside, [besideOneAnother(parts, labelWidth, beside)]);
  const most = Math.max(1, Math.floor(tallest / bandHeight / Math.max(1, parts.length)));
  const wanted = Number.isFinite(nearest) ? Math.ceil((longestPart * clearPx) / (room * nearest)) : 1;
  const bandsEach = Math.min(most, Math.max(1, wanted));
  const bandMs =
    bandsEach === 1 ? longestPart : roundUp(longestPart / bandsEach / minute, bandMinutes) * minute;
  const bands = parts.flatMap((part, p) =>
    Array.from({ length: Math.max(1, Math.ceil(part.lengthMs / bandMs - 1e-9)) }, (_, k): Stretch[] => [
      { part: p, fromMs: k * bandMs, toMs: Math.min(part.lengthMs, (k + 1) * bandMs), x: labelWidth },
    ]),
  );
  return laid(room / bandMs, bands);

  function laid(pxPerMs: number, strips: readonly (readonly Stretch[])[]): ScheduleLayout {
    return {
      labelWidth,
      endAt,
      pxPerMs,
      nearestPx: nearest * pxPerMs,
      head,
      rowPitch,
      bands: strips.map((stretches, k) => ({ y: k * bandHeight, stretches })),
      tickMinutes: minutesApart(pxPerMs),
      height: strips.length * bandHeight - bandGap + 4,
    };
  }
}

function besideOneAnother(parts: readonly SchedulePart[], left: number, pxPerMs: number): Stretch[] {
  let x = left;
  return parts.map(({ lengthMs }, part) => {
    const stretch = { part, fromMs: 0, toMs: lengthMs, x };
    x += lengthMs * pxPerMs + partGap;
    return stretch;
  });
}

/** Numbers on the time axis need about this much room. */
const minutesApart = (pxPerMs: number): number => roundUp(46 / (pxPerMs * minute), tickMinutes);

const roundUp = (minutes: number, among: readonly number[]): number =>
  among.find((one) => one >= minutes - 1e-9) ?? Math.ceil(minutes / 60) * 60;

function nearestLooks(rows: readonly ScheduleRow[]): number {
  let nearest = Number.POSITIVE_INFINITY;
  for (const { spans } of rows)
    for (const looks of spans)
      for (let k = 1; k < looks.length; k++)
        nearest = Math.min(nearest, (looks[k]?.[0] ?? 0) - (looks[k - 1]?.[0] ?? 0));
  return nearest;
}

const columnWidth = (
  rows: readonly ScheduleRow[],
  heads: readonly string[],
  column: number,
  size: number,
): number =>
  Math.ceil(
    Math.max(
      textWidth(heads[column] ?? '', size),
      ...rows.map(({ ends }) => textWidth(ends[column] ?? '', size)),
    ),
  );

function columnsFromRight(
  width: number,
  rows: readonly ScheduleRow[],
  heads: readonly string[],
  size: number,
): number[] {
  const edges: number[] = [];
  let edge = width - 1;
  for (let column = heads.length - 1; column >= 0; column--) {
    edges.unshift(edge);
    edge -= columnWidth(rows, heads, column, size) + 14;
  }
  return edges;
}
