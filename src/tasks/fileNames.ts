import { dateOf } from '../kernel/wallTime.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Study } from '../model/study.ts';

/** What a file's name must not tell whoever sees it: conditions and pseudonyms. */
export function secretWords(
  study: Pick<Study, 'conditions'>,
  classes: readonly Pick<Classroom, 'children'>[],
): string[] {
  return [...study.conditions, ...classes.flatMap((one) => one.children.map((child) => child.pseudonym))];
}

/** `lookbell-hedge-school-2026-11-03.…`: a name that every system takes, without words that are to stay inside. */
export function fileName(title: string, wall: string, ending: string, secret: readonly string[]): string {
  const told = plain(title);
  const tells = secret.some((word) => plain(word) !== '' && `-${told}-`.includes(`-${plain(word)}-`));
  const middle = told === '' || tells ? '' : `-${told}`;
  return `lookbell${middle}-${dateOf(wall)}${ending}`;
}

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 40);
