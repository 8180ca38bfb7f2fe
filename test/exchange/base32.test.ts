import fc from 'fast-check';
import { expect, it } from 'vitest';
import { fromBase32, toBase32 } from '../../src/exchange/base32.ts';

const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);

// RFC 4648, section 10, without the padding.
it.each([
  ['', ''],
  ['f', 'MY'],
  ['fo', 'MZXQ'],
  ['foo', 'MZXW6'],
  ['foob', 'MZXW6YQ'],
  ['fooba', 'MZXW6YTB'],
  ['foobar', 'MZXW6YTBOI'],
])('writes %j as %j, as the RFC does, and reads it', (plain, written) => {
  expect(toBase32(bytesOf(plain))).toBe(written);
  expect(fromBase32(written)).toEqual(bytesOf(plain));
});

it('reads what it wrote, in small letters too', () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 80 }), (bytes) => {
      expect(fromBase32(toBase32(bytes))).toEqual(bytes);
      expect(fromBase32(toBase32(bytes).toLowerCase())).toEqual(bytes);
    }),
  );
});

it('takes the figures that are not in the alphabet for the letters that they look like', () => {
  expect(fromBase32('0181')).toEqual(fromBase32('OIBI'));
});

it('refuses strange characters, lengths that cannot be, and bits that stand for nothing', () => {
  expect(['MZXW9', 'MZ W6', 'MY==', 'M', 'MZX', 'MZXW6Y', 'MZ', 'MZXR'].map(fromBase32)).toEqual(
    Array(8).fill(null),
  );
});
