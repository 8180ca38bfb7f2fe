// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import type { Protocol } from '../../../src/model/protocol.ts';
import { headerOf } from '../../support/session.ts';
import { plan } from './fakeLive.ts';
import { renderLesson } from './renderLesson.tsx';

afterEach(cleanup);

const lessonOf = (changes: Partial<Protocol>, more: Parameters<typeof headerOf>[2] = {}) =>
  renderLesson(headerOf(changes, ['before'], { plan, role: null, ...more }));
const button = (name: string | RegExp) => screen.getByRole('button', { name });
const seat = (name: string) => screen.getByRole('button', { name: name.replace('-', '- ') });

describe('whole interval', () => {
  test('says "throughout", takes several codes, and "none" is an answer', async () => {
    const room = await lessonOf({ method: 'whole', observeMs: 10_000 });
    await room.until(1);
    expect(room.lead()).toBe('watch: what lasts throughout?');
    await room.until(11);
    expect(room.lead()).toBe('now record what lasted throughout');
    room.touch(/^on-task\s*throughout/);
    await room.until(12);
    room.touch(/^off-task/);
    expect(button(/^on-task/).getAttribute('aria-pressed')).toBe('true');
    expect(button(/^off-task/).getAttribute('aria-pressed')).toBe('true');
    await room.until(16);
    room.touch(/^none of these throughout/);
    await room.until(31);
    expect(room.lesson.outcome().slice(0, 2)).toEqual(['on+off', 'none']);
  });
});

describe('headcount', () => {
  const scans = {
    method: 'headcount',
    intervalMs: 60_000,
    observeMs: 60_000,
    partLength: { kind: 'minutes', minutes: 4 },
  } as const;
  const counts = (room: Awaited<ReturnType<typeof lessonOf>>) =>
    room.lesson.session.snapshot().intervals.map((line) => line.counts ?? line.missing ?? line.status);

  test('is counted by steps, each a mark at once; the next prompt begins anew', async () => {
    const room = await lessonOf(scans);
    await room.until(60.1);
    expect(room.heading()).toBe('Not counted yet – of 3');
    screen.getByText('scan 1 of 4');
    room.touch(/^one more/);
    await room.until(60.3);
    room.touch(/^one more/);
    expect(room.heading()).toBe('2 of 3');
    expect(counts(room)[0]).toEqual({ on: 2, present: 3 });
    await room.until(120.1);
    expect(room.heading()).toMatch(/– of 3$/);
    room.touch(/^as last time/);
    expect(room.heading()).toBe('2 of 3');
    await room.until(121);
    room.touch(/^all on-task/);
    expect(room.heading()).toBe('3 of 3');
    await room.until(122);
    room.touch(/^nobody on-task/);
    expect(counts(room)[1]).toEqual({ on: 0, present: 3 });
  });

  test('each target says what the figure becomes', async () => {
    const room = await lessonOf(scans);
    await room.until(60.1);
    const hint = (name: RegExp) => button(name).querySelector('.target-hint')?.textContent;
    expect([hint(/^one more/), hint(/^one fewer/), hint(/^all/), hint(/^nobody/), hint(/^as last/)]).toEqual([
      '→ 1',
      '→ 2',
      '→ 3',
      '→ 0',
      'no scan before',
    ]);
  });

  test('seats are touched instead; undo takes the last one back, seat and figure together', async () => {
    const room = await lessonOf(scans);
    await room.until(61);
    room.touch('Otter- 01');
    await room.until(61.5);
    room.touch('Otter- 03');
    expect(room.heading()).toBe('2 of 3');
    expect(seat('Otter-03').getAttribute('aria-pressed')).toBe('true');
    fireEvent.click(button(/^undo\s*2 of 3$/));
    expect(room.heading()).toBe('1 of 3');
    expect(seat('Otter-03').getAttribute('aria-pressed')).toBe('false');
    expect(seat('Otter-01').getAttribute('aria-pressed')).toBe('true');
    await room.until(62);
    room.touch('Otter- 01');
    expect(counts(room)[0]).toEqual({ on: 0, present: 3 });
    await room.until(121);
    expect(seat('Otter-01').getAttribute('aria-pressed')).toBe('false');
  });

  test('those present are carried along, also when said before anybody was counted', async () => {
    const room = await lessonOf(scans);
    await room.until(61);
    room.touch('more present');
    room.touch('more present');
    expect(counts(room)[0]).toBe('open');
    room.touch(/^one more/);
    await room.until(121);
    screen.getByText('5 present');
    room.touch(/^all on-task/);
    await room.until(122);
    room.touch('fewer present');
    expect(counts(room).slice(0, 2)).toEqual([
      { on: 1, present: 5 },
      { on: 5, present: 5 },
    ]);
  });

  test('a scan that is not possible is missing; keys step, answer and never turn back', async () => {
    const room = await lessonOf(scans);
    await room.until(61);
    room.touch(/^cannot see/);
    expect(room.heading()).toBe('no scan possible');
    await room.until(121);
    let at = 121;
    const press = async (key: string) => {
      at += 0.5;
      await room.until(at);
      const event = new KeyboardEvent('keydown', { key, bubbles: true });
      Object.defineProperty(event, 'timeStamp', { value: room.lesson.clock.page });
      act(() => void document.body.dispatchEvent(event));
    };
    for (const key of ['b', '+', 'PageDown', '-', '+', '+', '+']) await press(key);
    expect(counts(room).slice(0, 2)).toEqual(['out of view', { on: 3, present: 3 }]);
    expect(screen.queryByRole('button', { name: /^child before/ })).toBeNull();
  });
});

