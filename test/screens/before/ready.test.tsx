// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { ok } from '../../../src/kernel/result.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import type { LiveSession } from '../../../src/recorder/liveSession.ts';
import { Ready } from '../../../src/screens/before/Ready.tsx';
import type { Device, OpenOptions, Services } from '../../../src/screens/services.ts';
import { addObserver, prepareVisit } from '../../../src/tasks/index.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

/** A prepared visit, an observer, and a recorder that only writes down with what it was opened. */
async function atTheDoor(device: Partial<Device> = {}) {
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
  must(await addObserver(services.deps, study.id, 'Quill'));
  const wish = {
    classroom: classroom.id,
    protocol: { id: protocol.id },
    phases: ['before'],
    absent: [],
    plannedStart: null,
  };
  const { plan } = must(await prepareVisit(services.deps, wish));
  must(await services.store.saveSettings({ prepared: plan }));
  const view = renderScreen(<Ready />, services, '/before/ready');
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
    await userEvent.type(await screen.findByLabelText(/Name of the observer/), 'Marsh');
    await userEvent.click(screen.getByRole('button', { name: 'Done' }));
    await screen.findByText(/^Marsh, /);
    const [study] = must(await services.store.studies());
    const names = must(await services.store.observers(study?.id ?? '')).map(({ name }) => name);
    expect(names).toEqual(['Marsh', 'Quill']);
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
