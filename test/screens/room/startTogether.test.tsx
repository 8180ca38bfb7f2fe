// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import type { EntryBody } from '../../../src/journal/entry.ts';
import { problem } from '../../../src/kernel/result.ts';
import type { WallTime } from '../../../src/kernel/units.ts';
import { shiftedWall } from '../../../src/kernel/wallTime.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import { likelySecond, secondOfDay, typedSecond } from '../../../src/screens/room/together/agreedSecond.ts';
import { memoryStore } from '../../../src/storage/index.ts';
import { FakeAudio } from '../../recorder/fakes/fakeAudio.ts';
import { HandClock } from '../../recorder/fakes/handClock.ts';
import { headerOf } from '../../support/session.ts';
import { fakeDevice } from '../support/renderScreen.tsx';
import { plan, snapshotOf } from './fakeLive.ts';
import { renderRoom } from './renderRoom.tsx';

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole('button', { name });
const press = (name: string | RegExp) => userEvent.setup().click(button(name));
/** The fake tablet's clock stands at 10:41:00. */
const clock = (time: string) => Date.parse(`2026-11-03T${time}+00:00`);

/** Before the tap that begins, with a tick check whose clock the test turns. */
async function before(
  more: Partial<SessionHeader> = {},
  resuming = false,
  { store = memoryStore(), later = 0 }: { store?: ReturnType<typeof memoryStore>; later?: number } = {},
) {
  const hand = new HandClock();
  const audio = new FakeAudio(hand);
  const device = fakeDevice({
    now: () => ({
      wall: shiftedWall('2026-11-03T10:41:00.000+00:00', later * 60_000) as WallTime,
      timeZone: null,
    }),
    tickPorts: () => ({
      audio,
      page: hand.pageClock,
      wall: hand.wallClock,
      timer: hand.timer,
      visibility: { hidden: () => false, subscribe: () => () => {} },
    }),
  });
  const header = headerOf({}, ['before'], { plan, ...more });
  const view = renderRoom(snapshotOf(header, [], -1, { phase: 'ready', resuming }), { device, store });
  // What two observers need is loaded when it is needed.
  await screen.findByRole('button', { name: /^(Start|Go on)/ });
  return { ...view, hand, audio };
}

test('alone there is nobody to begin with: no tick check, no agreed second', async () => {
  await before({ role: null });
  expect(screen.queryByRole('button', { name: /Tick check/ })).toBeNull();
  expect(screen.queryByRole('radio')).toBeNull();
});

test('a session that is taken up again begins by its own journal', async () => {
  const { live } = await before({}, true);
  expect(screen.queryByRole('radio')).toBeNull();
  await press('Go on');
  expect(live.calls).toEqual([['begin']]);
});

test('a familiarisation visit is called one', async () => {
  await before({ familiarisation: true });
  screen.getByText('Class Otter · Next child, every 15 seconds · familiarisation visit');
});

test('two observers begin on a shared count unless they say otherwise', async () => {
  const { live } = await before();
  await press('Start');
  expect(live.calls).toEqual([['begin']]);
});

test('an agreed second is offered, stepped and typed, and is what the button says', async () => {
  const user = userEvent.setup();
  const { live } = await before({ role: 'second' });
  await user.click(screen.getByRole('radio', { name: /agreed second/ }));
  expect(button('Start at 10:42:00').textContent).toBe('Start at 10:42:00');
  await press('10 s later');
  button('Start at 10:42:10');
  screen.getByText('It is 10:41:00 now: 1:10 minutes are left.');
  await press('10 s earlier');
  await press('10 s earlier');
  button('Start at 10:41:50');
  const field = screen.getByRole('textbox', { name: 'Agreed second' });
  await user.clear(field);
  await user.type(field, '10:4');
  screen.getByText(/This is no time of day/);
  await user.type(field, '3:30');
  await press('Start at 10:43:30');
  expect(live.calls).toEqual([['begin', { at: clock('10:43:30') }]]);
});

test('the planned start is offered where it is near', async () => {
  await before({ plannedStart: '2026-11-03T10:50:00.000+00:00' as WallTime });
  await userEvent.setup().click(screen.getByRole('radio', { name: /agreed second/ }));
  button('Start at 10:50:00');
});

test('a second that is too near is refused in words, and may be chosen anew', async () => {
  const { live } = await before();
  live.begun = problem('recorder.startTooNear', { seconds: 4 });
  await userEvent.setup().click(screen.getByRole('radio', { name: /agreed second/ }));
  await press('Start at 10:42:00');
  screen.getByText('The agreed second is too near: agree on one at least 4 seconds from now.');
  expect((button('Start at 10:42:00') as HTMLButtonElement).disabled).toBe(false);
});

test('tick check: started, nudged by touch and by key, kept, and handed to the session', async () => {
  const { live, audio, hand } = await before();
  await press(/Tick check/);
  await press('Start the ticks');
  await hand.advance(2500);
  expect(audio.heard().length).toBe(2);
  for (let i = 0; i < 4; i++) await press('1 s earlier');
  await press('1 s later');
  screen.getByText('This tablet’s clock is read 3.00 s later than it shows.');
  for (const key of ['ArrowRight', 'ArrowRight', 'ArrowLeft', 'ArrowUp', 'ArrowDown', 'ArrowRight'])
    fireEvent.keyDown(screen.getByRole('heading', { level: 1 }), { key });
  screen.getByText('This tablet’s clock is read 3.04 s later than it shows.');
  await press('The ticks are one');
  expect(audio.closed).toBe(true);
  screen.getByText(/Tick check kept\. .* 3\.04 s later/);
  // The clock of 10:41:00 is read as 10:41:03.04: both tablets offer the same minute.
  await press('Start at 10:42:00');
  expect(live.calls).toEqual([['begin', { at: clock('10:42:00'), nudgeMs: 3040 }]]);
});

