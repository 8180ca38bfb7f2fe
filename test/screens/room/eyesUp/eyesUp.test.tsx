// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import type { EntryBody } from '../../../../src/journal/entry.ts';
import type { CodeSet } from '../../../../src/model/codeSet.ts';
import { headerOf } from '../../../support/session.ts';
import { plan, snapshotOf } from '../fakeLive.ts';
import { renderLiked } from '../renderLiked.tsx';

afterEach(cleanup);

const header = headerOf({}, ['before', 'after'], { plan });
const marked = (interval: number, code: string | null): EntryBody => ({ kind: 'marked', interval, code });
const atSecond = (changes = {}) => snapshotOf(header, [[16_000, marked(1, 'on')]], 31_000, changes);
const button = (name: string | RegExp) => screen.getByRole('button', { name });
const places = () =>
  within(screen.getByRole('region', { name: 'Places to touch' }))
    .getAllByRole('button')
    .map((one) => one.querySelector('.target-label')?.firstChild?.textContent);

function touchDown(element: Element, pointerId = 1): number {
  const event = new PointerEvent('pointerdown', {
    bubbles: true,
    cancelable: true,
    button: 0,
    pointerId,
    isPrimary: pointerId === 1,
  });
  act(() => void element.dispatchEvent(event));
  return event.timeStamp;
}

/** So many kinds of off-task, beside on-task. */
const kinds = (n: number): CodeSet => ({
  name: 'kinds',
  codes: Array.from({ length: n + 1 }, (_, i) => ({
    id: `k${i}`,
    label: i === 0 ? 'on-task' : `off-task ${i}`,
    role: i === 0 ? 'on-task' : 'off-task',
    definition: '',
    examples: '',
    nonExamples: '',
  })),
});

