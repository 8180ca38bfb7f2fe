import type { Problem, Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { CodeSet } from '../model/codeSet.ts';
import type { MissingReason } from '../model/missing.ts';
import type { KeyMap, Observer } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import type { ObserverSide, SeatingPlan } from '../model/seatingPlan.ts';
import type { Role, SessionHeader } from '../model/session.ts';
import type { StarterTexts } from '../model/starterCodeSets.ts';
import type { Study } from '../model/study.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { Deps, ExportedFile, HandOver, SessionSummary } from './ports.ts';

export type * from './ports.ts';

type Answer<T> = Promise<Result<T>>;

/** What a new study starts with, in the language of the screens (words/en/starter.ts). */
export interface NewStudyTexts {
  readonly phases: readonly string[];
  readonly conditions: readonly string[];
  readonly control: string | null;
  readonly lessonParts: readonly string[];
  readonly codeSets: StarterTexts;
  readonly protocolMomentary: string;
  readonly protocolPartial: string;
}
export type StudySettings = Pick<
  Study,
  'name' | 'phases' | 'conditions' | 'control' | 'lessonParts' | 'criterion' | 'safeguarding'
>;
export interface ClassListSource {
  readonly name: string;
  /** Pasted or typed text, or the bytes of a CSV file. */
  readonly content: string | Uint8Array;
}
export interface ClassListDone {
  readonly classroom: Classroom;
  readonly added: number;
  readonly changed: number;
  readonly withoutConsent: number;
  readonly notices: readonly Problem[];
}
export type PlanPreset =
  | { readonly kind: 'pairs'; readonly columns: number; readonly rows: number }
  | { readonly kind: 'fours'; readonly columns: number; readonly rows: number }
  | { readonly kind: 'horseshoe'; readonly seats: number };
/** A protocol as a form holds it; `id` null for a new one. */
export type ProtocolDraft = Omit<Protocol, 'id' | 'version' | 'removed' | 'revision'> & {
  readonly id: string | null;
};
export interface VisitWish {
  readonly classroom: string;
  readonly protocol: { readonly id: string; readonly version?: number };
  readonly phases: readonly string[];
  /** Children who are not there today. */
  readonly absent: readonly string[];
  readonly plannedStart: string | null;
  readonly orderSeed?: string;
}
export interface PreparedVisit {
  readonly plan: VisitPlan;
  readonly replaced: readonly { readonly absent: string; readonly by: string | null }[];
}
export interface SessionWish {
  /** Observer id. */
  readonly observer: string;
  readonly role: Role | null;
  readonly practice: boolean;
}
export interface Counts {
  readonly new: number;
  readonly known: number;
  readonly changed: number;
}
export interface FilePreview {
  readonly name: string;
  readonly form: 'study' | 'visit' | 'table' | null;
  readonly study: { readonly id: string; readonly name: string } | null;
  readonly sessions: Counts;
  readonly classes: Counts;
  readonly observers: Counts;
  readonly protocols: Counts;
  /** Why the file contributes nothing; empty when it can be taken. */
  readonly problems: readonly Problem[];
  readonly notices: readonly Problem[];
  /** The study was removed here; taking the file brings it back only when asked for. */
  readonly removedHere: boolean;
}
export interface ImportPreview {
  readonly files: readonly FilePreview[];
  /** Opaque: what `commitImport` will keep. */
  readonly bundles: readonly import('./ports.ts').StudyBundle[];
}
export interface Amendment {
  readonly interval: number;
  readonly codes: readonly string[] | null;
  readonly missing: MissingReason | null;
  readonly why: string;
  readonly by: string;
}
export interface Settlement {
  readonly interval: number;
  readonly codes: readonly string[];
  readonly why: string;
  readonly by: string;
}
export interface RemovalQuestion {
  readonly token: string;
  readonly name: string;
  readonly classes: number;
  readonly sessions: number;
  readonly notHandedOver: number;
}
export interface SourceFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}
export interface ImportOptions {
  /** Which labels of a table count as on-task and off-task. */
  readonly on?: readonly string[];
  readonly off?: readonly string[];
  /** The study that takes the sessions of an interval table; null makes one of its own. */
  readonly study?: string | null;
  /** Ids of removed studies that are to come back. */
  readonly revive?: readonly string[];
}

const later = (): never => {
  throw new Error('not written yet');
};

