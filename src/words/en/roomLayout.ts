import type { Format } from '../format.ts';

/** Layout, hand, answers, the eyes-up places, the cover, and what is spoken ahead of a look. */

type F = Pick<Format, 'whole'>;

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
  layoutEyesUpHint: 'Large fixed places, felt and heard: your eyes stay with the children.',
  eyesUpNot: 'Eyes-up has room for four targets; this session has more, so the seating plan stays.',
  eyesUpNotCount: 'A headcount needs its figures in view, so the seating plan stays.',
  hand: 'Hand',
  handRight: 'right-handed',
  handLeft: 'left-handed (mirrored)',
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
  uncoverHold: 'hold',
  coverAbout: ({ places }: { places: boolean }) =>
    places
      ? 'Under the cover nothing can be read, prompts go on, and each code lies where eyes-up has it. Hold the folded corner to uncover.'
      : 'Under the cover nothing can be read and prompts go on. Here it has no places to touch: mark by keys, or uncover. Hold the folded corner to uncover.',

  // ahead of a look
  spokenSeat: ({ row, place }: { row: number; place: number }, f: F) =>
    `row ${f.whole(row)}, place ${f.whole(place)}`,
};
