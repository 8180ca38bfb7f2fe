import { readdirSync, readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { english } from '../../src/words/en/english.ts';

const source = new URL('../../src/', import.meta.url);

it.each(['tasks', 'storage', 'worker'])(
  'has a sentence for every problem of src/%s, and none besides',
  (floor) => {
    const folder = new URL(`${floor}/`, source);
    const texts = readdirSync(folder).map((name) => readFileSync(new URL(name, folder), 'utf8'));
    const codes = new Set(
      texts.flatMap((text) => [...text.matchAll(/'((?:task|store|ask)\.\w+)'/g)].map(([, code]) => code)),
    );
    expect(codes.size).toBeGreaterThan(0);
    const unsaid = [...codes].filter((code) => !(String(code) in english.problems));
    expect(unsaid).toEqual([]);
    if (floor === 'worker') return;
    const prefix = floor === 'tasks' ? 'task.' : 'store.';
    const said = Object.keys(english.problems).filter((code) => code.startsWith(prefix));
    expect(said.filter((code) => !codes.has(code))).toEqual([]);
  },
);
