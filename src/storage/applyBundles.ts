import type { StoredSession } from '../journal/stored.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import type { Study } from '../model/study.ts';
import type { Join, StudyBundle } from '../tasks/ports.ts';
import { ChangedMeanwhile, type Core, changeRows } from './core.ts';
import { historyRow, recordRow } from './putEdits.ts';
import { type AnyRecord, openRecords, type RecordTypes, recordKey } from './records.ts';
import type {
  EntryRow,
  HeaderRow,
  HistoryRow,
  PackRow,
  RecordKind,
  RecordRow,
  RowReader,
  RowWriter,
  SessionRow,
} from './rows.ts';
import { factsOf } from './sessionFacts.ts';
import {
  headerRow,
  lookAtSession,
  openSession,
  packRow,
  type SessionRows,
  sessionRow,
  sessionTables,
} from './sessionRows.ts';

/** What is to be written, and the stamps at which what was read stood. */
interface Plan {
  readonly records: RecordRow[];
  readonly history: HistoryRow[];
  readonly sessions: SessionRow[];
  readonly headers: HeaderRow[];
  readonly packs: PackRow[];
  readonly gone: EntryRow[];
  readonly recordStamps: Map<string, string | undefined>;
  readonly sessionStamps: Map<string, string | undefined>;
}

interface Seen {
  readonly records: ReadonlyMap<string, RecordRow | undefined>;
  readonly sessions: ReadonlyMap<string, SessionRows>;
}

const kinds = [
  ['classroom', 'classes'],
  ['observer', 'observers'],
  ['protocol', 'protocols'],
] as const satisfies readonly (readonly [RecordKind, keyof StudyBundle])[];

/**
 * Joins bundles with what is kept, in one transaction. What the join leaves as it is, is not written: the same
 * bundle again changes nothing. States that lose are kept as history.
 */
export function applyBundles(
  core: Core,
  incoming: readonly StudyBundle[],
  join: Join,
  revive: ReadonlySet<string>,
): Promise<void> {
  const bundles = joinedByStudy(incoming, join);
  return changeRows(
    core,
    ['records', 'history', ...sessionTables],
    (rows) => look(rows, bundles),
    async (seen) => {
      const plan: Plan = {
        records: [],
        history: [],
        sessions: [],
        headers: [],
        packs: [],
        gone: [],
        recordStamps: new Map([...seen.records].map(([key, row]) => [key, row?.stamp])),
        sessionStamps: new Map([...seen.sessions].map(([id, rows]) => [id, rows.row?.stamp])),
      };
      for (const bundle of bundles)
        await planBundle(core, bundle, join, revive.has(bundle.study.id), seen, plan);
      const nothing = [plan.records, plan.history, plan.sessions].every((rows) => rows.length === 0);
      return nothing ? null : (rows) => carryOut(rows, plan);
    },
  );
}

/** One bundle a study. */
function joinedByStudy(bundles: readonly StudyBundle[], join: Join): StudyBundle[] {
  const byStudy = new Map<string, StudyBundle>();
  for (const bundle of bundles) {
    const before = byStudy.get(bundle.study.id);
    byStudy.set(bundle.study.id, before === undefined ? bundle : join(before, bundle));
  }
  return [...byStudy.values()];
}

async function look(rows: RowReader, bundles: readonly StudyBundle[]): Promise<Seen> {
  const records = new Map<string, RecordRow | undefined>();
  const sessions = new Map<string, SessionRows>();
  for (const bundle of bundles) {
    const keys = [
      recordKey('study', bundle.study),
      ...kinds.flatMap(([kind, member]) => bundle[member].map((record) => recordKey(kind, record))),
    ];
    const found = await rows.getMany('records', keys);
    for (const [i, key] of keys.entries()) records.set(key, found[i]);
    for (const { header } of bundle.sessions) sessions.set(header.id, await lookAtSession(rows, header.id));
  }
  return { records, sessions };
}

