import { expect, test } from 'vitest';
import * as z from 'zod';
import { jsonSchemas } from '../../src/exchange/jsonSchemas.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import { writeVisitFile } from '../../src/exchange/writeVisitFile.ts';
import { journalOf, jsonOf, sampleBundle, visitPlan, writing } from './sampleStudy.ts';
import { codesWithSentences } from './sentence.ts';

const schemas = jsonSchemas();
const published = (name: string): z.ZodType =>
  z.fromJSONSchema(schemas[name] as z.core.JSONSchema.JSONSchema);

test('the published descriptions are JSON Schema 2020-12 and ask for every member of the envelope', () => {
  expect(Object.keys(schemas)).toEqual(['lookbell-study-1.schema.json', 'lookbell-visit-1.schema.json']);
  expect(schemas['lookbell-study-1.schema.json']).toMatchObject({
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    $id: 'lookbell-study-1.schema.json',
    required: [
      'format',
      'version',
      'exportedAt',
      'app',
      'checksum',
      'study',
      'classes',
      'observers',
      'protocols',
      'sessions',
    ],
  });
});

test('what is written fits the description, entries of newer kinds too; what lacks a member does not', async () => {
  const bundle = sampleBundle();
  const hum = journalOf('session-1', 'w2', [{ kind: 'hummed', at: 3 }]);
  bundle.sessions.push(
    ...bundle.sessions.splice(0).map((session) => ({ ...session, journal: [...session.journal, ...hum] })),
  );
  const file = jsonOf(await writeStudyFile(bundle, writing));
  const description = published('lookbell-study-1.schema.json');
  expect(description.safeParse(file).error?.issues).toBeUndefined();
  const { protocols: _, ...lacking } = file;
  expect(description.safeParse(lacking).success).toBe(false);
  const visit = jsonOf(await writeVisitFile(visitPlan, writing));
  expect(published('lookbell-visit-1.schema.json').safeParse(visit).error?.issues).toBeUndefined();
});

test('the catalogue has no sentence that nobody says', () => {
  expect(new Set(codesWithSentences).size).toBe(codesWithSentences.length);
  expect(codesWithSentences.length).toBeGreaterThan(60);
});
