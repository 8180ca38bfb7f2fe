import type { Bundle } from '../exchange/types.ts';
import { recordingFacts } from '../journal/headerFacts.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { byCodePoint } from '../kernel/compare.ts';
import { nextRevision } from '../model/revision.ts';
import type { Study } from '../model/study.ts';
import type { StudyBundle } from './ports.ts';

/** Who "writes" a study that only tables speak of; any installation's edit wins. */
const tableStudyWriter = '!table';

/** Names under which studies usually keep the condition that the others are compared with (common practice, no source). */
const controls = ['control', 'comparison', 'usual'];

/**
 * A table has sessions of one or more studies and no study record: each gets its own bundle, under the study that is
 * known, or under one made from what the table says. The same table gives the same study.
 */
export function bundlesOfTable(
  table: Bundle,
  fileName: string,
  known: (id: string) => Study | undefined,
): StudyBundle[] {
  const ids = [...new Set(table.sessions.map(({ header }) => header.study))].sort(byCodePoint);
  return ids.map((id) => {
    const sessions = table.sessions.filter(({ header }) => header.study === id);
    return {
      study: withWordsOf(known(id) ?? studyFrom(id, sessions, fileName), sessions),
      classes: table.classes.filter(({ study }) => study === id),
      observers: table.observers.filter(({ study }) => study === id),
      protocols: [],
      sessions,
    };
  });
}

type Sessions = StudyBundle['sessions'];

function studyFrom(id: string, sessions: Sessions, fileName: string): Study {
  const label = sessions.find(({ header }) => header.studyLabel)?.header.studyLabel;
  const name = (label ?? fileName.replace(/\.[^.]*$/, '')).slice(0, 200) || id;
  const conditions = wordsOf(sessions.map(({ header }) => header.condition));
  return {
    id,
    name,
    phases: [],
    conditions: [],
    control: conditions.find((one) => controls.includes(one.toLowerCase())) ?? null,
    lessonParts: [],
    criterion: { agreement: 0.85, kappa: 0.6 },
    safeguarding: '',
    pairings: [],
    demo: false,
    removed: false,
    revision: { counter: 0, writer: tableStudyWriter },
  };
}

/** A study made from tables has all their phases and conditions, in the order of dates; one that people keep is left alone. */
function withWordsOf(study: Study, sessions: Sessions): Study {
  if (study.revision.writer !== tableStudyWriter) return study;
  const dated = [...sessions].sort((a, b) => byCodePoint(a.header.date ?? '', b.header.date ?? ''));
  const phases = dated.flatMap(({ header }) => recordingFacts(header).phases);
  const all = wordsOf([...study.phases, ...phases]);
  const next = {
    ...study,
    phases: all.length === 0 ? ['1'] : all,
    conditions: wordsOf([...study.conditions, ...sessions.map(({ header }) => header.condition)]),
  };
  if (study.phases.length === 0 || canonicalJson(next) === canonicalJson(study)) return next;
  return { ...next, revision: nextRevision(study.revision, tableStudyWriter) };
}

const wordsOf = (words: readonly (string | null)[]): string[] => [
  ...new Set(words.filter((word) => word !== null && word !== '') as string[]),
];
