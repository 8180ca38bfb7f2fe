import { canonicalJson } from '../kernel/canonicalJson.ts';

/** SHA-256 (FIPS 180-4), in hexadecimal, of the canonical JSON of an envelope without its own checksum. */
export async function checksumOf(envelope: Readonly<Record<string, unknown>>): Promise<string> {
  const bytes = new TextEncoder().encode(canonicalJson({ ...envelope, checksum: undefined }));
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
