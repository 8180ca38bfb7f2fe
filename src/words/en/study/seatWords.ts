import type { Format } from '../../format.ts';

type F = Format;

/** The plan of seats as something to set up. */
export const seatWords = {
  seatsTitle: ({ klass }: { klass: string }) => `Where does everybody sit in ${klass}?`,
  seatsNote: 'Drawn as you see the room from your chair. The thick line is the front.',
  seatsWork: 'What to do with the seats',
  seatsPlace: 'Put children on seats',
  seatsBuild: 'Put up and take away seats',
  unseated: 'Children without a seat',
  allSeated: 'Everybody has a seat.',
  tapStart: 'Tap a child, then a seat. Or a seat, then a child.',
  tapSeatFor: ({ name }: { name: string }) => `${name}: tap a seat.`,
  tapChildFor: 'Now tap a child for this seat, or the seat again to let go.',
  tapAgain: ({ name }: { name: string }) => `${name}: tap another seat to move, the same seat to take off.`,
  buildHint: 'Tap an empty place to put a seat there, a seat to take it away.',
  joins: 'A new seat joins the table beside it',
  side: 'Where do you sit?',
  sideHint: 'Left and right as the children see them, facing the front.',
  sideBack: 'at the back',
  sideFront: 'at the front',
  sideLeft: 'on the left',
  sideRight: 'on the right',
  preset: 'Set up the room',
  presetAgain: 'Set up the room anew',
  presetKeeps: 'Children who have a seat keep their order.',
  presetPairs: 'Tables of two in rows',
  presetFours: 'Tables of four',
  presetHorseshoe: 'A horseshoe',
  tablesAcross: 'Tables side by side',
  tablesDeep: 'Rows of tables',
  seatCount: 'Seats',
  presetPut: ({ seats }: { seats: number }, f: F) =>
    `Put up ${f.whole(seats)} ${f.plural(seats, { one: 'seat', other: 'seats' })}`,
  planAway: 'Take the plan away',
  backToClass: ({ klass }: { klass: string }) => `Back to ${klass}`,
} as const;
