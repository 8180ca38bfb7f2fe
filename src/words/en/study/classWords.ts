import type { Format } from '../../format.ts';

type F = Format;

interface OpenSeat {
  readonly line: number;
  readonly seat: string;
  readonly why: 'not understood' | 'not in the plan' | 'taken';
}

/** What is wrong with many seats is seen in the first few. */
const mostSeatsTold = 3;

const openSeat = ({ line, seat, why }: OpenSeat): string =>
  why === 'taken'
    ? `Line ${line}: somebody else has seat “${seat}”; expected a free one.`
    : why === 'not in the plan'
      ? `Line ${line}: the plan has no seat “${seat}”; expected rows A to T (or 1 to 20) with 20 places each, such as B3.`
      : `Line ${line}: seat “${seat}” is not understood; expected a row and a place, such as B3 or 2-3.`;

/** A class, its children and the draw. */
export const classWords = {
  newClassTitle: 'Which class?',
  newClassNote:
    'A name of your own, such as Class Otter, keeps the school’s name of the class off the tablet.',
  className: 'Name of the class',
  classCondition: 'Condition',
  noCondition: 'none',
  addThisClass: 'Add this class',

  classTitle: (
    { name, children, chosen }: { name: string; children: number; chosen: number | null },
    f: F,
  ) =>
    children === 0
      ? `${name} has no children yet.`
      : `${name}: ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}, ${chosen === null ? 'none drawn yet' : `${f.whole(chosen)} drawn`}.`,
  children: 'Children',
  noChildren: 'Write down those with consent.',
  consentFirst:
    'Consent and assent come first. A child without consent is not written down, and pseudonyms stand for names.',
  tapToChange: 'Tap a child to change or withdraw it.',
  addMore: 'Add children',
  changeOf: ({ name }: { name: string }) => `Change ${name}`,
  withdrawOf: ({ name }: { name: string }) => `Withdraw ${name}`,
  withdrawn: ({ name }: { name: string }) => `${name} is withdrawn: no longer drawn, seated or watched.`,
  withdrawnSign: 'withdrawn',
  pseudonym: 'Pseudonym',
  pseudonymHint: 'Never a name.',
  /** One of these stands in pseudonyms where the class’s own name would tell too much. */
  animals: 'Otter, Heron, Badger, Wren, Hare, Finch, Newt, Vole',
  stratum: 'Stratum',
  stratumHint:
    'May stay empty. A group of which the draw takes its fair share: for example girls and boys, or year 3 and year 4.',
  howToAdd: 'How to add children',
  oneByOne: 'One at a time',
  numbered: 'Numbered',
  fromList: 'From a list',
  fromFile: 'From a file',
  consent: 'Consent and assent are given for every child that I write down here.',
  consentFromList: 'Consent and assent are given for every line that does not say otherwise.',
  addChild: 'Write this child down',
  howMany: 'How many children?',
  addNumbered: ({ first, last }: { first: string; last: string }) => `Write down ${first} to ${last}`,
  addNumberedOne: ({ first }: { first: string }) => `Write down ${first}`,
  list: 'Lines',
  listHint:
    'One pseudonym a line, such as Otter-01; or more with commas in this order: Otter-01, yes, year 3, B3.',
  columnConsent: 'consent',
  columnConsentText: 'yes or no. A line with no, or with nothing, is left out: nothing of it is kept.',
  columnStratum: 'stratum',
  columnStratumText: 'A group of which the draw takes its fair share, for example year 3. May be left out.',
  columnSeat: 'seat',
  columnSeatText:
    'Row from the front, then place from the left as the children see it: B3 or 2-3 is the second row, third place. May be left out.',
  takeList: 'Take over the lines',
  fileHint:
    'A CSV file whose first line names its columns: child and consent, and stratum and seat if you like.',
  takeFile: 'Choose the class list',
  added: ({ name }: { name: string }) => `${name} is written down.`,
  listDone: (
    {
      added,
      changed,
      left,
      seatsOpen,
    }: { added: number; changed: number; left: number; seatsOpen: readonly OpenSeat[] },
    f: F,
  ) =>
    [
      `${f.whole(added)} ${f.plural(added, { one: 'child', other: 'children' })} written down${changed === 0 ? '' : `, ${f.whole(changed)} changed`}.`,
      left === 0
        ? 'No line was left out.'
        : `${f.whole(left)} ${f.plural(left, { one: 'line was', other: 'lines were' })} left out, without consent; nothing of ${f.plural(left, { one: 'it', other: 'them' })} is kept.`,
      ...seatsOpen.slice(0, mostSeatsTold).map(openSeat),
      seatsOpen.length <= mostSeatsTold
        ? ''
        : `${f.whole(seatsOpen.length - mostSeatsTold)} more ${f.plural(seatsOpen.length - mostSeatsTold, { one: 'seat is', other: 'seats are' })} left open.`,
    ]
      .filter((sentence) => sentence !== '')
      .join(' '),
  aClass: 'The class',
  removeClass: 'Take this class off the list',
  classRemoved: ({ name }: { name: string }) => `${name} is off the list. Its recorded sessions stay.`,
  seats: 'Seats',
  seatsNone: 'No seating plan yet. With one you find the next child at a glance.',
  seatsSome: ({ seated, children }: { seated: number; children: number }, f: F) =>
    `${f.whole(seated)} of ${f.whole(children)} children have a seat.`,
  seatsOpen: 'Open the seating plan',
  planPicture: ({ klass }: { klass: string }) => `Seating plan of ${klass}, as you see it`,

  draw: 'Children to watch',
  drawWhy: 'Chance chooses, not you: stratum by stratum among all children of the class.',
  drawNotNeeded: 'A headcount looks at everybody: nobody has to be drawn.',
  drawNotFor: 'For a headcount nobody has to be drawn.',
  drawNobody: 'Write the children down first; then chance can choose among them.',
  drawProtocol: 'For which protocol?',
  drawProtocolHint: ({ children, reserves }: { children: number; reserves: number }, f: F) =>
    `${f.whole(children)} to watch, ${f.whole(reserves)} in reserve`,
  seed: 'Seed',
  seedHint: 'May stay empty. The same seed and the same children give the same draw.',
  seedLast: ({ seed }: { seed: string }) => `The draw that you took back had the seed ${seed}.`,
  drawNow: ({ children, reserves }: { children: number; reserves: number }, f: F) =>
    reserves === 0
      ? `Draw ${f.whole(children)} at random`
      : `Draw ${f.whole(children)} and ${f.whole(reserves)} in reserve`,
  drawFew: ({ children, wanted }: { children: number; wanted: number }, f: F) =>
    `The class has ${f.whole(children)} of the ${f.whole(wanted)} children that the protocol asks for: all are taken.`,
  drawnInOrder: 'Watched, in drawn order',
  reservesInOrder: 'In reserve: the first one here steps in',
  noReserves: 'Nobody is in reserve.',
  drawKept: ({ seed, from }: { seed: string; from: number }, f: F) =>
    `Seed ${seed}, drawn from ${f.whole(from)} ${f.plural(from, { one: 'child', other: 'children' })}.`,
  drawLate: ({ n }: { n: number }, f: F) =>
    `${f.whole(n)} ${f.plural(n, { one: 'child came', other: 'children came' })} after the draw and had no chance in it.`,
  drawBack: 'Take the draw back',
  drawStands: 'A draw can be taken back until a session has used it. From then on it is part of the record.',
} as const;
