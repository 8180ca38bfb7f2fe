import type { Format } from '../../format.ts';

type F = Format;

/** Settings of the study and the cautions. */
export const settingsWords = {
  settingsTitle: 'Settings of the study.',
  thisTablet: 'This tablet',
  wordsOfStudy: 'Words of the study',
  wordsNote: 'Sessions keep the words with which they were recorded.',
  phases: 'Phases, one a line, in the order in which they happen',
  conditions: 'Conditions, one a line',
  control: 'Compared with',
  controlHint: 'The condition that the others are compared with.',
  controlNone: 'nothing',
  lessonParts: 'Lesson parts, one a line',
  criterion: 'Criterion for agreement',
  criterionNote: 'What your study asks of two observers before their records count.',
  criterionAgreement: 'Agreement, percent',
  criterionKappa: 'Kappa',
  safeguarding: 'Safeguarding contact',
  safeguardingHint:
    'The school’s designated person and how to reach them. A worry about a child goes there, not into the record.',
  saveSettings: 'Keep these settings',
  settingsKept: 'The settings are kept.',
  cautions: 'Before you observe',
  cautionConsent: 'Consent and assent come first, under the rules of the school and of the ethics board.',
  cautionPseudonyms: 'Children have pseudonyms here, and nothing leaves this tablet unless you hand it over.',
  cautionGroups: 'Figures describe lessons and groups. They diagnose no child.',
  cautionSafeguarding: 'A safeguarding concern goes to the school’s designated person, not into the record.',
  cautionBreaks: 'Movement breaks follow the school’s own medical and safety rules.',
  cautionDesign:
    'One class before and after, without a comparison, cannot show that the break made the change.',
  removeStudy: 'Remove this study',
  removeText:
    'All its classes, protocols, observers and sessions go from this tablet. What was handed over stays where it is.',
  removeOpen: 'Remove the study …',
  removeTitle: ({ name }: { name: string }) => `Remove ${name} from this tablet?`,
  removeWhat: ({ classes, sessions, left }: { classes: number; sessions: number; left: number }, f: F) =>
    `${f.whole(classes)} ${f.plural(classes, { one: 'class', other: 'classes' })} and ${f.whole(sessions)} ${f.plural(sessions, { one: 'session', other: 'sessions' })} go with it.${left === 0 ? '' : ` ${f.whole(left)} ${f.plural(left, { one: 'session has', other: 'sessions have' })} not been handed over and would be lost.`} This cannot be taken back.`,
  removeType: ({ name }: { name: string }) => `Type the name of the study: ${name}`,
  removeFirst: 'First type the name as it stands above.',
  removeKeep: 'Keep the study',
  removeNow: 'Remove the study for good',
} as const;
