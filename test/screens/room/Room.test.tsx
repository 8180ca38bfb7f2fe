// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import type { EntryBody } from '../../../src/journal/entry.ts';
import { problem } from '../../../src/kernel/result.ts';
import type { CodeSet } from '../../../src/model/codeSet.ts';
import { headerOf } from '../../support/session.ts';
import { plan, snapshotOf } from './fakeLive.ts';
import { renderRoom } from './renderRoom.tsx';

afterEach(cleanup);

const header = headerOf({}, ['before', 'after'], { plan });
const marked = (interval: number, code: string | null): EntryBody => ({ kind: 'marked', interval, code });
/** Interval 1 (Otter-01) is marked; interval 2 (Otter-02) is the current one. */
const atSecond = (changes = {}) => snapshotOf(header, [[16_000, marked(1, 'on')]], 31_000, changes);

const button = (name: string | RegExp) => screen.getByRole('button', { name });
/** A finger going down, with the time that the browser gives it. */
function touchDown(element: Element): number {
  const event = new PointerEvent('pointerdown', { bubbles: true, cancelable: true, button: 0 });
  act(() => void element.dispatchEvent(event));
  return event.timeStamp;
}
const press = (key: string, more: KeyboardEventInit = {}) =>
  fireEvent.keyDown(document.body, { key, ...more });

test('a finger going down marks with its own time, and its click marks nothing more', () => {
  const { live } = renderRoom(atSecond());
  const target = button(/^off-task/);
  const at = touchDown(target);
  fireEvent.pointerUp(target);
  fireEvent.click(target);
  expect(live.calls).toEqual([['touch', 'off', at]]);
});

test('each target says what it is', () => {
  const { live } = renderRoom(atSecond());
  const times = [/^on-task/, /^cannot see/].map((name) => touchDown(button(name)));
  touchDown(button(/^child before/));
  expect(live.calls).toEqual([['touch', 'on', times[0]], ['cannotSee', times[1]], ['childBefore']]);
});

test('a second finger beside a resting palm is heard', () => {
  const { live } = renderRoom(atSecond());
  for (const [name, pointerId] of [
    [/^on-task/, 1],
    [/^off-task/, 2],
  ] as const)
    fireEvent.pointerDown(button(name), { pointerId, isPrimary: pointerId === 1, button: 0 });
  expect(live.calls.map(([, code]) => code)).toEqual(['on', 'off']);
});

test('a click without a finger, as a screen reader makes it, marks once', () => {
  const { live } = renderRoom(atSecond());
  fireEvent.click(button(/^on-task/));
  expect(live.calls.map(([name, code]) => [name, code])).toEqual([['touch', 'on']]);
});

test('the browser neither scrolls, zooms nor opens menus at a target', () => {
  renderRoom(atSecond());
  const target = button(/^on-task/);
  for (const event of [
    new Event('touchstart', { cancelable: true }),
    new Event('contextmenu', { cancelable: true }),
  ]) {
    target.dispatchEvent(event);
    expect(event.defaultPrevented).toBe(true);
  }
});

test('the current child, the next one and what the interval holds are shown', () => {
  const { live } = renderRoom(atSecond());
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Otter-02');
  screen.getByText('then Otter-03');
  expect(button(/^on-task/).getAttribute('aria-pressed')).toBe('false');
  act(() => live.show(snapshotOf(header, [[31_000, marked(2, 'on')]], 31_500)));
  expect(button(/^on-task/).getAttribute('aria-pressed')).toBe('true');
});

test('partial interval: codes latch side by side, and none of these is an answer', () => {
  const codeSet: CodeSet = {
    name: 'Four',
    codes: ['on', 'a', 'b', 'c'].map((id, i) => ({
      id,
      label: `code ${id}`,
      role: i === 0 ? 'on-task' : 'off-task',
      definition: '',
      examples: '',
      nonExamples: '',
    })),
  };
  const partial = headerOf({ method: 'partial', observeMs: 10_000, codeSet }, ['before'], { plan });
  const { live } = renderRoom(
    snapshotOf(
      partial,
      [
        [1000, marked(1, 'a')],
        [2000, marked(1, 'c')],
      ],
      3000,
      { cuePart: 'observe' },
    ),
  );
  const pressed = screen
    .getAllByRole('button', { pressed: true })
    .map((target) => target.querySelector('.target-label')?.textContent);
  expect(pressed).toEqual(['code a', 'code c']);
  const at = touchDown(button(/^none of these/));
  expect(live.calls).toEqual([['touch', null, at]]);
  screen.getByText('watch');
});

