// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, test } from 'vitest';
import type { SessionHeader } from '../../../src/model/session.ts';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { finishUnfinished, pairVisit } from '../../../src/tasks/index.ts';
import { journalOf } from '../../storage/samples.ts';
import { headerOf } from '../../support/session.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, keepRecorded, must } from '../support/studyOf.ts';

afterEach(cleanup);

const marsh = {
  id: 'marsh',
  role: 'second',
  observer: { id: 'observer-2', name: 'Marsh' },
} as const;

/** Marsh's record has ended, Quill's of the same visit is still running on this tablet. */
async function whileQuillRecords(path: string, visit = 'visit-1') {
  const services = fakeServices();
  await emptyStudy(services);
  await keepRecorded(services, { ...marsh, visit }, { 2: 'off' });
  must(await services.store.createSession(headerOf({}, ['before'], { id: 'quill' })));
  must(await services.store.appendEntries('quill', journalOf('quill', 3, false)));
  renderScreen(<Afterwards />, services, path);
  return services;
}

const closed = 'This record stays closed for now.';

describe('while one’s own record of the visit has not ended', () => {
  test.each(['/afterwards/session/marsh', '/afterwards/visit/marsh', '/afterwards/visit/quill'])(
    '%s shows nothing of the other’s, and then does',
    async (path) => {
      const services = await whileQuillRecords(path);
      await screen.findByRole('heading', { level: 1, name: closed });
      expect(document.body.textContent).not.toMatch(/look|%|scored/);
      must(await finishUnfinished(services.deps, 'quill'));
      expect(await screen.findByRole('heading', { level: 1, name: /looks/ })).toBeTruthy();
    },
  );

  test('also where a hand put the two together', async () => {
    const services = await whileQuillRecords('/afterwards/visit/quill', 'visit-2');
    expect(
      await screen.findByRole('heading', { level: 1, name: 'Only one observer was here.' }),
    ).toBeTruthy();
    must(await pairVisit(services.deps, 'marsh', 'visit-1'));
    expect(await screen.findByRole('heading', { level: 1, name: closed })).toBeTruthy();
  });

  test('one’s own page is open', async () => {
    await whileQuillRecords('/afterwards/session/quill');
    expect(await screen.findByRole('heading', { level: 1, name: /^3 of 6 looks/ })).toBeTruthy();
  });

  test('the list names the record and says why it is closed; there is nothing to compare', async () => {
    const services = await whileQuillRecords('/afterwards');
    const row = (await screen.findByRole('link', { name: 'Marsh' })).closest('li') as HTMLElement;
    await screen.findByText(/3 scored, 3 missing/);
    expect(row.textContent).toContain('closed until your own record of this visit has ended');
    expect(row.textContent).not.toMatch(/\d scored/);
    expect(screen.getByRole('heading', { level: 1, name: /^1 visit,/ })).toBeTruthy();
    expect(screen.queryByRole('link', { name: 'Compare the two' })).toBeNull();
    must(await finishUnfinished(services.deps, 'quill'));
    expect(await screen.findByRole('link', { name: 'Compare the two' })).toBeTruthy();
  });

  test('agreement says that a record is left out', async () => {
    await whileQuillRecords('/afterwards/agreement');
    expect(
      await screen.findByText(
        'A record of another observer is left out until your own of the same visit has ended.',
      ),
    ).toBeTruthy();
    expect(
      await screen.findByRole('heading', { level: 1, name: /^No visit has two observers/ }),
    ).toBeTruthy();
  });
});

describe('a familiarisation visit', () => {
  const first = { familiarisation: true } as const;
  async function recorded(path: string, more: Partial<SessionHeader> = first) {
    const services = fakeServices();
    await emptyStudy(services);
    await keepRecorded(services, { ...marsh, ...more }, { 2: 'off' });
    await keepRecorded(services, { id: 'quill', ...more });
    renderScreen(<Afterwards />, services, path);
  }

  test('is flagged in the list and on its page', async () => {
    await recorded('/afterwards');
    const row = (await screen.findByRole('link', { name: 'Marsh' })).closest('li') as HTMLElement;
    expect(row.textContent).toContain('second, familiarisation visit, complete');
    cleanup();
    await recorded('/afterwards/session/quill');
    expect(await screen.findByText(/^A familiarisation visit: kept, and left out of results/)).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Show the figures' }));
    expect(screen.getByText(/^A familiarisation visit/)).toBeTruthy();
  });

  test('from paper is said likewise', async () => {
    await recorded('/afterwards/session/quill', { fromPaper: true });
    expect(await screen.findByText('From paper: no prompt times.')).toBeTruthy();
    // Nobody knows when a mark on paper was made.
    expect(document.body.textContent).not.toContain('came late');
  });

  test('comes into the agreement by a switch, which is there only where there is one', async () => {
    await recorded('/afterwards/agreement');
    await screen.findByRole('heading', { level: 1, name: /^No visit has two observers/ });
    await userEvent.click(await screen.findByRole('checkbox', { name: /With familiarisation visits/ }));
    expect(await screen.findByRole('heading', { level: 1, name: /^In 1 comparison/ })).toBeTruthy();
    await userEvent.click(screen.getByRole('radio', { name: 'practice' }));
    expect(screen.queryByRole('checkbox', { name: /With familiarisation/ })).toBeNull();
    await screen.findByRole('heading', { level: 1, name: /^No visit has two observers/ });
    cleanup();
    await recorded('/afterwards/agreement', {});
    await screen.findByRole('heading', { level: 1, name: /^In 1 comparison/ });
    expect(screen.queryByRole('checkbox')).toBeNull();
  });

  test('its two observers can be compared on the page of the visit', async () => {
    await recorded('/afterwards');
    const visit = (await screen.findByRole('link', { name: 'Marsh' })).closest('.visit') as HTMLElement;
    const link = await within(visit).findByRole('link', { name: 'Compare the two' });
    cleanup();
    await recorded((link.getAttribute('href') ?? '').slice(1));
    expect(
      await screen.findByRole('heading', { level: 1, name: /^They agree on 5 of 6 looks/ }),
    ).toBeTruthy();
  });
});
