import { expect, test } from 'vitest';
import { wordsFor } from '../../src/words/words.ts';

const words = wordsFor();
const moments = { method: 'momentary', lookAt: 'start' } as const;

test('no figure of moments is printed without its moment', () => {
  const session = { ...moments, seconds: 15, observed: 15, codeSet: null, children: 6 };
  expect(words.afterwards.how(session)).toMatch(
    /^Momentary time sampling, looked at the start of the interval, every 15 s, 6 children\./,
  );
  expect(words.afterwards.how({ ...session, method: 'headcount', lookAt: 'end', seconds: 60 })).toMatch(
    /^Headcount, counted at the end of the interval, every 60 s/,
  );
  expect(words.agreement.how({ ways: [moments], compared: 10, excluded: 2 })).toMatch(
    /^Momentary time sampling, looked at the start of the interval; the same child/,
  );
  const mixed = [moments, { method: 'momentary', lookAt: 'end' } as const];
  expect(words.change.how({ before: 'before', after: 'after', ways: mixed })).toMatch(
    /^Momentary time sampling, looked at the start of the interval; momentary time sampling, looked at the end of/,
  );
  expect(words.batch.methodCell(moments)).toBe('momentary, look at start');
});

test('what a table does not tell is not made up, and a duration has no interval', () => {
  const duration = {
    method: 'duration',
    lookAt: null,
    seconds: 15,
    observed: 15,
    codeSet: null,
    children: 1,
  } as const;
  expect(words.afterwards.how(duration)).toMatch(/^Continuous duration, 1 child\./);
  expect(words.batch.methodCell({ method: 'momentary', lookAt: null })).toBe('momentary');
});