test('keys do what their targets do: once, without modifiers, with their own time', () => {
  const { live } = renderRoom(atSecond());
  press('1');
  press('2', { repeat: true });
  press('2', { ctrlKey: true });
  press('PageUp');
  press('0');
  press('B');
  press('Backspace');
  press('f');
  press('s');
  press('6'); // no sixth code
  press('n'); // not in momentary recording
  expect(live.calls.map((call) => call.filter((part) => typeof part !== 'number'))).toEqual([
    ['touch', 'on'],
    ['touch', 'off'],
    ['cannotSee'],
    ['childBefore'],
    ['undo'],
    ['flag'],
    ['silence', true],
  ]);
  expect(typeof live.calls[0]?.[2]).toBe('number');
});

test('keys are silent while a note is open; the targets are not, and the note is kept', async () => {
  const user = userEvent.setup();
  const { live } = renderRoom(atSecond({ lastFlag: { writer: 'w', seq: 3 } }));
  await user.click(button('note …'));
  await user.type(screen.getByRole('textbox'), '1 bell rang 2');
  press('1');
  expect(live.calls).toEqual([]);
  touchDown(button(/^on-task/));
  expect(live.calls.map(([name]) => name)).toEqual(['touch']);
  await user.click(screen.getByRole('checkbox', { name: 'About the last flag' }));
  await user.click(button('Keep the note'));
  expect(live.calls.at(-1)).toEqual(['note', '1 bell rang 2', { writer: 'w', seq: 3 }]);
  press('1');
  expect(live.calls).toHaveLength(3);
});

test('a child leaves, comes back, and sits elsewhere', async () => {
  const user = userEvent.setup();
  const { live } = renderRoom(atSecond());
  const choose = async (...names: string[]) => {
    await user.click(button('child …'));
    for (const name of names)
      await user.click(within(screen.getByRole('dialog')).getByRole('button', { name }));
  };
  await choose('Otter-03', 'left the room');
  act(() => live.show({ away: new Map([['c3', 'left the room']]) }));
  screen.getByText('Away: Otter-03 (left the room)');
  await choose('Otter-03 (left the room)', 'came back');
  await choose('Otter-01', 'sits elsewhere …');
  await user.click(
    within(screen.getByRole('dialog')).getAllByRole('button', { name: /free/i })[0] as Element,
  );
  expect(live.calls).toEqual([
    ['childLeft', 'c3', 'left the room'],
    ['childReturned', 'c3'],
    ['childMoved', 'c1', 's3'],
  ]);
});

test('undo says what it would undo', () => {
  const undo = {
    target: { writer: 'w', seq: 0 },
    kind: 'marked',
    interval: 1,
    child: null,
    code: 'on',
  } as const;
  const { live } = renderRoom(atSecond({ undo }));
  fireEvent.click(button(/^undo\s*on-task\s*Otter-01$/));
  expect(live.calls).toEqual([['undo']]);
});

test('before the first mark no number is shown that could be read as looks; then it is entries, and whether all are kept', () => {
  const kept = { kept: 4, of: 4, refused: null };
  const { live, container } = renderRoom(snapshotOf(header, [], 16_000, { kept }));
  const sign = () => container.querySelector('.room-kept')?.textContent;
  expect(sign()).toBe('nothing marked yet');
  act(() => live.show({ kept: { ...kept, kept: 3 } }));
  expect(sign()).toBe('4 entries, 3 kept');
  act(() => live.show(atSecond({ kept })));
  expect(sign()).toBe('4 entries, all kept');
});

test('targets are calm until the first prompt, and a touch is answered all the same', () => {
  const { live } = renderRoom(snapshotOf(header, [], 3000));
  const waits = (name: RegExp) => button(name).getAttribute('aria-disabled');
  const names = [/^on-task/, /^off-task/, /^cannot see/, /^child before/];
  expect(names.map(waits)).toEqual(['true', 'true', 'true', 'true']);
  touchDown(button(/^on-task/));
  expect(live.calls.map(([name]) => name)).toEqual(['touch']);
  act(() => live.show(snapshotOf(header, [], 16_000)));
  expect(names.map(waits)).toEqual(['false', 'false', 'false', 'true']);
  act(() => live.show(atSecond()));
  expect(waits(/^child before/)).toBe('false');
});

