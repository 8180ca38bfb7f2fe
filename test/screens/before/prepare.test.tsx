// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { Prepare } from '../../../src/screens/before/Prepare.tsx';
import { exportVisit, prepareVisit } from '../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

describe('Before the visit: choosing', () => {
  it('points to The study where there is none yet', async () => {
    renderScreen(<Prepare />, fakeServices());
    const link = await screen.findByRole('link', { name: 'Go to The study' });
    expect(link.getAttribute('href')).toBe('#/study');
  });

  it('lets a reserve step in for an absent child, in drawn order, and keeps the prepared visit', async () => {
    const services = fakeServices();
    const { classroom } = await studyWithClass(services);
    const nameOf = (id: string | undefined) =>
      classroom.children.find((child) => child.id === id)?.pseudonym ?? '';
    const [absent] = classroom.draw?.chosen ?? [];
    const [reserve] = classroom.draw?.reserves ?? [];
    const view = renderScreen(<Prepare />, services);
    await userEvent.click(await screen.findByRole('checkbox', { name: nameOf(absent) }));
    expect(screen.getByText(`${nameOf(reserve)} steps in for ${nameOf(absent)}.`)).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Prepare the visit' }));
    await waitFor(() => expect(view.visited.at(-1)).toBe('/before/ready'));
    const { prepared } = must(await services.store.settings());
    expect(prepared?.children.map((child) => child.id)).toContain(reserve);
    expect(prepared?.children.map((child) => child.id)).not.toContain(absent);
    expect(prepared?.children).toHaveLength(6);
    expect(prepared?.schedule.phases).toEqual(['before', 'after']);
  });

  it('says what the choice comes to: 10 looks a child in 15 minutes at 15 s with six children', async () => {
    const services = fakeServices();
    await studyWithClass(services);
    renderScreen(<Prepare />, services);
    expect(
      await screen.findByText(/^10 looks a child in 15 minutes in each phase, 6 children\.$/),
    ).toBeTruthy();
  });

  it('takes over the schedule of the first tablet from its visit file', async () => {
    const first = fakeServices();
    const { classroom, protocol } = await studyWithClass(first);
    const wish = {
      classroom: classroom.id,
      protocol: { id: protocol.id },
      phases: ['before'],
      absent: [],
      plannedStart: null,
    };
    const { plan } = must(await prepareVisit(first.deps, wish));
    const file = must(await exportVisit(first.deps, plan));

    const second = fakeServices();
    const view = renderScreen(<Prepare />, second);
    const input = await waitFor(() => {
      const found = view.container.querySelector<HTMLInputElement>('input[type=file]');
      if (found === null) throw new Error('no file input yet');
      return found;
    });
    await userEvent.upload(
      input,
      new File([new Uint8Array(file.bytes)], file.name, { type: 'application/json' }),
    );
    await waitFor(() => expect(view.visited.at(-1)).toBe('/before/ready'));
    expect(must(await second.store.settings()).prepared).toEqual(plan);
  });

  it('refuses a file that is no visit file in one sentence and keeps nothing', async () => {
    const services = fakeServices();
    const view = renderScreen(<Prepare />, services);
    const input = await waitFor(() => {
      const found = view.container.querySelector<HTMLInputElement>('input[type=file]');
      if (found === null) throw new Error('no file input yet');
      return found;
    });
    await userEvent.upload(input, new File(['<html></html>'], 'page.json', { type: 'application/json' }));
    expect((await screen.findByRole('alert')).textContent).toMatch(/^This is a web page; expected/);
    expect(must(await services.store.settings()).prepared).toBeNull();
  });
});
