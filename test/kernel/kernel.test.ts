import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import { byCodePoint } from '../../src/kernel/compare.ts';
import { idFromContent } from '../../src/kernel/idFromContent.ts';
import { newId } from '../../src/kernel/ids.ts';
import { seededRandom } from '../../src/kernel/random.ts';
import { epochMs } from '../../src/kernel/units.ts';
import { dateOf, epochOf, shiftedWall, toWallTime } from '../../src/kernel/wallTime.ts';

describe('canonicalJson', () => {
  it('sorts members and writes no white space (the object-sorting rule of RFC 8785, section 3.2.3)', () => {
    expect(canonicalJson({ b: [1, { z: null, a: 'x' }], a: 1e21 })).toBe(
      '{"a":1e+21,"b":[1,{"a":"x","z":null}]}',
    );
  });

  it('reads back as what it was', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });

  it('does not depend on the order in which members were set', () => {
    expect(canonicalJson({ a: 1, b: 2 })).toBe(canonicalJson({ b: 2, a: 1 }));
  });
});

describe('identifiers', () => {
  it('are UUIDs of version 4 (RFC 9562: version and variant digits)', () => {
    for (let i = 0; i < 200; i++)
      expect(newId(seededRandom(String(i)))).toMatch(
        /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/,
      );
  });

  it('from content are UUIDs of version 5, equal for equal content only', () => {
    expect(idFromContent('a', 'b')).toMatch(/-5[0-9a-f]{3}-[89ab]/);
    expect(idFromContent('a', 'b')).toBe(idFromContent('a', 'b'));
    expect(idFromContent('a', 'b')).not.toBe(idFromContent('ab'));
  });
});

describe('wall time', () => {
  it('writes local time with its offset (ISO 8601)', () => {
    expect(toWallTime(epochMs(Date.UTC(2026, 10, 3, 10, 42, 7, 123)), 60)).toBe(
      '2026-11-03T11:42:07.123+01:00',
    );
    expect(toWallTime(epochMs(Date.UTC(2026, 10, 3, 0, 0)), -210)).toBe('2026-11-02T20:30:00.000-03:30');
  });

  it('comes back as the same instant whatever the offset', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 4e12 }),
        fc.integer({ min: -14 * 60, max: 14 * 60 }),
        (epoch, offset) => {
          expect(epochOf(toWallTime(epochMs(epoch), offset))).toBe(epoch);
        },
      ),
    );
  });

  it('keeps the date of the place where it was written', () => {
    expect(dateOf('2026-11-03T00:10:00.000+13:00')).toBe('2026-11-03');
  });

  it('moves a wall time and keeps its offset', () => {
    expect(shiftedWall('2026-11-03T10:42:07.000-03:30', -7500)).toBe('2026-11-03T10:41:59.500-03:30');
    expect(shiftedWall('2026-03-29T00:59:59.000+00:00', 2000)).toBe('2026-03-29T01:00:01.000+00:00');
    expect(shiftedWall('2026-11-03T10:00:00Z', 1000)).toBe('2026-11-03T10:00:01.000+00:00');
    expect(shiftedWall('never', 5)).toBe('never');
  });
});

describe('byCodePoint', () => {
  it('orders astral characters after all others, unlike UTF-16 order', () => {
    expect(['\u{1F33B}', '\uFF5E', 'b', 'a', 'ab'].sort(byCodePoint)).toEqual([
      'a',
      'ab',
      'b',
      '\uFF5E',
      '\u{1F33B}',
    ]);
  });
});
