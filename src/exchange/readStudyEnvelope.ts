import * as z from 'zod/mini';
import { type JournalEntry, knownEntry } from '../journal/entry.ts';
import { isKnownKind } from '../journal/known.ts';
import { checkStudy } from './checkStudy.ts';
import { studyFrame, unknownEntry } from './envelope.ts';
import type { Envelope } from './migrations.ts';
import type { Refusal } from './openEnvelope.ts';
import { type Fault, fault } from './problemValues.ts';
import { schemaFault } from './schemaFault.ts';
import type { Bundle } from './types.ts';

export interface ReadEnvelope {
  readonly ok: true;
  readonly bundle: Bundle;
  readonly notices: { readonly path: string | null; readonly fault: Fault }[];
}

/**
 * A study file's content, looked at by schema and then by reference. What comes back is what stood there, with
 * members that a newer program may have added: they are passed on.
 */
export function readStudyEnvelope(envelope: Envelope, intact: boolean): ReadEnvelope | Refusal {
  const frame = z.safeParse(studyFrame, envelope);
  const issue = frame.error?.issues[0];
  if (issue !== undefined) return { ok: false, ...schemaFault(envelope, issue) };
  const content = envelope as unknown as z.infer<typeof studyFrame>;
  const kinds = new Map<string, number>();
  for (const [s, { journal }] of content.sessions.entries()) {
    for (const [e, entry] of journal.entries()) {
      const kind = (entry as Partial<JournalEntry> | null)?.kind;
      const known = typeof kind !== 'string' || isKnownKind(kind);
      if (!known) kinds.set(kind, (kinds.get(kind) ?? 0) + 1);
      const wrong = z.safeParse(known ? knownEntry : unknownEntry, entry).error?.issues[0];
      if (wrong !== undefined)
        return { ok: false, ...schemaFault(entry, wrong, ['sessions', s, 'journal', e]) };
    }
  }
  const { study, classes, observers, protocols, visitPlans = [] } = content;
  const sessions = content.sessions as unknown as Bundle['sessions'];
  const bundle: Bundle = { study, classes, observers, protocols, sessions, visitPlans };
  const checked = checkStudy(bundle);
  if (!checked.ok) return checked;
  const notices = [...checked.notices];
  if (!intact) {
    const entries = sessions.reduce((n, session) => n + session.journal.length, 0);
    const values = { classes: classes.length, sessions: sessions.length, entries };
    notices.unshift({ path: '$.checksum', fault: fault('study.checksum', values) });
  }
  if (kinds.size > 0) {
    const n = [...kinds.values()].reduce((sum, count) => sum + count, 0);
    notices.push({
      path: null,
      fault: fault('study.newKinds', { kinds: [...kinds.keys()].sort().join(', '), n }),
    });
  }
  return { ok: true, bundle, notices };
}
