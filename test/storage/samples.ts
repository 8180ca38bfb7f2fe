import type { EntryBody, KnownEntry } from '../../src/journal/entry.ts';
import { unionOfJournals } from '../../src/journal/union.ts';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import type { Classroom } from '../../src/model/classroom.ts';
import { compareRevisions } from '../../src/model/revision.ts';
import type { Study } from '../../src/model/study.ts';
import type { Join, StudyBundle } from '../../src/tasks/ports.ts';
import { headerOf, journalOf as written } from '../support/session.ts';

export const revision = (counter: number, writer = 'tablet-a') => ({ counter, writer });

export function studyOf(changes: Partial<Study> = {}): Study {
  return {
    id: 'study-1',
    name: 'Hedge school',
    phases: ['before', 'after'],
    conditions: ['break', 'usual'],
    control: 'usual',
    lessonParts: ['whole class'],
    criterion: { agreement: 0.85, kappa: 0.6 },
    safeguarding: '',
    pairings: [],
    demo: false,
    removed: false,
    revision: revision(0),
    ...changes,
  };
}

export function classOf(changes: Partial<Classroom> = {}): Classroom {
  return {
    id: 'class-1',
    study: 'study-1',
    name: 'Class Otter',
    condition: 'break',
    children: [{ id: 'c1', pseudonym: 'Otter-01', stratum: null, removed: false }],
    plan: null,
    draw: null,
    removed: false,
    revision: revision(0),
    ...changes,
  };
}

/** `started`, one mark an interval, and `ended` when asked for. */
export function journalOf(session: string, marks: number, ended: boolean, writer = 'run-1'): KnownEntry[] {
  const bodies: [number, EntryBody][] = [
    [0, { kind: 'started', checks: [], anyway: false }],
    ...Array.from({ length: marks }, (_, i): [number, EntryBody] => [
      15_000 * (i + 1),
      { kind: 'marked', interval: i + 1, code: 'on' },
    ]),
  ];
  if (ended) bodies.push([15_000 * (marks + 1), { kind: 'ended', reason: 'complete' }]);
  return written(...bodies).map((entry) => ({ ...entry, session, writer }));
}

export function bundleOf(changes: Partial<StudyBundle> = {}): StudyBundle {
  return {
    study: studyOf(),
    classes: [classOf()],
    observers: [],
    protocols: [],
    sessions: [{ header: headerOf(), journal: journalOf('session-1', 3, true) }],
    ...changes,
  };
}

/** The plainest join there is: higher revision, union of journals. The one of the app is tested with the tasks. */
export const plainJoin: Join = (kept, incoming) => {
  const best = <R extends { id: string; version?: number; revision: { counter: number; writer: string } }>(
    records: readonly R[],
  ): R[] => {
    const byKey = new Map<string, R>();
    for (const record of records) {
      const key = `${record.id} ${record.version ?? 0}`;
      const other = byKey.get(key);
      const order =
        other === undefined
          ? 1
          : compareRevisions(record.revision, other.revision) ||
            (canonicalJson(record) > canonicalJson(other) ? 1 : -1);
      if (order > 0) byKey.set(key, record);
    }
    return [...byKey.values()];
  };
  const sessions = new Map<string, StudyBundle['sessions'][number]>();
  for (const session of [...kept.sessions, ...incoming.sessions]) {
    const other = sessions.get(session.header.id);
    const journal = unionOfJournals(session.journal, other?.journal ?? []).entries;
    sessions.set(session.header.id, { header: (other ?? session).header, journal });
  }
  return {
    study: best([kept.study, incoming.study])[0] ?? kept.study,
    classes: best([...kept.classes, ...incoming.classes]),
    observers: best([...kept.observers, ...incoming.observers]),
    protocols: best([...kept.protocols, ...incoming.protocols]),
    sessions: [...sessions.values()],
  };
};

/** The value of a result that must be there. */
export function given<T>(result: { ok: true; value: T } | { ok: false; problem: { code: string } }): T {
  if (!result.ok) throw new Error(`unexpected problem ${result.problem.code}`);
  return result.value;
}

export function codeOf(result: { ok: true } | { ok: false; problem: { code: string } }): string {
  return result.ok ? 'ok' : result.problem.code;
}
