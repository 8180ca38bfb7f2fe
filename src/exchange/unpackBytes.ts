import { Gunzip, gzipSync } from 'fflate';
import { type Fault, fault } from './problemValues.ts';

/** Bytes that a file may have when unpacked. */
const most = 512e6;
const piece = 65_536;

/** Takes gzip off where it is on; other bytes pass through. A zip is not one of our forms. */
export function unpackBytes(
  bytes: Uint8Array,
): { readonly ok: true; readonly bytes: Uint8Array } | { readonly ok: false; readonly fault: Fault } {
  const [first, second, third, fourth] = bytes;
  if (first === 0x50 && second === 0x4b && third === 3 && fourth === 4)
    return { ok: false, fault: fault('file.zip', {}) };
  if (first !== 0x1f || second !== 0x8b) return { ok: true, bytes };
  if (bytes.length < 18) return { ok: false, fault: fault('file.cutOffCompressed', {}) };
  const chunks: Uint8Array[] = [];
  let length = 0;
  const unpacking = new Gunzip((chunk) => {
    length += chunk.length;
    chunks.push(chunk);
  });
  try {
    // Piece by piece, so that a small file that unpacks without end is stopped.
    for (let at = 0; at < bytes.length; at += piece) {
      unpacking.push(bytes.subarray(at, at + piece), at + piece >= bytes.length);
      if (length > most) return { ok: false, fault: fault('file.tooLarge', { most: most / 1e6 }) };
    }
  } catch {
    return { ok: false, fault: fault('file.cutOffCompressed', {}) };
  }
  // gzip ends by saying how long the content is (RFC 1952).
  const stated = new DataView(bytes.buffer, bytes.byteOffset).getUint32(bytes.length - 4, true);
  if (stated !== length) return { ok: false, fault: fault('file.cutOffCompressed', {}) };
  const whole = new Uint8Array(length);
  let at = 0;
  for (const chunk of chunks) {
    whole.set(chunk, at);
    at += chunk.length;
  }
  return { ok: true, bytes: whole };
}

/** gzip without a time stamp, so that the same content gives the same bytes. */
export function packBytes(bytes: Uint8Array): Uint8Array {
  return gzipSync(bytes, { level: 6, mtime: 0 });
}
