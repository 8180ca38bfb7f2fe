import type { IntervalRecord } from '../../journal/readOut.ts';

/**
 * The session in one text, one letter an interval, so that it can be compared cheaply: `w` waiting, `o` open,
 * `s` scored, `l` scored late, `m` missing; `|` between two parts.
 */
export function ribbonText(intervals: readonly IntervalRecord[]): string {
  let text = '';
  let part = intervals[0]?.part ?? 0;
  for (const interval of intervals) {
    if (interval.part !== part) text += '|';
    part = interval.part;
    text += letter(interval);
  }
  return text;
}

function letter({ status, late }: IntervalRecord): string {
  if (status === 'scored') return late ? 'l' : 's';
  return status === 'missing' ? 'm' : status === 'open' ? 'o' : 'w';
}
