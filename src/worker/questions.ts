import type {
  AgreementReport,
  ChangeDetails,
  DoubleCodedShare,
  OnTaskReport,
  PairDetails,
  Remark,
  RoundSheet,
  SessionDetails,
} from '../analysis/index.ts';
import type { Result } from '../kernel/result.ts';

/** One session with its round sheets, one a phase. */
export interface SessionAnswer {
  readonly details: SessionDetails;
  readonly sheets: readonly RoundSheet[];
}

/** One class at one time in one phase, as the study's lists show it. */
export interface VisitLine {
  readonly key: string;
  /** What people call the visit; null where nobody named it. */
  readonly visit: string | null;
  readonly visitIds: readonly string[];
  readonly class: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  readonly date: string | null;
  readonly observers: readonly string[];
  /** Header ids, in the order of the observers. */
  readonly sessions: readonly string[];
  /** Intervals scored and missing, in the order of the sessions. */
  readonly counts: readonly { readonly scored: number; readonly missing: number }[];
}

export interface StudyAnswer {
  readonly onTask: OnTaskReport;
  readonly visits: readonly VisitLine[];
  readonly doubleCoded: readonly DoubleCodedShare[];
  readonly notices: readonly Remark[];
}

export interface AgreementAnswer {
  readonly report: AgreementReport;
  readonly pairs: readonly PairDetails[];
  readonly doubleCoded: readonly DoubleCodedShare[];
  readonly problems: readonly Remark[];
  readonly notices: readonly Remark[];
}

/** What can be asked, and what the answer is. */
export interface Questions {
  readonly session: { readonly asks: { readonly session: string }; readonly answer: SessionAnswer };
  readonly study: { readonly asks: { readonly study: string }; readonly answer: StudyAnswer };
  readonly agreement: {
    readonly asks: {
      readonly study: string;
      /** A visit's `key`, one of its ids, or one of its sessions; left out: the whole study. */
      readonly visit?: string;
      /** Practice sessions alone, instead of those for the record. */
      readonly practice?: boolean;
      /** Familiarisation visits, too. */
      readonly familiarisation?: boolean;
    };
    readonly answer: AgreementAnswer;
  };
  readonly change: {
    readonly asks: {
      readonly study: string;
      readonly before?: string;
      readonly after?: string;
      readonly control?: string;
      readonly observer?: string;
    };
    readonly answer: ChangeDetails;
  };
}

export type QuestionKind = keyof Questions;
export type Question<Kind extends QuestionKind = QuestionKind> = {
  readonly [K in Kind]: { readonly kind: K } & Questions[K]['asks'];
}[Kind];
export type Answer<Kind extends QuestionKind> = Result<Questions[Kind]['answer']>;

export interface AskOptions {
  /** A question that nobody waits for any more is answered with `ask.stopped`. */
  readonly signal?: AbortSignal;
  /** Called with the share done, 0 to 1. */
  readonly progress?: (share: number) => void;
}

/** Asks for figures. They are computed where the store is read: no session crosses over. */
export type Ask = <Kind extends QuestionKind>(
  question: Question<Kind>,
  options?: AskOptions,
) => Promise<Answer<Kind>>;
