import type { Format } from '../format.ts';

export interface Way {
  readonly method: string;
  readonly lookAt: 'end' | 'start' | null;
}

const names: Record<string, string> = {
  momentary: 'momentary time sampling',
  partial: 'partial interval',
  whole: 'whole interval',
  headcount: 'headcount',
  duration: 'continuous duration',
};

/** "momentary time sampling, looked at the end of the interval": no figure of a moment is printed without its moment. */
export function wayText({ method, lookAt }: Way): string {
  const name = names[method] ?? method;
  return lookAt === null
    ? name
    : `${name}, ${method === 'headcount' ? 'counted' : 'looked'} at the ${lookAt} of the interval`;
}

/** Several ways as one text: "momentary …; headcount …". */
export const waysText = (ways: readonly Way[]): string => ways.map(wayText).join('; ');

/** The same as the beginning of a sentence. */
export const upperFirst = (text: string, f: Pick<Format, 'locale'>): string =>
  text.slice(0, 1).toLocaleUpperCase(f.locale) + text.slice(1);