test('tick check: back to 0, and left as it was', async () => {
  const { live, audio } = await before();
  await press(/Tick check/);
  await press('20 ms later');
  await press('Back to 0');
  screen.getByText('This tablet’s clock is read as it shows.');
  await press('20 ms later');
  await press('Leave as it was');
  expect(audio.laid).toEqual([]);
  screen.getByText('The clocks of the two tablets have not been compared.');
  await press('Start');
  expect(live.calls).toEqual([['begin']]);
});

/** A tick check that found 0.02 s, kept at 10:41. */
async function checkedOnce() {
  const store = memoryStore();
  await before({}, false, { store });
  await press(/Tick check/);
  await press('20 ms earlier');
  await press('The ticks are one');
  screen.getByText(/^Tick check kept\. .* 0\.02 s later/);
  cleanup();
  return store;
}

test.each([
  [12, /^Checked 12 minutes ago\. .* 0\.02 s later/],
  [61, /^Checked 1 hour ago, and clocks drift: better check anew\. .* 0\.02 s later/],
])('tick check: it outlives the page, and is offered %i minutes later with its age', async (later, said) => {
  const { live } = await before({}, false, { store: await checkedOnce(), later });
  await screen.findByText(said);
  await press(/^Start at/);
  expect(live.calls).toEqual([['begin', { at: expect.any(Number), nudgeMs: 20 }]]);
  await press('Check anew …');
  screen.getByText('This tablet’s clock is read 0.02 s later than it shows.');
});

test.each([
  ['of another visit', { visit: 'another' }, 1],
  ['from the future: the clock was set back since', {}, -1],
])('tick check: one %s says nothing', async (_, more, later) => {
  const { store } = { store: await checkedOnce() };
  await before(more as Partial<SessionHeader>, false, { store, later });
  await act(async () => void (await store.settings()));
  screen.getByText('The clocks of the two tablets have not been compared.');
  button('Start');
});

test('tick check: sound that stays locked is said', async () => {
  const { audio } = await before();
  audio.unlocks = false;
  await press(/Tick check/);
  await press('Start the ticks');
  screen.getByText(/The ticks do not sound/);
  button('Start the ticks');
});

test('while the second is awaited, its time and the time left are the largest words', () => {
  const header = headerOf({}, ['before'], { plan });
  const started: EntryBody = {
    kind: 'started',
    checks: [],
    anyway: false,
    agreedStart: '2026-11-03T10:42:00.000+00:00',
  };
  renderRoom(snapshotOf(header, [[-74_000, started]], -72_000, { phase: 'counting in', startsIn: 71_600 }));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('1:12');
  screen.getByText('The schedule begins at 10:42:00, in');
  screen.getByText('First: Otter-01');
});

test('while the second is awaited the start can be called off, and how they wanted to begin is remembered', async () => {
  const user = userEvent.setup();
  const { live } = await before();
  await user.click(screen.getByRole('radio', { name: /agreed second/ }));
  act(() => live.show({ phase: 'counting in', startsIn: 60_000 }));
  await press('Call this start off');
  expect(live.calls).toEqual([['callOff']]);
  act(() => live.show({ phase: 'ready', startsIn: null }));
  await screen.findByRole('button', { name: 'Start at 10:42:00' });
});

test('before session time 0 there is nothing to end, only a start to call off', async () => {
  const { live } = await before({ role: null });
  act(() => live.show({ phase: 'counting in', countIn: 3 }));
  await press('end …');
  screen.getByRole('heading', { name: 'The session has not begun yet.' });
  await press('Call this start off');
  act(() => live.show({ phase: 'running', countIn: null }));
  await press('end …');
  screen.getByRole('heading', { name: 'End the session now?' });
  expect(live.calls).toEqual([['callOff']]);
});

test.each([
  ['the next full minute', '10:41:00.000', null, '10:42:00'],
  ['the one after, when that is less than 20 s away', '10:41:40.001', null, '10:43:00'],
  ['exactly 20 s away is enough', '10:41:40.000', null, '10:42:00'],
  ['a planned start within 15 minutes', '10:41:00.000', '10:56:00', '10:56:00'],
  ['not one that is further away', '10:41:00.000', '10:56:01', '10:42:00'],
  ['nor one that is gone', '10:41:00.000', '10:40:00', '10:42:00'],
])('the second that is offered: %s', (_, now, planned, expected) => {
  const full = (time: string) => `2026-11-03T${time}+00:00`;
  const at = likelySecond(full(now), planned === null ? null : full(planned));
  expect(secondOfDay(at, full(now))).toBe(expected);
});

test.each([
  ['10:42:05', '2026-11-03T10:41:00.000+01:00', '2026-11-03T10:42:05.000+01:00'],
  ['1042', '2026-11-03T10:41:00.000-05:30', '2026-11-03T10:42:00.000-05:30'],
  ['00:00:10', '2026-11-03T23:59:30.000+01:00', '2026-11-04T00:00:10.000+01:00'],
])('%s typed at %s is %s', (text, now, expected) => {
  expect(typedSecond(text, now)).toBe(Date.parse(expected));
});
