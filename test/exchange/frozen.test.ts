import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { addParts } from '../../src/exchange/cardParts.ts';
import { readPairingCard } from '../../src/exchange/pairingCard.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import { given } from '../storage/samples.ts';
import { rowsOf } from './tableText.ts';

// The files of version 1 were written once and are never written anew: they are what tablets have out there.
const read = (name: string) =>
  readIncoming({ name, bytes: readFileSync(new URL(`../frozen/v1/${name}`, import.meta.url)) });

test.each(['study.lookbell.json', 'study-compressed.lookbell.json'])(
  'version 1 is read: %s',
  async (name) => {
    const outcome = await read(name);
    if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
    const { study, classes, observers, protocols, sessions, visitPlans } = outcome.bundle;
    expect(outcome.notices.map(({ problem }) => problem.code)).toEqual(['study.newKinds']);
    expect(study).toMatchObject({ id: 'study-1', phases: ['before', 'after'], control: 'usual' });
    expect([classes, observers, protocols, visitPlans].map((list) => list.length)).toEqual([1, 1, 1, 1]);
    expect(sessions.map(({ header, journal }) => [header.observer.name, journal.length])).toEqual([
      ['Quill', 6],
      ['Marsh', 0],
    ]);
    expect(sessions[0]?.journal.at(-1)).toMatchObject({ kind: 'hummed', tune: { bars: 4 } });
    expect(
      rowsOf(writeIntervalTable(sessions))
        .slice(0, 3)
        .map(({ code, missing }) => code || missing),
    ).toEqual(['on-task', 'off-task', 'out of view']);
  },
);

test('version 1 is read: visit file', async () => {
  const outcome = await read('visit.lookbell-visit.json');
  expect(outcome).toMatchObject({
    ok: true,
    form: 'visit',
    notices: [],
    bundle: { visitPlans: [{ visit: 'visit-2', plannedStart: '2026-11-04T10:40+00:00', orderSeed: 'seed' }] },
  });
});

test('an interval table of the first form is read, with identifiers that stay the same for good', async () => {
  const outcome = await read('table.csv');
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  const [session] = outcome.bundle.sessions;
  expect(session?.header).toMatchObject({
    id: '213e0826-ee48-5df9-94f9-1e8d9344ede4',
    visit: '547f4b4b-18ad-54fe-8731-abf2fdaa9b95',
    sessionLabel: 'morning',
    visitLabel: 'Tuesday',
    role: 'primary',
  });
  expect(session?.header.schedule).toMatchObject({
    intervals: [{}, {}, { startMs: 30_500, minutesFromBreak: 2 }],
  });
});

const readCard = async (name: string) => {
  const text = readFileSync(new URL(`../frozen/v1/${name}`, import.meta.url), 'utf8');
  return given(await readPairingCard(given(addParts(null, text))));
};

test('version 1 is read: pairing card', async () => {
  const file = await read('visit.lookbell-visit.json');
  expect(await readCard('pairing-card.txt')).toEqual(file.ok && file.bundle.visitPlans[0]);
  const large = await readCard('pairing-card-pictures.txt');
  expect(large).toMatchObject({
    classroom: { name: 'Class Otter' },
    plannedStart: '2026-11-03T10:40:00.000+00:00',
  });
  expect(large.children.map(({ pseudonym }) => pseudonym)).toEqual([
    'Otter-12',
    'Otter-05',
    'Otter-29',
    'Otter-20',
    'Otter-09',
    'Otter-07',
  ]);
  expect([large.plan?.seats.length, large.draw?.from.length]).toEqual([30, 30]);
});
