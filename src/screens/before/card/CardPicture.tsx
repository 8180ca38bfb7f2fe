import type { QrMatrix } from '../../../tasks/showCard.ts';

/** The light edge that a QR code needs, in modules (ISO/IEC 18004). */
const quiet = 4;

/** A QR code, dark on light in every theme: that is what cameras expect. */
export function CardPicture({ matrix, label }: { readonly matrix: QrMatrix; readonly label: string }) {
  const side = matrix.size + 2 * quiet;
  return (
    <svg
      className="card-picture"
      viewBox={`0 0 ${side} ${side}`}
      role="img"
      aria-label={label}
      shapeRendering="crispEdges"
    >
      <rect className="card-ground" width={side} height={side} />
      <path className="card-modules" d={runsOf(matrix)} />
    </svg>
  );
}

/** The dark modules, each run of a row as one bar. */
function runsOf({ size, dark }: QrMatrix): string {
  let path = '';
  for (let row = 0; row < size; row++) {
    let column = 0;
    while (column < size) {
      const from = column;
      while (column < size && dark[row * size + column]) column++;
      const length = column - from;
      if (length > 0) path += `M${from + quiet} ${row + quiet}h${length}v1h-${length}z`;
      else column++;
    }
  }
  return path;
}
