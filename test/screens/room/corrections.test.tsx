// @vitest-environment happy-dom
import { cleanup, fireEvent, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import type { Protocol } from '../../../src/model/protocol.ts';
import { headerOf } from '../../support/session.ts';
import { plan } from './fakeLive.ts';
import { renderLesson, touchAt } from './renderLesson.tsx';

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole('button', { name });
const panel = () => within(screen.getByRole('dialog'));
const inPanel = (...names: (string | RegExp)[]) => {
  for (const name of names) fireEvent.click(panel().getByRole('button', { name }));
};
const outcomes = (room: Awaited<ReturnType<typeof lessonOf>>) =>
  room.lesson.session
    .snapshot()
    .intervals.map((line) => line.codes?.join('+') ?? line.missing ?? line.status);

/** Looks at Otter-01, 02, 03 at 15, 30, 45 s: on-task, off-task, and the third one open. */
async function lessonOf(changes: Partial<Protocol> = {}) {
  const room = await renderLesson(headerOf(changes, ['before'], { plan, role: null }));
  await room.until(16);
  room.touch(/^on-task/);
  await room.until(31);
  room.touch(/^off-task/);
  await room.until(46);
  return room;
}

describe('one of the last looks', () => {
  test('is chosen, then what it should be, then said before it is done; undo names it', async () => {
    const room = await lessonOf();
    fireEvent.click(button('correct …'));
    inPanel('one of the last looks …');
    const looks = panel()
      .getAllByRole('button')
      .map((one) => one.textContent);
    expect(looks.slice(0, 3)).toEqual([
      '3 · Otter-03nothing yet',
      '2 · Otter-02off-task',
      '1 · Otter-01on-task',
    ]);
    inPanel(/^2 · Otter-02/, 'on-task');
    panel().getByText('off-task → on-task');
    expect(outcomes(room).slice(0, 3)).toEqual(['on', 'off', 'open']);
    inPanel('Correct it');
    expect(outcomes(room).slice(0, 3)).toEqual(['on', 'on', 'open']);
    expect(screen.queryByRole('dialog')).toBeNull();
    fireEvent.click(button(/^undo\s*correction Otter-02$/));
    expect(outcomes(room).slice(0, 3)).toEqual(['on', 'off', 'open']);
  });

  test('may be missing; what it holds already is nothing to do', async () => {
    const room = await lessonOf();
    fireEvent.click(button('correct …'));
    inPanel('one of the last looks …', /^1 · Otter-01/, 'on-task');
    panel().getByText('That is what it holds.');
    expect((button('Correct it') as HTMLButtonElement).disabled).toBe(true);
    inPanel('with another adult');
    panel().getByText('on-task → missing: with another adult');
    inPanel('Correct it');
    expect(outcomes(room)[0]).toBe('with another adult');
  });

  test('targets stay live while the panel is open', async () => {
    const room = await lessonOf();
    fireEvent.click(button('correct …'));
    inPanel('one of the last looks …', /^1 · Otter-01/);
    const target = screen.getAllByRole('button', { name: /^off-task/ }).at(-1);
    touchAt(target as HTMLElement, room.lesson.clock.page);
    expect(outcomes(room).slice(0, 3)).toEqual(['on', 'off', 'off']);
  });

  test('several codes where several may be marked', async () => {
    const room = await lessonOf({ method: 'partial', observeMs: 10_000 });
    fireEvent.click(button('correct …'));
    // Otter-02 was watched from 15 to 30 s: on-task.
    inPanel('one of the last looks …', /^2 · Otter-02/, 'off-task');
    panel().getByText('on-task → on-task and off-task');
    inPanel('Correct it');
    expect(outcomes(room)[1]).toBe('on+off');
  });

  test('a scan gets another count', async () => {
    const room = await renderLesson(
      headerOf({ method: 'headcount', partLength: { kind: 'minutes', minutes: 2 } }, ['before'], { plan }),
    );
    await room.until(16);
    room.touch(/^all on-task/);
    await room.until(31);
    fireEvent.click(button('correct …'));
    inPanel('one of the last scans …', /^1/, 'fewer on-task', 'more present');
    panel().getByText('3 of 3 → 2 of 4');
    inPanel('Correct it');
    expect(room.lesson.session.snapshot().intervals[0]?.counts).toEqual({ on: 2, present: 4 });
  });
});

describe('two children taken for each other', () => {
  test('who and who, over how many looks, which pairs; undone as one', async () => {
    const room = await lessonOf();
    fireEvent.click(button('correct …'));
    inPanel('two children taken for each other …', 'Otter-01', 'Otter-02');
    panel().getByText('Otter-01, look 1 → off-task; Otter-02, look 2 → on-task');
    inPanel('fewer looks');
    panel().getByText(/no turns to change/);
    expect((button('Swap 0 pairs') as HTMLButtonElement).disabled).toBe(true);
    inPanel('more looks', 'Swap 1 pair');
    expect(outcomes(room).slice(0, 3)).toEqual(['off', 'on', 'open']);
    fireEvent.click(button(/^undo\s*swap$/));
    expect(outcomes(room).slice(0, 3)).toEqual(['on', 'off', 'open']);
  });

  test('is not offered where one child is watched', async () => {
    await lessonOf({ rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } });
    fireEvent.click(button('correct …'));
    expect(panel().queryByRole('button', { name: /taken for each other/ })).toBeNull();
  });
});

describe('a stretch of no use', () => {
  test('says how many looks it takes, needs a reason, and can be undone', async () => {
    const room = await lessonOf();
    fireEvent.click(button('correct …'));
    inPanel('a stretch is of no use …', 'the last minute');
    panel().getByText('From 0:00 to 0:46: 3 looks will be missing, 2 of them marked.');
    expect((button('Take it out') as HTMLButtonElement).disabled).toBe(true);
    inPanel('since a look …', /^2 · Otter-02/);
    panel().getByText('From 0:30 to 0:46: 2 looks will be missing, 1 of them marked.');
    inPanel('other reason', 'Take it out');
    expect(outcomes(room).slice(0, 4)).toEqual(['on', 'other', 'other', 'waiting']);
    fireEvent.click(button(/^undo\s*stretch of no use$/));
    expect(outcomes(room).slice(0, 4)).toEqual(['on', 'off', 'open', 'waiting']);
  });

  test('of a duration record it is time; what holds goes on after it, and single onsets are not corrected', async () => {
    const room = await renderLesson(
      headerOf(
        { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 3 } },
        ['before'],
        { plan },
      ),
    );
    await room.until(5);
    room.touch(/^on-task/);
    await room.until(90);
    fireEvent.click(button('correct …'));
    expect(panel().queryByRole('button', { name: /last looks/ })).toBeNull();
    inPanel('a stretch is of no use …', 'the last minute', 'no mark');
    panel().getByText('The time from 0:30 to 1:30 will be missing.');
    inPanel('Take it out');
    await room.until(100);
    expect(outcomes(room)).toEqual(['missed', 'on', 'missed', 'on']);
  });
});
