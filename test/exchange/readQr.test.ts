import { expect, it } from 'vitest';
import { type QrMatrix, qrMatrix } from '../../src/exchange/qrMatrix.ts';
import { type Pixels, readQr } from '../../src/exchange/readQr.ts';
import { type Random, seededRandom } from '../../src/kernel/random.ts';

/** The longest part that is written: 99 groups of eight characters and a head. */
const text = `LB1.ABCDEFGH.12.34.${'LOOKBELL'.repeat(99)}.`;
const matrix = qrMatrix(text);

interface Taken {
  /** Pixels a module. */
  readonly scale: number;
  readonly turned?: number;
  /** Grey levels by which a pixel may be off. */
  readonly noise?: number;
  readonly dark?: number;
  readonly light?: number;
}

/** The code as a camera may see it: somewhere in a larger picture, turned, grey and grainy; each pixel averages nine places. */
function taken(
  { size, dark: modules }: QrMatrix,
  { scale, turned = 0, noise = 0, dark = 0, light = 255 }: Taken,
): Pixels {
  const random: Random = seededRandom('grain');
  const side = Math.ceil((size + 8) * scale * 1.5);
  const data = new Uint8ClampedArray(side * side * 4).fill(255);
  const [cos, sin] = [Math.cos((turned * Math.PI) / 180) / scale, Math.sin((turned * Math.PI) / 180) / scale];
  const at = (x: number, y: number): number => {
    const [dx, dy] = [x - side / 2, y - side / 2];
    const column = Math.floor(dx * cos + dy * sin + size / 2);
    const row = Math.floor(dy * cos - dx * sin + size / 2);
    const inside = row >= 0 && column >= 0 && row < size && column < size;
    return inside && modules[row * size + column] ? dark : light;
  };
  for (let y = 0; y < side; y++)
    for (let x = 0; x < side; x++) {
      let sum = 0;
      for (const a of [1 / 6, 1 / 2, 5 / 6]) for (const b of [1 / 6, 1 / 2, 5 / 6]) sum += at(x + a, y + b);
      const grey = sum / 9 + (random() - 0.5) * 2 * noise;
      data.set([grey, grey, grey], (y * side + x) * 4);
    }
  return { data, width: side, height: side };
}

it('draws version 18, which is the largest that is used', () => {
  expect(matrix.size).toBe(89);
});

it.each<[string, Taken]>([
  ['sharp and large', { scale: 8 }],
  ['at three pixels a module', { scale: 3 }],
  ['at an uneven size', { scale: 4.3 }],
  ['turned a little', { scale: 5, turned: 4 }],
  ['held across', { scale: 5, turned: 90 }],
  ['grainy and grey', { scale: 5, turned: -3, noise: 10, dark: 60, light: 190 }],
  ['light on dark', { scale: 5, dark: 240, light: 20 }],
])('reads what was drawn: %s', (_, how) => {
  expect(readQr(taken(matrix, how))).toBe(text);
});

it('finds nothing where there is no code', () => {
  const data = new Uint8ClampedArray(200 * 100 * 4).fill(200);
  expect(readQr({ data, width: 200, height: 100 })).toBeNull();
});

it('reads short texts too', () => {
  expect(readQr(taken(qrMatrix('LB1.A.1.1.MY.'), { scale: 6 }))).toBe('LB1.A.1.1.MY.');
});
