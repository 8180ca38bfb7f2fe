import { rmSync } from 'node:fs';
import type { Row } from '../bench.ts';
import { findChromium } from '../find-chromium.mjs';
import { readReport, runNode } from '../run/process.mjs';

interface Report {
  readonly suites: readonly Suite[];
}
interface Suite {
  readonly title: string;
  readonly suites?: readonly Suite[];
  readonly specs: readonly {
    readonly ok: boolean;
    readonly tests: readonly {
      readonly annotations: readonly { readonly type: string; readonly description?: string }[];
    }[];
  }[];
}

export interface LiveBenches {
  readonly benches: readonly { readonly name: string; readonly rows: readonly Row[] }[];
  /** What went wrong, one line each. */
  readonly problems: readonly string[];
}

const report = '.cache/bench.json';

/**
 * Runs benches in a browser, one after the other, and collects the rows that they said.
 *
 * @param files below bench/
 */
export async function liveBenches(files: readonly string[]): Promise<LiveBenches> {
  const { path, said } = findChromium({ install: true });
  if (!path) return { benches: [], problems: [said] };
  rmSync(report, { force: true });
  const { output } = await runNode([
    'node_modules/@playwright/test/cli.js',
    'test',
    '--config=bench/live/playwright.config.ts',
    ...files.map((file) => `bench/${file}`),
  ]);
  const found = readReport<Report>(report);
  if (found === undefined) return { benches: [], problems: [output] };
  const suites = found.suites.flatMap(withSpecs);
  return {
    benches: suites.map(({ title, specs }) => ({ name: title, rows: specs.flatMap(rowsOf) })),
    problems: suites.some(({ specs }) => specs.some(({ ok }) => !ok)) ? [output] : [],
  };
}

/** A `describe` is one bench, each test in it measures some of its rows. */
const withSpecs = (suite: Suite): readonly Suite[] => [
  ...(suite.specs.length > 0 ? [suite] : []),
  ...(suite.suites ?? []).flatMap(withSpecs),
];

const rowsOf = ({ tests }: Suite['specs'][number]): Row[] =>
  tests.flatMap(({ annotations }) =>
    annotations.flatMap(({ type, description }) =>
      type === 'row' && description !== undefined ? [JSON.parse(description) as Row] : [],
    ),
  );
