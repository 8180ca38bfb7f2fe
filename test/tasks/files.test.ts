import { readdirSync, readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import {
  addObserver,
  adoptVisitFile,
  amendInterval,
  askRemoveStudy,
  commitImport,
  exportStudy,
  exportTable,
  exportVisit,
  type IncomingFile,
  importDemo,
  importFiles,
  markHandedOver,
  removeChild,
  removeStudy,
  renameStudy,
  saveClass,
  startSession,
} from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { type Bench, bench, recorded, school, visitOf } from './bench.ts';

const fileOf = ({ name, bytes }: { name: string; bytes: Uint8Array }): IncomingFile => ({ name, bytes });
const textFile = (name: string, text: string): IncomingFile => ({
  name,
  bytes: new TextEncoder().encode(text),
});

async function take(on: Bench, ...files: IncomingFile[]) {
  const preview = given(await importFiles(on.deps, files));
  given(await commitImport(on.deps, preview));
  return preview;
}

it('hands a study over whole: another tablet has the same afterwards', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  await recorded(here, made);
  const file = given(await exportStudy(here.deps, made.study.id));
  const packed = given(await exportStudy(here.deps, made.study.id, { compress: true }));
  expect(packed.bytes.length).toBeLessThan(file.bytes.length / 2);
  const preview = await take(there, fileOf(file));
  expect(preview.files).toMatchObject([
    {
      form: 'study',
      studies: [{ name: 'Hedge school', removedHere: false }],
      sessions: { new: 1, known: 0, changed: 0 },
      classes: { new: 1 },
      protocols: { new: 2 },
      problems: [],
    },
  ]);
  const bundle = given(await there.deps.store.bundle(made.study.id));
  expect(bundle).toEqual(given(await here.deps.store.bundle(made.study.id)));
  const before = await there.dump();
  const again = await take(there, fileOf(packed));
  expect(again.files[0]).toMatchObject({
    sessions: { new: 0, known: 1, changed: 0 },
    protocols: { known: 2 },
  });
  expect(await there.dump()).toBe(before);
});

it('keeps conditions and pseudonyms out of the names of files', async () => {
  const on = await bench();
  const made = await school(on);
  const { plan } = await visitOf(on, made);
  await recorded(on, made);
  expect(given(await exportStudy(on.deps, made.study.id)).name).toBe(
    'lookbell-hedge-school-2026-11-03.lookbell.json',
  );
  expect(given(await exportVisit(on.deps, plan)).name).toBe(
    'lookbell-visit-class-otter-2026-11-03.lookbell-visit.json',
  );
  expect(given(await exportTable(on.deps, made.study.id)).name).toBe('lookbell-hedge-school-2026-11-03.csv');
  given(await renameStudy(on.deps, made.study.id, 'The break of Otter-01'));
  expect(given(await exportStudy(on.deps, made.study.id)).name).toBe('lookbell-2026-11-03.lookbell.json');
  given(await saveClass(on.deps, made.classroom.id, { name: 'Usual 3b' }));
  const later = await visitOf(on, made);
  expect(given(await exportVisit(on.deps, later.plan)).name).toBe('lookbell-2026-11-03.lookbell-visit.json');
});

it('knows what has been handed over, and that a later entry has not', async () => {
  const on = await bench();
  const made = await school(on);
  const { id } = await recorded(on, made);
  const file = given(await exportStudy(on.deps, made.study.id));
  expect(file.covers).toEqual([{ session: id, own: 5 }]);
  given(
    await amendInterval(on.deps, id, { interval: 1, codes: ['off'], missing: null, why: 'tap', by: 'Quill' }),
  );
  given(await markHandedOver(on.deps, file.covers));
  expect(given(await on.deps.store.session(id))?.handedOver).toBe(false);
  given(await markHandedOver(on.deps, given(await exportStudy(on.deps, made.study.id)).covers));
  expect(given(await on.deps.store.session(id))?.handedOver).toBe(true);
  expect(given(await on.deps.store.settings()).lastBackup).toMatch(/^2026-11-03T/);
  expect(given(await exportTable(on.deps, made.study.id)).covers).toEqual([]);
});

