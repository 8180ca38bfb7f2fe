import { describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { bodies, entryStamp } from '../../src/journal/entry.ts';
import { entryKinds } from '../../src/journal/known.ts';
import { classroom } from '../../src/model/classroom.ts';
import { observer } from '../../src/model/observer.ts';
import { protocol } from '../../src/model/protocol.ts';
import { sessionHeader } from '../../src/model/session.ts';
import { study } from '../../src/model/study.ts';
import { entryShapes, misshapen, recordShapes, type Shapes, stampShapes } from '../../src/storage/shapes.ts';

/** The needed members of a schema as a table of shapes, by way of its JSON Schema. */
function shapesOf(schema: z.ZodMiniType): Shapes {
  const json = z.toJSONSchema(schema, { io: 'input' }) as {
    required?: string[];
    properties?: Record<string, Json>;
  };
  const needed = (json.required ?? []).filter((name) => name !== 'kind');
  return Object.fromEntries(needed.map((name) => [name, shapeOf(json.properties?.[name] ?? {})])) as Shapes;
}

interface Json {
  readonly type?: string | readonly string[];
  readonly anyOf?: readonly Json[];
  readonly oneOf?: readonly Json[];
}

function shapeOf(json: Json): string {
  const kinds = json.anyOf ?? json.oneOf ?? [json];
  const types = new Set(
    kinds.flatMap(({ type = 'object' }) => type).map((type) => (type === 'integer' ? 'number' : type)),
  );
  const nothing = types.delete('null');
  expect(types.size).toBe(1);
  return `${nothing ? '?' : ''}${[...types][0]}`;
}

describe('what is looked at when a row is read', () => {
  it.each(
    Object.entries({ study, classroom, observer, protocol, header: sessionHeader }) as [
      keyof typeof recordShapes,
      z.ZodMiniType,
    ][],
  )('is what the schema of a %s needs', (form, schema) => {
    expect(recordShapes[form]).toEqual(shapesOf(schema));
  });

  it('is what the schema of each kind of entry needs, and names every kind', () => {
    expect(stampShapes).toEqual(shapesOf(entryStamp));
    expect([...entryKinds].sort()).toEqual(Object.keys(bodies).sort());
    for (const kind of entryKinds) expect([kind, entryShapes[kind]]).toEqual([kind, shapesOf(bodies[kind])]);
  });

  it('finds the first member that is damaged, and takes null where null may stand', () => {
    expect(misshapen({ a: 'x', b: null }, { a: 'string', b: '?number' })).toBeNull();
    expect(misshapen({ a: 'x', b: 'y' }, { a: 'string', b: '?number' })).toBe('b');
    expect(misshapen({ a: null }, { a: 'string' })).toBe('a');
    expect(misshapen([], {})).toBe('');
    expect(misshapen(null, {})).toBe('');
  });
});
