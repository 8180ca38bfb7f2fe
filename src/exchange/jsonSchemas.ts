import * as z from 'zod/mini';
import { currentVersion, studyEnvelope, studyFormat, visitEnvelope, visitFormat } from './envelope.ts';

/**
 * The published descriptions (JSON Schema 2020-12) of the files of the current version, by file name. Further
 * members are allowed: a newer program may have added some, and they are passed on.
 */
export function jsonSchemas(): Record<string, object> {
  const describe = (format: string, schema: z.ZodMiniType): [string, object] => {
    const name = `${format}-${currentVersion}.schema.json`;
    const content = z.toJSONSchema(schema, { target: 'draft-2020-12', io: 'input' });
    return [name, { $id: name, title: `${format}, version ${currentVersion}`, ...content }];
  };
  return Object.fromEntries([describe(studyFormat, studyEnvelope), describe(visitFormat, visitEnvelope)]);
}
