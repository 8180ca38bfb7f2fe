import { describe, expect, test } from 'vitest';
import type { Code, CodeRole } from '../../../src/model/codeSet.ts';
import { codeEdges, codeSigns, type EdgeTarget } from '../../../src/screens/room/codeEdges.ts';

const codes = (...roles: CodeRole[]): Code[] =>
  roles.map((role, i) => ({
    id: `${i + 1}`,
    label: `${i + 1}`,
    role,
    definition: '',
    examples: '',
    nonExamples: '',
  }));
const names = (targets: readonly EdgeTarget[]) =>
  targets.map((target) => (target.kind === 'code' ? target.code.id : target.kind)).join(' ');
const edges = (latched: boolean, ...roles: CodeRole[]) => {
  const { left, right } = codeEdges(codes(...roles), latched);
  return `${names(left)} | ${names(right)}`;
};
const [on, off, other] = ['on-task', 'off-task', 'other'] as const;

describe('which target stands where', () => {
  test('on-task has the left edge to itself with two or three codes, wherever it stands in the list', () => {
    expect(edges(false, on, off)).toBe('1 | 2 cannot see');
    expect(edges(false, off, on, off)).toBe('2 | 1 3 cannot see');
  });

  test('from four codes on both edges share, cannot see last', () => {
    expect(edges(false, on, off, off, off)).toBe('1 2 | 3 4 cannot see');
    expect(edges(false, on, off, off, off, off, other)).toBe('1 2 3 | 4 5 6 cannot see');
  });

  test('with latched codes none of these closes the left edge', () => {
    expect(edges(true, on, off)).toBe('1 nothing | 2 cannot see');
    expect(edges(true, on, off, off, off, off, off)).toBe('1 2 3 nothing | 4 5 6 cannot see');
  });

  test('a set without on-task fills the left edge all the same', () => {
    expect(edges(false, off, off)).toBe('1 | 2 cannot see');
  });
});

test('on-task is filled, each further kind of off-task is denser, the rest is an outline', () => {
  expect([...codeSigns(codes(on, off, other, off)).values()]).toEqual([0, 1, 'other', 2]);
});
