// npm run bench [-- word]: runs what in bench/ has the word in its path, and prints one table. `*.bench.ts` is run on
// the spot, `*.live.ts` in a browser, against the built app.
import { existsSync, readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { liveBenches } from './bench/liveBenches.ts';
import { build } from './run/runners.mjs';

/** One line of a bench: a value with its unit, and what it is when the bench's first line is 1. */
export interface Row {
  label: string;
  value: number;
  unit: string;
  /** Left out, it is worked out against the first row of the same bench and unit. null: not compared. */
  ratio?: number | null;
  /** The most that was asked for: the row says whether it is kept. */
  most?: number;
}

/** What a bench file exports as `bench`. */
export interface Bench {
  name: string;
  run: () => Row[] | Promise<Row[]>;
}

/** The rows of one bench with their ratios or limits, as lines of a table. */
export function benchTable(name: string, rows: readonly Row[]): string[] {
  const width = Math.max(0, ...rows.map(({ label }) => label.length));
  const against = ({ value, unit, ratio, most }: Row): string => {
    if (most !== undefined) return `${value <= most ? 'within' : 'OVER'} ${most}`;
    if (ratio === null) return '';
    const base = rows.find((row) => row.unit === unit)?.value ?? Number.NaN;
    return `× ${(ratio ?? value / base).toFixed(2).padStart(7)}`;
  };
  return [
    name,
    ...rows.map((row) =>
      `  ${row.label.padEnd(width)} ${numeral(row.value).padStart(9)} ${row.unit.padEnd(6)} ${against(row)}`.trimEnd(),
    ),
  ];
}

/** Three digits that count; whole numbers as they are. */
const numeral = (n: number): string => (Number.isInteger(n) ? String(n) : n.toPrecision(3));

/** @param ending of the files of one sort */
function filesWith(ending: string, word: string): string[] {
  return (existsSync('bench') ? readdirSync('bench', { recursive: true, encoding: 'utf8' }) : [])
    .filter((file) => file.endsWith(ending) && file.includes(word))
    .sort();
}

async function main() {
  const word = process.argv[2] ?? '';
  const [files, live] = [filesWith('.bench.ts', word), filesWith('.live.ts', word)];
  if (files.length + live.length === 0) {
    console.error(`No bench found${word && ` for "${word}"`}.`);
    process.exitCode = 1;
    return;
  }
  const needsApp = live.length > 0 || files.some((file) => file.startsWith('recorder'));
  if (needsApp && !process.env.BUILT && (await build()).failed > 0) {
    process.exitCode = 1;
    return;
  }
  for (const file of files) {
    const { bench } = (await import(pathToFileURL(resolve('bench', file)).href)) as { bench: Bench };
    console.log(`\n${benchTable(bench.name, await bench.run()).join('\n')}`);
  }
  if (live.length === 0) return;
  const { benches, problems } = await liveBenches(live);
  for (const { name, rows } of benches) console.log(`\n${benchTable(name, rows).join('\n')}`);
  for (const problem of problems) console.error(problem);
  if (problems.length > 0) process.exitCode = 1;
}

if (process.argv[1]?.endsWith('bench.ts')) await main();
