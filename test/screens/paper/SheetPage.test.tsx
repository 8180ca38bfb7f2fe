// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it, vi } from 'vitest';
import { SheetPage } from '../../../src/screens/paper/SheetPage.tsx';
import { addObserver, prepareVisit, startSession } from '../../../src/tasks/index.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must, studyOfTable } from '../support/studyOf.ts';

afterEach(cleanup);

async function prepared() {
  const print = vi.fn();
  const services = fakeServices({ device: fakeDevice({ print }) });
  const { study, classroom, protocol } = await studyWithClass(services);
  const observer = must(await addObserver(services.deps, study.id, 'Quill'));
  const wish = {
    classroom: classroom.id,
    protocol: { id: protocol.id },
    phases: ['before', 'after'],
    absent: [],
    plannedStart: null,
  };
  const { plan } = must(await prepareVisit(services.deps, wish));
  return { services, plan, print, observer };
}

const numbers = (container: HTMLElement): number[] =>
  [...container.querySelectorAll('[data-interval]')]
    .map((one) => Number(one.textContent))
    .sort((a, b) => a - b);

it('shows the prepared visit on sheets in both forms, and keeps its schedule when it is printed', async () => {
  const { services, plan, print } = await prepared();
  must(await services.store.saveSettings({ prepared: plan }));
  const user = userEvent.setup();
  const { container } = renderScreen(<SheetPage session={null} />, services);
  await screen.findByRole('heading', { name: 'The schedule on paper.' });
  const all = Array.from({ length: 120 }, (_, k) => k + 1);
  expect(numbers(container)).toEqual(all);
  for (const { pseudonym } of plan.children) expect(screen.getAllByText(pseudonym).length).toBeGreaterThan(0);
  expect(screen.getByText(/^No mark: 0 cannot see · 5 left the room/)).toBeTruthy();
  expect(screen.getByText(/Pseudonyms only, no names/)).toBeTruthy();
  const pages = container.querySelectorAll('.paper-page').length;
  await user.click(screen.getByRole('radio', { name: /Round sheet/ }));
  expect(numbers(container)).toEqual(all);
  expect(container.querySelectorAll('.paper-page').length).toBeLessThan(pages);
  await user.click(screen.getByRole('button', { name: 'Print it' }));
  await waitFor(() => expect(print).toHaveBeenCalledTimes(1));
  expect(must(await services.store.settings()).sheets).toEqual([plan]);
});

it('prints the schedule of a session again, also of one that was cut off', async () => {
  const { services, plan, observer } = await prepared();
  const header = must(
    await startSession(services.deps, plan, { observer: observer.id, role: null, practice: false }),
  );
  const { container } = renderScreen(<SheetPage session={header.id} />, services);
  await screen.findByRole('heading', { name: 'The schedule on paper.' });
  expect(numbers(container)).toHaveLength(120);
  expect(screen.getByRole('link', { name: 'Back to the session' }).getAttribute('href')).toBe(
    `#/afterwards/session/${header.id}`,
  );
});

it('asks who stepped in for whom where the protocol has stepping in, and nowhere else', async () => {
  const { services, plan } = await prepared();
  const reserves = plan.reserves ?? [];
  expect(reserves.length).toBe(2);
  must(await services.store.saveSettings({ prepared: plan }));
  const { container } = renderScreen(<SheetPage session={null} />, services);
  await screen.findByRole('heading', { name: 'The schedule on paper.' });
  expect(container.querySelector('.paper-stand-ins')).toBeNull();
  expect(screen.queryByText(/^Reserves, in order/)).toBeNull();
  cleanup();
  const protocol = { ...plan.schedule.protocol, reservesStepIn: true };
  must(
    await services.store.saveSettings({ prepared: { ...plan, schedule: { ...plan.schedule, protocol } } }),
  );
  renderScreen(<SheetPage session={null} />, services);
  await screen.findByRole('heading', { name: 'The schedule on paper.' });
  const names = reserves.map(({ pseudonym }) => pseudonym).join(', ');
  const why = '5 left the room · 6 with another adult · 7 not taking part';
  expect(screen.getByText(new RegExp(`Reserves, in order: ${names}\\. Why: ${why}\\.`))).toBeTruthy();
  const heads = screen.getByRole('columnheader', { name: 'Who stepped in' }).closest('table');
  // One line a reserve and one to spare.
  expect(heads?.querySelectorAll('tbody tr')).toHaveLength(3);
});

it('says why there is nothing to print', async () => {
  const services = fakeServices();
  renderScreen(<SheetPage session={null} />, services);
  expect(await screen.findByText(/No visit is prepared/)).toBeTruthy();
  cleanup();
  const study = await studyOfTable(services, [
    { session: 's1', observer: 'Quill', child: 'Otter-01', interval: 1, code: 'on-task' },
  ]);
  const [table] = must(await services.store.listSessions(study));
  renderScreen(<SheetPage session={table?.id ?? ''} />, services);
  expect(await screen.findByText(/came from a table, so it has no schedule/)).toBeTruthy();
});
