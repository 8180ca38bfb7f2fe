import type { QrMatrix } from '../../src/exchange/qrMatrix.ts';
import type { Pixels } from '../../src/exchange/readQr.ts';

/** A QR code as pixels, sharp, with its light edge. */
export function codePixels({ size, dark }: QrMatrix, scale = 4): Pixels {
  const side = (size + 8) * scale;
  const data = new Uint8ClampedArray(side * side * 4).fill(255);
  for (let y = 0; y < side; y++)
    for (let x = 0; x < side; x++) {
      const [row, column] = [Math.floor(y / scale) - 4, Math.floor(x / scale) - 4];
      const inside = row >= 0 && column >= 0 && row < size && column < size;
      if (inside && dark[row * size + column]) data.set([0, 0, 0], (y * side + x) * 4);
    }
  return { data, width: side, height: side };
}

/** A wall. */
export function noCode(): Pixels {
  return { data: new Uint8ClampedArray(100 * 100 * 4).fill(220), width: 100, height: 100 };
}