describe('eyes-up', () => {
  test('has a place for each code from edge to edge, with how its answer is felt', async () => {
    const { live, container } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    expect(places()).toEqual(['on-task', 'off-task', 'cannot see']);
    expect(button(/^off-task/).textContent).toContain('two short pulses');
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Otter-02');
    screen.getByText('then Otter-03');
    screen.getByText(/^1 entry, all kept$/);
    expect(screen.queryByRole('figure')).toBeNull();
    expect(container.querySelector('main')?.className).toContain('glass-dim');
    const at = touchDown(button(/^off-task/));
    expect(live.calls).toEqual([['touch', 'off', at]]);
  });

  test('any finger counts, and each is told to the recorder, which knows echoes', async () => {
    const { live } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    touchDown(button(/^cannot see/), 1);
    touchDown(button(/^on-task/), 2);
    expect(live.calls.map(([name]) => name)).toEqual(['cannotSee', 'touch']);
  });

  test('nothing is said of pulses to an observer who wants no answers', async () => {
    const { live } = await renderLiked({ layout: 'eyes-up', confirm: false }, atSecond());
    expect(button(/^off-task/).textContent).toBe('off-task2');
    expect(live.manners.at(-1)).toEqual({ confirm: false, remind: false });
  });

  test('a colour theme that was chosen light stays light', async () => {
    const { container, services } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    await act(async () => void (await services.store.saveSettings({ theme: 'light' })));
    await waitFor(() => expect(container.querySelector('main')?.className).not.toContain('glass-dim'));
  });

  test('a recalled prompt is shown as a stroke, once', async () => {
    const { live, container } = await renderLiked({ layout: 'eyes-up', remind: true }, atSecond());
    const stroke = () => container.querySelectorAll('.recalled').length;
    expect(stroke()).toBe(0);
    act(() => live.show({ reminded: 1 }));
    expect(stroke()).toBe(1);
    expect(live.manners.at(-1)).toEqual({ confirm: true, remind: true });
  });

  test('places stay while a panel is open, and after the break has begun as long as a look is open', async () => {
    const { live } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    fireEvent.click(button('more …'));
    fireEvent.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'note …' }));
    expect(places()).toHaveLength(3);
    fireEvent.click(button('Cancel'));
    act(() =>
      live.show({ phase: 'between parts', breakStarted: true, nextPart: { part: 1, phase: 'after' } }),
    );
    screen.getByRole('heading', { name: 'Break.' });
    expect(places()).toHaveLength(3);
    act(() => live.show({ current: null }));
    expect(screen.queryByRole('region', { name: 'Places to touch' })).toBeNull();
    fireEvent.click(button('First task given'));
    expect(live.calls).toEqual([['firstTaskGiven']]);
  });

  test('flag and "child before" wait behind "more"', async () => {
    const { live } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    fireEvent.click(button('more …'));
    fireEvent.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'child before' }));
    fireEvent.click(button('more …'));
    fireEvent.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'flag' }));
    expect(live.calls).toEqual([['childBefore'], ['flag']]);
  });

  test('keys and page-turners work as ever', async () => {
    const { live } = await renderLiked({ layout: 'eyes-up' }, atSecond());
    for (const key of ['PageDown', 'PageUp', '0', 'u']) fireEvent.keyDown(document.body, { key });
    expect(live.calls.map(([name, code]) => [name, code])).toEqual([
      ['touch', 'on'],
      ['touch', 'off'],
      ['cannotSee', expect.any(Number)],
      ['undo', undefined],
    ]);
  });

  test('partial interval: codes latch side by side, none of these has a corner', async () => {
    const partial = headerOf({ method: 'partial', observeMs: 10_000 }, ['before'], { plan });
    const { live } = await renderLiked(
      { layout: 'eyes-up' },
      snapshotOf(
        partial,
        [
          [1000, marked(1, 'on')],
          [2000, marked(1, 'off')],
        ],
        3000,
        { cuePart: 'observe' },
      ),
    );
    expect(places()).toEqual(['on-task', 'none of these', 'off-task', 'cannot see']);
    screen.getByText('watch');
    expect(screen.getAllByRole('button', { pressed: true })).toHaveLength(2);
    const at = touchDown(button(/^none of these/));
    expect(live.calls).toEqual([['touch', null, at]]);
  });

  test('with more codes than places the seating plan stays, and it is said before the start and at the choice', async () => {
    const many = headerOf({ codeSet: kinds(4) }, ['before'], { plan });
    const { live } = await renderLiked({ layout: 'eyes-up' }, snapshotOf(many, [], -1, { phase: 'ready' }));
    await screen.findByText(/^Eyes-up has five places at most/);
    act(() => live.show(snapshotOf(many, [], 16_000)));
    screen.getByRole('figure');
    fireEvent.click(button('layout …'));
    expect((screen.getByRole('radio', { name: /^eyes-up/ }) as HTMLInputElement).disabled).toBe(true);
  });

  test('headcounts keep the seating plan', async () => {
    const heads = headerOf({ method: 'headcount' }, ['before'], { plan });
    await renderLiked({ layout: 'eyes-up' }, snapshotOf(heads, [], -1, { phase: 'ready' }));
    await screen.findByText(/^Eyes-up is not for headcounts/);
  });
});

describe('how the observer likes it', () => {
  test('is changed in the room at once, kept on the observer, and told to the recorder', async () => {
    const { live, kept } = await renderLiked({}, atSecond());
    screen.getByRole('figure');
    fireEvent.click(button('layout …'));
    fireEvent.click(screen.getByRole('radio', { name: /^eyes-up/ }));
    expect(screen.queryByRole('figure')).toBeNull();
    // Eyes-up begins with prompts recalled.
    expect(live.manners.at(-1)).toEqual({ confirm: true, remind: true });
    await waitFor(async () =>
      expect(await kept()).toEqual({ layout: 'eyes-up', hand: 'right', confirm: true, remind: true }),
    );
    fireEvent.click(screen.getByRole('checkbox', { name: /^Answer each touch/ }));
    fireEvent.click(screen.getByRole('checkbox', { name: /^Recall a prompt/ }));
    fireEvent.click(screen.getByRole('radio', { name: /^left-handed/ }));
    expect(live.manners.at(-1)).toEqual({ confirm: false, remind: false });
    await waitFor(async () =>
      expect(await kept()).toEqual({ layout: 'eyes-up', hand: 'left', confirm: false, remind: false }),
    );
    await screen.findByText('Kept for this observer.');
  });

  test('the hand mirrors both layouts', async () => {
    const { container } = await renderLiked({ hand: 'left' }, atSecond());
    expect(container.querySelector('main')?.getAttribute('data-hand')).toBe('left');
    expect(
      within(screen.getByRole('region', { name: 'Codes, right edge' })).getByRole('button', {
        name: /^on-task/,
      }),
    ).toBeTruthy();
  });
});
