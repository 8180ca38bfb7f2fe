import { expect, it } from 'vitest';
import {
  addChild,
  addClass,
  addObserver,
  createStudy,
  importClassList,
  removeChild,
  removeClass,
  removeObserver,
  renameChild,
  saveClass,
  saveObserver,
  seatChild,
  setSeatingPlan,
} from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, school, texts } from './bench.ts';

async function emptyClass() {
  const on = await bench();
  const study = given(await createStudy(on.deps, { name: 'Hedge school', texts }));
  const classroom = given(await addClass(on.deps, study.id, { name: 'Class Otter', condition: 'break' }));
  return { ...on, study, classroom };
}

it('adds, renames and removes a class; names and conditions are the study’s', async () => {
  const { deps, dump, study, classroom } = await emptyClass();
  expect(
    given(await saveClass(deps, classroom.id, { name: 'Class Heron', condition: 'USUAL' })),
  ).toMatchObject({
    name: 'Class Heron',
    condition: 'usual',
  });
  const before = await dump();
  expect(codeOf(await addClass(deps, study.id, { name: 'class  heron', condition: null }))).toBe(
    'task.nameTaken',
  );
  expect(codeOf(await addClass(deps, study.id, { name: 'Newt', condition: 'walk' }))).toBe(
    'task.noSuchCondition',
  );
  expect(codeOf(await addClass(deps, 'nobody', { name: 'Newt', condition: null }))).toBe('task.noStudy');
  expect(await dump()).toBe(before);
  given(await removeClass(deps, classroom.id));
  expect(given(await deps.store.classes(study.id))).toEqual([]);
  expect(codeOf(await saveClass(deps, classroom.id, { name: 'x' }))).toBe('task.noClass');
});

it('never writes down a child without consent', async () => {
  const { deps, dump, classroom } = await emptyClass();
  const before = await dump();
  const wish = { pseudonym: 'Otter-07', stratum: null, consent: false };
  expect(codeOf(await addChild(deps, classroom.id, wish))).toBe('task.noConsent');
  expect(await dump()).toBe(before);
  const list = await importClassList(deps, classroom.id, {
    content: 'child,consent,stratum,seat\nOtter-01,yes,a,\nOtter-02,no,a,\nOtter-03,,b,\n',
  });
  expect(given(list)).toMatchObject({ added: 1, withoutConsent: 2 });
  expect(await dump()).not.toMatch(/Otter-0[23]/);
});

it('keeps pseudonyms apart within a class, whatever their case', async () => {
  const { deps, dump, classroom } = await emptyClass();
  const once = given(
    await addChild(deps, classroom.id, { pseudonym: ' Otter-01', stratum: ' ', consent: true }),
  );
  expect(once.children).toMatchObject([{ pseudonym: 'Otter-01', stratum: null, removed: false }]);
  const twice = given(
    await addChild(deps, classroom.id, { pseudonym: 'Otter-02', stratum: 'a', consent: true }),
  );
  const before = await dump();
  const wish = { pseudonym: 'otter-01', stratum: null, consent: true };
  expect(codeOf(await addChild(deps, classroom.id, wish))).toBe('task.nameTaken');
  const second = twice.children[1]?.id ?? '';
  expect(codeOf(await renameChild(deps, classroom.id, second, { pseudonym: 'OTTER-01' }))).toBe(
    'task.nameTaken',
  );
  expect(codeOf(await renameChild(deps, classroom.id, 'nobody', { pseudonym: 'x' }))).toBe('task.noChild');
  expect(await dump()).toBe(before);
  const renamed = given(
    await renameChild(deps, classroom.id, second, { pseudonym: 'Otter-09', stratum: null }),
  );
  expect(renamed.children[1]).toMatchObject({ id: second, pseudonym: 'Otter-09', stratum: null });
});

it('withdraws a child: the seat is empty, a tombstone stays, the pseudonym is free again', async () => {
  const { deps, classroom } = await emptyClass();
  const one = given(
    await addChild(deps, classroom.id, { pseudonym: 'Otter-01', stratum: null, consent: true }),
  );
  const child = one.children[0]?.id ?? '';
  const planned = given(await setSeatingPlan(deps, classroom.id, { kind: 'pairs', columns: 1, rows: 1 }));
  const seat = planned.plan?.seats[0]?.id ?? '';
  given(await seatChild(deps, classroom.id, seat, child));
  const gone = given(await removeChild(deps, classroom.id, child));
  expect(gone.children).toMatchObject([{ id: child, removed: true }]);
  expect(gone.plan?.seats.every((one) => one.child === null)).toBe(true);
  expect(codeOf(await removeChild(deps, classroom.id, child))).toBe('task.noChild');
  expect(codeOf(await seatChild(deps, classroom.id, seat, child))).toBe('task.noChild');
  const again = { pseudonym: 'Otter-01', stratum: null, consent: true };
  expect(given(await addChild(deps, classroom.id, again)).children).toHaveLength(2);
});

