// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { ok } from '../../../src/kernel/result.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import type { LiveSession } from '../../../src/recorder/liveSession.ts';
import { Ready } from '../../../src/screens/before/Ready.tsx';
import type { Device, OpenOptions, Services } from '../../../src/screens/services.ts';
import { addObserver, prepareVisit, startSession } from '../../../src/tasks/index.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

interface Arrival {
  readonly names?: readonly string[];
  readonly as?: 'second' | null;
  /** Who recorded on this tablet before. */
  readonly before?: { readonly by: string; readonly sameVisit?: boolean };
}

/** A prepared visit, an observer, and a recorder that only writes down with what it was opened. */
async function atTheDoor(
  device: Partial<Device> = {},
  { names = ['Quill', 'Marsh'], as = null, before }: Arrival = {},
) {
  const opened: { header: SessionHeader; options: OpenOptions }[] = [];
  const base = fakeServices();
  const services: Services = {
    ...base,
    device: fakeDevice(device),
    recorder: {
      ...base.recorder,
      open: async (header, options) => {
        opened.push({ header, options });
        return ok({} as LiveSession);
      },
    },
  };
  const { study, classroom, protocol } = await studyWithClass(services);
  for (const name of names) must(await addObserver(services.deps, study.id, name));
  const wish = {
    classroom: classroom.id,
    protocol: { id: protocol.id },
    phases: ['before'],
    absent: [],
    plannedStart: null,
  };
  const { plan } = must(await prepareVisit(services.deps, wish));
  must(await services.store.saveSettings({ prepared: plan }));
  if (before !== undefined) {
    const observers = must(await services.store.observers(study.id));
    const { id } = observers.find(({ name }) => name === before.by) ?? { id: '' };
    const visit = before.sameVisit === true ? plan.visit : 'the visit before';
    must(
      await startSession(services.deps, { ...plan, visit }, { observer: id, role: null, practice: false }),
    );
  }
  const view = renderScreen(<Ready as={as} />, services, '/before/ready');
  await screen.findByText('Only here');
  return { services, opened, view };
}

async function choose(role: RegExp, purpose?: RegExp) {
  await userEvent.click(screen.getByRole('button', { name: 'Choose' }));
  await userEvent.click(await screen.findByRole('radio', { name: 'Quill' }));
  await userEvent.click(screen.getByRole('radio', { name: role }));
  if (purpose !== undefined) await userEvent.click(screen.getByRole('radio', { name: purpose }));
  await userEvent.click(screen.getByRole('button', { name: 'Done' }));
}

async function hear() {
  await userEvent.click(screen.getByRole('button', { name: 'Play tone' }));
  await userEvent.click(await screen.findByRole('button', { name: 'In my ear' }));
}