async function planBundle(
  core: Core,
  incoming: StudyBundle,
  join: Join,
  revived: boolean,
  seen: Seen,
  plan: Plan,
): Promise<void> {
  const rowOf = (kind: RecordKind, record: AnyRecord): RecordRow | undefined =>
    seen.records.get(recordKey(kind, record));
  const kept = async <K extends RecordKind>(kind: K, record: RecordTypes[K]): Promise<RecordTypes[K][]> => {
    const row = rowOf(kind, record);
    return row === undefined ? [] : openRecords(core, kind, [row]);
  };
  const [standing] = await kept('study', incoming.study);
  if (standing?.removed && !revived) return;
  const known: Study | undefined = standing?.removed ? undefined : standing;
  const keptSessions: StoredSession[] = [];
  for (const { header } of incoming.sessions) {
    const rows = seen.sessions.get(header.id);
    const session = rows === undefined ? null : await openSession(core, rows);
    if (session !== null) keptSessions.push(session);
  }
  const before: StudyBundle = {
    study: known ?? incoming.study,
    classes: (await Promise.all(incoming.classes.map((record) => kept('classroom', record)))).flat(),
    observers: (await Promise.all(incoming.observers.map((record) => kept('observer', record)))).flat(),
    protocols: (await Promise.all(incoming.protocols.map((record) => kept('protocol', record)))).flat(),
    sessions: keptSessions,
  };
  const after = join(before, incoming);

  const planRecords = async <K extends RecordKind>(
    kind: K,
    lists: {
      before: readonly RecordTypes[K][];
      incoming: readonly RecordTypes[K][];
      after: readonly RecordTypes[K][];
    },
  ): Promise<void> => {
    const texts = new Map(lists.before.map((record) => [recordKey(kind, record), canonicalJson(record)]));
    const winners = new Map(lists.after.map((record) => [recordKey(kind, record), canonicalJson(record)]));
    for (const record of lists.after)
      if (texts.get(recordKey(kind, record)) !== canonicalJson(record))
        plan.records.push(await recordRow(core, kind, record));
    for (const record of [...lists.before, ...lists.incoming]) {
      const winner = winners.get(recordKey(kind, record));
      if (winner !== undefined && winner !== canonicalJson(record))
        plan.history.push(await historyRow(core, kind, record));
    }
  };
  await planRecords('study', {
    before: known === undefined ? [] : [known],
    incoming: [incoming.study],
    after: [after.study],
  });
  await planRecords('classroom', {
    before: before.classes,
    incoming: incoming.classes,
    after: after.classes,
  });
  await planRecords('observer', {
    before: before.observers,
    incoming: incoming.observers,
    after: after.observers,
  });
  await planRecords('protocol', {
    before: before.protocols,
    incoming: incoming.protocols,
    after: after.protocols,
  });
  for (const session of after.sessions) {
    const old = keptSessions.find(({ header }) => header.id === session.header.id);
    await planSession(core, session, old, seen.sessions.get(session.header.id), plan);
  }
}

async function planSession(
  core: Core,
  session: StoredSession,
  old: StoredSession | undefined,
  rows: SessionRows | undefined,
  plan: Plan,
): Promise<void> {
  // A join is a union: a journal that has not grown has not changed.
  if (
    old?.journal.length === session.journal.length &&
    canonicalJson(old.header) === canonicalJson(session.header)
  )
    return;
  const local = rows?.row ?? { here: false, own: 0, handed: null };
  plan.headers.push(await headerRow(core, session.header));
  plan.packs.push(await packRow(core, session.header, session.journal));
  plan.sessions.push(await sessionRow(core, session.header, local, factsOf(session.journal)));
  plan.gone.push(...(rows?.entries ?? []));
}

async function carryOut(rows: RowWriter, plan: Plan): Promise<void> {
  await requireStamps('records', rows, plan.recordStamps, plan.records);
  await requireStamps('sessions', rows, plan.sessionStamps, plan.sessions);
  const history = await rows.getMany(
    'history',
    plan.history.map((row) => row.key),
  );
  await rows.put('records', plan.records);
  await rows.put(
    'history',
    plan.history.filter((_, i) => history[i] === undefined),
  );
  await rows.put('headers', plan.headers);
  await rows.put('packs', plan.packs);
  await rows.remove(
    'entries',
    plan.gone.map((row) => row.key),
  );
  await rows.put('sessions', plan.sessions);
}

async function requireStamps(
  table: 'records' | 'sessions',
  rows: RowWriter,
  stamps: ReadonlyMap<string, string | undefined>,
  written: readonly (RecordRow | SessionRow)[],
): Promise<void> {
  const own = new Map(written.map((row) => [row.key, row.stamp]));
  const keys = [...stamps.keys()];
  const found = await rows.getMany(table, keys);
  for (const [i, key] of keys.entries()) {
    const stamp = found[i]?.stamp;
    if (stamp !== stamps.get(key) && stamp !== own.get(key)) throw new ChangedMeanwhile();
  }
}
