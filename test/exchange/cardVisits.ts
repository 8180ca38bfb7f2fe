import type { VisitPlan } from '../../src/model/visitPlan.ts';
import { newStudyTexts } from '../../src/screens/study/starterTexts.ts';
import {
  addClass,
  createStudy,
  drawTargets,
  importClassList,
  type PlanPreset,
  prepareVisit,
  setSeatingPlan,
} from '../../src/tasks/index.ts';
import { wordsFor } from '../../src/words/words.ts';
import { given } from '../storage/samples.ts';
import { bench } from '../tasks/bench.ts';

interface Class {
  readonly children: number;
  readonly plan: PlanPreset | null;
  readonly phases?: readonly string[];
}

/** A visit as the program prepares it: starter codes, six children drawn, everybody seated, identifiers of chance. */
export async function preparedVisit({
  children,
  plan,
  phases = ['before', 'after'],
}: Class): Promise<VisitPlan> {
  const { deps } = await bench('tablet-a', `class of ${children}`);
  const study = given(await createStudy(deps, { name: 'Breaks', texts: newStudyTexts(wordsFor()) }));
  const { id } = given(await addClass(deps, study.id, { name: 'Class Otter', condition: 'break' }));
  const content = Array.from({ length: children }, (_, i) => `Otter-${String(i + 1).padStart(2, '0')}`);
  given(await importClassList(deps, id, { content: content.join('\n'), consent: true }));
  const [protocol] = given(await deps.store.protocols(study.id));
  if (protocol === undefined) throw new Error('a new study has no protocol');
  let classroom = given(await drawTargets(deps, id, protocol, 'seed one'));
  if (plan !== null) {
    const empty = given(await setSeatingPlan(deps, id, plan)).plan;
    if (empty === null) throw new Error('the plan was not set');
    const seats = empty.seats.map((seat, i) => ({ ...seat, child: classroom.children[i]?.id ?? null }));
    classroom = given(await setSeatingPlan(deps, id, { ...empty, seats }));
  }
  const prepared = await prepareVisit(deps, {
    classroom: id,
    protocol: { id: protocol.id },
    phases,
    absent: [],
    plannedStart: '2026-11-03T10:40:00.000+00:00',
  });
  return given(prepared).plan;
}
