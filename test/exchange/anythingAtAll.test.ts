import fc from 'fast-check';
import { expect, test } from 'vitest';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import { bytesOf, jsonOf, sampleBundle, visitPlan, writing } from './sampleStudy.ts';
import { sentence } from './sentence.ts';

/** Reads, and expects either content or one sentence of one line. */
async function readsOrSays(bytes: Uint8Array): Promise<void> {
  const outcome = await readIncoming({ name: 'a', bytes });
  if (outcome.ok) return;
  const sentences = outcome.problems.map(sentence);
  expect(sentences).toEqual([expect.stringMatching(/^[^\n]*; expected [^\n]*\.$/)]);
  expect(sentences[0]?.length).toBeLessThan(500);
}

test('any bytes are read or refused in one sentence', async () => {
  const magic = fc.constantFrom([], [0x1f, 0x8b, 8], [0xef, 0xbb, 0xbf], [0x50, 0x4b, 3, 4], [0x7b], [0x3c]);
  await fc.assert(
    fc.asyncProperty(magic, fc.uint8Array({ maxLength: 60 }), (first, rest) =>
      readsOrSays(Uint8Array.from([...first, ...rest])),
    ),
    { numRuns: 500 },
  );
});

/** Every place of a document, as the members that lead to it. */
function placesOf(value: unknown, path: (string | number)[] = []): (string | number)[][] {
  if (value === null || typeof value !== 'object') return [path];
  const members: [string | number, unknown][] = Array.isArray(value)
    ? value.map((member, i) => [i, member])
    : Object.entries(value);
  return [path, ...members.flatMap(([key, member]) => placesOf(member, [...path, key]))];
}

function replaced(value: unknown, path: readonly (string | number)[], by: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined || value === null || typeof value !== 'object') return by;
  const copy = (Array.isArray(value) ? [...value] : { ...value }) as Record<string | number, unknown>;
  copy[key] = replaced(copy[key], rest, by);
  return copy;
}

test('a study file with anything at all in any place is read or refused in one sentence', async () => {
  const bundle = { ...sampleBundle(), visitPlans: [visitPlan] };
  const file = jsonOf(await writeStudyFile(bundle, writing));
  const places = placesOf(file);
  expect(places.length).toBeGreaterThan(200);
  await fc.assert(
    fc.asyncProperty(fc.constantFrom(...places), fc.jsonValue({ maxDepth: 2 }), (place, value) =>
      readsOrSays(bytesOf(replaced(file, place, value))),
    ),
    { numRuns: 1000 },
  );
});

test('without any one member a study file is refused with its path, unless the member may be absent', async () => {
  const bundle = { ...sampleBundle(), visitPlans: [visitPlan] };
  const file = jsonOf(await writeStudyFile(bundle, writing));
  const optional = ['visitPlans'];
  for (const place of placesOf(file)) {
    const member = place.at(-1);
    if (typeof member !== 'string' || optional.includes(member)) continue;
    const outcome = await readIncoming({ name: 'a', bytes: bytesOf(replaced(file, place, undefined)) });
    expect(outcome.ok, place.join('.')).toBe(false);
    const [problem] = outcome.ok ? [] : outcome.problems;
    expect(problem?.path).toBe(
      place.reduce<string>(
        (path, part) => (typeof part === 'number' ? `${path}[${part}]` : `${path}.${part}`),
        '$',
      ),
    );
  }
});
