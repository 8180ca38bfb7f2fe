import {
  agreementReport,
  changeDetails,
  changeReport,
  comparedPairs,
  doubleCodedShares,
  onTaskReport,
  pairDetails,
  recordsOf,
  roundSheet,
  sessionDetails,
  sessionRecords,
  type Visit,
  visits,
} from '../analysis/index.ts';
import { heldBack } from '../journal/heldBack.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { isForTheRecord } from '../model/forTheRecord.ts';
import type { Study } from '../model/study.ts';
import type { SessionSummary, StoreReader } from '../tasks/ports.ts';
import type { Answer, Question, QuestionKind, VisitLine } from './questions.ts';
import { type Along, readSessions } from './readSessions.ts';

type Answerers = {
  readonly [Kind in QuestionKind]: (
    store: StoreReader,
    question: Question<Kind>,
    along: Along,
  ) => Promise<Answer<Kind>>;
};

const answerers: Answerers = {
  session: async (store, { session }) => {
    const found = await store.readSession(session);
    if (!found.ok) return found;
    if (found.value === null) return problem('task.noSession', { id: session });
    const held = await heldBackIn(store, found.value.header.study);
    if (!held.ok) return held;
    if (held.value.has(session)) return problem('ask.heldBack');
    const sheets = sessionRecords(found.value).map((record) => roundSheet(record));
    return ok({ details: sessionDetails(found.value), sheets });
  },

  study: async (store, { study }, along) => {
    const found = await gathered(store, study, isForTheRecord, along);
    if (!found.ok) return found;
    const { all, records } = found.value;
    const { report, notices } = onTaskReport(records);
    return ok({ onTask: report, visits: all.map(visitLine), doubleCoded: doubleCodedShares(all), notices });
  },

  agreement: async (store, { study, visit, practice = false, familiarisation = false }, along) => {
    const wanted = (session: SessionSummary): boolean =>
      session.practice === practice && isForTheRecord(session, { practice, familiarisation });
    const found = await gathered(store, study, wanted, along);
    if (!found.ok) return found;
    const all = found.value.all.filter((one) => visit === undefined || isVisit(one, visit));
    const { report, problems, notices } = agreementReport(all);
    const pairs = comparedPairs(all).map((pair) => pairDetails(pair, found.value.study.criterion));
    return ok({ report, pairs, doubleCoded: doubleCodedShares(all), problems, notices });
  },

  change: async (store, { study, before, after, control, observer }, along) => {
    const found = await gathered(store, study, isForTheRecord, along);
    if (!found.ok) return found;
    const studyControl = found.value.study.control;
    const analysis = changeReport(found.value.all, { before, after, control, observer, studyControl });
    return analysis.ok ? ok(changeDetails(analysis.value)) : analysis;
  },
};

/** Answers one question from the store, where it stands. */
export function answerFrom<Kind extends QuestionKind>(
  store: StoreReader,
  question: Question<Kind>,
  along: Along,
): Promise<Answer<Kind>> {
  const answerer = answerers[question.kind] as Answerers[Kind];
  return answerer(store, question, along);
}

interface Gathered {
  readonly study: Study;
  readonly records: ReturnType<typeof recordsOf>;
  readonly all: Visit[];
}

async function gathered(
  store: StoreReader,
  id: string,
  which: (session: SessionSummary) => boolean,
  along: Along,
): Promise<Result<Gathered>> {
  const study = await store.study(id);
  if (!study.ok) return study;
  if (study.value === null || study.value.removed) return problem('task.noStudy', { id });
  const held = await heldBackIn(store, id);
  if (!held.ok) return held;
  const wanted = (session: SessionSummary): boolean => which(session) && !held.value.has(session.id);
  const sessions = await readSessions(store, id, wanted, along);
  if (!sessions.ok) return sessions;
  const records = recordsOf(sessions.value, { practice: true, familiarisation: true });
  return ok({ study: study.value, records, all: visits(records, study.value.pairings) });
}

/** The sessions of a study of which nothing may be seen yet. */
async function heldBackIn(store: StoreReader, id: string): Promise<Result<ReadonlySet<string>>> {
  const study = await store.study(id);
  if (!study.ok) return study;
  const listed = await store.listSessions(id);
  if (!listed.ok) return listed;
  return ok(heldBack(listed.value, study.value?.pairings ?? []));
}

const isVisit = (visit: Visit, wanted: string): boolean =>
  visit.key === wanted ||
  visit.records.some((record) => record.visitId === wanted || record.session === wanted);

function visitLine(visit: Visit): VisitLine {
  return {
    key: visit.key,
    visit: visit.visit,
    visitIds: [...new Set(visit.records.map((record) => record.visitId))],
    class: visit.className,
    condition: visit.condition,
    phase: visit.phase,
    date: visit.date,
    observers: visit.records.map((record) => record.observer),
    sessions: visit.records.map((record) => record.session),
    counts: visit.records.map(({ looks }) => {
      const scored = looks.filter(({ status }) => status === 'scored').length;
      return { scored, missing: looks.length - scored };
    }),
  };
}
