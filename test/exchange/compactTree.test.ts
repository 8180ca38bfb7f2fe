import fc from 'fast-check';
import { expect, it } from 'vitest';
import { compactTree, expandTree, type Json } from '../../src/exchange/compactTree.ts';
import { packTree, unpackTree } from '../../src/exchange/packTree.ts';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import { newId } from '../../src/kernel/ids.ts';
import { seededRandom } from '../../src/kernel/random.ts';

const random = seededRandom('compact');
const ids = Array.from({ length: 6 }, () => newId(random));

/** Texts and names that the tree uses itself, identifiers that come again, names in an order that objects do not keep. */
const text = fc.oneof(
  fc.constantFrom(...ids),
  fc.constantFrom('~', '~~', '~1', '~z', '', `${ids[0]}x`, ids[1]?.toUpperCase() ?? ''),
  fc.string({ unit: 'binary', maxLength: 6 }),
);
const name = fc.oneof(fc.constantFrom('~', '~~', '~a', '10', '9', '__proto__', '!', ids[2] ?? ''), text);
const { value } = fc.letrec<{ value: Json }>((tie) => ({
  value: fc.oneof(
    { maxDepth: 4 },
    text,
    fc.constantFrom(null, true, false, 0, -1.5, 1e21, 15_000),
    fc.array(tie('value'), { maxLength: 4 }),
    members(tie('value')),
    // Like objects one after another: a table.
    fc
      .tuple(fc.uniqueArray(name, { minLength: 1, maxLength: 3 }), fc.integer({ min: 2, max: 4 }))
      .chain(([names, count]) =>
        fc
          .array(fc.tuple(...names.map(() => tie('value'))), { minLength: count, maxLength: count })
          .map(
            (rows): Json =>
              rows.map((row) => Object.fromEntries(names.map((one, i) => [one, row[i] as Json])) as Json),
          ),
      ),
  ),
}));

function members(of: fc.Arbitrary<Json>): fc.Arbitrary<Json> {
  return fc
    .array(fc.tuple(name, of), { maxLength: 4 })
    .map((pairs): Json => Object.fromEntries(pairs) as Json);
}

it('gives every JSON value back', () => {
  fc.assert(
    fc.property(value, (one) => {
      const expanded = expandTree(compactTree(one));
      expect(canonicalJson(expanded?.value)).toBe(canonicalJson(one));
      expect(canonicalJson(unpackTree(packTree(one))?.value)).toBe(canonicalJson(one));
    }),
    { numRuns: 400 },
  );
});

it('says each identifier once, and turns like objects by columns', () => {
  const [a = '', b = ''] = ids;
  const seats = [
    { id: a, child: null, row: 0 },
    { id: b, child: a, row: 0 },
  ];
  expect(compactTree({ seats, again: b })).toEqual({
    tree: {
      again: '~',
      seats: {
        '~': [
          ['child', 'id', 'row'],
          [null, '~'],
          ['~1', '~0'],
          [0, 0],
        ],
      },
    },
    ids: [b, a],
  });
});

it('gives nothing for a tree or for bytes that it has not made', () => {
  for (const tree of [
    '~',
    '~5',
    '~?',
    { '~': 1 },
    { '~': [['a', 'b'], [1]] },
    { '~': [['a', 'b'], [1], []] },
  ])
    expect(expandTree({ tree: tree as Json, ids: [] })).toBeNull();
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 60 }), (bytes) => {
      expect(() => unpackTree(bytes)).not.toThrow();
    }),
  );
  const packed = packTree({ a: ids });
  for (let length = 0; length < packed.length; length++)
    expect(unpackTree(packed.subarray(0, length))).toBeNull();
});

it('stops at a card that would unpack without end', () => {
  expect(unpackTree(packTree('x'.repeat(9_000_000)))).toBeNull();
});
