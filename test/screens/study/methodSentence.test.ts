import { expect, test } from 'vitest';
import type { Protocol } from '../../../src/model/protocol.ts';
import { methodSentence } from '../../../src/screens/study/methodSentence.ts';
import { wordsFor } from '../../../src/words/words.ts';
import { protocolOf } from '../../support/session.ts';

const line = (changes: Partial<Protocol>) => methodSentence(wordsFor(), protocolOf(changes));
const minutes = { partLength: { kind: 'minutes', minutes: 15 } } as const;

test('says every method and rotation in one line, with the moment of the look where there is one', () => {
  expect(line({})).toBe(
    'momentary, every 15 s, looked at the end of the interval, next child, 2 rounds a part',
  );
  expect(line({ ...minutes, lookAt: 'start', rotation: { kind: 'sweep', eachMs: 3000 } })).toBe(
    'momentary, every 15 s, looked at the start of the interval, all children in turn, 3 s each, 15 minutes a part',
  );
  expect(
    line({ ...minutes, method: 'partial', observeMs: 10_000, rotation: { kind: 'block', intervals: 4 } }),
  ).toBe('partial interval, 10 s watched of 15 s, 4 in a row for each child, 15 minutes a part');
  expect(line({ ...minutes, method: 'whole', rotation: { kind: 'target', peerEvery: 4 } })).toBe(
    'whole interval, every 15 s, target child, every 4th look a peer, 15 minutes a part',
  );
  expect(line({ ...minutes, rotation: { kind: 'target', peerEvery: 22 } })).toContain(
    'every 22nd look a peer',
  );
  expect(line({ ...minutes, method: 'headcount', intervalMs: 60_000, lookAt: 'end' })).toBe(
    'headcount, every 60 s, counted at the end of the interval, everybody, 15 minutes a part',
  );
  expect(line({ ...minutes, method: 'duration', rotation: { kind: 'next' } })).toBe(
    'duration, on and off as it happens, one child, 15 minutes a part',
  );
});
