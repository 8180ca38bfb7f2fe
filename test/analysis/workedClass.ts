import { looksOf } from './sessionsFrom.ts';

/** A class of six, ten looks each: made up and worked by hand, no source. */
export const workedClass = [
  ...looksOf(
    { session: 's1', class: 'Otters', phase: 'before', date: '2026-11-03' },
    {
      C1: '1101110110',
      C2: '1110111011',
      C3: '0101101010',
      C4: '11111011.1',
      C5: '1001.10011',
      C6: '1111111111',
    },
  ),
  ...looksOf(
    { session: 's2', class: 'Otters', phase: 'after', date: '2026-11-10' },
    {
      C1: '1111110111',
      C2: '1111111011',
      C3: '1101111010',
      C4: '1111111111',
      C5: '1111.1011.',
      C6: '1111110111',
    },
  ),
];