it('writes the interval table without practice, and takes it in elsewhere once', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  await recorded(here, made, { practice: true });
  expect(codeOf(await exportTable(here.deps, made.study.id))).toBe('task.noSessions');
  await recorded(here, made);
  const table = given(await exportTable(here.deps, made.study.id));
  const preview = await take(there, fileOf(table));
  expect(preview.files[0]).toMatchObject({ form: 'table', sessions: { new: 1 }, problems: [] });
  const [study] = given(await there.deps.store.studies());
  expect(study?.phases).toEqual(['before']);
  const before = await there.dump();
  await take(there, fileOf(table));
  expect(await there.dump()).toBe(before);
});

it('gives the sessions of a table to the study of the same import, or to the one that was chosen', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  const study = given(await exportStudy(here.deps, made.study.id));
  const paper = textFile(
    'paper.csv',
    'session,observer,child,interval,code,class,phase,date\np1,Quill,Otter-01,1,on-task,Class Otter,before,2026-11-04\n',
  );
  await take(there, paper, fileOf(study));
  const [session] = given(await there.deps.store.listSessions(made.study.id));
  expect(session).toMatchObject({ classroom: { id: made.classroom.id }, observer: { id: made.observer } });
  const chosen = given(await importFiles(here.deps, [paper], { study: made.study.id }));
  expect(chosen.bundles[0]?.study.id).toBe(made.study.id);
});

it('brings the second tablet what it needs for a visit, and nothing that is personal but pseudonyms', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  const { plan } = await visitOf(here, made);
  const file = given(await exportVisit(here.deps, plan));
  expect(given(await adoptVisitFile(there.deps, fileOf(file)))).toEqual(plan);
  const classroom = given(await there.deps.store.classroom(made.classroom.id));
  expect(classroom?.children.map(({ pseudonym }) => pseudonym)).toEqual(
    plan.children.map(({ pseudonym }) => pseudonym),
  );
  expect(given(await there.deps.store.observers(made.study.id))).toEqual([]);
  const before = await there.dump();
  given(await adoptVisitFile(there.deps, fileOf(file)));
  expect(await there.dump()).toBe(before);

  const marsh = given(await addObserver(there.deps, made.study.id, 'Marsh'));
  const header = given(
    await startSession(there.deps, plan, { observer: marsh.id, role: 'second', practice: false }),
  );
  expect(header).toMatchObject({ visit: plan.visit, children: plan.children, orderSeed: plan.orderSeed });
  await take(here, fileOf(given(await exportStudy(there.deps, made.study.id))));
  expect(given(await here.deps.store.study(made.study.id))).toEqual(made.study);
  expect(given(await here.deps.store.classroom(made.classroom.id))).toEqual(made.classroom);
  expect(given(await here.deps.store.listSessions(made.study.id))).toHaveLength(1);
  await take(there, fileOf(given(await exportStudy(here.deps, made.study.id))));
  expect(given(await there.deps.store.bundle(made.study.id))).toEqual(
    given(await here.deps.store.bundle(made.study.id)),
  );
});

it('refuses a file that is no visit file', async () => {
  const on = await bench();
  const made = await school(on);
  const study = given(await exportStudy(on.deps, made.study.id));
  const before = await on.dump();
  expect(codeOf(await adoptVisitFile(on.deps, fileOf(study)))).toBe('task.noVisitFile');
  expect(codeOf(await adoptVisitFile(on.deps, textFile('x.json', '{')))).toMatch(/^(json|file)\./);
  expect(await on.dump()).toBe(before);
});

it('lets a broken file contribute nothing while the others go on', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  await recorded(here, made);
  const good = fileOf(given(await exportStudy(here.deps, made.study.id)));
  const cut: IncomingFile = { name: 'cut.json', bytes: good.bytes.slice(0, good.bytes.length / 2) };
  const page = textFile('page.html', '<!doctype html><p>sign in</p>');
  const before = await there.dump();
  const preview = given(await importFiles(there.deps, [cut, good, page]));
  expect(await there.dump()).toBe(before);
  expect(preview.files.map(({ name, problems }) => [name, problems.length])).toEqual([
    ['cut.json', 1],
    [good.name, 0],
    ['page.html', 1],
  ]);
  const bad = given(await importFiles(there.deps, [cut, page]));
  expect(codeOf(await commitImport(there.deps, bad))).toBe('task.nothingToImport');
  expect(await there.dump()).toBe(before);
  given(await commitImport(there.deps, preview));
  expect(given(await there.deps.store.listSessions(made.study.id))).toHaveLength(1);
});

