import { describe, expect, test } from 'vitest';
import type { Code } from '../../../../src/model/codeSet.ts';
import type { EdgeTarget } from '../../../../src/screens/room/codeEdges.ts';
import { eyesUpZones } from '../../../../src/screens/room/eyesUp/zones.ts';

const code = (id: string, role: Code['role']): Code => ({
  id,
  label: id,
  role,
  definition: '',
  examples: '',
  nonExamples: '',
});
const on = code('on', 'on-task');
const [a, b, c] = ['a', 'b', 'c'].map((id) => code(id, 'off-task')) as [Code, Code, Code];
const said = (target: EdgeTarget | null) =>
  target === null ? null : target.kind === 'code' ? target.code.id : target.kind;
const places = (codes: readonly Code[], withNone = false) => {
  const zones = eyesUpZones(codes, withNone);
  return (
    zones && [zones.kind, zones.left.map(said).join(' '), zones.right.map(said).join(' '), said(zones.foot)]
  );
};

describe('the places of the eyes-up layout', () => {
  test('two codes have the halves, and what cannot be seen the whole foot', () => {
    expect(places([on, a])).toEqual(['halves', 'on', 'a', 'cannot see']);
  });

  test('three codes and "cannot see" have the corners; codes keep their sides', () => {
    expect(places([on, a, b])).toEqual(['corners', 'on cannot see', 'a b', null]);
    expect(places([a, on, b])).toEqual(['corners', 'on cannot see', 'a b', null]);
  });

  test('"none of these" is a corner of its own', () => {
    expect(places([on, a], true)).toEqual(['corners', 'on nothing', 'a cannot see', null]);
    expect(places([on, a, b], true)).toEqual(['corners', 'on nothing', 'a b', 'cannot see']);
  });

  test('four codes have the corners and the foot', () => {
    expect(places([on, a, b, c])).toEqual(['corners', 'on a', 'b c', 'cannot see']);
  });

  test('one code stands beside "cannot see"', () => {
    expect(places([on])).toEqual(['halves', 'on', 'cannot see', null]);
  });

  test('a set of one role only is spread over both sides', () => {
    const calm = ['x', 'y', 'z'].map((id) => code(id, 'on-task'));
    expect(places(calm)).toEqual(['corners', 'x y', 'z cannot see', null]);
  });

  test('more than five targets have no places', () => {
    expect(places([on, a, b, c], true)).toBeNull();
    expect(places([on, a, b, c, code('d', 'other')])).toBeNull();
  });
});
