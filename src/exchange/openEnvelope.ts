import * as z from 'zod/mini';
import { checksumOf } from './checksumOf.ts';
import { currentVersion, studyFormat, visitFormat } from './envelope.ts';
import { type Envelope, migrate } from './migrations.ts';
import { excerpt, type Fault, fault } from './problemValues.ts';
import { schemaFault } from './schemaFault.ts';

export interface Refusal {
  readonly ok: false;
  readonly path: string;
  readonly fault: Fault;
}

export interface OpenedEnvelope {
  readonly ok: true;
  readonly form: 'study' | 'visit';
  /** Of the current version. */
  readonly envelope: Envelope;
  /** Whether the content is still what it was when the file was written. */
  readonly intact: boolean;
}

const versionNumber = z.object({ version: z.int().check(z.minimum(1)) });

/** Tells which form a JSON document is, refuses a newer version, brings an older one forward, compares the checksum. */
export async function openEnvelope(document: unknown): Promise<OpenedEnvelope | Refusal> {
  const isObject = document !== null && typeof document === 'object' && !Array.isArray(document);
  const envelope = (isObject ? document : {}) as Envelope;
  const form = envelope.format === studyFormat ? 'study' : envelope.format === visitFormat ? 'visit' : null;
  if (isObject && envelope.format === undefined) {
    const detail = `${studyFormat}, ${visitFormat}`;
    return {
      ok: false,
      path: '$.format',
      fault: fault('json.absent', { path: '$.format', expected: 'oneOf', detail }),
    };
  }
  if (form === null) {
    const found = isObject
      ? excerpt(JSON.stringify(envelope.format ?? null))
      : Array.isArray(document)
        ? '[…]'
        : excerpt(String(document));
    return { ok: false, path: isObject ? '$.format' : '$', fault: fault('json.otherForm', { found }) };
  }
  const stated = z.safeParse(versionNumber, envelope);
  if (!stated.success) {
    const [issue] = stated.error.issues;
    if (issue !== undefined) return { ok: false, ...schemaFault(envelope, issue) };
    return { ok: false, path: '$.version', fault: fault('json.otherForm', { found: '' }) };
  }
  const { version } = stated.data;
  if (version > currentVersion)
    return { ok: false, path: '$.version', fault: fault('json.newer', { version, known: currentVersion }) };
  const intact = envelope.checksum === (await checksumOf(envelope));
  return { ok: true, form, envelope: migrate(envelope, version, currentVersion), intact };
}
