// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import type { EntryBody } from '../../../src/journal/entry.ts';
import { isKnown } from '../../../src/journal/known.ts';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import type { Row } from '../../analysis/sessionsFrom.ts';
import { headerOf, journalOf } from '../../support/session.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, keepRecorded, must, studyOfTable } from '../support/studyOf.ts';

afterEach(cleanup);

async function shown(
  said: Parameters<typeof keepRecorded>[2],
  more: Parameters<typeof keepRecorded>[3] = [],
) {
  const services = fakeServices();
  await emptyStudy(services);
  await keepRecorded(services, { id: 's1' }, said, more);
  renderScreen(<Afterwards />, services, '/afterwards/session/s1');
  await screen.findByRole('heading', { level: 1, name: /scored\.$/ });
  return services;
}
const journal = async (services: ReturnType<typeof fakeServices>) =>
  must(await services.store.readSession('s1'))?.journal.filter(isKnown) ?? [];

test('completeness comes first: what is missing and why, and no figure', async () => {
  await shown({ 2: 'missed', 4: null, 5: 'off' });
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('4 of 6 looks are scored.');
  expect(screen.getByText('2 missing: no mark (1) and out of view (1).')).toBeTruthy();
  expect(screen.getByText(/farthest from its planned moment was 5 ms away/)).toBeTruthy();
  expect(document.body.textContent).not.toContain('%');
  expect(screen.queryByRole('img')).toBeNull();
});

test('one tap shows the figures, another covers them', async () => {
  await shown({ 2: 'missed', 4: null, 5: 'off' });
  await userEvent.click(screen.getByRole('button', { name: 'Show the figures' }));
  // 3 of 4 looks on-task; Wilson 95 % limits 30.1 and 95.4.
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe(
    'On-task at 75\u202f% of the looks, between 30 and 95\u202f%.',
  );
  expect(screen.getByRole('img', { name: /^Round sheet of Class Otter/ })).toBeTruthy();
  // How much is missing stands beside it, and that all of it is on this tablet alone.
  expect(screen.getByText(/^33 % of the looks are missing \(2 of 6\)\./)).toBeTruthy();
  expect(screen.getByText('Not handed over: 1')).toBeTruthy();
  // Two looks a child are too few: said beside each child, not on top.
  expect(screen.getAllByText(/too few to speak of this child alone/)).toHaveLength(3);
  await userEvent.click(screen.getByRole('button', { name: 'Cover the figures' }));
  expect(screen.queryByRole('img')).toBeNull();
});

test('nothing scored is said in words', async () => {
  await shown({ 1: null, 2: null, 3: null, 4: null, 5: null, 6: null });
  await userEvent.click(screen.getByRole('button', { name: 'Show the figures' }));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('There is no percent on-task to tell.');
  expect(document.body.textContent).not.toMatch(/NaN|null|undefined/);
});

