// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import type { EntryBody, KnownEntry } from '../../../src/journal/entry.ts';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { headerOf, journalOf } from '../../support/session.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, must } from '../support/studyOf.ts';

afterEach(cleanup);

const touch = (code: string): EntryBody => ({ kind: 'marked', interval: 1, code });

test('two duration records of one child: second by second, totals, and which to believe first', async () => {
  const services = fakeServices();
  await emptyStudy(services);
  // On for 60 of 120 s, and on for 64: four seconds differ, of 120.
  for (const [name, changes] of [
    ['Marsh', 60_000],
    ['Quill', 64_000],
  ] as const) {
    const header = headerOf(
      { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
      ['before'],
      { id: name, observer: { id: name, name } },
    );
    const said = journalOf(
      [0, touch('on')],
      [changes, touch('off')],
      [120_000, { kind: 'ended', reason: 'complete' }],
    );
    const journal = said.map((entry): KnownEntry => ({ ...entry, session: name, writer: name }));
    must(await services.store.createSession(header));
    must(await services.store.appendEntries(name, journal));
  }
  renderScreen(<Afterwards />, services, '/afterwards/visit/Marsh');
  const heading = await screen.findByRole(
    'heading',
    { level: 2, name: 'Second by second' },
    { timeout: 10_000 },
  );
  const sheet = within(heading.closest('section') ?? heading);
  expect(sheet.getByText('same code in the same second').parentElement?.textContent).toContain('96.7');
  const row = sheet.getByRole('row', { name: /^on-task/ });
  expect(row.textContent).toContain('1:00');
  expect(row.textContent).toContain('1:04');
  // 60 of 64.
  expect(row.textContent).toContain('93.8');
  expect(sheet.getByText(/120 seconds that both watched; 0 that not both did/)).toBeDefined();
});