describe('Before the visit: the checks', () => {
  it('takes a name that stands in the field on "Done", though nobody tapped "Add"', async () => {
    const { services } = await atTheDoor();
    await userEvent.click(screen.getByRole('button', { name: 'Choose' }));
    await userEvent.type(await screen.findByLabelText(/Name of the observer/), 'Reed');
    await userEvent.click(screen.getByRole('button', { name: 'Done' }));
    await screen.findByText(/^Reed, /);
    const [study] = must(await services.store.studies());
    const names = must(await services.store.observers(study?.id ?? '')).map(({ name }) => name);
    expect(names).toEqual(['Marsh', 'Quill', 'Reed']);
  });

  it('takes the only observer of the study without a question, says so, and lets it be changed', async () => {
    await atTheDoor({}, { names: ['Quill'] });
    expect(screen.getByText('Quill, alone. The only observer of the study.')).toBeTruthy();
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Two things before you go in.');
    await choose(/nobody/);
    expect(screen.getByText('Quill, alone.')).toBeTruthy();
  });

  it('takes the one of several who recorded last on this tablet, and nobody where nobody has', async () => {
    await atTheDoor({}, { before: { by: 'Marsh' } });
    expect(screen.getByText('Marsh, alone. As last time on this tablet.')).toBeTruthy();
    cleanup();
    await atTheDoor();
    expect(screen.getByText('Say who records.')).toBeTruthy();
  });

  it('takes nobody for granted who has a record of this visit, or whose name came with the first tablet', async () => {
    await atTheDoor({}, { before: { by: 'Marsh', sameVisit: true } });
    expect(screen.getByText('Say who records.')).toBeTruthy();
    cleanup();
    await atTheDoor({}, { names: ['Quill'], as: 'second' });
    expect(screen.getByText('Say who records.')).toBeTruthy();
  });

  it('says why nobody can go in yet, and a touch leads to the observer', async () => {
    const { opened } = await atTheDoor();
    const goIn = screen.getByRole('button', { name: 'Go in anyway' });
    const why = document.getElementById(goIn.getAttribute('aria-describedby') ?? '');
    expect(why?.textContent).toBe('First say who records: the record carries the observer’s name.');
    await userEvent.click(goIn);
    expect(screen.getByRole('dialog', { name: 'Who records on this tablet?' })).toBeTruthy();
    expect(opened).toHaveLength(0);
  });

  it('asks for a name where “Add” was tapped without one', async () => {
    await atTheDoor();
    await userEvent.click(screen.getByRole('button', { name: 'Choose' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Add' }));
    expect((await screen.findByRole('alert')).textContent).toBe('Write a name for the observer first.');
  });

  it('counts what stands in the way, and lets in quietly when nothing does', async () => {
    const { opened, view } = await atTheDoor();
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Three things before you go in.');
    await choose(/nobody/);
    await hear();
    await userEvent.click(screen.getByRole('button', { name: 'All are here' }));
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Everything is ready. Go in.');
    await userEvent.click(screen.getByRole('button', { name: 'Go in' }));
    await waitFor(() => expect(opened).toHaveLength(1));
    expect(opened[0]?.options).toEqual({ checks: [], anyway: false });
    expect(opened[0]?.header).toMatchObject({ role: null, practice: false, observer: { name: 'Quill' } });
    expect(opened[0]?.header).not.toHaveProperty('familiarisation');
    await waitFor(() => expect(view.visited.at(-1)).toBe(`/room/${opened[0]?.header.id}`));
  });

  it('goes in anyway on request, and the recorder is told what was on hold', async () => {
    const { opened } = await atTheDoor({
      wakeLock: async () => 'refused',
      room: async () => ({ free: 1_000_000, kept: false }),
      battery: async () => ({ level: 0.12, charging: false }),
      otherTabRecords: async () => true,
      readyOffline: async () => false,
    });
    expect(screen.getByText(/12 % left/)).toBeTruthy();
    await choose(/a second observer checks mine/);
    await userEvent.click(screen.getByRole('button', { name: 'Go in anyway' }));
    await waitFor(() => expect(opened).toHaveLength(1));
    expect(opened[0]?.options).toEqual({
      checks: ['sound', 'children', 'awake', 'room', 'battery', 'offline', 'onlyHere'],
      anyway: true,
    });
  });

  it.each([
    [/^practice/, /this one is practice/, { practice: true }],
    [/^familiarisation visit/, /a familiarisation visit/, { practice: false, familiarisation: true }],
  ])('says on the page and in the header what the session is for: %s', async (purpose, said, kept) => {
    const { opened } = await atTheDoor();
    await choose(/nobody/, purpose);
    screen.getByText(said);
    await userEvent.click(screen.getByRole('button', { name: 'Go in anyway' }));
    await waitFor(() => expect(opened).toHaveLength(1));
    expect(opened[0]?.header).toMatchObject(kept);
  });

  it('holds when the class could hear the tone, or nobody did', async () => {
    await atTheDoor();
    await userEvent.click(screen.getByRole('button', { name: 'Play tone' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Out loud' }));
    expect(screen.getByText(/The class could hear it/)).toBeTruthy();
  });

  it('says so where the browser cannot tell that an earpiece was pulled out', async () => {
    await atTheDoor({ tellsOutputChanges: false });
    expect(screen.getByText(/cannot tell when the earpiece is pulled out/)).toBeTruthy();
  });

  it('offers the visit file only to the primary of two observers', async () => {
    await atTheDoor();
    expect(screen.queryByRole('button', { name: 'Hand over the visit file' })).toBeNull();
    await choose(/a second observer checks mine/);
    await userEvent.click(await screen.findByRole('button', { name: 'Hand over the visit file' }));
    expect(await screen.findByText('The visit file has left this tablet.')).toBeTruthy();
  });
});
