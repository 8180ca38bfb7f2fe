import type { Code } from '../../../model/codeSet.ts';

/** The sign of each code: 0 = on-task, 1, 2, 3 … = kinds of off-task in their order, other = neither. */
export function codeKinds(codes: readonly Pick<Code, 'role'>[]): (number | 'other')[] {
  let off = 0;
  return codes.map(({ role }) => {
    if (role === 'on-task') return 0;
    if (role === 'other') return 'other';
    off += 1;
    return off;
  });
}
