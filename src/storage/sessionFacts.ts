import type { JournalEntry } from '../journal/entry.ts';
import { recordingFacts } from '../journal/headerFacts.ts';
import { inOrder } from '../journal/order.ts';
import { epochOf } from '../kernel/wallTime.ts';
import type { SessionHeader } from '../model/session.ts';
import type { SessionSummary } from '../tasks/ports.ts';
import type { SessionRow } from './rows.ts';

/** What a row says of its journal, kept up to date entry by entry. */
export type JournalFacts = Pick<SessionRow, 'entries' | 'firstWall' | 'lastWall' | 'ended' | 'endedBy'>;

export const noFacts: JournalFacts = {
  entries: 0,
  firstWall: null,
  lastWall: null,
  ended: null,
  endedBy: null,
};

/** The facts alone, out of a row. */
export function factsIn({ entries, firstWall, lastWall, ended, endedBy }: JournalFacts): JournalFacts {
  return { entries, firstWall, lastWall, ended, endedBy };
}

const earlier = (a: string | null, b: string): string => (a === null || epochOf(b) < epochOf(a) ? b : a);
const later = (a: string | null, b: string): string => (a === null || epochOf(b) > epochOf(a) ? b : a);

/** The facts after some more entries. An undo of `ended` opens the session again. */
export function factsAfter(facts: JournalFacts, entries: readonly JournalEntry[]): JournalFacts {
  let { firstWall, lastWall, ended, endedBy } = facts;
  for (const entry of entries) {
    firstWall = earlier(firstWall, entry.wall);
    lastWall = later(lastWall, entry.wall);
    if (entry.kind === 'ended') {
      ended = entry.reason === 'early' ? 'early' : 'complete';
      endedBy = { writer: entry.writer, seq: entry.seq };
    } else if (entry.kind === 'withdrawn' && endedBy !== null) {
      const target = entry.target as { writer: string; seq: number };
      if (target.writer === endedBy.writer && target.seq === endedBy.seq) [ended, endedBy] = [null, null];
    }
  }
  return { entries: facts.entries + entries.length, firstWall, lastWall, ended, endedBy };
}

/** The facts of a whole journal. */
export const factsOf = (journal: readonly JournalEntry[]): JournalFacts =>
  factsAfter(noFacts, inOrder(journal));

/** The part of a summary that the header gives; it names people, so it is sealed. */
export type HeaderFacts = Omit<
  SessionSummary,
  'entries' | 'firstWall' | 'lastWall' | 'ended' | 'here' | 'own' | 'handedOver'
>;

export function headerFactsOf(header: SessionHeader): HeaderFacts {
  const { method, phases } = recordingFacts(header);
  const { schedule } = header;
  return {
    id: header.id,
    study: header.study,
    classroom: { id: header.classroom.id, name: header.classroom.name },
    condition: header.condition,
    visit: header.visit,
    visitLabel: header.visitLabel,
    observer: { id: header.observer.id, name: header.observer.name },
    role: header.role,
    practice: header.practice,
    ...(header.familiarisation === true ? { familiarisation: true } : {}),
    ...(header.fromPaper === true ? { fromPaper: true } : {}),
    date: header.date,
    plannedStart: header.plannedStart,
    method,
    protocol:
      schedule.kind === 'laid'
        ? { id: schedule.protocol.id, version: schedule.protocol.version, name: schedule.protocol.name }
        : null,
    phases,
    children: header.children.length,
  };
}
