import { checksumOf } from './checksumOf.ts';
import { currentVersion, studyFormat } from './envelope.ts';
import type { Envelope } from './migrations.ts';
import type { Bundle, WriteOptions } from './types.ts';
import { packBytes } from './unpackBytes.ts';

/** The bytes of a study file (`.lookbell.json`), which loses nothing. The same bundle gives the same bytes. */
export function writeStudyFile(bundle: Bundle, options: WriteOptions): Promise<Uint8Array> {
  const { study, classes, observers, protocols, sessions, visitPlans } = bundle;
  const planned = visitPlans.length > 0 ? { visitPlans } : {};
  const content = { study, classes, observers, protocols, sessions, ...planned };
  return envelopeBytes(studyFormat, content, options);
}

/** Wraps content in the envelope that study and visit files share. */
export async function envelopeBytes(
  format: string,
  content: Envelope,
  { exportedAt, app, compress = false }: WriteOptions,
): Promise<Uint8Array> {
  const envelope = { format, version: currentVersion, exportedAt, app, ...content };
  const text = `${JSON.stringify({ ...envelope, checksum: await checksumOf(envelope) })}\n`;
  const bytes = new TextEncoder().encode(text);
  return compress ? packBytes(bytes) : bytes;
}
