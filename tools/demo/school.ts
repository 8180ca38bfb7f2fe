import { idFromContent } from '../../src/kernel/idFromContent.ts';
import type { Child, Classroom } from '../../src/model/classroom.ts';
import type { Observer } from '../../src/model/observer.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { Seat, SeatingPlan } from '../../src/model/seatingPlan.ts';
import { starterCodeSets } from '../../src/model/starterCodeSets.ts';
import type { Study } from '../../src/model/study.ts';
import { drawChildren } from '../../src/schedule/drawChildren.ts';
import { starter } from '../../src/words/en/starter.ts';
import { type ClassTruth, classes } from './truth.ts';

const id = (...parts: string[]): string => idFromContent('demo', ...parts);
const revision = { counter: 0, writer: 'demo' };

export const study: Study = {
  id: id('study'),
  name: 'Demo: a break before mathematics',
  phases: ['before', 'after'],
  conditions: ['break', 'usual'],
  control: 'usual',
  lessonParts: [starter.wholeClass, starter.group, starter.individual, starter.transition],
  criterion: { agreement: 0.8, kappa: 0.6 },
  safeguarding: '',
  pairings: [],
  demo: true,
  removed: false,
  revision,
};

const texts = (label: string, definition: string, examples: string, nonExamples: string) => ({
  label,
  definition,
  examples,
  nonExamples,
});

const [, aloneOrWithOthers] = starterCodeSets({
  onOff: starter.onOff,
  aloneOrWithOthers: starter.aloneOrWithOthers,
  onTask: texts(starter.onLabel, starter.onDefinition, starter.onExamples, starter.onNonExamples),
  offTask: texts(starter.offLabel, starter.offDefinition, starter.offExamples, starter.offNonExamples),
  offTaskAlone: texts(
    starter.offAloneLabel,
    starter.offAloneDefinition,
    starter.offAloneExamples,
    starter.offAloneNonExamples,
  ),
  offTaskWithOthers: texts(
    starter.offOthersLabel,
    starter.offOthersDefinition,
    starter.offOthersExamples,
    starter.offOthersNonExamples,
  ),
});
if (aloneOrWithOthers === undefined) throw new Error('The starter code sets are not there.');

export const protocol: Protocol = {
  id: id('protocol'),
  version: 1,
  study: study.id,
  name: starter.protocolMomentary,
  method: 'momentary',
  intervalMs: 15_000,
  observeMs: 15_000,
  lookAt: 'end',
  rotation: { kind: 'next' },
  partLength: { kind: 'minutes', minutes: 15 },
  order: 'random',
  childrenToDraw: 6,
  reserves: 2,
  graceMs: 400,
  codeSet: aloneOrWithOthers,
  cues: { channel: 'left', volume: 0.3, flash: true, vibration: false },
  removed: false,
  revision,
};

export const observers: Observer[] = ['Quill', 'Marsh'].map((name) => ({
  id: id('observer', name),
  study: study.id,
  name,
  keyMap: null,
  removed: false,
  revision,
}));

/** Tables of two in three rows, seen by an observer at the back. */
function plan(children: readonly Child[]): SeatingPlan {
  const seats: Seat[] = Array.from({ length: 15 }, (_, i) => {
    const [column, row] = [i % 5, Math.floor(i / 5)];
    return {
      id: `seat-${i + 1}`,
      column: column + (column > 2 ? 1 : 0),
      row,
      table: row * 3 + Math.floor(column / 2),
      child: children[i]?.id ?? null,
    };
  });
  return { columns: 6, rows: 3, seats, observerSide: 'back' };
}

function classroomOf(truth: ClassTruth): Classroom {
  const children: Child[] = Array.from({ length: 12 }, (_, i) => ({
    id: id('child', truth.name, String(i + 1)),
    pseudonym: `${truth.animal}-${String(i + 1).padStart(2, '0')}`,
    stratum: i % 2 === 0 ? 'A' : 'B',
    removed: false,
  }));
  return {
    id: id('class', truth.name),
    study: study.id,
    name: truth.name,
    condition: truth.condition,
    children,
    plan: plan(children),
    draw: drawChildren(children, 6, 2, `demo ${truth.name}`),
    removed: false,
    revision,
  };
}

export const classrooms: Classroom[] = classes.map(classroomOf);