describe('duration', () => {
  const watching = {
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 2 },
  } as const;

  test('what is in force is said with its onset and its time; the next touch ends it', async () => {
    const room = await lessonOf(watching);
    await room.until(5);
    expect(room.heading()).toBe('Otter-01');
    expect(room.below()).toBe('Nothing is in force. Touch what the child does now.');
    room.touch(/^on-task/);
    await room.until(20);
    expect(room.below()).toBe('on-task since 0:05');
    expect(button(/^on-task/).textContent).toContain('for 0:15');
    room.touch(/^none of these/);
    await room.until(26);
    expect(room.below()).toBe('none of these since 0:20');
    expect(button(/^on-task/).getAttribute('aria-pressed')).toBe('false');
    room.touch(/^cannot see/);
    await room.until(30);
    expect(room.below()).toBe('cannot see since 0:26');
    expect(screen.queryByText(/^round|^scan/)).toBeNull();
    expect(screen.queryByRole('button', { name: /^child before/ })).toBeNull();
  });

  test('after an interruption nothing is in force', async () => {
    const room = await lessonOf(watching);
    await room.until(5);
    room.touch(/^on-task/);
    await room.until(10);
    fireEvent.click(button('class interrupted'));
    screen.getByText(/Then touch anew what the child does/);
    await room.until(15);
    fireEvent.click(button('The class goes on'));
    expect(room.below()).toBe('Nothing is in force. Touch what the child does now.');
    expect(screen.queryAllByRole('button', { pressed: true })).toEqual([]);
    const ribbon = screen.getByRole('img', { name: /^Session/ });
    expect(ribbon.getAttribute('aria-label')).toBe('Session: 0:15 of 2:00 minutes; 0:10 minutes are missing');
  });

  test('undo names the onset it takes back; the end says what was not watched', async () => {
    const room = await lessonOf(watching);
    await room.until(5);
    room.touch(/^on-task/);
    await room.until(30);
    room.touch(/^off-task/);
    fireEvent.click(button(/^undo\s*off-task\s*Otter-01$/));
    await room.until(31);
    expect(room.below()).toBe('on-task since 0:05');
    fireEvent.click(button('end …'));
    screen.getByText(/^The last 1:29 minutes will be missing/);
    fireEvent.click(button('End the session'));
    screen.getByText(/^1:34 minutes are missing of 2:00 minutes\./);
  });
});

describe('sweep', () => {
  test('shows how far it is, and is calm until the next one', async () => {
    const room = await lessonOf({ intervalMs: 30_000, rotation: { kind: 'sweep', eachMs: 4000 } });
    await room.until(30.1);
    expect([room.lead(), room.heading()]).toEqual(['look at · 1 of 3', 'Otter-01']);
    await room.until(34.1);
    expect([room.lead(), room.heading()]).toEqual(['look at · 2 of 3', 'Otter-02']);
    await room.until(38.1);
    expect(room.heading()).toBe('Otter-03');
    await room.until(43);
    expect(room.heading()).toBe('This sweep is done.');
    expect(room.lead()).toBe('Otter-03 may still be marked.');
    expect(room.below()).toBe('The next one begins in 0:17, with Otter-01.');
    room.touch(/^on-task/);
    expect(room.lesson.session.snapshot().intervals[2]?.codes).toEqual(['on']);
    expect(room.lead()).toBe('');
  });
});

describe('target and peers', () => {
  test('says whose look it is', async () => {
    const room = await lessonOf({ rotation: { kind: 'target', peerEvery: 2 } });
    await room.until(15.1);
    expect([room.lead(), room.heading()]).toEqual(['look at · the target child', 'Otter-01']);
    await room.until(30.1);
    expect([room.lead(), room.heading()]).toEqual(['look at · a peer', 'Otter-02']);
    await room.until(45.1);
    expect([room.lead(), room.heading()]).toEqual(['look at · the target child', 'Otter-01']);
    await room.until(60.1);
    expect(room.heading()).toBe('Otter-03');
  });
});

describe('reserves', () => {
  const reserves = [{ id: 'r1', pseudonym: 'Otter-09', stratum: null }];

  test('who steps in is said before the child has left, and shown after it', async () => {
    const room = await lessonOf({ reservesStepIn: true }, { reserves });
    await room.until(1);
    fireEvent.click(button('child …'));
    fireEvent.click(button('Otter-01'));
    screen.getByText('If it leaves or takes no part, Otter-09 steps in until it comes back.');
    fireEvent.click(button('left the room'));
    screen.getByText('Away: Otter-01 (left the room; Otter-09 stands in)');
    await room.until(15.1);
    expect(room.heading()).toBe('Otter-09');
    expect(room.below()).toMatch(/^in the place of Otter-01/);
    fireEvent.click(button('child …'));
    button('Otter-09 (for Otter-01)');
  });

  test('nobody is promised where the protocol says no, or nobody is left', async () => {
    const room = await lessonOf({ reservesStepIn: true }, { reserves: [] });
    await room.until(1);
    fireEvent.click(button('child …'));
    fireEvent.click(button('Otter-01'));
    screen.getByText('No reserve is left to step in.');
  });
});
