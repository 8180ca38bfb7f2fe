import type { Format } from '../format.ts';

/** Layout, hand, answers, the eyes-up places, the cover, and what is spoken ahead of a look. */

type F = Pick<Format, 'whole'>;

const nth = [
  'first',
  'second',
  'third',
  'fourth',
  'fifth',
  'sixth',
  'seventh',
  'eighth',
  'ninth',
  'tenth',
  'eleventh',
  'twelfth',
  'thirteenth',
  'fourteenth',
  'fifteenth',
  'sixteenth',
  'seventeenth',
  'eighteenth',
  'nineteenth',
  'twentieth',
];

/** How each code's answer is felt and heard, in the order of the code set. */
const pulses = [
  'one short pulse',
  'two short pulses',
  'one long pulse',
  'a short and a long pulse',
  'a long and a short pulse',
  'three short pulses',
];

export const roomLayout = {
  // how an observer likes the room to be
  manner: 'layout …',
  mannerTitle: 'How you like to work',
  layout: 'Layout',
  layoutPlan: 'seating plan in the middle',
  layoutPlanHint: 'For any number of codes.',
  layoutEyesUp: 'eyes-up',
  layoutEyesUpHint:
    'Two halves or four corners, felt and heard: your eyes stay with the children. For up to four codes, not for headcounts.',
  eyesUpNot: 'Eyes-up has five places at most; this session needs more, so the seating plan stays.',
  eyesUpNotCount:
    'Eyes-up is not for headcounts: counting needs its figures in view, so the seating plan stays.',
  hand: 'Hand',
  handRight: 'right-handed',
  handRightHint: 'On-task and undo lie on the left, under the thumb that holds the tablet.',
  handLeft: 'left-handed',
  handLeftHint: 'The same, mirrored.',
  confirm: 'Answer each touch',
  confirmHint:
    'By a low click in the earpiece and a short vibration, different for each code. Off if the class can hear.',
  remind: 'Recall a prompt that waits',
  remindHint: 'Once more, felt and heard, shortly before its interval is lost.',
  mannerKept: 'Kept for this observer.',

  // eyes-up
  leaveEyesUp: 'leave eyes-up',
  zones: 'Places to touch',
  pulse: ({ place }: { place: number | null }) =>
    (place === null ? undefined : pulses[place]) ?? 'one low, long pulse',

  // the cover
  cover: 'cover',
  covered: 'Covered. Prompts go on.',
  coveredZones: 'Places to touch, without words',
  coveredKeys: 'This session has too many codes to be touched without words: mark by keys, or uncover.',
  coveredStill: 'Nobody is to be looked at now.',
  uncover: 'Uncover: hold',
  uncoverHow: 'hold the corner',
  uncoverLonger: 'hold it longer',
  coverAbout: ({ places }: { places: boolean }) =>
    places
      ? 'Under the cover nothing of the lesson can be read, prompts go on, and each code lies where eyes-up has it. Hold the folded corner to uncover.'
      : 'Under the cover nothing of the lesson can be read, and prompts go on. Here it has no places to touch: mark by keys, or uncover. Hold the folded corner to uncover.',

  // spoken ahead of a look
  spokenChild: ({ child }: { child: string }) =>
    child
      .replace(/[-_./]+/g, ' ')
      .replace(/(^|\D)0+(?=\d)/g, '$1')
      .replace(/(\p{L})(\d)/gu, '$1 $2')
      .trim(),
  spokenSeat: ({ row, place, of }: { row: number; place: number; of: number }, f: F) =>
    of === 1
      ? `row ${f.whole(row)}`
      : `row ${f.whole(row)}, ${nth[place - 1] ?? f.whole(place)} from the left`,
};
