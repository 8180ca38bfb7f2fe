import { gunzipSync, gzipSync } from 'fflate';
import { type Fault, fault } from './problemValues.ts';

const mostMegabytes = 512;

/** Takes gzip off where it is on; other bytes pass through. A zip is not one of our forms. */
export function unpackBytes(
  bytes: Uint8Array,
): { readonly ok: true; readonly bytes: Uint8Array } | { readonly ok: false; readonly fault: Fault } {
  const [first, second, third, fourth] = bytes;
  if (first === 0x50 && second === 0x4b && third === 3 && fourth === 4)
    return { ok: false, fault: fault('file.zip', {}) };
  if (first !== 0x1f || second !== 0x8b) return { ok: true, bytes };
  if (bytes.length < 18) return { ok: false, fault: fault('file.cutOffCompressed', {}) };
  // gzip says at its end how long the content is: what would not fit is refused before it is unpacked.
  const length = new DataView(bytes.buffer, bytes.byteOffset).getUint32(bytes.length - 4, true);
  if (length > mostMegabytes * 1e6 || length > bytes.length * 1100) {
    const megabytes = Math.round(length / 1e6);
    return megabytes > mostMegabytes
      ? { ok: false, fault: fault('file.tooLarge', { megabytes, most: mostMegabytes }) }
      : { ok: false, fault: fault('file.cutOffCompressed', {}) };
  }
  try {
    const unpacked = gunzipSync(bytes, { out: new Uint8Array(length) });
    return unpacked.length === length
      ? { ok: true, bytes: unpacked }
      : { ok: false, fault: fault('file.cutOffCompressed', {}) };
  } catch {
    return { ok: false, fault: fault('file.cutOffCompressed', {}) };
  }
}

/** gzip without a time stamp, so that the same content gives the same bytes. */
export function packBytes(bytes: Uint8Array): Uint8Array {
  return gzipSync(bytes, { level: 6, mtime: 0 });
}
