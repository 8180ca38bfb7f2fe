import { newId } from '../kernel/ids.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Protocol } from '../model/protocol.ts';
import { nextRevision } from '../model/revision.ts';
import { type StarterTexts, starterCodeSets } from '../model/starterCodeSets.ts';
import { type Study, study as studySchema } from '../model/study.ts';
import { editStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { starterDraft } from './protocolDrafts.ts';
import { nameFrom, namesFrom, sameName } from './text.ts';

/** What a new study starts with, in the language of the screens. */
export interface NewStudyTexts {
  readonly phases: readonly string[];
  readonly conditions: readonly string[];
  /** The condition that the others are compared with. */
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

/** A new study with two protocols to begin with, and shown from now on. */
export async function createStudy(
  deps: Deps,
  wish: { readonly name: string; readonly texts: NewStudyTexts },
): Promise<Result<Study>> {
  const name = nameFrom(wish.name, 'study');
  if (!name.ok) return name;
  const { texts } = wish;
  const study: Study = {
    id: newId(deps.random),
    name: name.value,
    phases: [...texts.phases],
    conditions: [...texts.conditions],
    control: texts.control,
    lessonParts: [...texts.lessonParts],
    criterion: { agreement: 0.85, kappa: 0.6 },
    safeguarding: '',
    pairings: [],
    demo: false,
    removed: false,
    revision: nextRevision(null, deps.writer),
  };
  const [onOff] = starterCodeSets(texts.codeSets);
  if (onOff === undefined) return problem('task.noCodes');
  const drafts = [
    starterDraft('momentary', study.id, texts.protocolMomentary, onOff),
    starterDraft('partial', study.id, texts.protocolPartial, onOff),
  ];
  const protocols = drafts.map(
    (draft): Protocol => ({
      ...draft,
      id: newId(deps.random),
      version: 1,
      removed: false,
      revision: nextRevision(null, deps.writer),
    }),
  );
  const kept = await deps.store.put({
    studies: [{ record: study, previous: null }],
    protocols: protocols.map((record) => ({ record, previous: null })),
  });
  if (!kept.ok) return kept;
  // The study is kept; which one is shown is only a convenience.
  await deps.store.saveSettings({ study: study.id });
  return ok(study);
}

/** Changes a study's own words. Sessions keep the words with which they were recorded. */
export function saveStudy(
  deps: Deps,
  study: string,
  changes: Partial<StudySettings>,
): Promise<Result<Study>> {
  return editStudy(deps, study, (before) => {
    const next = { ...before, ...changes };
    const name = nameFrom(next.name, 'study');
    if (!name.ok) return name;
    const phases = namesFrom(next.phases, 'phase');
    if (!phases.ok) return phases;
    if (phases.value.length === 0) return problem('task.noPhase');
    const conditions = namesFrom(next.conditions, 'condition');
    if (!conditions.ok) return conditions;
    const lessonParts = namesFrom(next.lessonParts, 'lessonPart');
    if (!lessonParts.ok) return lessonParts;
    const control =
      next.control === null
        ? null
        : (conditions.value.find((one) => sameName(one, next.control ?? '')) ?? null);
    if (next.control !== null && control === null)
      return problem('task.controlIsNoCondition', { control: next.control });
    const record = {
      ...next,
      name: name.value,
      phases: phases.value,
      conditions: conditions.value,
      lessonParts: lessonParts.value,
      control,
    };
    if (!studySchema.safeParse(record).success) return problem('task.studyOutOfRange');
    return ok(record);
  });
}

export function renameStudy(deps: Deps, study: string, name: string): Promise<Result<Study>> {
  return saveStudy(deps, study, { name });
}
