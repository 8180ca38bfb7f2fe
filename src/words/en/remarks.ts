import type { RemarkCode } from '../../analysis/remark.ts';
import type { WarningCode } from '../../analysis/warning.ts';
import type { Format } from '../format.ts';

type F = Pick<Format, 'whole' | 'percent' | 'fixed' | 'kappa' | 'plural'>;

interface AtVisit {
  visit: string;
  class: string;
  phase: string;
  observers: string;
}

const at = ({ visit, class: name, phase }: AtVisit): string =>
  `visit ${visit}${name === '' ? '' : `, ${name}`}${phase === '' ? '' : `, ${phase}`}`;

/** What must be told beside a report. */
export const remarks = {
  visitWithoutRole: (v: AtVisit) =>
    `${at(v)}: ${v.observers} observed, and none is marked as primary, so it is not known whose record counts; the visit is left out. Expected: role "primary" and "second", or a chosen observer`,
  visitWithTwoPrimaries: (v: AtVisit) =>
    `${at(v)}: ${v.observers} are all marked as primary, so it is not known whose record counts; the visit is left out. Expected: one "primary" a visit, or a chosen observer`,
  secondAlone: (v: AtVisit) =>
    `${at(v)}: the primary observer's record is not here, only that of ${v.observers}, who was second; the visit is left out of the change`,
  methodsJoined: (v: { class: string; methods: string }) =>
    `${v.class}: figures of different methods are joined (${v.methods}); they do not measure the same thing`,
  methodsJoinedOverall: (v: { methods: string }) =>
    `the figures over all pairs join different methods (${v.methods}); look at each pair by itself`,
  phasesByName: (v: { before: string; after: string }) =>
    `dates do not tell which phase came first; "${v.before}" is taken as before and "${v.after}" as after, by the order of their names`,
  leftOutOfPooling: (v: { class: string; condition: string }) =>
    `${v.class}: left out of the pooled change${v.condition === '' ? '' : ` of ${v.condition}`}, because its standard error is 0 or undefined`,
} as const satisfies Record<RemarkCode, unknown>;

/** Said beside a figure; never blocks. */
export const warnings = {
  fewLooksForChild: ({ looks }: { looks: number }, f: F) =>
    `${f.whole(looks)} ${f.plural(looks, { one: 'look', other: 'looks' })}: too few to speak of this child alone.`,
  manyMissing: ({ percent, missing }: { percent: number; missing: number }, f: F) =>
    `${f.percent(percent)} of the intervals are missing (${f.whole(missing)}).`,
  underFortyPercent: ({ percent }: { percent: number }, f: F) =>
    `${f.percent(percent)} on-task is low for a whole class: was it an ordinary lesson?`,
  allOnTask:
    'Every interval was scored on-task: check the definition and whether the children could be seen.',
  longMomentary: ({ seconds }: { seconds: number }, f: F) =>
    `One look every ${f.whole(seconds)} seconds is far apart: behaviour in short bouts is caught by chance.`,
  longInterval: ({ seconds }: { seconds: number }, f: F) =>
    `Intervals observed for ${f.whole(seconds)} seconds bend the figure a good deal.`,
  partialOverestimates: 'Partial-interval recording overestimates the share of time for behaviour in bouts.',
  wholeUnderestimates: 'Whole-interval recording underestimates the share of time for behaviour in bouts.',
  neverEnded: 'This session was never ended; it is read up to where its record stops.',
  fewPairedIntervals: ({ compared }: { compared: number }, f: F) =>
    `Only ${f.whole(compared)} ${f.plural(compared, { one: 'interval was', other: 'intervals were' })} scored by both: agreement is uncertain.`,
  nearlyAlwaysOnTask: ({ percent }: { percent: number }, f: F) =>
    `${f.percent(percent)} of these intervals were on-task, so two people would often agree by luck and kappa is low easily. Look at non-occurrence agreement too.`,
  nearlyNeverOnTask: ({ percent }: { percent: number }, f: F) =>
    `Only ${f.percent(percent)} of these intervals were on-task, so two people would often agree by luck and kappa is low easily. Look at occurrence agreement too.`,
  underCriterion: ({ agreement, kappa }: { agreement: number; kappa: number }, f: F) =>
    `Under the study's criterion (${f.percent(agreement)} agreement and kappa ${f.kappa(kappa)}).`,
  oftenOutOfStep: ({ seconds }: { seconds: number }, f: F) =>
    `The cues came ${f.fixed(seconds, 1)} seconds apart by the tablets' clocks: disagreement may come from that.`,
} as const satisfies Record<WarningCode, unknown>;
