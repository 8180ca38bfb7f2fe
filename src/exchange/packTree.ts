import { deflateSync, Inflate } from 'fflate';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { cardDictionary } from './cardDictionary.ts';
import { compactTree, expandTree, type Json } from './compactTree.ts';

/** Bytes that a card may have when unpacked: many times the largest visit, and no burden for a tablet. */
const most = 8e6;
const idBytes = 16;
const dictionary = new TextEncoder().encode(cardDictionary);

/**
 * A JSON value in few bytes: how many identifiers there are (2 bytes, big-endian), each of them in 16 bytes, then the
 * rest of the value as deflated text (RFC 1951, with a dictionary). `unpackTree` gives the same value back.
 */
export function packTree(value: unknown): Uint8Array {
  const { tree, ids } = compactTree(JSON.parse(canonicalJson(value)) as Json);
  const text = new TextEncoder().encode(JSON.stringify(tree));
  const rest = deflateSync(text, { level: 9, dictionary });
  const bytes = new Uint8Array(2 + ids.length * idBytes + rest.length);
  new DataView(bytes.buffer).setUint16(0, ids.length);
  for (const [i, id] of ids.entries()) bytes.set(bytesOf(id), 2 + i * idBytes);
  bytes.set(rest, 2 + ids.length * idBytes);
  return bytes;
}

/** The value of packed bytes; null when they are none. */
export function unpackTree(bytes: Uint8Array): { readonly value: unknown } | null {
  if (bytes.length < 2) return null;
  const count = new DataView(bytes.buffer, bytes.byteOffset).getUint16(0);
  const start = 2 + count * idBytes;
  if (bytes.length <= start) return null;
  const ids = Array.from({ length: count }, (_, i) =>
    idOf(bytes.subarray(2 + i * idBytes, 2 + (i + 1) * idBytes)),
  );
  const text = inflated(bytes.subarray(start));
  if (text === null) return null;
  try {
    return expandTree({ tree: JSON.parse(text) as Json, ids });
  } catch {
    return null;
  }
}

/** Piece by piece, so that a small card that unpacks without end is stopped. */
function inflated(bytes: Uint8Array): string | null {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  let text = '';
  let length = 0;
  let ended = false;
  const unpacking = new Inflate({ dictionary }, (chunk, last) => {
    length += chunk.length;
    text += decoder.decode(chunk, { stream: !last });
    ended ||= last;
  });
  try {
    for (let at = 0; at < bytes.length; at += 1024) {
      unpacking.push(bytes.subarray(at, at + 1024), at + 1024 >= bytes.length);
      if (length > most) return null;
    }
  } catch {
    return null;
  }
  return ended ? text : null;
}

function bytesOf(id: string): Uint8Array {
  const hex = id.replaceAll('-', '');
  return Uint8Array.from({ length: idBytes }, (_, i) => Number.parseInt(hex.slice(i * 2, i * 2 + 2), 16));
}

function idOf(bytes: Uint8Array): string {
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}
