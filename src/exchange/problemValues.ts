import type { Problem } from '../kernel/result.ts';
import type { FileProblem } from './types.ts';

type None = Record<never, never>;

/** Every sentence of this floor and the values of its gaps; `words/<language>/problems.ts` has one for each. */
export interface ProblemValues {
  'file.empty': None;
  'file.notUtf8': None;
  'file.utf16': None;
  'file.html': None;
  'file.zip': None;
  'file.cutOffCompressed': None;
  'file.tooLarge': { most: number };
  'file.nul': None;
  'json.cutOff': None;
  'json.notJson': { found: string };
  'json.tooDeep': { path: string; most: number };
  'json.nul': { path: string };
  'json.otherForm': { found: string };
  'json.newer': { version: number; known: number };
  'json.absent': { path: string; expected: string; detail: string };
  'json.wrong': { path: string; expected: string; detail: string; found: string };
  'study.checksum': { classes: number; sessions: number; entries: number };
  'study.twice': { path: string; id: string };
  'study.otherSession': { path: string; found: string; expected: string };
  'study.otherStudy': { path: string; found: string; expected: string };
  'study.noInterval': { path: string; interval: number; most: number };
  'study.noCode': { path: string; code: string; codes: string };
  'study.gap': { path: string; n: number; first: number };
  'study.entryConflict': { path: string; seq: number };
  'study.newKinds': { kinds: string; n: number };
  'visit.checksum': { children: number };
  'table.noRows': None;
  'table.columns': { absent: string; found: string };
  'table.columnTwice': { column: string };
  'table.columnsDropped': { columns: string; n: number };
  'table.ragged': { cells: number; columns: number };
  'table.quoteOpen': None;
  'table.quoteAfter': { found: string };
  'table.cellTooLong': { length: number; most: number };
  'table.textTooLong': { column: string; length: number; most: number };
  'table.needed': { column: string };
  'table.noChild': None;
  'table.interval': { found: string };
  'table.number': { column: string; found: string };
  'table.whole': { column: string; found: string };
  'table.positive': { column: string; found: string };
  'table.notNegative': { column: string; found: string };
  'table.date': { column: string; found: string };
  'table.start': { found: string };
  'table.word': { column: string; found: string; expected: string };
  'table.codeAndMissing': { code: string; missing: string };
  'table.noCode': None;
  'table.severalCodes': { code: string };
  'table.headcountCode': { code: string };
  'table.counts': None;
  'table.countsOver': { on: number; present: number };
  'table.countsElsewhere': { method: string };
  'table.observeOver': { observe: number; interval: number };
  'table.durationTimes': None;
  'table.endBeforeStart': { start: number; end: number };
  'table.twice': { session: string; child: string; interval: number; firstLine: number };
  'table.twoObservers': { session: string; first: string; found: string };
  'table.varies': { column: string; session: string; first: string; found: string };
  'table.roleUnknown': { labels: string; n: number };
  'classList.noRows': { line: number };
  'classList.columns': { absent: string; found: string; line: number };
  'classList.noChild': { line: number };
  'classList.consent': { found: string; line: number };
  'classList.twice': { pseudonym: string; firstLine: number; line: number };
  'classList.cells': { cells: number; columns: number; line: number };
  'classList.text': { column: string; most: number; line: number };
  'classList.broken': { line: number };
  'merge.session': { session: string; observer: string; n: number };
  'merge.entry': { session: string; writer: string; seq: number };
  'merge.record': { noun: string; name: string };
  'merge.studies': { kept: string; other: string };
}

export type ProblemCode = keyof ProblemValues;

/** A problem that has no place yet. */
export interface Fault<Code extends ProblemCode = ProblemCode> extends Problem<Code> {}

/** A code of the catalogue with the values of its sentence. */
export function fault<Code extends ProblemCode>(code: Code, values: ProblemValues[Code]): Fault<Code> {
  return { code, values: values as Problem['values'] };
}

/** A problem where it was found: a line of a text, a JSON path, or the whole file. */
export function problemAt(file: string, where: { line?: number; path?: string }, found: Fault): FileProblem {
  return { file, line: where.line ?? null, path: where.path ?? null, problem: found };
}

/** `FILE:LINE` or `FILE`: what a line on standard error begins with. A JSON path is part of the sentence. */
export function placeOf(found: Pick<FileProblem, 'file' | 'line'>): string {
  return found.line === null ? found.file : `${found.file}:${found.line}`;
}

/** A piece of somebody's file as a sentence can carry it: one line, at most 60 characters. */
export function excerpt(text: string): string {
  const plain = text.slice(0, 400).replace(/[\p{Cc}\u2028\u2029]+/gu, ' ');
  const characters = Array.from(plain);
  return characters.length > 60 || text.length > 400 ? `${characters.slice(0, 59).join('')}…` : plain;
}
