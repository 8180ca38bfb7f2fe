// npm run bench [-- word]: runs bench/**/*.bench.ts (those whose path holds the word) and prints one table.
import { existsSync, readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

/** One line of a bench: a value with its unit, and what it is when the bench's first line is 1. */
export interface Row {
  label: string;
  value: number;
  unit: string;
  /** Left out, it is worked out against the first row of the same bench and unit. */
  ratio?: number;
}

/** What a bench file exports as `bench`. */
export interface Bench {
  name: string;
  run: () => Row[] | Promise<Row[]>;
}

/** The rows of one bench with their ratios, as lines of a table. */
export function benchTable(name: string, rows: Row[]): string[] {
  const width = Math.max(0, ...rows.map(({ label }) => label.length));
  return [
    name,
    ...rows.map(({ label, value, unit, ratio }) => {
      const base = rows.find((row) => row.unit === unit)?.value ?? Number.NaN;
      const times = (ratio ?? value / base).toFixed(2);
      return `  ${label.padEnd(width)} ${value.toPrecision(3).padStart(9)} ${unit.padEnd(6)} × ${times.padStart(7)}`;
    }),
  ];
}

async function main() {
  const word = process.argv[2] ?? '';
  const files = (existsSync('bench') ? readdirSync('bench', { recursive: true, encoding: 'utf8' }) : [])
    .filter((file) => file.endsWith('.bench.ts') && file.includes(word))
    .sort();
  if (files.length === 0) {
    console.error(`No bench found${word && ` for "${word}"`}.`);
    process.exitCode = 1;
  }
  for (const file of files) {
    const { bench } = (await import(pathToFileURL(resolve('bench', file)).href)) as { bench: Bench };
    console.log(`\n${benchTable(bench.name, await bench.run()).join('\n')}`);
  }
}

if (process.argv[1]?.endsWith('bench.ts')) await main();
