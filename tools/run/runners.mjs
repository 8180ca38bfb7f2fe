import { mkdirSync, rmSync } from 'node:fs';
import { checkFloors } from '../floors/check.mjs';
import { checkGlobals } from '../globals/check.mjs';
import { readReport, runNode } from './process.mjs';
import { fromPlaywright, fromVitest, sum } from './reports.mjs';

/** @typedef {import('./summary.mjs').Result} Result */

/** @param {string} title */
const head = (title) => console.log(`\n— ${title}`);

/**
 * A program that is right or wrong as a whole.
 *
 * @param {string} name @param {string[]} args @returns {Promise<Result>}
 */
async function whole(name, args) {
  const { code, output } = await runNode(args);
  if (code === 0) return { name, passed: 1, failed: 0 };
  head(name);
  console.log(output.trimEnd());
  return { name, passed: 0, failed: 1 };
}

/**
 * The native checker takes a second where the classic one takes seven; where its binary is missing for the
 * machine, the classic one answers the same.
 *
 * @returns {Promise<Result>}
 */
export async function types() {
  const native = 'node_modules/typescript-native/bin/tsc';
  const there = (await runNode([native, '--version'])).code === 0;
  return whole('types', [there ? native : 'node_modules/typescript/bin/tsc', '--noEmit', '-p', '.']);
}

/** Warnings fail as well: what is only a warning stays for good. */
export const lint = () =>
  whole('lint', ['node_modules/@biomejs/biome/bin/biome', 'check', '--error-on-warnings', '.']);

export const build = () => whole('build', ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn']);

/** @param {string} name @param {{ passed: number, failed: number, problems: string[] }} outcome @returns {Result} */
function counted(name, { passed, failed, problems }) {
  if (problems.length > 0) head(name);
  for (const problem of problems) console.log(problem);
  return { name, passed, failed };
}

export const floors = async () => counted('floors', await checkFloors(process.cwd()));

export const globals = async () => counted('globals', checkGlobals(process.cwd()));

/** @returns {Promise<Result>} */
export async function unit() {
  head('unit and contract tests');
  const file = '.cache/vitest.json';
  rmSync(file, { force: true });
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const { code } = await runNode(['node_modules/vitest/vitest.mjs', 'run', ...reporters], { show: true });
  return fromVitest(readReport(file), code, 'unit');
}

/** @param {string[]} args handed on to Playwright @returns {Promise<Result>} */
async function playwright(args) {
  const file = '.cache/playwright.json';
  mkdirSync('.cache', { recursive: true });
  rmSync(file, { force: true });
  const { code } = await runNode(['node_modules/@playwright/test/cli.js', 'test', ...args], { show: true });
  return fromPlaywright(readReport(file), code, 'browser');
}

/**
 * All of them: first what may run side by side, then what has the machine for itself. With arguments, whatever they
 * choose.
 *
 * @param {string[]} [args] handed on to Playwright @returns {Promise<Result>}
 */
export async function browser(args = []) {
  head('browser tests');
  if (args.length > 0) return playwright(args);
  const together = await playwright(['--project=app']);
  return sum('browser', [together, await playwright(['--project=time'])]);
}

/** The fast part: everything that needs no build and no browser. @returns {Promise<Result[]>} */
export async function check() {
  const [typed, linted] = await Promise.all([types(), lint()]);
  return [typed, linted, await floors(), await globals(), await unit()];
}
