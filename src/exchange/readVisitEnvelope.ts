import * as z from 'zod/mini';
import { visitEnvelope } from './envelope.ts';
import type { Envelope } from './migrations.ts';
import type { Refusal } from './openEnvelope.ts';
import { fault } from './problemValues.ts';
import type { ReadEnvelope } from './readStudyEnvelope.ts';
import { schemaFault } from './schemaFault.ts';

/** A visit file's content: one frozen schedule, nobody's marks. */
export function readVisitEnvelope(envelope: Envelope, intact: boolean): ReadEnvelope | Refusal {
  const issue = z.safeParse(visitEnvelope, envelope).error?.issues[0];
  if (issue !== undefined) return { ok: false, ...schemaFault(envelope, issue) };
  const { visit } = envelope as unknown as z.infer<typeof visitEnvelope>;
  const bundle = {
    study: null,
    classes: [],
    observers: [],
    protocols: [],
    sessions: [],
    visitPlans: [visit],
  };
  const notices = intact
    ? []
    : [{ path: '$.checksum', fault: fault('visit.checksum', { children: visit.children.length }) }];
  return { ok: true, bundle, notices };
}
