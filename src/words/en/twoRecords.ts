import type { Format } from '../format.ts';

type F = Pick<Format, 'whole' | 'plural'>;

/** Afterwards: what a visit was for, and records that stay closed until one's own has ended. */
export const twoRecords = {
  familiarisation: 'familiarisation visit',
  practiceLine: 'Practice: kept, and left out of all results.',
  familiarisationLine: 'A familiarisation visit: kept, and left out of results unless you ask for it.',
  fromPaperLine: 'From paper: no prompt times.',
  withFamiliarisation: 'With familiarisation visits',
  withFamiliarisationHint: 'Visits that let a class get used to an observer. Usually left out.',

  heldBack: 'closed until your own record of this visit has ended',
  heldBackTitle: 'This record stays closed for now.',
  heldBackText:
    'Your own record of the same visit has not ended. What the other observer marked is shown once it has.',
  heldBackGo: 'Go to your own record',
  heldBackSome: ({ n }: { n: number }, f: F) =>
    `${f.plural(n, { one: 'A record of another observer is', other: `${f.whole(n)} records of other observers are` })} left out until your own of the same visit has ended.`,
} as const;
