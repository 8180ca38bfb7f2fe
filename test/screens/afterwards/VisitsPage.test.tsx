// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, test } from 'vitest';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, keepRecorded, must } from '../support/studyOf.ts';

afterEach(cleanup);
const show = (services: ReturnType<typeof fakeServices>) =>
  renderScreen(<Afterwards />, services, '/afterwards');

describe('the visits', () => {
  test('say so when there is none, and where records come from', async () => {
    show(fakeServices());
    expect(
      await screen.findByRole('heading', { level: 1, name: 'No visit has been recorded yet.' }),
    ).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Go to The study' })).toBeTruthy();
  });

  test('stand by day, newest first, with what was scored and is missing', async () => {
    const services = fakeServices();
    await emptyStudy(services);
    await keepRecorded(services, { id: 's1' });
    await keepRecorded(
      services,
      { id: 's2', visit: 'visit-2', date: '2026-11-05' },
      { 2: 'missed', 5: null },
    );
    show(services);
    expect(
      await screen.findByRole('heading', { level: 1, name: '2 visits, the latest on Thursday 5 November.' }),
    ).toBeTruthy();
    const days = screen.getAllByRole('heading', { level: 2 }).map((one) => one.textContent);
    expect(days.filter((day) => day?.includes('November'))).toEqual([
      'Thursday 5 November',
      'Tuesday 3 November',
    ]);
    expect(await screen.findByText(/4 scored, 2 missing/)).toBeTruthy();
    // When, in which phase, and by which protocol: two visits of one day are told apart.
    expect(screen.getAllByText(/^\d\d:\d\d · .+ · .+$/)).toHaveLength(2);
  });

  test('two observers of one visit can be compared, one alone cannot', async () => {
    const services = fakeServices();
    await emptyStudy(services);
    await keepRecorded(services, { id: 's1' });
    show(services);
    await screen.findByRole('link', { name: 'Quill' });
    expect(screen.queryByRole('link', { name: 'Compare the two' })).toBeNull();
    await keepRecorded(services, { id: 's2', role: 'second', observer: { id: 'o2', name: 'Marsh' } });
    expect(await screen.findByRole('link', { name: 'Compare the two' })).toBeTruthy();
  });
});

describe('handing over', () => {
  test('takes a tap to make the file and a tap to give it, and then says that all is handed over', async () => {
    const given: string[] = [];
    const services = fakeServices({
      device: fakeDevice({
        handOver: async ({ name }) => {
          given.push(name);
          return 'shared';
        },
      }),
    });
    await emptyStudy(services);
    await keepRecorded(services, { id: 's1' });
    await keepRecorded(services, { id: 's2', visit: 'visit-2' });
    show(services);
    expect(await screen.findByText('Not handed over: 2')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Hand over now' }));
    expect(given).toEqual([]);
    await userEvent.click(await screen.findByRole('button', { name: 'Share or save it' }));
    expect(await screen.findByText('Everything is handed over.')).toBeTruthy();
    expect(given).toHaveLength(1);
    expect(given[0]).toMatch(/\.lookbell\.json$/);
    const sessions = must(await services.store.listSessions('study-1'));
    expect(sessions.map(({ handedOver }) => handedOver)).toEqual([true, true]);
  });

  test('a cancelled share hands nothing over', async () => {
    const services = fakeServices({ device: fakeDevice({ handOver: async () => 'cancelled' }) });
    await emptyStudy(services);
    await keepRecorded(services, { id: 's1' });
    show(services);
    await userEvent.click(await screen.findByRole('button', { name: 'Hand over now' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Share or save it' }));
    expect(await screen.findByText('Nothing has left the tablet.')).toBeTruthy();
    expect(screen.getByText('Not handed over: 1')).toBeTruthy();
  });
});

test('a record put into another visit by hand can be taken back', async () => {
  const services = fakeServices();
  await emptyStudy(services);
  await keepRecorded(services, { id: 's1' });
  await keepRecorded(services, { id: 's2', visit: 'visit-2', observer: { id: 'o2', name: 'Marsh' } });
  show(services);
  const marsh = (await screen.findByRole('link', { name: 'Marsh' })).closest('li') as HTMLElement;
  await userEvent.click(within(marsh).getByRole('button', { name: 'Wrong visit?' }));
  await userEvent.click(screen.getByRole('radio', { name: /with Quill/ }));
  await userEvent.click(screen.getByRole('button', { name: 'Save' }));
  expect(await screen.findByText('The record of Marsh belongs to another visit now.')).toBeTruthy();
  expect(must(await services.store.study('study-1'))?.pairings).toEqual([
    { session: 's2', visit: 'visit-1' },
  ]);
  expect(await screen.findByRole('link', { name: 'Compare the two' })).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Take it back' }));
  await screen.findByRole('heading', { level: 1, name: /^2 visits/ });
  expect(must(await services.store.study('study-1'))?.pairings).toEqual([]);
});