test('the bottom row holds the same buttons in the same order, whatever goes on', () => {
  const { live } = renderRoom(atSecond({ mayPause: true }));
  const row = () =>
    within(screen.getByRole('group', { name: /now and then/ }))
      .getAllByRole('button')
      .map((one) => (one.className.includes('rare-silence') ? 'silence' : one.textContent));
  const running = row();
  expect(running).toEqual(expect.arrayContaining(['class interrupted', 'pause', 'break started']));
  for (const changes of [
    { phase: 'counting in' },
    { phase: 'interrupted' },
    { phase: 'paused' },
    { phase: 'between parts', current: null, breakStarted: true },
    { phase: 'running', part: 1 },
  ] as const) {
    act(() => live.show(changes));
    expect(row()).toEqual(running);
    fireEvent.click(button('break started'));
  }
  expect(live.calls).toEqual([]);
  expect(button('break started').getAttribute('aria-disabled')).toBe('true');
  expect(button('pause').getAttribute('aria-disabled')).toBe('false');
});

test('only an observer who records alone may pause', () => {
  const { live } = renderRoom(atSecond());
  expect(screen.queryByRole('button', { name: 'pause' })).toBeNull();
  act(() => live.show({ mayPause: true }));
  fireEvent.click(button('pause'));
  act(() => live.show({ phase: 'paused' }));
  screen.getByRole('heading', { name: 'Paused.' });
  expect(screen.queryByRole('button', { name: /^on-task/ })).toBeNull();
  fireEvent.click(button('Go on'));
  expect(live.calls).toEqual([['pause'], ['resume']]);
});

test('an interrupted class is said in full, with one main button', () => {
  const { live } = renderRoom(atSecond());
  fireEvent.click(button('class interrupted'));
  act(() => live.show({ phase: 'interrupted' }));
  screen.getByRole('heading', { name: 'The class is interrupted.' });
  fireEvent.click(button('The class goes on'));
  expect(live.calls).toEqual([['interruptClass'], ['continueClass']]);
});

test('after "break started" the last look can still be marked, then the first task opens the next part', () => {
  const { live } = renderRoom(atSecond());
  fireEvent.click(button('break started'));
  act(() => live.show({ phase: 'between parts', breakStarted: true, nextPart: { part: 1, phase: 'after' } }));
  touchDown(button(/^on-task/));
  act(() => live.show({ current: null }));
  expect(screen.queryByRole('button', { name: /^on-task/ })).toBeNull();
  screen.getByText(/“after” begins after three, two, one/);
  fireEvent.click(button('First task given'));
  expect(live.calls.map(([name]) => name)).toEqual(['breakStarted', 'touch', 'firstTaskGiven']);
});

test('no name of a class, no condition, no percentage and no code count is on the glass', () => {
  const { container } = renderRoom(atSecond());
  expect(container.textContent).not.toMatch(/%|Class Otter|Quill|break\b(?! started)|percent/i);
});

test('nothing chatters: the only live region speaks of holds, and it is silent', () => {
  const { container, live } = renderRoom(atSecond());
  const regions = () => [...container.querySelectorAll('[role=status],[role=alert],[aria-live]')];
  expect(regions().map((region) => region.textContent)).toEqual(['']);
  act(() => live.show(snapshotOf(header, [], 46_000)));
  expect(regions().map((region) => region.textContent)).toEqual(['']);
});

test('each hold is one sentence at its place, the worst first', () => {
  const refused = problem('store.full').problem;
  const { live, container } = renderRoom(atSecond({ wakeLock: 'refused' }));
  const line = () => container.querySelector('.hold-line')?.textContent ?? '';
  const sound = live.snapshot().sound;
  expect(line()).toMatch(/fall asleep/);
  act(() => live.show({ sound: { ...sound, heard: false } }));
  expect(line()).toMatch(/gives no sound/);
  fireEvent.click(button('Try the sound'));
  act(() => live.show({ sound: { ...sound, on: false, cause: 'device' } }));
  expect(line()).toMatch(/output changed/);
  act(() => live.show({ kept: { kept: 41, of: 43, refused } }));
  expect(line()).toMatch(/^Kept 41 of 43 entries\./);
  act(() => live.show({ kept: { kept: 43, of: 43, refused: null }, sound }));
  fireEvent.click(button('Seen'));
  expect(line()).toBe('');
  expect(live.calls).toEqual([['silence', false]]);
});

