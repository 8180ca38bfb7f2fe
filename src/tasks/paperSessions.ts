import type { KnownEntry } from '../journal/entry.ts';
import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { epochMs, type SessionMs } from '../kernel/units.ts';
import { dateOf } from '../kernel/wallTime.ts';
import { offsetOf, wallIn } from '../kernel/zoneTime.ts';
import type { SessionHeader } from '../model/session.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { sheetLabel, tidyLabel } from '../schedule/sheetLabel.ts';
import { requireStudy } from './edits.ts';
import { headerOfVisit } from './headerOfVisit.ts';
import type { PaperDraft } from './paperDraft.ts';
import { type PaperJournal, paperJournal } from './paperJournal.ts';
import type { Deps } from './ports.ts';

/** So many printed schedules are kept, the newest ones. */
const sheetsKept = 24;

/** Keeps the schedule of a sheet that goes to the printer: the sheet finds it again when it is typed in. */
export async function keepSheet({ store }: Deps, plan: VisitPlan): Promise<Result<null>> {
  const settings = await store.settings();
  if (!settings.ok) return settings;
  const label = sheetLabel(plan);
  const others = settings.value.sheets.filter((one) => sheetLabel(one) !== label);
  return store.saveSettings({ sheets: [plan, ...others].slice(0, sheetsKept) });
}

/** The schedule of a recorded session, as it was prepared: for printing it again, and for a second record on paper. */
export async function visitOfSession(deps: Deps, session: string): Promise<Result<VisitPlan>> {
  const stored = await deps.store.readSession(session);
  if (!stored.ok) return stored;
  if (stored.value === null) return problem('task.noSession', { id: session });
  const { header } = stored.value;
  const { schedule } = header;
  if (schedule.kind !== 'laid') return problem('paper.noSchedule');
  const study = await requireStudy(deps, header.study);
  if (!study.ok) return study;
  const { id, name, phases, conditions, lessonParts } = study.value;
  return ok({
    visit: header.visit,
    study: { id, name, phases, conditions, lessonParts },
    classroom: header.classroom,
    condition: header.condition,
    plannedStart: header.plannedStart,
    children: header.children,
    ...(header.reserves === undefined ? {} : { reserves: header.reserves }),
    plan: header.plan,
    draw: header.draw,
    orderSeed: header.orderSeed,
    schedule,
  });
}

/** The schedule whose label somebody read off a sheet: prepared, printed or recorded on this tablet. */
export async function findSheet(deps: Deps, study: string, typed: string): Promise<Result<VisitPlan>> {
  const label = tidyLabel(typed);
  const settings = await deps.store.settings();
  if (!settings.ok) return settings;
  const { prepared, sheets } = settings.value;
  const near = [...(prepared === null ? [] : [prepared]), ...sheets].find(
    (plan) => sheetLabel(plan) === label,
  );
  if (near !== undefined) return ok(near);
  const sessions = await deps.store.listSessions(study);
  if (!sessions.ok) return sessions;
  const visits = new Map(
    sessions.value.filter(({ protocol }) => protocol !== null).map((one) => [one.visit, one.id]),
  );
  for (const id of visits.values()) {
    const plan = await visitOfSession(deps, id);
    if (plan.ok && sheetLabel(plan.value) === label) return plan;
  }
  return problem('paper.noLabel', { label });
}

/** Begins to type a sheet in. One sheet at a time: what was typed of another one is replaced. */
export async function beginPaper(deps: Deps, plan: VisitPlan): Promise<Result<PaperDraft>> {
  const sessions = await deps.store.listSessions(plan.study.id);
  if (!sessions.ok) return sessions;
  const beside = sessions.value.filter(
    ({ visit, practice, familiarisation }) => visit === plan.visit && !practice && familiarisation !== true,
  );
  const first = beside.find(({ date }) => date !== null);
  const draft: PaperDraft = {
    session: newId(deps.random),
    writer: newId(deps.random),
    plan,
    observer: null,
    role: beside.length === 0 ? null : beside.some(({ role }) => role === 'second') ? 'primary' : 'second',
    practice: false,
    date: first?.date ?? dateOf(deps.clock.wall()),
    start: first?.firstWall?.slice(11, 19) ?? plan.plannedStart?.slice(11, 16) ?? '',
    parts: plan.schedule.phases.slice(1).map(() => ({ breakStarted: '', firstTask: '' })),
    stoppedAfter: null,
    stoppedAt: null,
    answers: {},
    onsets: [],
  };
  const kept = await savePaper(deps, draft);
  return kept.ok ? ok(draft) : kept;
}

/** Keeps the sheet as far as it is typed; null puts it away. */
export function savePaper({ store }: Deps, draft: PaperDraft | null): Promise<Result<null>> {
  return store.saveSettings({ paper: draft });
}

/** What the sheet would become, or the first thing about it that cannot be. */
export function readPaper(deps: Deps, draft: PaperDraft): Result<PaperJournal> {
  const wall = deps.clock.wall();
  return paperJournal(draft, { timeZone: deps.timeZone, offset: offsetOf(wall), today: dateOf(wall) });
}

/** Turns the typed sheet into a session that is marked as from paper, and forgets what was typed. */
export async function keepPaperSession(deps: Deps, draft: PaperDraft): Promise<Result<SessionHeader>> {
  const { store } = deps;
  const { plan } = draft;
  if (draft.observer === null) return problem('paper.noObserver');
  const journal = readPaper(deps, draft);
  if (!journal.ok) return journal;
  const made = await headerOfVisit(deps, plan, {
    id: draft.session,
    observer: draft.observer,
    role: draft.role,
    practice: draft.practice,
    familiarisation: draft.familiarisation,
    date: draft.date,
    fromPaper: true,
  });
  if (!made.ok) return made;
  const header = made.value;
  const created = await store.createSession(header);
  if (!created.ok)
    return (await isEmptyShell(deps, created.problem.code, header.id))
      ? keepPaperSession(deps, { ...draft, session: newId(deps.random), writer: newId(deps.random) })
      : created;
  const appended = await store.appendEntries(header.id, entriesOf(deps, draft, journal.value));
  if (!appended.ok) return appended;
  const packed = await store.pack(header.id);
  if (!packed.ok) return packed;
  const settings = await store.settings();
  const prepared = settings.ok && settings.value.prepared?.visit === plan.visit;
  const done = await store.saveSettings({ paper: null, ...(prepared ? { prepared: null } : {}) });
  return done.ok ? ok(header) : done;
}

/** Each entry with the wall time of what it tells of; nobody knows when a pencil moved. */
function entriesOf(deps: Deps, { session, writer }: PaperDraft, { start, said }: PaperJournal): KnownEntry[] {
  const fallback = offsetOf(deps.clock.wall());
  return said.map(({ at, body }, seq) => {
    const wall = wallIn(epochMs(start + at), deps.timeZone, fallback);
    return { session, writer, seq, at: at as SessionMs, wall, ...body } as KnownEntry;
  });
}

/** True where an earlier try kept the header and no entry, and the sheet's head was changed since: it takes another id. */
async function isEmptyShell({ store }: Deps, code: string, session: string): Promise<boolean> {
  if (code !== 'store.sessionExists') return false;
  const found = await store.session(session);
  return found.ok && found.value?.entries === 0;
}
