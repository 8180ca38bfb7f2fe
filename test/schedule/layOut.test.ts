import { describe, expect, it } from 'vitest';
import { layOut } from '../../src/schedule/layOut.ts';
import { protocolOf } from '../support/session.ts';

const children = (n: number) => Array.from({ length: n }, (_, i) => `c${i + 1}`);

describe('layOut', () => {
  it('gives 60 looks in 15 minutes at 15 s, 10 for each of 6 children (arithmetic; field practice, no source)', () => {
    const lines = layOut(
      protocolOf({ partLength: { kind: 'minutes', minutes: 15 } }),
      ['before', 'after'],
      children(6),
    );
    expect(lines).toHaveLength(120);
    for (const phase of ['before', 'after']) {
      for (const child of children(6))
        expect(lines.filter((l) => l.phase === phase && l.child === child)).toHaveLength(10);
    }
  });

  it('looks when the interval ends, or when it starts', () => {
    const end = layOut(protocolOf(), ['before'], children(3));
    const start = layOut(protocolOf({ lookAt: 'start' }), ['before'], children(3));
    expect(end.map((l) => l.cueMs).slice(0, 3)).toEqual([15_000, 30_000, 45_000]);
    expect(start.map((l) => l.cueMs).slice(0, 3)).toEqual([0, 15_000, 30_000]);
  });

  it('observes first and records after: 10 s and 5 s', () => {
    const [first, second] = layOut(
      protocolOf({ method: 'partial', observeMs: 10_000 }),
      ['before'],
      children(3),
    );
    expect(first).toMatchObject({ openMs: 0, cueMs: 0, recordMs: 10_000, closeMs: 15_000 });
    expect(second).toMatchObject({ openMs: 15_000, cueMs: 15_000, recordMs: 25_000, child: 'c2' });
  });

  it('watches each child for a block, or one child throughout', () => {
    const block = layOut(
      protocolOf({ rotation: { kind: 'block', intervals: 4 }, partLength: { kind: 'rounds', rounds: 1 } }),
      ['x'],
      children(3),
    );
    expect(block.map((l) => l.child).join(' ')).toBe('c1 c1 c1 c1 c2 c2 c2 c2 c3 c3 c3 c3');
    const one = layOut(
      protocolOf({ rotation: { kind: 'one' }, partLength: { kind: 'rounds', rounds: 3 } }),
      ['x'],
      children(3),
    );
    expect(one.map((l) => [l.child, l.round])).toEqual([
      ['c1', 1],
      ['c1', 2],
      ['c1', 3],
    ]);
  });
});
