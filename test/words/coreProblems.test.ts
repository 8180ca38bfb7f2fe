import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { coreWordsFor } from '../../src/words/coreWords.ts';

/** All problems that the recorder, the store and the tablet can tell, as their sources name them. */
function codesIn(folder: string): string[] {
  return readdirSync(folder)
    .filter((name) => /\.tsx?$/.test(name))
    .flatMap((name) => [
      ...readFileSync(join(folder, name), 'utf8').matchAll(/'((?:recorder|session|store|demo)\.[a-z]\w+)'/gi),
    ])
    .map(([, code]) => code ?? '');
}

it('the recording screen has a sentence for whatever can be in its way', () => {
  const codes = ['recorder', 'storage', 'devices', 'app'].flatMap((floor) => codesIn(`src/${floor}`));
  expect(new Set(codes).size).toBeGreaterThan(15);
  const { problems } = coreWordsFor();
  expect([...new Set(codes)].filter((code) => !(code in problems))).toEqual([]);
});
