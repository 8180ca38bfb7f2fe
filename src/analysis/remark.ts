import type { Problem } from '../kernel/result.ts';

/**
 * Something that people must be told beside a report: what (a code of the message catalogue with its values) and
 * which sessions (header ids) it is about, so that a file can be named.
 */
export interface Remark extends Problem<RemarkCode> {
  readonly sessions: readonly string[];
}

export type RemarkCode =
  | 'visitWithoutRole'
  | 'visitWithTwoPrimaries'
  | 'secondAlone'
  | 'methodsJoined'
  | 'methodsJoinedOverall'
  | 'phasesByName'
  | 'leftOutOfPooling';

/** A report, with what stands in its way (`problems`: figures are incomplete) and what is worth knowing (`notices`). */
export interface Analysed<Report> {
  readonly report: Report;
  readonly problems: readonly Remark[];
  readonly notices: readonly Remark[];
}
