import type { StoredSession } from '../journal/stored.ts';
import { say } from '../words/say.ts';
import type { Words } from '../words/words.ts';
import type { Gathered } from './gather.ts';

/** What the files say against one another. */
export interface Contradictions {
  readonly lines: readonly string[];
  readonly failed: boolean;
  /** The sessions that figures may be made of. */
  readonly sessions: readonly StoredSession[];
}

/**
 * A session that stands with different contents in two tables is left out: which of them counts must not be decided by
 * anything but people. A recorded session loses nothing by a contradiction (both contents are kept) and stays.
 */
export function contradictions({ merged, filesOf }: Gathered, words: Words): Contradictions {
  const { batch, problems } = words;
  const lines = new Map<string, string>();
  const leftOut = new Set<string>();
  const notes: string[] = [];
  for (const [i, notice] of merged.notices.entries()) {
    // The first notices are those of the conflicts, in their order.
    const conflict = merged.conflicts[i];
    const sentence = say(problems, notice);
    if (conflict === undefined || conflict.kind === 'record') {
      notes.push(batch.general({ sentence }));
      continue;
    }
    if (lines.has(conflict.session)) continue;
    const files = filesOf.get(conflict.session) ?? [];
    const stored = merged.bundle.sessions.find(({ header }) => header.id === conflict.session);
    const table = stored?.header.schedule.kind === 'listed';
    if (table) leftOut.add(conflict.session);
    const session = stored?.header.sessionLabel ?? conflict.session;
    const told = table ? batch.contradicted({ session, files: files.join(', ') }) : sentence;
    lines.set(conflict.session, batch.atFile({ file: files[0] ?? session, sentence: told }));
  }
  const severalStudies = merged.notices.length > merged.conflicts.length;
  return {
    lines: [...lines.values(), ...notes],
    failed: lines.size > 0 || severalStudies,
    sessions: merged.bundle.sessions.filter(({ header }) => !leftOut.has(header.id)),
  };
}
