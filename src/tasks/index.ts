export type { FileForm, FileProblem, IncomingFile } from '../exchange/types.ts';
export { addChild, type ChildWish, removeChild, renameChild } from './children.ts';
export { addClass, type ClassWish, removeClass, saveClass } from './classes.ts';
export { type ClassListDone, type ClassListSource, importClassList } from './classLists.ts';
export { type Amendment, amendInterval, pairVisit, type Settlement, settleInterval } from './corrections.ts';
export { drawTargets, undoDraw } from './draws.ts';
export { exportStudy, exportTable, exportVisit, markHandedOver } from './exports.ts';
export {
  type Counts,
  commitImport,
  type FilePreview,
  type ImportOptions,
  type ImportPreview,
  importDemo,
  importFiles,
} from './imports.ts';
export { ensureInstallation } from './installation.ts';
export { type LastTime, type LikelyObserver, lastTime, likelyObserver } from './lastTime.ts';
export { addNote, type NoteWish } from './notes.ts';
export { addObserver, removeObserver, saveObserver } from './observers.ts';
export type { PaperAnswer, PaperDraft, PaperOnset, PaperPart, PaperStandIn } from './paperDraft.ts';
export {
  beginPaper,
  findSheet,
  keepPaperSession,
  keepSheet,
  readPaper,
  savePaper,
  visitOfSession,
} from './paperSessions.ts';
export { awayReasons, hasStandIns, standInsFault, watchedOnPaper } from './paperStandIns.ts';
export type { PlanPreset } from './planPresets.ts';
export type * from './ports.ts';
export { recipeProblem } from './protocolChecks.ts';
export { type ProtocolDraft, starterDraft, switchMethod } from './protocolDrafts.ts';
export { removeProtocol, saveProtocol } from './protocols.ts';
export { finishUnfinished, resumeCandidates, type SessionWish, startSession } from './recordings.ts';
export { askRemoveStudy, type RemovalQuestion, removeStudy } from './removal.ts';
export { addSeat, removeSeat, seatChild, setSeatingPlan, turnPlan } from './seating.ts';
export { newSeed } from './seeds.ts';
export { createStudy, type NewStudyTexts, renameStudy, type StudySettings, saveStudy } from './studies.ts';
export { tryShort } from './tryShort.ts';
export { adoptVisitFile } from './visitFiles.ts';
export { type PreparedVisit, prepareVisit, type VisitWish } from './visits.ts';
