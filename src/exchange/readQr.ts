import jsQR from 'jsqr';

/** A picture, 4 bytes a pixel (red, green, blue, opacity), row by row from the top. */
export interface Pixels {
  readonly data: Uint8ClampedArray;
  readonly width: number;
  readonly height: number;
}

/** The text of the QR code in a picture; null where none is found. */
export function readQr({ data, width, height }: Pixels): string | null {
  const found = jsQR(data, width, height, { inversionAttempts: 'attemptBoth' });
  return found === null || found.data === '' ? null : found.data;
}
