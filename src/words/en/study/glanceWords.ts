import type { Format } from '../../format.ts';
import { ordinal, short } from './short.ts';

type F = Format;

/** The study at a glance, and the first start. */
export const glanceWords = {
  firstTitle: 'Begin with a study.',
  firstNote:
    'A study holds classes, children under pseudonyms, observers and protocols. All of it stays on this tablet.',
  demoTitle: 'Look around first',
  demoText: 'An invented primary school: four classes, two observers, lessons before and after a break.',
  demoOpen: 'Open the demo study',
  demoOpening: 'Opening the demo study …',
  firstFiles: 'Or take over a study file from another tablet',
  ownTitle: 'A study of your own',
  ownName: 'Name of the study',
  ownHint: 'For example the school and the year. Everything can be changed later.',
  ownBegin: 'Begin this study',
  glance: (
    {
      name,
      classes,
      children,
      observers,
    }: { name: string; classes: number; children: number; observers: number },
    f: F,
  ) =>
    `${name}: ${f.whole(classes)} ${f.plural(classes, { one: 'class', other: 'classes' })}, ${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}, ${f.whole(observers)} ${f.plural(observers, { one: 'observer', other: 'observers' })}.`,
  glanceNote: (
    {
      phases,
      conditions,
      control,
    }: { phases: readonly string[]; conditions: readonly string[]; control: string | null },
    f: F,
  ) =>
    `Phases: ${phases.join(', then ')}.${conditions.length === 0 ? '' : ` Conditions: ${f.list(conditions)}${control === null ? '' : `; the others are compared with ${control}`}.`}`,
  demoSign: 'The demo study: invented, for looking around.',
  prepareVisit: 'Prepare a visit',
  classes: 'Classes',
  noClasses: 'No class yet.',
  addClass: 'Add a class',
  classLine: (
    {
      children,
      chosen,
      reserves,
      condition,
    }: { children: number; chosen: number | null; reserves: number; condition: string | null },
    f: F,
  ) =>
    [
      `${f.whole(children)} ${f.plural(children, { one: 'child', other: 'children' })}`,
      chosen === null ? 'not drawn yet' : `${f.whole(chosen)} drawn, ${f.whole(reserves)} in reserve`,
      condition === null ? 'no condition' : condition,
    ].join(' · '),
  protocols: 'Protocols',
  noProtocols: 'No protocol yet.',
  newProtocol: 'New protocol',
  method: ({ method }: { method: string }) =>
    method === 'momentary'
      ? 'momentary'
      : method === 'partial'
        ? 'partial interval'
        : method === 'whole'
          ? 'whole interval'
          : method,
  protocolLine: (
    {
      method,
      seconds,
      observeSeconds,
      lookAt,
      turns,
      inRow,
      eachSeconds,
      peerEvery,
      minutes,
      rounds,
    }: {
      method: string;
      /** null where there are no intervals. */
      seconds: number | null;
      observeSeconds: number | null;
      lookAt: 'end' | 'start' | null;
      turns: 'next' | 'block' | 'one' | 'sweep' | 'target' | 'everybody';
      inRow: number;
      eachSeconds: number;
      peerEvery: number;
      minutes: number | null;
      rounds: number | null;
    },
    f: F,
  ) =>
    [
      method,
      seconds === null
        ? 'on and off as it happens'
        : observeSeconds === null
          ? `every ${short(seconds, f)} s`
          : `${short(observeSeconds, f)} s watched of ${short(seconds, f)} s`,
      ...(lookAt === null
        ? []
        : [`${turns === 'everybody' ? 'counted' : 'looked'} at the ${lookAt} of the interval`]),
      {
        next: 'next child',
        one: 'one child',
        block: `${f.whole(inRow)} in a row for each child`,
        sweep: `all children in turn, ${short(eachSeconds, f)} s each`,
        target: `target child, every ${ordinal(peerEvery, f)} look a peer`,
        everybody: 'everybody',
      }[turns],
      minutes === null
        ? `${f.whole(rounds ?? 0)} ${f.plural(rounds ?? 0, { one: 'round', other: 'rounds' })} a part`
        : `${short(minutes, f)} ${f.plural(minutes, { one: 'minute', other: 'minutes' })} a part`,
    ].join(', '),
  observers: 'Observers',
  noObservers: 'No observer yet.',
  toObservers: 'Observers and their keys',
  more: 'More',
  toFiles: 'Files of the study',
  toMethods: 'Methods and checks',
  toSettings: 'Settings of the study',
  otherStudies: 'Other studies on this tablet',
  showStudy: ({ name }: { name: string }) => `Show ${name}`,
  beginAnother: 'Begin another study',
  backToStudy: 'The study',
  notHere: 'This page belongs to something that is not on this tablet, or no more.',
  taken: 'Kept.',
  undone: 'Taken back.',
  undoNothing: 'nothing to undo yet',
} as const;
