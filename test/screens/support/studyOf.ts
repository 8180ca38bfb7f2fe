import type { EntryBody, KnownEntry } from '../../../src/journal/entry.ts';
import type { Result } from '../../../src/kernel/result.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import type { Services } from '../../../src/screens/services.ts';
import { commitImport, importFiles } from '../../../src/tasks/index.ts';
import { csvOf, type Row } from '../../analysis/sessionsFrom.ts';
import { headerOf, journalOf } from '../../support/session.ts';

export function must<T>(answer: Result<T>): T {
  if (!answer.ok) throw new Error(JSON.stringify(answer.problem));
  return answer.value;
}

/** A study that holds what an interval table says, and is the one that screens show. */
export async function studyOfTable(services: Services, rows: readonly Row[]): Promise<string> {
  const bytes = new TextEncoder().encode(csvOf(rows));
  const preview = must(await importFiles(services.deps, [{ name: 'table.csv', bytes }]));
  must(await commitImport(services.deps, preview));
  const study = must(await services.store.studies())[0]?.id ?? '';
  must(await services.store.saveSettings({ study }));
  return study;
}

type Said = readonly [number, EntryBody];

/** Keeps a session recorded on this tablet: three children, two rounds, every look on-task but those said otherwise. */
export async function keepRecorded(
  services: Services,
  changes: Partial<SessionHeader> & Pick<SessionHeader, 'id'>,
  said: Readonly<Record<number, 'off' | 'missed' | null>> = {},
  more: readonly Said[] = [],
): Promise<SessionHeader> {
  const header = headerOf({}, ['before'], changes);
  const looks = Array.from({ length: 6 }, (_, k): Said[] => {
    const interval = k + 1;
    const at = interval * 15_000;
    const what = said[interval];
    const cue: Said = [
      at,
      { kind: 'cued', interval, cue: 'look', planned: at, delivered: at + k, by: ['sound'] },
    ] as const;
    if (what === null) return [cue];
    return [
      cue,
      what === 'missed'
        ? [at + 800, { kind: 'missing', interval, reason: 'out of view' }]
        : [at + 800, { kind: 'marked', interval, code: what ?? 'on' }],
    ];
  }).flat();
  const journal: KnownEntry[] = journalOf(
    [0, { kind: 'started', checks: [], anyway: false }],
    [0, { kind: 'phaseStarted', phase: 'before', part: 0, origin: 0 }],
    ...looks,
    ...more,
    [105_000, { kind: 'ended', reason: 'complete' }],
  ).map((entry) => ({ ...entry, session: header.id, writer: services.deps.writer }));
  must(await services.store.createSession(header));
  must(await services.store.appendEntries(header.id, journal));
  return header;
}

/** The study of `headerOf`, with nothing in it yet. */
export async function emptyStudy(services: Services): Promise<void> {
  const revision = { counter: 0, writer: 'w' };
  must(
    await services.store.put({
      studies: [
        {
          previous: null,
          record: {
            id: 'study-1',
            name: 'Breaks',
            phases: ['before', 'after'],
            conditions: ['break', 'usual'],
            control: 'usual',
            lessonParts: [],
            criterion: { agreement: 0.8, kappa: 0.6 },
            safeguarding: '',
            pairings: [],
            demo: false,
            removed: false,
            revision,
          },
        },
      ],
    }),
  );
  must(await services.store.saveSettings({ study: 'study-1' }));
}
