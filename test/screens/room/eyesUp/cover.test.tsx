// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { headerOf } from '../../../support/session.ts';
import { plan, snapshotOf } from '../fakeLive.ts';
import { renderLiked } from '../renderLiked.tsx';

afterEach(cleanup);

const header = headerOf({}, ['before'], { plan });
const now = (changes = {}) => snapshotOf(header, [], 31_000, changes);
const button = (name: string | RegExp) => screen.getByRole('button', { name });
const corner = () => button('Uncover: hold');
/** All that can be read under the cover: how to turn the page. */
const how = 'hold the corner';
const isCovered = () => screen.queryByRole('button', { name: 'Uncover: hold' }) !== null;

/** What an eye can read on the glass: all words but those that are hidden from it. */
function readable(container: HTMLElement): string {
  const copy = container.cloneNode(true) as HTMLElement;
  for (const hidden of copy.querySelectorAll('.visually-hidden, .zones-covered .target > *')) hidden.remove();
  return copy.textContent?.trim() ?? '';
}

async function covered(changes = {}) {
  const room = await renderLiked({}, now(changes));
  expect(readable(room.container)).toMatch(/on-task.*Otter-02/);
  fireEvent.click(button('cover'));
  return room;
}

describe('the cover', () => {
  test('comes at one touch, leaves nothing to read but how it goes, and is not journalled', async () => {
    const { container, live } = await covered();
    expect(readable(container)).toBe(how);
    expect(live.calls).toEqual([]);
  });

  test('prompts go on, and marks are still possible at the places of eyes-up', async () => {
    const { container, live } = await covered();
    const event = new PointerEvent('pointerdown', { bubbles: true, cancelable: true, button: 0 });
    act(() => void button(/^off-task/).dispatchEvent(event));
    act(() => live.show({ flash: 1, flashStrongly: true }));
    expect(container.querySelector('.flash')).not.toBeNull();
    expect(live.calls).toEqual([['touch', 'off', event.timeStamp]]);
    expect(readable(container)).toBe(how);
  });

  test('the observer’s screen reader still says whom to look at', async () => {
    await covered();
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Otter-02');
  });

  test('a touch of the corner only says what to do; held long enough it uncovers', async () => {
    const { container, wakeUp } = await covered();
    fireEvent.pointerDown(corner());
    fireEvent.pointerUp(corner());
    fireEvent.click(corner(), { detail: 1 });
    expect(isCovered()).toBe(true);
    expect(readable(container)).toBe('hold it longer');
    wakeUp();
    expect(readable(container)).toBe(how);
    fireEvent.pointerDown(corner());
    expect(isCovered()).toBe(true);
    wakeUp();
    expect(isCovered()).toBe(false);
    screen.getByRole('figure');
  });

  test('a click without a finger uncovers, as a screen reader or Enter makes it', async () => {
    await covered();
    fireEvent.click(corner());
    expect(isCovered()).toBe(false);
  });

  test('the key covers and uncovers, and the other keys work under it', async () => {
    const { live } = await renderLiked({}, now());
    fireEvent.keyDown(document.body, { key: 'c' });
    expect(isCovered()).toBe(true);
    fireEvent.keyDown(document.body, { key: '1' });
    fireEvent.keyDown(document.body, { key: 'Backspace' });
    expect(live.calls.map(([name]) => name)).toEqual(['touch', 'undo']);
    fireEvent.keyDown(document.body, { key: 'c' });
    expect(isCovered()).toBe(false);
  });

  test('a headcount has no places under it: keys count, and that is said where the cover is explained', async () => {
    const heads = headerOf({ method: 'headcount', lookAt: 'start' }, ['before'], { plan });
    const { live } = await renderLiked({}, snapshotOf(heads, [], 1000));
    fireEvent.click(button('layout …'));
    screen.getByText(/no places to touch: mark by keys/);
    fireEvent.click(button('Close'));
    fireEvent.click(button('cover'));
    expect(screen.getAllByRole('button')).toEqual([corner()]);
    fireEvent.keyDown(document.body, { key: '+' });
    expect(live.calls.map(([name, on]) => [name, on])).toEqual([['count', 1]]);
  });

  test('the finger that uncovered lifts over another button, and works nothing there', async () => {
    const { live, wakeUp } = await covered();
    fireEvent.pointerDown(corner());
    wakeUp();
    expect(isCovered()).toBe(false);
    fireEvent.click(button('silence'), { detail: 1 });
    expect(live.calls).toEqual([]);
    fireEvent.pointerDown(button('silence'));
    fireEvent.click(button('silence'), { detail: 1 });
    expect(live.calls.map(([name]) => name)).toEqual(['silence']);
  });

  test('a note that is being typed outlives the cover', async () => {
    await renderLiked({}, now());
    fireEvent.click(button('note …'));
    const typed = 'the class next door came';
    fireEvent.change(screen.getByRole('textbox'), { target: { value: typed } });
    fireEvent.click(button('cover'));
    fireEvent.click(corner());
    expect((screen.getByRole('textbox') as HTMLTextAreaElement).value).toBe(typed);
    fireEvent.click(button('Cancel'));
    fireEvent.click(button('note …'));
    expect((screen.getByRole('textbox') as HTMLTextAreaElement).value).toBe('');
  });

  test('what is covered stays covered through an interruption and past the end', async () => {
    const { container, live } = await covered();
    act(() => live.show({ phase: 'interrupted' }));
    expect(readable(container)).toBe(how);
    act(() => live.show({ phase: 'ended', ended: 'complete', current: null, upcoming: null }));
    expect(readable(container)).toBe(how);
    fireEvent.click(corner());
    screen.getByRole('heading', { name: 'The session is over.' });
  });
});
