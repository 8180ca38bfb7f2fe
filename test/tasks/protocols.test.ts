import { expect, it } from 'vitest';
import type { Protocol } from '../../src/model/protocol.ts';
import { exportStudy, type ProtocolDraft, removeProtocol, saveProtocol } from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { bench, recorded, school, visitOf } from './bench.ts';

const draftOf = ({ version: _v, removed: _r, revision: _n, ...draft }: Protocol): ProtocolDraft => draft;

it('edits a version in place while nobody has used it', async () => {
  const on = await bench();
  const { protocol, study } = await school(on);
  const edited = given(await saveProtocol(on.deps, { ...draftOf(protocol), graceMs: 300 }));
  expect(edited).toMatchObject({ id: protocol.id, version: 1, graceMs: 300, revision: { counter: 1 } });
  expect(given(await on.deps.store.protocolVersions(protocol.id))).toHaveLength(1);
  const before = await on.dump();
  expect(given(await saveProtocol(on.deps, draftOf(edited)))).toEqual(edited);
  expect(await on.dump()).toBe(before);
  const fresh = given(await saveProtocol(on.deps, { ...draftOf(protocol), id: null, name: 'Another' }));
  expect(fresh).toMatchObject({ version: 1, name: 'Another', study: study.id });
});

it.each(['recorded', 'prepared', 'exported'])('makes a new version once it was %s with', async (use) => {
  const on = await bench();
  const made = await school(on);
  if (use === 'recorded') await recorded(on, made);
  else if (use === 'prepared') await visitOf(on, made);
  else given(await exportStudy(on.deps, made.study.id));
  const edited = given(await saveProtocol(on.deps, { ...draftOf(made.protocol), graceMs: 300 }));
  expect(edited).toMatchObject({ version: 2, graceMs: 300, revision: { counter: 0 } });
  const [first] = given(await on.deps.store.protocolVersions(made.protocol.id));
  expect(first).toEqual(made.protocol);
  const again = given(await saveProtocol(on.deps, { ...draftOf(edited), graceMs: 200 }));
  expect(again.version).toBe(2);
});

it('takes a version that another tablet has made for used', async () => {
  const on = await bench();
  const { protocol } = await school(on);
  const other = { ...on.deps, writer: 'tablet-b' };
  expect(given(await saveProtocol(other, { ...draftOf(protocol), graceMs: 300 })).version).toBe(2);
});

it('refuses what nobody could record with', async () => {
  const on = await bench();
  const { protocol } = await school(on);
  const draft = draftOf(protocol);
  const [code] = draft.codeSet.codes;
  if (code === undefined) throw new Error('no code');
  const before = await on.dump();
  const refused = async (changes: Partial<ProtocolDraft>) =>
    codeOf(await saveProtocol(on.deps, { ...draft, ...changes }));
  expect(await refused({ observeMs: 20_000 })).toBe('task.observeLongerThanInterval');
  expect(await refused({ intervalMs: 100, observeMs: 100 })).toBe('task.intervalOutOfRange');
  expect(await refused({ graceMs: 9000 })).toBe('task.protocolOutOfRange');
  expect(await refused({ codeSet: { name: 'x', codes: [] } })).toBe('task.codesOutOfRange');
  expect(await refused({ codeSet: { name: 'x', codes: [code, { ...code, label: 'y' }] } })).toBe(
    'task.codeTwice',
  );
  expect(await refused({ codeSet: { name: 'x', codes: [code, { ...code, id: 'y' }] } })).toBe(
    'task.nameTaken',
  );
  expect(await refused({ partLength: { kind: 'minutes', minutes: 0.25 }, intervalMs: 60_000 })).toBe(
    'task.noInterval',
  );
  expect(await refused({ name: 'one after another' })).toBe('task.nameTaken');
  expect(await refused({ id: 'nothing' })).toBe('task.noProtocol');
  expect(await on.dump()).toBe(before);
});

it('takes a protocol off the lists and leaves its versions', async () => {
  const on = await bench();
  const made = await school(on);
  given(await removeProtocol(on.deps, made.protocol.id));
  const left = given(await on.deps.store.protocols(made.study.id)).map(({ id }) => id);
  expect(left).not.toContain(made.protocol.id);
  expect(given(await on.deps.store.protocol(made.protocol.id, 1))?.removed).toBe(true);
  expect(codeOf(await removeProtocol(on.deps, made.protocol.id))).toBe('task.noProtocol');
});

it('leaves a version alone that is older than a rule, until somebody changes it', async () => {
  const on = await bench();
  const { protocol } = await school(on);
  const old: Protocol = { ...protocol, id: 'old', name: 'Old', method: 'partial', observeMs: 1500 };
  given(await on.deps.store.put({ protocols: [{ record: old, previous: null }] }));
  const before = await on.dump();
  expect(given(await saveProtocol(on.deps, draftOf(old)))).toEqual(old);
  expect(await on.dump()).toBe(before);
  expect(codeOf(await saveProtocol(on.deps, { ...draftOf(old), graceMs: 300 }))).toBe(
    'task.observeOutOfRange',
  );
  expect(given(await on.deps.store.protocol('old'))).toEqual(old);
});