test('a correction stands beside the mark, with why and by whom', async () => {
  const services = await shown({ 5: 'off' });
  await userEvent.click(screen.getByRole('button', { name: 'Correct a look' }));
  await userEvent.selectOptions(screen.getByLabelText('Child'), 'Otter-02');
  await userEvent.selectOptions(screen.getByLabelText('Which look'), '5');
  await userEvent.selectOptions(screen.getByLabelText('What it should be'), 'on-task');
  await userEvent.click(screen.getByRole('button', { name: 'Keep the correction' }));
  expect(await screen.findByText('Say what it should be, why, and who corrects it.')).toBeTruthy();
  await userEvent.type(screen.getByLabelText('Why'), 'Touched the wrong side');
  await userEvent.type(screen.getByLabelText('Who corrects it'), 'Quill');
  await userEvent.click(screen.getByRole('button', { name: 'Keep the correction' }));
  expect(await screen.findByText('The correction is kept beside the mark.')).toBeTruthy();
  const entries = await journal(services);
  expect(entries.filter(({ kind }) => kind === 'marked')).toHaveLength(6);
  expect(entries.at(-1)).toMatchObject({
    kind: 'amended',
    interval: 5,
    codes: ['on'],
    missing: null,
    why: 'Touched the wrong side',
    by: 'Quill',
  });
  expect(await screen.findByText(/Interval 5 → on-task\. Touched the wrong side \(Quill/)).toBeTruthy();
});

test('words can be given to a flag later', async () => {
  const services = await shown({}, [[50_000, { kind: 'flagged', interval: 3 }]]);
  expect(screen.getByText('Flag at 0:50, interval 3')).toBeTruthy();
  await userEvent.type(screen.getByLabelText('Words for this flag'), 'A visitor came in');
  await userEvent.click(screen.getByRole('button', { name: 'Keep the words' }));
  expect(await screen.findByText('A visitor came in')).toBeTruthy();
  const entries = await journal(services);
  const flag = entries.find(({ kind }) => kind === 'flagged');
  expect(entries.at(-1)).toMatchObject({
    kind: 'noted',
    text: 'A visitor came in',
    about: { writer: flag?.writer, seq: flag?.seq },
  });
});

test('a record that is not here is said so', async () => {
  const services = fakeServices();
  await emptyStudy(services);
  renderScreen(<Afterwards />, services, '/afterwards/session/elsewhere');
  expect(await screen.findByRole('heading', { name: 'This record is not on this tablet.' })).toBeTruthy();
});

const facts = { session: 'a', observer: 'Quill', class: 'Otter', phase: 'before' };
const methods: Record<string, { rows: Row[]; title: string }> = {
  partial: {
    rows: ['on-task|off-task', 'off-task', '', 'on-task'].map((code, k) => ({
      ...facts,
      child: 'C1',
      interval: k + 1,
      code,
      method: 'partial',
    })),
    title: 'Some on-task in 50\u202f% of the intervals, between 15 and 85\u202f%.',
  },
  headcount: {
    rows: [
      { ...facts, child: '', interval: 1, code: '', method: 'headcount', on_count: 8, present_count: 10 },
      { ...facts, child: '', interval: 2, code: '', method: 'headcount', on_count: 7, present_count: 10 },
    ],
    title: 'On-task in the counts: 75\u202f% of the children counted, between 53 and 89\u202f%.',
  },
  duration: {
    rows: ['on-task', 'off-task'].map((code, k) => ({
      ...facts,
      child: 'C1',
      interval: k + 1,
      code,
      method: 'duration',
      start_s: k * 30,
      end_s: k * 30 + (k === 0 ? 30 : 10),
    })),
    title: 'On-task for 75\u202f% of the time.',
  },
};

test.each(Object.entries(methods))('%s has a sentence of its own', async (_method, { rows, title }) => {
  const services = fakeServices();
  const study = await studyOfTable(services, rows);
  const [session] = must(await services.store.listSessions(study));
  renderScreen(<Afterwards />, services, `/afterwards/session/${session?.id}`);
  await userEvent.click(await screen.findByRole('button', { name: 'Show the figures' }));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe(title);
  expect(document.body.textContent).not.toMatch(/NaN|null|undefined/);
});

/** The page of a session of another method, recorded on this tablet. */
async function shownBy(
  protocol: Parameters<typeof headerOf>[0],
  ...said: readonly (readonly [number, EntryBody])[]
) {
  const services = fakeServices();
  await emptyStudy(services);
  const header = headerOf(protocol, ['before'], { id: 's1' });
  const entries = journalOf([0, { kind: 'started', checks: [], anyway: false }], ...said);
  must(await services.store.createSession(header));
  must(
    await services.store.appendEntries(
      's1',
      entries.map((entry) => ({ ...entry, session: 's1', writer: services.deps.writer })),
    ),
  );
  renderScreen(<Afterwards />, services, '/afterwards/session/s1');
  const heading = await screen.findByRole('heading', { level: 1, name: /counted\.$|watched\.$/ });
  return { services, heading: heading.textContent };
}

test('a recorded headcount is told in scans, and a scan is corrected by counts', async () => {
  const { services, heading } = await shownBy(
    {
      method: 'headcount',
      intervalMs: 60_000,
      observeMs: 60_000,
      partLength: { kind: 'minutes', minutes: 2 },
    },
    [61_000, { kind: 'marked', interval: 1, code: null, counts: { on: 15, present: 20 } }],
    [180_000, { kind: 'ended', reason: 'complete' }],
  );
  expect(heading).toBe('1 of 2 scans was counted.');
  const user = userEvent.setup();
  await user.click(screen.getByRole('button', { name: 'Correct a scan' }));
  await user.selectOptions(screen.getByLabelText('Which scan'), '1');
  await user.type(screen.getByLabelText('On-task'), '16');
  await user.type(screen.getByLabelText('Present'), '20');
  await user.type(screen.getByLabelText('Who corrects it'), 'Quill');
  await user.type(screen.getByLabelText(/^Why/), 'one sat behind the pillar');
  await user.click(screen.getByRole('button', { name: 'Keep the correction' }));
  await screen.findByText(/is kept beside the mark/);
  await screen.findByText(/Interval 1 → 16 of 20\. one sat behind the pillar/);
  expect((await journal(services)).at(-1)).toMatchObject({
    kind: 'amended',
    codes: [],
    counts: { on: 16, present: 20 },
  });
});

test('a recorded duration is told in time, stretch by stretch, and says why none is corrected', async () => {
  const { heading } = await shownBy(
    { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
    [10_000, { kind: 'marked', interval: 1, code: 'on' }],
    [70_000, { kind: 'marked', interval: 1, code: 'off' }],
    [120_000, { kind: 'ended', reason: 'complete' }],
  );
  expect(heading).toBe('1:50 of 2:00 minutes were watched.');
  screen.getByText('0:10 minutes are missing: no mark.');
  screen.getByText(/A recorded duration has no single looks/);
  await userEvent.click(screen.getByRole('button', { name: 'Show the figures' }));
  const table = screen.getByRole('table', { name: 'From touch to touch' });
  const rows = [...table.querySelectorAll('tbody tr')].map((row) =>
    [...row.querySelectorAll('td, th')].map((cell) => cell.textContent).join(' '),
  );
  expect(rows).toEqual([
    '0:00 0:10 0:10 no mark Otter-01',
    '0:10 1:10 1:00 on-task Otter-01',
    '1:10 2:00 0:50 off-task Otter-01',
  ]);
});
