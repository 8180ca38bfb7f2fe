import * as z from 'zod/mini';
import { isoDate, wallTime } from '../model/common.ts';
import { jsonPath, valueAt } from './jsonPath.ts';
import { excerpt, type Fault, fault } from './problemValues.ts';

/**
 * What a schema expected, as a word of the catalogue (`expected`) and its detail. Words: the types of JSON, and
 * `oneOf`, `least`, `most`, `date`, `wall`, `form`, `other`.
 */
interface Expectation {
  readonly expected: string;
  readonly detail: string;
}

const patterns = new Map(
  (
    [
      ['date', isoDate],
      ['wall', wallTime],
    ] as const
  ).map(([word, schema]) => [z.toJSONSchema(schema).pattern ?? '', word]),
);

function expectation(issue: z.core.$ZodIssue): Expectation {
  switch (issue.code) {
    case 'invalid_type':
      return { expected: issue.expected === 'int' ? 'integer' : issue.expected, detail: '' };
    case 'invalid_value':
      return { expected: 'oneOf', detail: issue.values.map(String).join(', ') };
    case 'too_small':
      return {
        expected: issue.origin === 'string' || issue.origin === 'array' ? 'longer' : 'least',
        detail: String(issue.minimum),
      };
    case 'too_big':
      return {
        expected: issue.origin === 'string' || issue.origin === 'array' ? 'shorter' : 'most',
        detail: String(issue.maximum),
      };
    case 'invalid_format': {
      const pattern = (issue.pattern ?? '').replace(/^\/|\/$/g, '');
      const word = patterns.get(pattern);
      return word === undefined ? { expected: 'form', detail: pattern } : { expected: word, detail: '' };
    }
    case 'invalid_union':
      return {
        expected: 'oneOf',
        detail: 'options' in issue ? (issue.options ?? []).map(String).join(', ') : '',
      };
    default:
      return { expected: 'other', detail: '' };
  }
}

/** The first thing that a schema found wrong: a member that is absent, or one that is something else. */
export function schemaFault(
  root: unknown,
  issue: z.core.$ZodIssue,
  prefix: readonly PropertyKey[] = [],
): { readonly path: string; readonly fault: Fault } {
  const path = jsonPath([...prefix, ...issue.path]);
  const value = valueAt(root, issue.path);
  const expected = expectation(issue);
  if (value === undefined) return { path, fault: fault('json.absent', { path, ...expected }) };
  const found = excerpt(JSON.stringify(value).slice(0, 500));
  return { path, fault: fault('json.wrong', { path, ...expected, found }) };
}
