import { describe, expect, it } from 'vitest';
import { formatFor } from '../../src/words/format.ts';
import { say } from '../../src/words/say.ts';
import { wordsFor } from '../../src/words/words.ts';

const f = formatFor('en-GB');

describe('numbers as people read them', () => {
  it('writes kappa without a leading zero and with a true minus', () => {
    expect([0.756, -0.0526, 1, 0].map(f.kappa)).toEqual(['.76', '\u2212.05', '1.00', '.00']);
  });

  it('signs points, and gives nothing a sign that rounds to zero', () => {
    expect([13.8426, -4, 0.02, -0.02].map(f.points)).toEqual(['+13.8', '\u22124.0', '0.0', '0.0']);
  });

  it('counts down and never below zero', () => {
    expect([860_000, 59_001, -5].map(f.clock)).toEqual(['14:20', '1:00', '0:00']);
  });

  it('names a day as it was where it was written', () => {
    expect(f.day('2026-11-03')).toBe('Tuesday 3 November');
  });
});

describe('the catalogue', () => {
  it('fills gaps with the number forms of its language', () => {
    expect(wordsFor().common.notHandedOver({ n: 1200 })).toBe('Not handed over: 1,200');
  });

  it('shows a code that has no sentence rather than nothing', () => {
    expect(say(wordsFor().common, { code: 'never.written', values: {} })).toBe('never.written');
  });
});
