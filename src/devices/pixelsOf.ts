/** A picture, 4 bytes a pixel, row by row from the top. */
export interface PictureData {
  readonly data: Uint8ClampedArray;
  readonly width: number;
  readonly height: number;
}

interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** The pixels of a picture file, made smaller where a side is longer than `edge`; null when it is no picture. */
export async function pixelsOf(picture: Blob, edge: number): Promise<PictureData | null> {
  let bitmap: ImageBitmap;
  try {
    bitmap = await createImageBitmap(picture);
  } catch {
    return null;
  }
  const { width, height } = bitmap;
  const pixels = drawn(bitmap, { x: 0, y: 0, width, height }, edge);
  bitmap.close();
  return pixels;
}

/** A part of a picture on white ground, since a picture may be see-through. */
export function drawn(picture: CanvasImageSource, from: Box, edge: number): PictureData | null {
  const scale = Math.min(1, edge / Math.max(from.width, from.height));
  const canvas = document.createElement('canvas');
  canvas.width = Math.max(1, Math.round(from.width * scale));
  canvas.height = Math.max(1, Math.round(from.height * scale));
  const context = canvas.getContext('2d', { willReadFrequently: true });
  if (context === null) return null;
  context.fillStyle = 'white';
  context.fillRect(0, 0, canvas.width, canvas.height);
  context.imageSmoothingQuality = 'high';
  context.drawImage(picture, from.x, from.y, from.width, from.height, 0, 0, canvas.width, canvas.height);
  return context.getImageData(0, 0, canvas.width, canvas.height);
}
