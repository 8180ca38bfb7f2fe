import { expect, it } from 'vitest';
import { visitPlan } from '../../src/model/visitPlan.ts';
import {
  addObserver,
  createStudy,
  finishUnfinished,
  prepareVisit,
  removeObserver,
  resumeCandidates,
  saveStudy,
  startSession,
  type VisitWish,
} from '../../src/tasks/index.ts';
import { codeOf, given, journalOf } from '../storage/samples.ts';
import { bench, recorded, school, texts, visitOf } from './bench.ts';

const wishOf = (made: Awaited<ReturnType<typeof school>>, changes: Partial<VisitWish> = {}): VisitWish => ({
  classroom: made.classroom.id,
  protocol: { id: made.protocol.id },
  phases: ['before', 'after'],
  absent: [],
  plannedStart: '2026-11-03T10:30+00:00',
  ...changes,
});

it('freezes the schedule: the drawn children in random order, with the seed, and the protocol itself', async () => {
  const on = await bench();
  const made = await school(on);
  const { plan, replaced } = given(await prepareVisit(on.deps, wishOf(made, { orderSeed: 'order one' })));
  expect(visitPlan.safeParse(plan).success).toBe(true);
  expect(replaced).toEqual([]);
  const chosen = made.classroom.draw?.chosen ?? [];
  const order = plan.children.map(({ id }) => id);
  expect([...order].sort()).toEqual([...chosen].sort());
  expect(order).not.toEqual(chosen);
  expect(plan).toMatchObject({ orderSeed: 'order one', condition: 'break', draw: made.classroom.draw });
  expect(plan.schedule).toEqual({ kind: 'laid', protocol: made.protocol, phases: ['before', 'after'] });
  const again = given(await prepareVisit(on.deps, wishOf(made, { orderSeed: 'order one' }))).plan;
  expect(again.children).toEqual(plan.children);
  expect(again.visit).not.toBe(plan.visit);
});

it('lets reserves step in for absent children, and says so', async () => {
  const on = await bench();
  const made = await school(on);
  const { chosen, reserves } = made.classroom.draw ?? { chosen: [], reserves: [] };
  const [first, second, third] = chosen as [string, string, string];
  const { plan, replaced } = given(
    await prepareVisit(on.deps, wishOf(made, { absent: [first, second, third] })),
  );
  expect(replaced.map(({ absent }) => absent)).toEqual([first, second, third]);
  expect(
    replaced
      .map(({ by }) => by)
      .filter((by) => by !== null)
      .sort(),
  ).toEqual([...reserves].sort());
  expect(replaced[2]?.by).toBeNull();
  expect(plan.children).toHaveLength(5);
  expect(plan.children.map(({ id }) => id)).not.toContain(first);
});

it('says why a visit cannot be prepared, and changes nothing', async () => {
  const on = await bench();
  const made = await school(on);
  const before = await on.dump();
  const refused = async (changes: Partial<VisitWish>) =>
    codeOf(await prepareVisit(on.deps, wishOf(made, changes)));
  expect(await refused({ classroom: 'nobody' })).toBe('task.noClass');
  expect(await refused({ protocol: { id: 'nothing' } })).toBe('task.noProtocol');
  expect(await refused({ phases: [] })).toBe('task.noPhase');
  expect(await refused({ phases: ['during'] })).toBe('task.noSuchPhase');
  expect(await refused({ plannedStart: 'tomorrow' })).toBe('task.visitOutOfRange');
  expect(await refused({ absent: made.classroom.children.map(({ id }) => id) })).toBe('task.nobodyThere');
  expect(await on.dump()).toBe(before);
});

it('keeps the header of a session that begins, and nothing for an observer of another study', async () => {
  const on = await bench();
  const made = await school(on);
  const { plan } = await visitOf(on, made);
  const wish = { observer: made.observer, role: 'second' as const, practice: true };
  const header = given(await startSession(on.deps, plan, wish));
  expect(header).toMatchObject({
    observer: { id: made.observer, name: 'Quill' },
    role: 'second',
    practice: true,
    visit: plan.visit,
    date: '2026-11-03',
    device: 'test tablet',
    timeZone: 'Europe/London',
    children: plan.children,
    schedule: plan.schedule,
  });
  expect(given(await on.deps.store.readSession(header.id))).toEqual({ header, journal: [] });
  const other = given(await createStudy(on.deps, { name: 'Other', texts }));
  const stranger = given(await addObserver(on.deps, other.id, 'Marsh'));
  const before = await on.dump();
  expect(codeOf(await startSession(on.deps, plan, { ...wish, observer: stranger.id }))).toBe(
    'task.noObserver',
  );
  expect(codeOf(await startSession(on.deps, plan, { ...wish, observer: 'nobody' }))).toBe('task.noObserver');
  given(await removeObserver(on.deps, stranger.id));
  expect(codeOf(await startSession(on.deps, plan, { ...wish, observer: stranger.id }))).toBe(
    'task.noObserver',
  );
  expect(before).not.toContain('"practice":false');
});

it('keeps the words of a recorded session when the study finds others', async () => {
  const on = await bench();
  const made = await school(on);
  const header = await recorded(on, made);
  given(await saveStudy(on.deps, made.study.id, { phases: ['baseline', 'break weeks'] }));
  expect(given(await on.deps.store.readSession(header.id))?.header).toEqual(header);
});

it('offers what was cut off, newest first, and closes what nobody will resume', async () => {
  const on = await bench();
  const made = await school(on);
  const done = await recorded(on, made);
  const cut = await recorded(on, made, { ended: false });
  expect(given(await resumeCandidates(on.deps)).map(({ id }) => id)).toEqual([cut.id]);
  given(await finishUnfinished(on.deps, cut.id));
  expect(given(await resumeCandidates(on.deps))).toEqual([]);
  const stored = given(await on.deps.store.readSession(cut.id));
  const last = stored?.journal.find((entry) => entry.kind === 'ended');
  expect(last).toMatchObject({ writer: 'tablet-a', seq: 0, at: 45_000, reason: 'early' });
  expect(stored?.journal).toHaveLength(5);
  const before = await on.dump();
  expect(codeOf(await finishUnfinished(on.deps, cut.id))).toBe('task.sessionEnded');
  expect(codeOf(await finishUnfinished(on.deps, done.id))).toBe('task.sessionEnded');
  expect(codeOf(await finishUnfinished(on.deps, 'nothing'))).toBe('task.noSession');
  expect(await on.dump()).toBe(before);
});

it('keeps a session open while its recorder writes on after others have been closed', async () => {
  const on = await bench();
  const made = await school(on);
  const cut = await recorded(on, made, { ended: false, marks: 1 });
  given(await on.deps.store.pack(cut.id));
  given(await on.deps.store.appendEntries(cut.id, journalOf(cut.id, 4, false)));
  expect(given(await on.deps.store.readSession(cut.id))?.journal).toHaveLength(5);
  expect(given(await resumeCandidates(on.deps))).toMatchObject([{ id: cut.id, entries: 5, own: 5 }]);
});
