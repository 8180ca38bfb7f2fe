import fc from 'fast-check';
import { expect, test } from 'vitest';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import type { ReadFile, TableDelimiter } from '../../src/exchange/types.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import { missingReasons } from '../../src/model/missing.ts';
import { bytesOf, writing } from './sampleStudy.ts';
import { sentence } from './sentence.ts';
import { rowsOf, tableOf } from './tableText.ts';

type Row = Record<string, string>;

// Text as people write it: trimmed, and with whatever a spreadsheet, a CSV or a terminal might choke on.
const text = fc
  .array(fc.constantFrom(...'ab Zé7"\',;\n=+-@💡'), { minLength: 1, maxLength: 12 })
  .map((characters) => characters.join('').trim())
  .filter((words) => words !== '');
const maybe = (value: fc.Arbitrary<string>): fc.Arbitrary<string> =>
  fc.oneof({ weight: 3, arbitrary: value }, { weight: 1, arbitrary: fc.constant('') });
const decimal = (least: number, most: number): fc.Arbitrary<string> =>
  fc.integer({ min: least * 1000, max: most * 1000 }).map((n) => String(n / 1000));
const labels = ['on-task', 'off-task, with others', 'Off task "alone"', 'on', '0'];

/** A text cell as a table holds it. */
const cell = (words: string): string => (/^[=+\-@\t\r']/.test(words) ? `'${words}` : words);

const sessionArbitrary: fc.Arbitrary<Row[]> = fc
  .record({
    observer: text,
    role: fc.constantFrom('', 'primary', 'second'),
    class: maybe(text),
    condition: maybe(text),
    visit: maybe(text),
    date: fc.constantFrom('2026-11-03', '2024-02-29'),
    start: fc.constantFrom('', '2026-11-03T10:40:00+01:00', '2026-11-03T10:40Z'),
    study: maybe(text),
    method: fc.constantFrom('momentary', 'partial', 'whole', 'headcount', 'duration'),
    interval_s: maybe(fc.constantFrom('15', '20.5')),
    observe_s: maybe(fc.constantFrom('10', '0.125')),
  })
  .chain((facts) =>
    fc.array(rowArbitrary(facts.method), { minLength: 1, maxLength: 8 }).map((rows) => {
      const seen = new Set<string>();
      return rows
        .filter((row) => {
          const key = `${row.interval} ${row.child}`;
          return !seen.has(key) && seen.add(key) !== undefined;
        })
        .map((row) => ({ ...facts, ...row }));
    }),
  );

function rowArbitrary(method: string): fc.Arbitrary<Row> {
  const several = method === 'partial' || method === 'whole';
  const codes = fc
    .uniqueArray(fc.constantFrom(...labels), { minLength: several ? 0 : 1, maxLength: several ? 3 : 1 })
    .map((some) => some.join('|'));
  return fc
    .record({
      child: fc.constantFrom('Otter-07', 'Heron-02', '=2+3', '-'),
      interval: fc.integer({ min: 1, max: 6 }).map(String),
      code: codes,
      missing: fc.oneof({ weight: 3, arbitrary: fc.constant('') }, fc.constantFrom(...missingReasons)),
      phase: maybe(text),
      round: maybe(fc.nat(9).map(String)),
      start_s: decimal(0, 100),
      end_s: decimal(100, 200),
      lesson_part: maybe(text),
      minutes_from_break: maybe(decimal(-60, 60)),
      present: fc.integer({ min: 0, max: 30 }),
      share: fc.double({ min: 0, max: 1, noNaN: true }),
    })
    .map(({ present, share, ...row }) => {
      const counted = method === 'headcount' && row.missing === '';
      return {
        ...row,
        child: method === 'headcount' ? '' : cell(row.child),
        code: method === 'headcount' || row.missing !== '' ? '' : row.code,
        on_count: counted ? String(Math.floor(present * share)) : '',
        present_count: counted ? String(present) : '',
      };
    });
}

const tableArbitrary: fc.Arbitrary<Row[]> = fc
  .array(sessionArbitrary, { minLength: 1, maxLength: 4 })
  .map((sessions) =>
    sessions.flatMap((rows, s) =>
      rows.map((row) => {
        const words = ['observer', 'class', 'condition', 'visit', 'study', 'phase', 'lesson_part'];
        const guarded = Object.entries(row).map(([name, value]) => [
          name,
          words.includes(name) ? cell(value) : value,
        ]);
        return { session: `s${s}`, ...Object.fromEntries(guarded) } as Row;
      }),
    ),
  );

/** Rows as one text each, only some columns, whatever their order. */
const picture = (rows: readonly Row[], columns: readonly string[]): string[] =>
  rows.map((row) => JSON.stringify(columns.map((column) => row[column] ?? ''))).sort();

async function take(content: string): Promise<ReadFile> {
  const outcome = await readIncoming({ name: 'a.csv', bytes: bytesOf(content) });
  if (!outcome.ok) throw new Error(outcome.problems.map(sentence).join(' '));
  return outcome;
}

test('table to sessions to table is identity on the columns that were there', async () => {
  const optional = [
    'role',
    'class',
    'condition',
    'visit',
    'study',
    'phase',
    'round',
    'lesson_part',
    'observe_s',
  ];
  await fc.assert(
    fc.asyncProperty(tableArbitrary, fc.subarray(optional), async (rows, left) => {
      const columns = Object.keys(rows[0] ?? {}).filter((column) => !left.includes(column));
      const given = rows.map((row) =>
        Object.fromEntries(columns.map((column) => [column, row[column] ?? ''])),
      );
      const { bundle } = await take(tableOf(given));
      expect(picture(rowsOf(writeIntervalTable(bundle.sessions)), columns)).toEqual(picture(given, columns));
    }),
    { numRuns: 200 },
  );
});

test('the order of rows and columns, the delimiter and a second reading change nothing', async () => {
  await fc.assert(
    fc.asyncProperty(
      tableArbitrary,
      fc.constantFrom<TableDelimiter>(',', ';', '\t'),
      async (rows, delimiter) => {
        const { bundle } = await take(tableOf(rows));
        const turned = [...rows]
          .reverse()
          .map((row) => Object.fromEntries(Object.entries(row).reverse()) as Row);
        const again = await take(`\ufeff${tableOf(turned)}`);
        expect(new Set(again.bundle.sessions)).toEqual(new Set(bundle.sessions));
        const written = await take(writeIntervalTable(bundle.sessions, { delimiter }));
        expect(written.bundle.sessions).toEqual(bundle.sessions);
      },
    ),
    { numRuns: 100 },
  );
});

test('sessions from a table can be handed on in a study file', async () => {
  await fc.assert(
    fc.asyncProperty(tableArbitrary, async (rows) => {
      const { bundle } = await take(tableOf(rows));
      const outcome = await readIncoming({ name: 'a.json', bytes: await writeStudyFile(bundle, writing) });
      expect(outcome.ok ? [] : outcome.problems.map(sentence)).toEqual([]);
      expect(outcome).toMatchObject({ bundle, notices: [] });
    }),
    { numRuns: 100 },
  );
});

test('a table with anything at all in its cells is read or refused in one sentence, never thrown', async () => {
  const junk = fc.oneof(
    fc.string({ unit: 'binary', maxLength: 6 }),
    fc.constantFrom(
      '',
      '1e308',
      '9999999',
      '-0',
      '9999-12-31',
      '9999-12-31T23:59Z',
      '2026-11-03T10:42Z',
      "'",
      '|',
      'NaN',
    ),
  );
  await fc.assert(
    fc.asyncProperty(tableArbitrary, junk, fc.nat(), fc.nat(), async (rows, value, r, c) => {
      const columns = Object.keys(rows[0] ?? {});
      const changed = rows.map((row, i) =>
        i === r % rows.length ? { ...row, [columns[c % columns.length] ?? '']: value } : row,
      );
      const outcome = await readIncoming({ name: 'a.csv', bytes: bytesOf(tableOf(changed)) });
      if (outcome.ok) {
        const handedOn = await readIncoming({
          name: 'b',
          bytes: await writeStudyFile(outcome.bundle, writing),
        });
        expect(handedOn.ok ? [] : handedOn.problems.map(sentence)).toEqual([]);
      } else expect(outcome.problems.map(sentence)).toEqual([expect.stringContaining('; expected ')]);
    }),
    { numRuns: 500 },
  );
});
