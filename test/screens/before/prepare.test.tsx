// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import type { CodeSet } from '../../../src/model/codeSet.ts';
import { Prepare } from '../../../src/screens/before/Prepare.tsx';
import type { Services } from '../../../src/screens/services.ts';
import { starterSets } from '../../../src/screens/study/starterTexts.ts';
import {
  addClass,
  addObserver,
  exportVisit,
  prepareVisit,
  saveProtocol,
  starterDraft,
  startSession,
  undoDraw,
} from '../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

/** A study with one class, the protocols that it begins with, and one more whose name comes last. */
async function twoProtocols() {
  const services = fakeServices();
  const { study, classroom } = await studyWithClass(services);
  const [set] = starterSets(services.words);
  const draft = starterDraft('momentary', study.id, 'Zeal', set as CodeSet);
  return { services, classroom, second: must(await saveProtocol(services.deps, draft)) };
}

/** A session of the class on this tablet. */
async function recorded({ deps }: Services, classroom: string, protocol: string, phases: string[]) {
  const wish = { classroom, protocol: { id: protocol }, phases, absent: [], plannedStart: null };
  const { plan } = must(await prepareVisit(deps, wish));
  const observer = must(await addObserver(deps, plan.study.id, 'Quill'));
  return startSession(deps, plan, { observer: observer.id, role: null, practice: false });
}

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

  it('offers the protocol that this class was last recorded with, else the study’s, and says so', async () => {
    const { services, classroom, second } = await twoProtocols();
    must(await recorded(services, classroom.id, second.id, ['before', 'after']));
    renderScreen(<Prepare />, services);
    const radio = await screen.findByRole<HTMLInputElement>('radio', { name: /^Zeal/ });
    expect(radio.checked).toBe(true);
    expect(screen.getByText('As last time in this class.')).toBeTruthy();
    expect(screen.getByRole<HTMLInputElement>('radio', { name: /^before, break, after/ }).checked).toBe(true);
    const other = screen
      .getAllByRole<HTMLInputElement>('radio')
      .find((one) => one.name === radio.name && one !== radio);
    await userEvent.click(other as HTMLInputElement);
    expect(screen.queryByText('As last time in this class.')).toBeNull();
    expect(other?.checked).toBe(true);
    cleanup();
    must(await addClass(services.deps, classroom.study, { name: 'Wren', condition: null }));
    renderScreen(<Prepare />, services);
    await userEvent.click(await screen.findByRole('radio', { name: /^Wren/ }));
    expect(screen.getByText('As last time in this study.')).toBeTruthy();
  });

  it('makes and chooses what is over in a minute for a first try, once, until something was recorded here', async () => {
    const services = fakeServices();
    const { study, classroom } = await studyWithClass(services);
    renderScreen(<Prepare />, services);
    const tryIt = () => screen.getByRole('button', { name: 'Try it for a minute' });
    await screen.findByRole('button', { name: 'Try it for a minute' });
    await userEvent.click(tryIt());
    const radio = await screen.findByRole<HTMLInputElement>('radio', { name: /^One minute, to try/ });
    expect(radio.checked).toBe(true);
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'only before' }).checked).toBe(true);
    expect(screen.getByText('2 looks a child in 1 minute, 6 children.')).toBeTruthy();
    await userEvent.click(tryIt());
    const named = async () =>
      must(await services.store.protocols(study.id)).filter(({ name }) => name === 'One minute, to try');
    await waitFor(async () => expect(await named()).toHaveLength(1));
    must(await recorded(services, classroom.id, (await named())[0]?.id ?? '', ['before']));
    await waitFor(() => expect(screen.queryByRole('button', { name: 'Try it for a minute' })).toBeNull());
  });

  it('says what Lookbell is to somebody who opened it by chance, with a study and without', async () => {
    const what = /Lookbell is the timer, the prompt and the record sheet of a lesson observation/;
    renderScreen(<Prepare />, fakeServices());
    expect(await screen.findByText(what)).toBeTruthy();
    cleanup();
    const services = fakeServices();
    await studyWithClass(services);
    renderScreen(<Prepare />, services);
    expect(await screen.findByText(what)).toBeTruthy();
  });

  it('asks for the phase where the class was last seen in one alone, and leads there', async () => {
    const { services, classroom, second } = await twoProtocols();
    must(await recorded(services, classroom.id, second.id, ['before']));
    renderScreen(<Prepare />, services);
    expect(await screen.findByText('Last time this class was seen in before alone.')).toBeTruthy();
    const prepare = screen.getByRole('button', { name: 'Prepare the visit' });
    expect(screen.getByText('First say which phases this lesson has.')).toBeTruthy();
    await userEvent.click(prepare);
    expect((document.activeElement as HTMLInputElement).closest('fieldset')?.textContent).toMatch(
      /^Phases of this lesson/,
    );
    await userEvent.click(screen.getByRole('radio', { name: 'only after' }));
    await userEvent.click(screen.getByRole('button', { name: 'Prepare the visit' }));
    await waitFor(async () =>
      expect(must(await services.store.settings()).prepared?.schedule.phases).toEqual(['after']),
    );
  });

  it('says what is missing, one thing after the other, and leads to it', async () => {
    const services = fakeServices();
    const { study, classroom } = await studyWithClass(services);
    const hare = must(await addClass(services.deps, study.id, { name: 'Hare', condition: null }));
    renderScreen(<Prepare />, services);
    const prepare = async () =>
      userEvent.click(await screen.findByRole('button', { name: 'Prepare the visit' }));
    expect(await screen.findByText('First choose the class.')).toBeTruthy();
    await prepare();
    expect((document.activeElement as HTMLInputElement).closest('fieldset')?.textContent).toMatch(/^Class/);
    await userEvent.click(screen.getByRole('radio', { name: /^Hare/ }));
    expect(screen.getByText('First add the children of this class.')).toBeTruthy();
    await prepare();
    expect(document.activeElement?.getAttribute('href')).toBe(`#/study/class/${hare.id}`);
    must(await undoDraw(services.deps, classroom.id));
    await userEvent.click(screen.getByRole('radio', { name: /^Otter/ }));
    expect(await screen.findByText('First draw the children to watch.')).toBeTruthy();
    await prepare();
    expect(document.activeElement?.textContent).toBe('Draw 6 at random');
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
