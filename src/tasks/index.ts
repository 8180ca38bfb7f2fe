import type { Problem, Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import type { Deps, ExportedFile, HandOver } from './ports.ts';

export { addChild, type ChildWish, removeChild, renameChild } from './children.ts';
export { addClass, type ClassWish, removeClass, saveClass } from './classes.ts';
export { type Amendment, amendInterval, pairVisit, type Settlement, settleInterval } from './corrections.ts';
export { drawTargets, undoDraw } from './draws.ts';
export { addObserver, removeObserver, saveObserver } from './observers.ts';
export type { PlanPreset } from './planPresets.ts';
export type * from './ports.ts';
export { type ProtocolDraft, starterDraft } from './protocolDrafts.ts';
export { removeProtocol, saveProtocol } from './protocols.ts';
export { finishUnfinished, resumeCandidates, type SessionWish, startSession } from './recordings.ts';
export { addSeat, removeSeat, seatChild, setSeatingPlan, turnPlan } from './seating.ts';
export { createStudy, type NewStudyTexts, renameStudy, type StudySettings, saveStudy } from './studies.ts';
export { type PreparedVisit, prepareVisit, type VisitWish } from './visits.ts';

type Answer<T> = Promise<Result<T>>;

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

export const importClassList = later as (
  deps: Deps,
  classroom: string,
  source: ClassListSource,
) => Answer<ClassListDone>;
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
export const askRemoveStudy = later as (deps: Deps, study: string) => Answer<RemovalQuestion>;
export const removeStudy = later as (deps: Deps, study: string, token: string) => Answer<null>;
export const ensureInstallation = later as (deps: Omit<Deps, 'writer'>) => Answer<string>;