it('reads a class list with seats, and the same one again adds nobody', async () => {
  const { deps, dump, classroom } = await emptyClass();
  const content = new TextEncoder().encode(
    'seat;child;stratum;consent\nA1;Otter-01;a;yes\n1-2;Otter-02;b;yes\nB3;Otter-03;a;yes\nby the door;Otter-04;b;yes\nA1;Otter-05;b;yes\n',
  );
  const done = given(await importClassList(deps, classroom.id, { content }));
  expect(done).toMatchObject({
    added: 5,
    changed: 0,
    withoutConsent: 0,
    seatsLeftOpen: [
      { line: 5, seat: 'by the door', why: 'not understood' },
      { line: 6, seat: 'A1', why: 'taken' },
    ],
  });
  const name = new Map(done.classroom.children.map((child) => [child.id, child.pseudonym]));
  const seats = done.classroom.plan?.seats.map(({ row, column, child }) => [
    row,
    column,
    name.get(child ?? ''),
  ]);
  expect(seats).toEqual([
    [0, 0, 'Otter-01'],
    [0, 1, 'Otter-02'],
    [1, 2, 'Otter-03'],
  ]);
  expect(done.classroom.plan).toMatchObject({ columns: 3, rows: 2 });
  const again = given(await importClassList(deps, classroom.id, { content }));
  expect(again).toMatchObject({ added: 0, changed: 0 });
  expect(again.classroom.children).toEqual(done.classroom.children);
  expect(again.classroom.plan?.seats).toHaveLength(3);
  const before = await dump();
  const broken = 'child,consent\nOtter-09,yes\nOtter-09,yes\n';
  expect(codeOf(await importClassList(deps, classroom.id, { content: broken }))).toBe('classList.twice');
  expect(
    codeOf(await importClassList(deps, classroom.id, { content: new Uint8Array([0xff, 0xfe, 0]) })),
  ).toBe('file.utf16');
  expect(await dump()).toBe(before);
});

it('asks about consent where pasted lines do not speak of it', async () => {
  const { deps, classroom } = await emptyClass();
  const content = 'Otter-01\nOtter-02\n';
  expect(codeOf(await importClassList(deps, classroom.id, { content }))).toBe('task.consentNotStated');
  expect(given(await importClassList(deps, classroom.id, { content, consent: true })).added).toBe(2);
});

it('adds, renames and removes observers, with keys of their own', async () => {
  const { deps, dump, study } = await emptyClass();
  const quill = given(await addObserver(deps, study.id, 'Quill'));
  given(await addObserver(deps, study.id, 'Marsh'));
  const keyMap = { on: true, keys: { PageDown: 'code:1', PageUp: 'undo' } };
  expect(given(await saveObserver(deps, quill.id, { keyMap })).keyMap).toEqual(keyMap);
  expect(given(await saveObserver(deps, quill.id, { name: 'Q.' }))).toMatchObject({ name: 'Q.', keyMap });
  const before = await dump();
  expect(codeOf(await saveObserver(deps, quill.id, { name: 'marsh' }))).toBe('task.nameTaken');
  expect(codeOf(await saveObserver(deps, quill.id, { keyMap: { on: true, keys: { a: 'sing' } } }))).toBe(
    'task.keysOutOfRange',
  );
  const manner = { layout: 'eyes-up', hand: 'left', confirm: true, remind: true } as const;
  const odd = { ...manner, hand: 'both' } as unknown as typeof manner;
  expect(codeOf(await saveObserver(deps, quill.id, { manner: odd }))).toBe('task.mannerOutOfRange');
  expect(await dump()).toBe(before);
  given(await saveObserver(deps, quill.id, { manner }));
  expect(given(await saveObserver(deps, quill.id, { name: 'Quill' }))).toMatchObject({ manner, keyMap });
  given(await removeObserver(deps, quill.id));
  expect(given(await deps.store.observers(study.id)).map(({ name }) => name)).toEqual(['Marsh']);
});

it('refuses the second of two edits that were made on the same state', async () => {
  const on = await bench();
  const made = await school(on, 3);
  const [first, second] = await Promise.all([
    saveClass(on.deps, made.classroom.id, { name: 'Class Heron' }),
    saveClass(on.deps, made.classroom.id, { name: 'Class Newt' }),
  ]);
  expect([codeOf(first), codeOf(second)].sort()).toEqual(['ok', 'store.changedMeanwhile']);
});