export const createStudy = later as (
  deps: Deps,
  wish: { name: string; texts: NewStudyTexts },
) => Answer<Study>;
export const saveStudy = later as (
  deps: Deps,
  study: string,
  changes: Partial<StudySettings>,
) => Answer<Study>;
export const renameStudy = later as (deps: Deps, study: string, name: string) => Answer<Study>;
export const addClass = later as (
  deps: Deps,
  study: string,
  wish: { name: string; condition: string | null },
) => Answer<Classroom>;
export const saveClass = later as (
  deps: Deps,
  classroom: string,
  changes: { name?: string; condition?: string | null },
) => Answer<Classroom>;
export const removeClass = later as (deps: Deps, classroom: string) => Answer<null>;
export const importClassList = later as (
  deps: Deps,
  classroom: string,
  source: ClassListSource,
) => Answer<ClassListDone>;
export const addChild = later as (
  deps: Deps,
  classroom: string,
  wish: { pseudonym: string; stratum: string | null; consent: boolean },
) => Answer<Classroom>;
export const renameChild = later as (
  deps: Deps,
  classroom: string,
  child: string,
  changes: { pseudonym?: string; stratum?: string | null },
) => Answer<Classroom>;
export const removeChild = later as (deps: Deps, classroom: string, child: string) => Answer<Classroom>;
export const setSeatingPlan = later as (
  deps: Deps,
  classroom: string,
  plan: SeatingPlan | PlanPreset | null,
) => Answer<Classroom>;
export const addSeat = later as (
  deps: Deps,
  classroom: string,
  place: { column: number; row: number; table?: number },
) => Answer<Classroom>;
export const removeSeat = later as (deps: Deps, classroom: string, seat: string) => Answer<Classroom>;
export const seatChild = later as (
  deps: Deps,
  classroom: string,
  seat: string,
  child: string | null,
) => Answer<Classroom>;
export const turnPlan = later as (deps: Deps, classroom: string, side: ObserverSide) => Answer<Classroom>;
export const drawTargets = later as (
  deps: Deps,
  classroom: string,
  protocol: { id: string; version?: number },
  seed?: string,
) => Answer<Classroom>;
export const undoDraw = later as (deps: Deps, classroom: string) => Answer<Classroom>;
export const addObserver = later as (deps: Deps, study: string, name: string) => Answer<Observer>;
export const saveObserver = later as (
  deps: Deps,
  observer: string,
  changes: { name?: string; keyMap?: KeyMap | null },
) => Answer<Observer>;
export const removeObserver = later as (deps: Deps, observer: string) => Answer<null>;
export const saveProtocol = later as (deps: Deps, draft: ProtocolDraft) => Answer<Protocol>;
export const removeProtocol = later as (deps: Deps, protocol: string) => Answer<null>;
export const newProtocolDraft = later as (study: string, name: string, codeSet: CodeSet) => ProtocolDraft;
export const prepareVisit = later as (deps: Deps, wish: VisitWish) => Answer<PreparedVisit>;
export const startSession = later as (
  deps: Deps,
  plan: VisitPlan,
  wish: SessionWish,
) => Answer<SessionHeader>;
export const adoptVisitFile = later as (deps: Deps, file: SourceFile) => Answer<VisitPlan>;
export const exportStudy = later as (deps: Deps, study: string) => Answer<ExportedFile>;
export const exportVisit = later as (deps: Deps, plan: VisitPlan) => Answer<ExportedFile>;
export const exportTable = later as (deps: Deps, study: string) => Answer<ExportedFile>;
export const markHandedOver = later as (deps: Deps, covers: readonly HandOver[]) => Answer<null>;
export const importFiles = later as (
  deps: Deps,
  files: readonly SourceFile[],
  options?: ImportOptions,
) => Answer<ImportPreview>;
export const commitImport = later as (
  deps: Deps,
  preview: ImportPreview,
  options?: Pick<ImportOptions, 'revive'>,
) => Answer<null>;
export const importDemo = later as (deps: Deps, files: readonly SourceFile[]) => Answer<ImportPreview>;
export const pairVisit = later as (deps: Deps, session: string, visit: string | null) => Answer<Study>;
export const amendInterval = later as (deps: Deps, session: string, wish: Amendment) => Answer<null>;
export const settleInterval = later as (deps: Deps, session: string, wish: Settlement) => Answer<null>;
export const askRemoveStudy = later as (deps: Deps, study: string) => Answer<RemovalQuestion>;
export const removeStudy = later as (deps: Deps, study: string, token: string) => Answer<null>;
export const resumeCandidates = later as (deps: Deps) => Answer<SessionSummary[]>;
export const finishUnfinished = later as (deps: Deps, session: string) => Answer<null>;
export const ensureInstallation = later as (deps: Omit<Deps, 'writer'>) => Answer<string>;
