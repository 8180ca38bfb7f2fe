import { expect, it } from 'vitest';
import { drawChildren } from '../../src/schedule/drawChildren.ts';
import { drawTargets, removeChild, undoDraw } from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, recorded, school } from './bench.ts';

it('keeps the draw with its seed, so that it can be repeated', async () => {
  const on = await bench();
  const { classroom, protocol } = await school(on, 10);
  expect(classroom.draw).toEqual(drawChildren(classroom.children, 6, 2, 'seed one'));
  expect(classroom.draw?.chosen).toHaveLength(6);
  expect(codeOf(await drawTargets(on.deps, classroom.id, protocol))).toBe('task.alreadyDrawn');
});

it('makes a seed of its own, another one each time', async () => {
  const on = await bench();
  const { classroom, protocol } = await school(on, 10);
  const seeds = new Set<string>();
  for (let i = 0; i < 3; i++) {
    given(await undoDraw(on.deps, classroom.id));
    seeds.add(given(await drawTargets(on.deps, classroom.id, protocol)).draw?.seed ?? '');
  }
  expect(seeds.size).toBe(3);
});

it('leaves withdrawn children out', async () => {
  const on = await bench();
  const { classroom, protocol } = await school(on, 4);
  given(await undoDraw(on.deps, classroom.id));
  const child = classroom.children[0]?.id ?? '';
  given(await removeChild(on.deps, classroom.id, child));
  const drawn = given(await drawTargets(on.deps, classroom.id, protocol)).draw;
  expect(drawn?.from).toHaveLength(3);
  expect(drawn?.from).not.toContain(child);
});

it('undoes a draw only while no session has used it', async () => {
  const on = await bench();
  const made = await school(on);
  await recorded(on, made);
  const before = await on.dump();
  expect(codeOf(await undoDraw(on.deps, made.classroom.id))).toBe('task.drawWasUsed');
  expect(await on.dump()).toBe(before);
});

it('says why nothing can be drawn', async () => {
  const on = await bench();
  const { classroom, protocol } = await school(on, 1);
  given(await undoDraw(on.deps, classroom.id));
  expect(codeOf(await undoDraw(on.deps, classroom.id))).toBe('task.notDrawn');
  expect(codeOf(await drawTargets(on.deps, classroom.id, { id: 'nothing' }))).toBe('task.noProtocol');
  given(await removeChild(on.deps, classroom.id, classroom.children[0]?.id ?? ''));
  expect(codeOf(await drawTargets(on.deps, classroom.id, protocol))).toBe('task.noChildren');
});
