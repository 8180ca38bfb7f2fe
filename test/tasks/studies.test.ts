import { expect, it } from 'vitest';
import { createStudy, renameStudy, saveStudy } from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, texts } from './bench.ts';

it('makes a study with two protocols to begin with, and shows it', async () => {
  const { deps } = await bench();
  const study = given(await createStudy(deps, { name: '  Hedge   school ', texts }));
  expect(study).toMatchObject({
    name: 'Hedge school',
    phases: ['before', 'after'],
    control: 'usual',
    criterion: { agreement: 0.85, kappa: 0.6 },
    revision: { counter: 0, writer: 'tablet-a' },
  });
  const protocols = given(await deps.store.protocols(study.id));
  const momentary = protocols.find((one) => one.method === 'momentary');
  expect(momentary).toMatchObject({
    intervalMs: 15_000,
    lookAt: 'end',
    graceMs: 400,
    childrenToDraw: 6,
    reserves: 2,
    order: 'random',
    rotation: { kind: 'next' },
    partLength: { kind: 'minutes', minutes: 15 },
  });
  const partial = protocols.find((one) => one.method === 'partial');
  expect(partial).toMatchObject({ intervalMs: 15_000, observeMs: 10_000 });
  expect(given(await deps.store.settings()).study).toBe(study.id);
});

it('keeps nothing of a study without a name', async () => {
  const { deps, dump } = await bench();
  const before = await dump();
  expect(codeOf(await createStudy(deps, { name: '   ', texts }))).toBe('task.nameMissing');
  expect(codeOf(await createStudy(deps, { name: 'x'.repeat(201), texts }))).toBe('task.nameTooLong');
  expect(await dump()).toBe(before);
});

it('changes a study word by word and refuses what does not fit together', async () => {
  const { deps, dump } = await bench();
  const { id } = given(await createStudy(deps, { name: 'Hedge school', texts }));
  expect(given(await renameStudy(deps, id, 'Brook school'))).toMatchObject({
    name: 'Brook school',
    revision: { counter: 1 },
  });
  const phases = given(
    await saveStudy(deps, id, { phases: ['baseline', ' ', 'Baseline', 'break weeks'] }),
  ).phases;
  expect(phases).toEqual(['baseline', 'break weeks']);
  const before = await dump();
  expect(codeOf(await saveStudy(deps, id, { phases: [' '] }))).toBe('task.noPhase');
  expect(codeOf(await saveStudy(deps, id, { conditions: ['walk'] }))).toBe('task.controlIsNoCondition');
  expect(codeOf(await saveStudy(deps, 'nobody', { phases: ['x'] }))).toBe('task.noStudy');
  expect(await dump()).toBe(before);
});
