import { textWidth } from './textWidth.ts';

/** A run of columns of one part, as it stands in one band. */
export interface Block {
  readonly part: number;
  /** Columns from … (0-based) up to, not including. */
  readonly from: number;
  readonly to: number;
  readonly x: number;
}

/** One strip of the sheet: all rows, some columns. */
export interface Band {
  readonly y: number;
  readonly blocks: readonly Block[];
}

export interface SheetLayout {
  readonly labelWidth: number;
  readonly pitch: number;
  readonly cell: number;
  readonly rowPitch: number;
  /** From a band's top to its first row: phase name and column numbers. */
  readonly head: number;
  readonly bands: readonly Band[];
  readonly height: number;
}

const partGap = 32;
const largest = 46;
const smallestBeside = 24;
const smallest = 19;

/**
 * Where the cells of a round sheet stand, in px of `width`: all parts side by side where cells stay large enough to
 * be told apart, else under one another, and a long part broken into several bands.
 */
export function sheetLayout(
  width: number,
  rowLabels: readonly string[],
  columns: readonly number[],
  labelSize: number,
): SheetLayout {
  const longest = Math.max(0, ...rowLabels.map((label) => textWidth(label, labelSize)));
  const labelWidth = Math.min(Math.ceil(longest) + 16, width * 0.34);
  const room = width - labelWidth - 4;
  const total = columns.reduce((sum, n) => sum + n, 0);
  const beside = (room - partGap * (columns.length - 1)) / Math.max(1, total);
  const stacked = beside < smallestBeside && (columns.length > 1 || total * smallest > room);
  const perBand = Math.max(1, Math.floor(room / smallest));
  const widest = Math.min(perBand, Math.max(1, ...columns));
  const pitch = Math.min(largest, stacked ? room / widest : beside);
  const gap = pitch > 30 ? 7 : 5;
  const cell = pitch - gap;
  const rowPitch = cell + gap + 2;
  const head = 46;
  const bandHeight = head + rowLabels.length * rowPitch;
  const bands: Band[] = [];
  if (stacked) {
    columns.forEach((n, part) => {
      for (let from = 0; from < Math.max(1, n); from += perBand) {
        const to = Math.min(n, from + perBand);
        bands.push({ y: bands.length * (bandHeight + 14), blocks: [{ part, from, to, x: labelWidth }] });
      }
    });
  } else {
    let x = labelWidth;
    const blocks = columns.map((n, part) => {
      const block = { part, from: 0, to: n, x };
      x += n * pitch + partGap;
      return block;
    });
    bands.push({ y: 0, blocks });
  }
  const height = bands.length * (bandHeight + 14);
  return { labelWidth, pitch, cell, rowPitch, head, bands, height };
}
