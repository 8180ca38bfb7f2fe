// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import type { WallTime } from '../../../src/kernel/units.ts';
import { RoomDoor } from '../../../src/screens/room/RoomDoor.tsx';
import { memoryStore } from '../../../src/storage/index.ts';
import { headerOf, journalOf } from '../../support/session.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { FakeLive, snapshotOf } from './fakeLive.ts';
import { deskWith } from './renderRoom.tsx';

afterEach(cleanup);

/** A store with one session that was cut off after its first mark, at 10:00:16. */
async function cutOff() {
  const store = memoryStore();
  const header = headerOf({}, ['before', 'after']);
  await store.createSession(header);
  await store.appendEntries(
    header.id,
    journalOf(
      [0, { kind: 'started', checks: [], anyway: false }],
      [16_000, { kind: 'marked', interval: 1, code: 'on' }],
    ),
  );
  const wall = '2026-11-03T10:00:50.000+00:00' as WallTime;
  return fakeServices({ store, device: fakeDevice({ now: () => ({ wall, timeZone: null }) }) });
}

test('with nothing to take up it leads to what comes before', async () => {
  renderScreen(<RoomDoor />, fakeServices(), '/room');
  await screen.findByRole('heading', { name: 'Nothing is being recorded.' });
  expect(screen.getByRole('link', { name: 'Before the visit' }).getAttribute('href')).toBe('#/before');
});

test('a session that was cut off says what is kept, where it goes on and what is lost', async () => {
  const { visited } = renderScreen(<RoomDoor />, await cutOff(), '/room');
  await screen.findByRole('heading', { name: 'A session was cut off.' });
  screen.getByText('Quill began it on Tuesday 3 November at 10:00.');
  await screen.findByText('Kept: 1 of 12 looks marked.');
  screen.getByText('Taken up now, it goes on at about interval 4 of 12, with Otter-01.');
  screen.getByText('2 intervals in between are missing, with that reason.');
  await userEvent.setup().click(screen.getByRole('button', { name: 'Take it up' }));
  expect(visited.at(-1)).toBe('/room/session-1');
});

test('a session whose start was called off has not begun, whatever its journal tells of it', async () => {
  const store = memoryStore();
  const header = headerOf({}, ['before']);
  await store.createSession(header);
  await store.appendEntries(
    header.id,
    journalOf(
      [-60_000, { kind: 'started', checks: [], anyway: false }],
      [-50_000, { kind: 'withdrawn', target: { writer: 'writer-1', seq: 0 } }],
    ),
  );
  renderScreen(<RoomDoor />, fakeServices({ store }), '/room');
  await screen.findByText('It begins with Otter-01.');
  screen.getByText('Quill went in, and it has not begun yet.');
  screen.getByRole('button', { name: 'Go in' });
});

test('it is closed for good only after the consequence was read', async () => {
  const services = await cutOff();
  const user = userEvent.setup();
  renderScreen(<RoomDoor />, services, '/room');
  await user.click(await screen.findByRole('button', { name: 'Close it for good' }));
  const dialog = within(screen.getByRole('dialog'));
  dialog.getByText(/cannot be taken up again/);
  await user.click(dialog.getByRole('button', { name: 'Close it' }));
  await screen.findByRole('heading', { name: 'Nothing is being recorded.' });
  const kept = await services.store.session('session-1');
  expect(kept.ok && kept.value?.ended).toBe('early');
});

test('what another window records at this moment is not closed from here', async () => {
  const services = await cutOff();
  const device = { ...services.device, otherTabRecords: async () => true };
  const user = userEvent.setup();
  renderScreen(<RoomDoor />, { ...services, device }, '/room');
  await user.click(await screen.findByRole('button', { name: 'Close it for good' }));
  await user.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'Close it' }));
  await screen.findByText(/^Another window of this tablet records/);
  const kept = await services.store.session('session-1');
  expect(kept.ok && kept.value?.ended).toBe(null);
});

test('a session that runs is one touch away', async () => {
  const live = new FakeLive(snapshotOf(headerOf(), [], 20_000));
  renderScreen(<RoomDoor />, fakeServices({ recorder: deskWith(live) }), '/room');
  await screen.findByRole('heading', { name: 'A session is running.' });
  expect(screen.getByRole('link', { name: 'Back into the room' }).getAttribute('href')).toBe(
    '#/room/session-1',
  );
});
