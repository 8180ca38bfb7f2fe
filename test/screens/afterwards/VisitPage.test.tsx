// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { looksOf } from '../../analysis/sessionsFrom.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { must, studyOfTable } from '../support/studyOf.ts';

afterEach(cleanup);

/** Two observers of one visit; `a` and `b` are their looks at one child, 1 on-task, 0 off-task, a dot for missed. */
async function shown(a: string, b: string) {
  const services = fakeServices();
  const facts = { class: 'Otter', phase: 'before', visit: 'v1', date: '2026-11-03' };
  const study = await studyOfTable(services, [
    ...looksOf({ ...facts, session: 'a', observer: 'Marsh', role: 'primary' }, { 'Otter-02': a }),
    ...looksOf({ ...facts, session: 'b', observer: 'Quill', role: 'second' }, { 'Otter-02': b }),
  ]);
  const [first] = must(await services.store.listSessions(study));
  renderScreen(<Afterwards />, services, `/afterwards/visit/${first?.id}`);
  return services;
}

// 40 on/on, 9 on/off, 6 off/on, 45 off/off: kappa .6995, between .560 and .839 (Feinstein & Cicchetti 1990 via Gerstman).
const marsh = '1'.repeat(49) + '0'.repeat(51);
const quill = '1'.repeat(40) + '0'.repeat(9) + '1'.repeat(6) + '0'.repeat(45);

test('the sentence, the companions and the table of a published pair', async () => {
  await shown(marsh, quill);
  const heading = await screen.findByRole('heading', { level: 1 });
  expect(heading.textContent).toBe('They agree on 85 of 100 looks. Kappa .70, between .56 and .84.');
  expect(screen.getByText(/two people guessing would agree on 50 %/)).toBeTruthy();
  expect(screen.getByRole('heading', { name: 'Whether they were in step cannot be told.' })).toBeTruthy();
  expect(
    screen.getByText(/^At least one record has no prompt times .* No shift of the marks agrees better/),
  ).toBeTruthy();
  const companions = screen.getByRole('region', { name: 'Figures' });
  expect(companions.textContent).toContain('85.0\u202f%');
  expect(companions.textContent).toContain('72.7\u202f%');
  expect(companions.textContent).toContain('75.0\u202f%');
  expect(companions.textContent).toContain('.94');
  const table = screen.getByRole('table', { name: 'rows Marsh, columns Quill' });
  expect(
    within(table)
      .getAllByRole('cell')
      .map((cell) => cell.textContent),
  ).toEqual(['45', '6', '9', '40']);
  expect(screen.getByRole('button', { name: 'Go through the 15 differences' })).toBeTruthy();
});

test('undefined kappa says why, nowhere a number', async () => {
  await shown('1'.repeat(60), '1'.repeat(60));
  const heading = await screen.findByRole('heading', { level: 1 });
  expect(heading.textContent).toBe('They agree on 60 of 60 looks.');
  expect(screen.getByText(/^Kappa is not defined: both observers used one code only\./)).toBeTruthy();
  expect(document.body.textContent).not.toMatch(/NaN|null/);
  expect(screen.queryByRole('button', { name: /Go through/ })).toBeNull();
});

test('what only one of them scored is left out, and by whom', async () => {
  await shown('..110', '110.0');
  await screen.findByRole('heading', { level: 1 });
  expect(screen.getByText('Marsh: no mark (2).')).toBeTruthy();
  expect(screen.getByText('Quill: no mark (1).')).toBeTruthy();
});

test('one observer alone cannot be compared', async () => {
  const services = fakeServices();
  const study = await studyOfTable(
    services,
    looksOf({ session: 'a', observer: 'Marsh', class: 'Otter', phase: 'before' }, { 'Otter-02': '1101' }),
  );
  const [first] = must(await services.store.listSessions(study));
  renderScreen(<Afterwards />, services, `/afterwards/visit/${first?.id}`);
  expect(await screen.findByRole('heading', { name: 'Only one observer was here.' })).toBeTruthy();
});

test('all pairs: criterion by word, and the share double-coded in each phase', async () => {
  const services = fakeServices();
  const facts = { class: 'Otter', phase: 'before' };
  await studyOfTable(services, [
    ...looksOf({ ...facts, visit: 'v1', session: 'a', observer: 'Marsh', role: 'primary' }, { C: marsh }),
    ...looksOf({ ...facts, visit: 'v1', session: 'b', observer: 'Quill', role: 'second' }, { C: quill }),
    ...['v2', 'v3', 'v4', 'v5', 'v6'].flatMap((visit) =>
      looksOf({ ...facts, visit, session: visit, observer: 'Marsh', role: 'primary' }, { C: '1101' }),
    ),
  ]);
  renderScreen(<Afterwards />, services, '/afterwards/agreement');
  const heading = await screen.findByRole('heading', { level: 1 });
  expect(heading.textContent).toBe(
    'In 1 comparison the observers agree on 85\u202f% of 100 intervals; kappa over all .70.',
  );
  expect(screen.getByText(/1 of 6 visits, 17 %: under 20 %/)).toBeTruthy();
  expect(screen.getByText('meets it')).toBeTruthy();
});
