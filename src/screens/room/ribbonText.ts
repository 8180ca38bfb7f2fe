import type { IntervalRecord } from '../../journal/readOut.ts';

/**
 * The session in one text, one letter an interval, so that it can be compared cheaply: `w` waiting, `o` open,
 * `s` scored, `l` scored late, `m` missing; `|` between two parts, a blank between two sweeps.
 */
export function ribbonText(intervals: readonly IntervalRecord[], inSweeps = false): string {
  let text = '';
  let before = intervals[0];
  for (const interval of intervals) {
    if (interval.part !== before?.part) text += '|';
    else if (inSweeps && interval.round !== before.round) text += ' ';
    before = interval;
    text += letter(interval);
  }
  return text;
}

function letter({ status, late }: IntervalRecord): string {
  if (status === 'scored') return late ? 'l' : 's';
  return status === 'missing' ? 'm' : status === 'open' ? 'o' : 'w';
}
