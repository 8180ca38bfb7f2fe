import { useId } from 'react';
import { flowItems } from './flowItems.ts';
import { Hatches } from './Hatch.tsx';
import { type CellMark, Mark, SplitMark } from './Mark.tsx';
import type { Palette } from './palette.ts';
import { sheetLayout } from './sheetLayout.ts';

/** One look. `marks`: the first (or only) observer's; `second`: the other's, where two are compared. */
export interface SheetCell {
  readonly marks: readonly CellMark[];
  readonly second?: readonly CellMark[];
  readonly differs?: boolean;
  readonly late?: boolean;
}

export interface SheetPart {
  readonly name: string;
  /** Row by row, in the order of `rows`; a row may be shorter than others. */
  readonly cells: readonly (readonly SheetCell[])[];
}

export interface KeyItem {
  readonly sign: CellMark | 'late' | 'differs';
  readonly label: string;
}

interface Props {
  /** px; cells, not letters, shrink with it. */
  readonly width: number;
  readonly palette: Palette;
  /** The accessible name: what the picture shows. */
  readonly label: string;
  /** One label a child. */
  readonly rows: readonly string[];
  readonly parts: readonly SheetPart[];
  readonly legend: readonly KeyItem[];
}

const labelSize = 16;
const smallSize = 14;

/**
 * The picture of a session: one row a child, one column a look. With two observers, cells in which they agree are
 * pale and cells in which they differ are split in a dark frame; a ring where either has no mark.
 */
export function RoundSheet({ width, palette, label, rows, parts, legend }: Props) {
  const scope = useId();
  const columns = parts.map((part) => Math.max(0, ...part.cells.map((cells) => cells.length)));
  const layout = sheetLayout(width, rows, columns, labelSize);
  const { cell, pitch, rowPitch, head } = layout;
  const kinds = Math.max(0, ...parts.flatMap((part) => part.cells.flat().map(kindsIn)), ...legend.map(inKey));
  const numberEvery = pitch >= 26 ? 1 : 5;
  const flow = flowItems(
    legend.map((item) => item.label),
    width,
    { size: smallSize, lead: 26, gap: 24 },
  );
  const legendY = layout.height + 4;
  const height = Math.ceil(legendY + flow.lines * 28);
  const draw = { palette, scope };
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
      <Hatches scope={scope} palette={palette} kinds={kinds} />
      {layout.bands.map((band) => (
        <g key={band.y} transform={`translate(0 ${band.y})`}>
          {rows.map((row, r) => (
            <text
              // biome-ignore lint/suspicious/noArrayIndexKey: rows stand by place
              key={r}
              x={0}
              y={head + r * rowPitch + cell / 2}
              dominantBaseline="central"
              fontSize={labelSize}
              fill={palette.ink}
            >
              {row}
            </text>
          ))}
          {band.blocks.map(({ part, from, to, x }) => (
            <g key={`${part}-${from}`} transform={`translate(${x} 0)`}>
              <text x={0} y={14} fontSize={smallSize} fill={palette.ink2} fontWeight={600}>
                {parts[part]?.name}
              </text>
              {columnNumbers(from, to, numberEvery).map((n) => (
                <text
                  key={n}
                  x={(n - 1 - from) * pitch + cell / 2}
                  y={head - 10}
                  fontSize={smallSize - 1}
                  fill={palette.ink2}
                  textAnchor="middle"
                >
                  {n}
                </text>
              ))}
              <Cells
                rows={(parts[part]?.cells ?? []).map((cells) => cells.slice(from, to))}
                {...{ pitch, rowPitch, size: cell, top: head, ...draw }}
              />
            </g>
          ))}
        </g>
      ))}
      <g transform={`translate(0 ${legendY})`}>
        {legend.map(({ sign, label: text }, k) => {
          const place = flow.places[k] ?? { x: 0, line: 0 };
          return (
            <g key={text} transform={`translate(${place.x} ${place.line * 28})`}>
              <KeySign sign={sign} {...draw} />
              <text x={26} y={11} dominantBaseline="central" fontSize={smallSize} fill={palette.ink2}>
                {text}
              </text>
            </g>
          );
        })}
      </g>
    </svg>
  );
}

interface Drawing {
  readonly palette: Palette;
  readonly scope: string;
}

interface CellsProps extends Drawing {
  readonly rows: readonly (readonly SheetCell[])[];
  readonly pitch: number;
  readonly rowPitch: number;
  readonly top: number;
  readonly size: number;
}

function Cells({ rows, pitch, rowPitch, top, size, ...draw }: CellsProps) {
  const placed = rows.flatMap((cells, r) =>
    cells.map((one, c) => ({ one, x: c * pitch, y: top + r * rowPitch, key: `${r}-${c}` })),
  );
  return placed.map(({ key, ...place }) => <Cell key={key} {...place} size={size} {...draw} />);
}

function Cell({
  one,
  x,
  y,
  size,
  ...draw
}: Drawing & { readonly one: SheetCell; readonly x: number; readonly y: number; readonly size: number }) {
  const place = { x, y, size, ...draw };
  const [a, b] = [one.marks[0], one.second?.[0]];
  const body =
    one.second === undefined ? (
      <Mark marks={one.marks} {...place} />
    ) : one.differs === true ? (
      <SplitMark
        a={differing(one.marks, one.second) ?? { kind: 'none' }}
        b={differing(one.second, one.marks) ?? { kind: 'none' }}
        {...place}
      />
    ) : a?.kind === 'missing' || b?.kind === 'missing' ? (
      <Mark marks={[{ kind: 'missing' }]} {...place} />
    ) : (
      <Mark marks={one.marks} soft {...place} />
    );
  return (
    <>
      {body}
      {one.late === true && <circle cx={x + size / 2} cy={y - 3.6} r={2.2} fill={draw.palette.ink} />}
    </>
  );
}

/** Of several codes in one interval, the one that the other observer does not have. */
function differing(own: readonly CellMark[], other: readonly CellMark[]): CellMark | undefined {
  const name = (mark: CellMark): string => (mark.kind === 'off' ? `off${mark.nth}` : mark.kind);
  const theirs = new Set(other.map(name));
  return own.find((mark) => !theirs.has(name(mark))) ?? own[0];
}

function KeySign({ sign, ...draw }: Drawing & { readonly sign: KeyItem['sign'] }) {
  const place = { x: 2, y: 2, size: 18, ...draw };
  if (sign === 'late') return <circle cx={11} cy={11} r={2.4} fill={draw.palette.ink} />;
  if (sign === 'differs') return <SplitMark a={{ kind: 'on' }} b={{ kind: 'off', nth: 1 }} {...place} />;
  return <Mark marks={[sign]} {...place} />;
}

function columnNumbers(from: number, to: number, every: number): number[] {
  const all = Array.from({ length: to - from }, (_, k) => from + k + 1);
  return all
    .filter((n) => n === from + 1 || n % every === 0)
    .filter((n, k) => k !== 1 || n - from > 2 || every === 1);
}

const nthOf = (mark: CellMark): number => (mark.kind === 'off' ? mark.nth : 0);
const kindsIn = (cell: SheetCell): number =>
  Math.max(0, ...cell.marks.map(nthOf), ...(cell.second ?? []).map(nthOf));
const inKey = ({ sign }: KeyItem): number => (sign === 'differs' ? 1 : sign === 'late' ? 0 : nthOf(sign));
