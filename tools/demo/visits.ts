import type { StoredSession } from '../../src/journal/stored.ts';
import { type Lesson, observe } from './observe.ts';
import { classrooms } from './school.ts';
import { classes } from './truth.ts';

/** Three mornings a class in November 2026; the second visits of two classes bring what lessons bring. */
export const lessons: readonly Lesson[] = classes.flatMap((truth, c) =>
  [1, 2, 3].map((number): Lesson => {
    const day = 2 + c + (number - 1) * 7;
    const classroom = classrooms[c];
    if (classroom === undefined) throw new Error(`The demo has no class ${truth.name}.`);
    return {
      truth,
      classroom,
      number,
      start: `2026-11-${String(day).padStart(2, '0')}T09:${number === 2 ? '30' : '15'}:00`,
      fireDrill: truth.name === 'Heron' && number === 2,
      childLeaves: truth.name === 'Lark' && number === 1,
    };
  }),
);

/** Which visits Marsh double-codes, by class and number: one in each class, the drifting ones last. */
const doubleCoded: readonly [string, number][] = [
  ['Otter', 1],
  ['Heron', 2],
  ['Lark', 3],
  ['Newt', 3],
];

/** Quill's tablet, and Marsh's; Newt's first visit was on paper and comes as a table. */
export function recordings(): { quill: StoredSession[]; marsh: StoredSession[]; paper: StoredSession[] } {
  const quill: StoredSession[] = [];
  const marsh: StoredSession[] = [];
  const paper: StoredSession[] = [];
  for (const lesson of lessons) {
    const double = doubleCoded.findIndex(
      ([name, number]) => name === lesson.truth.name && number === lesson.number,
    );
    const onPaper = lesson.truth.name === 'Newt' && lesson.number === 1;
    const role = double >= 0 ? 'primary' : null;
    (onPaper ? paper : quill).push(observe(lesson, { observer: 'Quill', role, visitsSoFar: 0, lateMs: 0 }));
    if (double >= 0)
      marsh.push(observe(lesson, { observer: 'Marsh', role: 'second', visitsSoFar: double, lateMs: 180 }));
  }
  return { quill, marsh, paper };
}
