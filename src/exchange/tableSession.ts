import type { KnownEntry } from '../journal/entry.ts';
import type { StoredSession } from '../journal/stored.ts';
import { byCodePoint } from '../kernel/compare.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import type { Id } from '../kernel/ids.ts';
import { sessionMs } from '../kernel/units.ts';
import { dateOf } from '../kernel/wallTime.ts';
import type { SessionChild, SessionHeader } from '../model/session.ts';
import { codesOfSession, type SessionCodes } from './codeRoles.ts';
import type { SessionRows } from './groupRows.ts';
import type { TableRow } from './readTableRow.ts';
import type { TableIds } from './tableIds.ts';
import type { ReadOptions } from './types.ts';
import { wallClockOf } from './wallClockOf.ts';

/** Milliseconds from seconds, exact to the microsecond that a table may give. */
const ms = (seconds: number | null): number | null =>
  seconds === null ? null : Math.round(seconds * 1e6) / 1000;

/** An entry before it is known who wrote it and in which place. */
type Saying = KnownEntry extends infer Entry
  ? Entry extends KnownEntry
    ? Omit<Entry, 'session' | 'writer' | 'seq' | 'wall'>
    : never
  : never;

/**
 * The rows of one session as a header and a journal that reads out to just these rows, in whatever order they stood.
 * `at` is `start_s` where given, else 0 (a table without times says nothing of when); `wall` is counted from
 * `start`, else from the date's midnight, else from 1970, all of which measure nothing.
 */
export function tableSession(
  { first, rows }: SessionRows,
  ids: TableIds,
  options: ReadOptions,
): StoredSession {
  const ordered = [...rows].sort(
    (a, b) => a.interval - b.interval || byCodePoint(a.child ?? '', b.child ?? ''),
  );
  const children = new Map<string, SessionChild>();
  for (const { child } of ordered) {
    if (child !== null && !children.has(child))
      children.set(child, { id: ids.child(first, child), pseudonym: child, stratum: null });
  }
  const codes = codesOfSession(new Set(ordered.flatMap(({ labels }) => labels)), options);
  const childOf = (row: TableRow): Id | null => children.get(row.child ?? '')?.id ?? null;
  const id = ids.session(first, ordered);
  const header: SessionHeader = {
    id,
    study: ids.study(first),
    classroom: { id: ids.classroom(first), name: first.class ?? '' },
    condition: first.condition,
    visit: ids.visit(first, id),
    visitLabel: first.visit,
    sessionLabel: first.session,
    ...(first.study === null ? {} : { studyLabel: first.study }),
    observer: { id: ids.observer(first), name: first.observer },
    role: first.role,
    practice: false,
    date: first.date ?? (first.start === null ? null : dateOf(first.start)),
    plannedStart: first.start,
    children: [...children.values()],
    plan: null,
    draw: null,
    orderSeed: null,
    schedule: {
      kind: 'listed',
      method: first.method,
      intervalMs: ms(first.interval_s),
      observeMs: ms(first.observe_s),
      codeSet: codes.codeSet,
      intervals: ordered.map((row) => ({
        number: row.interval,
        child: childOf(row),
        phase: row.phase,
        lessonPart: row.lesson_part,
        round: row.round,
        startMs: ms(row.start_s),
        endMs: ms(row.end_s),
        minutesFromBreak: row.minutes_from_break,
      })),
    },
    app: '',
    device: '',
    timeZone: null,
  };
  return { header, journal: journalOf(header, ordered, codes, options) };
}

function journalOf(
  header: SessionHeader,
  rows: readonly TableRow[],
  codes: SessionCodes,
  options: ReadOptions,
): KnownEntry[] {
  const writer = idFromContent('writer', header.id);
  const wall = wallClockOf(header);
  const journal: KnownEntry[] = [];
  const say = (saying: Saying): void => {
    const seq = journal.length;
    journal.push({ session: header.id, writer, seq, wall: wall(saying.at), ...saying } as KnownEntry);
  };
  const sharing = new Map<number, number>();
  for (const { interval } of rows) sharing.set(interval, (sharing.get(interval) ?? 0) + 1);
  const idOfChild = new Map(header.children.map(({ id, pseudonym }) => [pseudonym, id]));
  let end = 0;
  say({ kind: 'started', at: 0, checks: [], anyway: false });
  for (const row of rows) {
    const at = sessionMs(ms(row.start_s) ?? 0);
    end = Math.max(
      end,
      at,
      Math.ceil(ms(row.end_s) ?? at + (row.start_s === null ? 0 : (ms(row.interval_s) ?? 0))),
    );
    const child = idOfChild.get(row.child ?? '');
    const whose = child !== undefined && (sharing.get(row.interval) ?? 0) > 1 ? { child } : {};
    const about = { interval: row.interval, ...whose, at };
    const mark = { writer, seq: journal.length };
    if (row.missing !== null) say({ kind: 'missing', ...about, reason: row.missing });
    else if (row.on_count !== null && row.present_count !== null)
      say({ kind: 'marked', ...about, code: null, counts: { on: row.on_count, present: row.present_count } });
    else if (row.labels.length === 0) say({ kind: 'marked', ...about, code: null });
    else
      for (const label of row.labels) say({ kind: 'marked', ...about, code: codes.idOf.get(label) ?? label });
    for (const [i, text] of row.kept.entries())
      if (text !== '')
        say({
          kind: 'noted',
          at,
          text: `${options.keepColumns?.[i] ?? ''}: ${text}`.slice(0, 10_000),
          about: mark,
        });
  }
  say({ kind: 'ended', at: end, reason: 'complete' });
  return journal;
}
