import { expect, test } from 'vitest';
import { readClassList } from '../../src/exchange/readClassList.ts';
import { sentence } from './sentence.ts';

const said = (text: string): string => {
  const result = readClassList(text);
  return result.ok ? '' : sentence(result);
};

test('columns in any order; children without consent are counted and go no further', () => {
  const result = readClassList(
    '\ufeffConsent;Child;Seat;Stratum\r\nyes;Otter-07;A1;b\r\nno;Secret-01;A2;g\r\n;Secret-02;;\r\nYES;Heron-02;;\r\n',
  );
  expect(result).toEqual({
    ok: true,
    value: {
      children: [
        { pseudonym: 'Otter-07', consent: true, stratum: 'b', seat: 'A1', line: 2 },
        { pseudonym: 'Heron-02', consent: true, stratum: null, seat: null, line: 5 },
      ],
      leftOut: 2,
      consentStated: true,
    },
  });
  expect(JSON.stringify(result)).not.toContain('Secret');
});

test('pasted lines: pseudonyms alone say nothing of consent, and the result says that', () => {
  expect(readClassList('Otter-07\n\nHeron-02\n')).toMatchObject({
    ok: true,
    value: { children: [{ pseudonym: 'Otter-07' }, { pseudonym: 'Heron-02' }], consentStated: false },
  });
});

test('pasted from a spreadsheet: tabs, in the order child, consent, stratum, seat', () => {
  expect(readClassList('Otter-07\tyes\tb\tA1\nHeron-02\tno\tg\tA2')).toMatchObject({
    ok: true,
    value: {
      children: [{ pseudonym: 'Otter-07', stratum: 'b', seat: 'A1' }],
      leftOut: 1,
      consentStated: true,
    },
  });
});

test('what is wrong is said with its line', () => {
  expect(said('child,stratum\nOtter-07,b\n')).toBe(
    'Line 1: the column names lack consent; expected child and consent (stratum and seat if wanted), found “child, stratum”.',
  );
  expect(said('child,consent\nOtter-07,perhaps\n')).toBe('Line 2: consent is “perhaps”; expected yes or no.');
  expect(said('child,consent\nOtter-07,yes\nOtter-07,yes\n')).toBe(
    'Line 3: Otter-07 is already in line 2; expected each child once.',
  );
  expect(said('child,consent\n,yes\n')).toBe('Line 2: child is empty; expected a pseudonym.');
  expect(said('child,consent\nOtter-07\n')).toBe('Line 2: 1 cell; expected 2, as in the first line.');
  expect(said('child,consent\n"Otter-07,yes\n')).toMatch(/^Line 2: the cells cannot be told apart/);
  expect(said('child,consent\n')).toBe(
    'Line 1: no child is listed; expected at least one line with a pseudonym.',
  );
  expect(said('')).toMatch(/^Line 1: no child is listed/);
  expect(said(`child,consent\n${'x'.repeat(300)},yes\n`)).toMatch(/^Line 2: child is too long/);
});
