import type { Format } from '../format.ts';

type Numbers = Pick<Format, 'whole'>;

const nouns: Record<string, string> = {
  study: 'the study',
  phase: 'the phase',
  condition: 'the condition',
  lessonPart: 'the lesson part',
  class: 'the class',
  child: 'the child’s pseudonym',
  stratum: 'the stratum',
  observer: 'the observer',
  protocol: 'the protocol',
  by: 'who made the change',
};
const others: Record<string, string> = {
  class: 'Another class of this study',
  child: 'Another child of this class',
  observer: 'Another observer of this study',
  protocol: 'Another protocol of this study',
  code: 'Another code of this set',
};

/** Why something that was asked for is not done: what is in the way, and what to do. */
export const refusals = {
  'task.nameMissing': (v: { what: string }) => `Write a name for ${nouns[v.what] ?? 'it'} first.`,
  'task.nameTooLong': (v: { what: string; most: number }, f: Numbers) =>
    `The name for ${nouns[v.what] ?? 'it'} is too long: ${f.whole(v.most)} characters at most.`,
  'task.nameTaken': (v: { what: string; name: string }) =>
    `${others[v.what] ?? 'Another one'} is called “${v.name}” already. Choose another name.`,
  'task.noStudy': 'This study is not on this tablet.',
  'task.noClass': 'This class is not in the study any more.',
  'task.noObserver': 'This observer is not in the study. Choose another one.',
  'task.noProtocol': 'This protocol is not in the study any more. Choose another one.',
  'task.noSession': 'This session is not kept on this tablet.',
  'ask.heldBack':
    'This record of the other observer stays closed until your own of the same visit has ended.',
  'task.noSessions': 'There is no session for the record yet.',
  'task.noVisit': 'This visit is not in the study.',
  'task.noChild': 'This child is not in the class any more.',
  'task.noSeat': 'This seat is not on the plan any more.',
  'task.noPlan': 'This class has no seating plan yet. Choose how the room stands first.',
  'task.noCodes': 'There is no set of codes to begin with.',
  'task.noPhase': 'A study, and a visit, needs at least one phase.',
  'task.noSuchPhase': (v: { phase: string }) => `The study has no phase “${v.phase}”. Choose one of its own.`,
  'task.noSuchCondition': (v: { condition: string }) =>
    `The study has no condition “${v.condition}”. Add it to the study first.`,
  'task.controlIsNoCondition': (v: { control: string }) =>
    `“${v.control}” is compared with the others, so it has to be one of the conditions.`,
  'task.studyOutOfRange': 'Something in the study’s settings is out of range. Look through them again.',
  'task.noConsent': 'Without consent a child is not written down.',
  'task.consentNotStated':
    'The list says nothing of consent. Say that every child on it has consent, or add the column “consent”.',
  'task.noChildren': 'There is nobody to draw from. Add the children with consent first.',
  'task.alreadyDrawn': 'The children of this class are drawn already. Undo that draw first.',
  'task.notDrawn': 'The children of this class are not drawn yet. Draw them first.',
  'task.drawWasUsed': 'A session has been recorded with this draw, so it stands.',
  'task.planTooLarge': (v: { most: number }, f: Numbers) =>
    `The plan is too large: ${f.whole(v.most)} columns and ${f.whole(v.most)} rows at most.`,
  'task.planEmpty': 'The plan has no seat. Give it at least one table.',
  'task.seatTaken': 'A seat stands in this place already, or it is outside of the room.',
  'task.seatedTwice': 'A child sits on two seats. Empty one of them.',
  'task.keysOutOfRange': 'A key is set to something that no key can do.',
  'task.mannerOutOfRange': 'Layout, hand or answers are set to something that there is not.',
  'task.observeLongerThanInterval':
    'Watching takes longer than the interval. Shorten it, or make the interval longer.',
  'task.intervalOutOfRange': 'An interval takes from 3 seconds to 10 minutes, in whole seconds.',
  'task.observeOutOfRange': 'Watching takes from 3 seconds to 10 minutes, in whole seconds.',
  'task.recordOutOfRange':
    'Recording takes from 3 seconds to 10 minutes, in whole seconds, or no time of its own: 0.',
  'task.sweepIsMomentary': 'A sweep is one short look after the other: it goes with momentary looks only.',
  'task.sweepTooLong': (v: { children: number; seconds: number; interval: number }, f: Numbers) =>
    `A sweep of ${f.whole(v.children)} children takes ${f.whole(v.seconds)} s, and the interval has ${f.whole(v.interval)} s. Make the interval longer, or give each child less.`,
  'task.targetAlone':
    'A target child needs at least one other to be compared with: draw two children or more.',
  'task.headsUpTooEarly': (v: { seconds: number; interval: number }, f: Numbers) =>
    `The heads-up comes ${f.whole(v.seconds)} s ahead, and the interval has ${f.whole(v.interval)} s. It has to come after the look before.`,
  'task.durationByMinutes': 'A duration has no rounds: say for how many minutes a part goes on.',
  'task.partTooLong': (v: { minutes: number }, f: Numbers) =>
    `A part would take ${f.whole(v.minutes)} minutes; three hours are the most. Take fewer rounds or shorter intervals.`,
  'task.firstNotThere': 'The child that you chose is not there today. Choose another one.',
  'task.targetAloneToday':
    'Only the target child is there today: at least one other has to be watched beside it.',
  'task.codesOutOfRange': (v: { most: number }, f: Numbers) =>
    `A protocol has one code at least and ${f.whole(v.most)} at most: that is how many fit at the edges of the screen.`,
  'task.codeTwice': 'One code is there twice.',
  'task.protocolOutOfRange': (v: { where: string }) =>
    `Something in the protocol is out of range: ${v.where}.`,
  'task.noInterval':
    'The observation is too short for one interval. Make it longer, or the interval shorter.',
  'task.nobodyThere': 'None of the drawn children and reserves is there today.',
  'task.visitOutOfRange':
    'Something of this visit cannot be kept: look at the planned start and the names again.',
  'task.sessionEnded': 'This session has ended already.',
  'task.sessionRuns': 'A session has not ended yet. Resume it or close it first.',
  'task.codesOrReason': 'A correction is either codes or a reason why the interval is missing.',
  'task.durationNotCorrected':
    'A duration record has no single looks to correct: its stretches run from touch to touch.',
  'task.countsOrReason': 'A correction of a scan is two counts or a reason why it is missing.',
  'task.countsOutOfRange': 'Counts are whole numbers, and no more children are on-task than are present.',
  'task.oneCode': 'With momentary time sampling an interval has exactly one code.',
  'task.noSuchCode': 'This code is not in the session’s set.',
  'task.noSuchInterval': (v: { interval: number }, f: Numbers) =>
    `The session has no interval ${f.whole(v.interval)}.`,
  'task.noWords': 'Write something first.',
  'task.noReason': 'Write down why: the reason stays with the change.',
  'task.noVisitFile': 'This is not a visit file. Ask the first tablet for the file of today’s visit.',
  'task.studyRemoved': (v: { name: string }) =>
    `The study “${v.name}” was removed from this tablet. Bring its study file in first.`,
  'task.nothingToImport': 'None of these files can be taken, so nothing was kept.',
  'task.changedSinceAsked': 'The study has changed since you were asked. Look at it again, then decide.',
} as const;