it('keeps a child withdrawn, whichever tablet edits the class afterwards', async () => {
  const [here, there] = [await bench('tablet-a'), await bench('tablet-b')];
  const made = await school(here);
  await take(there, fileOf(given(await exportStudy(here.deps, made.study.id))));
  const child = made.classroom.children[0]?.id ?? '';
  given(await removeChild(here.deps, made.classroom.id, child));
  given(await saveClass(there.deps, made.classroom.id, { name: 'Class Heron' }));
  given(await saveClass(there.deps, made.classroom.id, { name: 'Class Newt' }));
  const [a, b] = [
    given(await exportStudy(here.deps, made.study.id)),
    given(await exportStudy(there.deps, made.study.id)),
  ];
  await take(here, fileOf(b));
  await take(there, fileOf(a));
  for (const on of [here, there]) {
    const classroom = given(await on.deps.store.classroom(made.classroom.id));
    expect(classroom?.name).toBe('Class Newt');
    expect(classroom?.children.find(({ id }) => id === child)?.removed).toBe(true);
  }
});

it('removes a study only when asked as it stands; its file comes back only when that is said', async () => {
  const [on, copy] = [await bench(), await bench('tablet-b')];
  const made = await school(on);
  const running = await recorded(on, made, { ended: false });
  const file = fileOf(given(await exportStudy(on.deps, made.study.id)));
  const question = given(await askRemoveStudy(on.deps, made.study.id));
  expect(question).toMatchObject({
    name: 'Hedge school',
    classes: 1,
    sessions: 1,
    notHandedOver: 1,
    unfinished: 1,
  });
  expect(codeOf(await removeStudy(on.deps, made.study.id, question.token))).toBe('task.sessionRuns');
  const { finishUnfinished } = await import('../../src/tasks/index.ts');
  given(await finishUnfinished(on.deps, running.id));
  expect(codeOf(await removeStudy(on.deps, made.study.id, question.token))).toBe('task.changedSinceAsked');
  expect(given(await on.deps.store.bundle(made.study.id))).not.toBeNull();
  const now = given(await askRemoveStudy(on.deps, made.study.id));
  given(await removeStudy(on.deps, made.study.id, now.token));
  expect(given(await on.deps.store.studies())).toEqual([]);
  expect(given(await on.deps.store.settings()).study).toBeNull();
  expect(codeOf(await askRemoveStudy(on.deps, made.study.id))).toBe('task.noStudy');
  expect(codeOf(await exportStudy(on.deps, made.study.id))).toBe('task.noStudy');

  const before = await on.dump();
  const preview = await take(on, file);
  expect(preview.files[0]?.studies).toMatchObject([{ removedHere: true }]);
  expect(await on.dump()).toBe(before);
  given(await commitImport(on.deps, preview, { revive: [made.study.id] }));
  expect(given(await on.deps.store.listSessions(made.study.id))).toHaveLength(1);
  await take(copy, file);
  expect(given(await copy.deps.store.studies())).toHaveLength(1);
});

const demo = new URL('../../demo-sessions/', import.meta.url);

it('brings the demo in at one touch, and again after it was removed', async () => {
  const on = await bench();
  const files = readdirSync(demo)
    .filter((name) => /\.(json|csv)$/.test(name))
    .map((name) => ({ name, bytes: new Uint8Array(readFileSync(new URL(name, demo))) }));
  const preview = given(await importDemo(on.deps, files));
  expect(preview.files.flatMap(({ problems }) => problems)).toEqual([]);
  const studies = given(await on.deps.store.studies());
  expect(studies).toHaveLength(1);
  const study = studies[0]?.id ?? '';
  expect(given(await on.deps.store.settings()).study).toBe(study);
  const sessions = given(await on.deps.store.listSessions(study));
  expect(sessions.length).toBeGreaterThan(10);
  expect(sessions.every((session) => session.handedOver && !session.here)).toBe(true);
  expect(given(await on.deps.store.unfinishedSessions())).toEqual([]);
  given(await removeStudy(on.deps, study, given(await askRemoveStudy(on.deps, study)).token));
  given(await importDemo(on.deps, files));
  expect(given(await on.deps.store.listSessions(study))).toHaveLength(sessions.length);
});

it('keeps nothing of a demo that is damaged', async () => {
  const on = await bench();
  const before = await on.dump();
  expect(codeOf(await importDemo(on.deps, [textFile('demo.lookbell.json', '{}')]))).not.toBe('ok');
  expect(await on.dump()).toBe(before);
});