test('silence by hand is no hold, and one touch gives the sound back', () => {
  const { live, container } = renderRoom(atSecond());
  fireEvent.click(button('silence'));
  act(() => live.show({ sound: { ...live.snapshot().sound, on: false, cause: 'hand' } }));
  expect(container.querySelector('.hold-line')?.textContent).toBe('');
  fireEvent.click(button('sound on'));
  expect(live.calls).toEqual([
    ['silence', true],
    ['silence', false],
  ]);
});

test('a touch that was not taken is said until the next look; an echo is not worth a word', () => {
  const { live, container } = renderRoom(atSecond());
  const line = () => container.querySelector('.hold-line')?.textContent ?? '';
  act(() => live.show({ refusal: { count: 1, why: 'double touch' } }));
  expect(line()).toBe('');
  act(() => live.show({ refusal: { count: 2, why: 'nothing before' } }));
  expect(line()).toBe('There is no look before this one.');
  act(() => live.show(snapshotOf(header, [], 46_000, { refusal: { count: 2, why: 'nothing before' } })));
  expect(line()).toBe('');
});

test('the frame of the visual cue is shown once a cue, where it is asked for', () => {
  const { live, container } = renderRoom(atSecond({ flash: 4 }));
  const flash = () => container.querySelector('[data-flash]')?.getAttribute('data-flash') ?? null;
  act(() => live.show({ flash: 5 }));
  expect(flash()).toBeNull();
  act(() => live.show({ flash: 6, flashStrongly: true }));
  expect(flash()).toBe('6');
});

test('the start waits for a tap, and tells two observers when to touch', async () => {
  const { live } = renderRoom(snapshotOf(header, [], -1, { phase: 'ready' }));
  await screen.findByText(/Both observers touch on “one”/);
  live.begun = problem('session.otherTab');
  await userEvent.setup().click(button('Start'));
  expect(live.calls).toEqual([['begin']]);
  screen.getByRole('alert');
  expect((button('Start') as HTMLButtonElement).disabled).toBe(false);
  act(() => live.show({ phase: 'counting in', countIn: 3 }));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('3');
});

test('ending asks once, with what it costs', async () => {
  const user = userEvent.setup();
  const { live } = renderRoom(atSecond());
  await user.click(button('end …'));
  screen.getByText(/10 looks not made yet will be missing/);
  await user.type(screen.getByRole('textbox'), 'fire drill');
  await user.click(button('End the session'));
  expect(live.calls).toEqual([['end', 'fire drill']]);
});

test('at the end it says what is kept, and leaves only when all of it is', async () => {
  const user = userEvent.setup();
  const ended = atSecond({
    phase: 'ended',
    ended: 'complete',
    kept: { kept: 41, of: 43, refused: problem('store.full').problem },
  });
  const { live, recorder, visited } = renderRoom(ended);
  screen.getByText(/^Kept 41 of 43/);
  await user.click(button('Try again'));
  expect(live.calls).toEqual([['flush']]);
  act(() => live.show({ kept: { kept: 43, of: 43, refused: null } }));
  screen.getByText('All kept: 43 entries (prompts, touches and notes).');
  await user.click(button('Go to its figures'));
  expect(visited.at(-1)).toBe('/afterwards/session/session-1');
  expect(recorder.currentId()).toBeNull();
});

test('the tab cannot be left by accident while recording, and can before and after', () => {
  const leave = () => {
    const event = new Event('beforeunload', { cancelable: true });
    window.dispatchEvent(event);
    return event.defaultPrevented;
  };
  const { live, container } = renderRoom(atSecond({ phase: 'ready' }));
  expect(leave()).toBe(false);
  act(() => live.show({ phase: 'running' }));
  expect(leave()).toBe(true);
  act(() => void window.dispatchEvent(new Event('popstate')));
  expect(container.querySelector('.hold-line')?.textContent).toMatch(/^Still recording/);
  act(() => live.show({ phase: 'ended', kept: { kept: 2, of: 2, refused: null } }));
  expect(leave()).toBe(false);
});
