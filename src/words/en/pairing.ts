import type { Format } from '../format.ts';

type F = Format;

interface VisitSaid {
  readonly klass: string;
  readonly children: readonly string[];
  readonly protocol: string;
  /** Wall time; empty when none was agreed. */
  readonly start: string;
}

const pictures = (n: number, f: F): string =>
  `${f.whole(n)} ${f.plural(n, { one: 'picture', other: 'pictures' })}`;

/** The pairing card: a visit as pictures, from one tablet to the other. */
export const pairing = {
  // the first tablet
  show: 'Show the pairing card',
  shown: 'The pairing card was shown.',
  showTitle: 'Let the second tablet look at this.',
  making: 'Drawing the card …',
  how: ({ n }: { n: number }, f: F) =>
    `There: Before the visit, “Read a pairing card”. Hold its camera so that the square fills the frame.${n > 1 ? ` The ${pictures(n, f)} come in turn; it waits for those that it missed.` : ''}`,
  what: ({ klass, children, seats, protocol, start }: VisitSaid & { readonly seats: boolean }, f: F) =>
    `In it: ${klass}, ${f.list(children)} in their order${seats ? ' with the seats' : ''}, “${protocol}”${start === '' ? '' : `, start at ${f.time(start)}`}. Pseudonyms only, and nobody’s marks.`,
  picture: ({ number, of }: { number: number; of: number }, f: F) =>
    of === 1 ? 'The pairing card' : `Picture ${f.whole(number)} of ${f.whole(of)}`,
  previous: 'Back',
  next: 'Next',
  stay: 'Stay at this one',
  turn: 'Show them in turn',
  copy: 'Copy as text',
  copied: 'Copied. Paste it on the second tablet.',
  copyFailed: 'This browser does not let a page copy. Mark the text below and copy it by hand.',
  textShow: 'Show the text',
  text: 'The card as text',
  textLength: ({ n }: { n: number }, f: F) =>
    `${f.whole(n)} characters, made to be pasted. Typing them is for a day when nothing else works; each line checks itself.`,

  // the second tablet
  read: 'Read a pairing card',
  readTitle: 'Read the pairing card of the first tablet.',
  readNote:
    'On the first tablet: the checks, “Show the pairing card”. Nothing is kept here before you take the visit over.',
  camera: 'With the camera',
  cameraText: 'Hold the tablet so that the square on the other one fills the frame.',
  cameraOpen: 'Open the camera',
  cameraOpening: 'Opening the camera …',
  cameraStop: 'Close the camera',
  cameraView: 'What the camera sees',
  cameraLook: 'Looking for the square …',
  cameraRefused:
    'The camera is not allowed here. Allow it in the browser’s settings for this page, or take a picture or the text.',
  cameraMissing: 'No camera can be used here. Take a picture or the text.',
  cameraBusy: 'The camera does not answer; another program may hold it. Close that one and open it again.',
  picturesTitle: 'From pictures',
  picturesText: 'Screenshots or photos, one or several, in any order. Pasting works as well.',
  picturesChoose: 'Choose pictures',
  textTitle: 'From the text',
  textLabel: 'Text of the card',
  textHint: 'Spaces, line breaks and small letters do no harm. A line that is wrong is told.',
  textFirst: 'First paste or type the text of the card.',
  textRead: 'Read the text',
  reading: 'Reading …',
  progress: ({ read, of }: { read: number; of: number }, f: F) =>
    `${f.whole(read)} of ${pictures(of, f)} read.`,
  partRead: ({ number }: { number: number }, f: F) => `Picture ${f.whole(number)}: read`,
  partMissing: ({ number }: { number: number }, f: F) => `Picture ${f.whole(number)}: still missing`,
  again: 'Begin again',
  preview: ({ klass, children, protocol, start }: VisitSaid, f: F) =>
    `${klass}: ${f.list(children)}, in this order, by “${protocol}”, ${start === '' ? 'with no agreed start' : `to start on ${f.day(start)} at ${f.time(start)}`}.`,
  previewTitle: 'The card is read.',
  replaces: ({ klass }: { klass: string }) =>
    `It takes the place of the visit of ${klass} that is prepared here.`,
  take: 'Take this visit over',
  leave: 'Leave it',
} as const;

/** Why a pairing card is not read, or not shown. */
export const cardProblems = {
  'card.noCode': (v: { name: string }) =>
    `No square code was found in ${v.name}. Take the picture again, straight on, with the whole square in it.`,
  'card.noPicture': (v: { name: string }) => `${v.name} is no picture that this browser can open.`,
  'card.otherCode': (v: { found: string }) =>
    `This is no pairing card of Lookbell: it says “${v.found}”. A card begins with LB1.`,
  'card.newer': (v: { version: number; known: number }) =>
    `The card is of version ${v.version}, made by a newer Lookbell; this one reads version ${v.known}. Update Lookbell here, then read it again.`,
  'card.cutOff': 'The text of the card ends in the middle. Copy all of it, to the point at its end.',
  'card.damaged': 'The card was not read as it was written: a character is wrong or absent. Read it again.',
  'card.line': (v: { line: number; found: string }) =>
    `Line ${v.line} of the card is not as it was written: “${v.found}”. Compare it with the first tablet.`,
  'card.otherCard': 'This belongs to another card. Go on with the first one, or begin again.',
  'card.missing': (v: { missing: string; of: number }) =>
    `Not all is read: of ${v.of} pictures these are missing: ${v.missing}.`,
  'card.tooLarge': (v: { pictures: number; most: number }) =>
    `This visit would take ${v.pictures} pictures, and ${v.most} are the most. Hand the visit file over instead.`,
} as const;
