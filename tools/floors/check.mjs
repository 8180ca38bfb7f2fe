import { existsSync, readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { cruise } from 'dependency-cruiser';
import { plants, writePlants } from './plants.mjs';
import { rulesFromAllowList } from './rules.mjs';

/** @typedef {{ passed: number, failed: number, problems: string[] }} Outcome */

/** @param {string} baseDir @returns {Promise<import('dependency-cruiser').ICruiseResult>} */
async function cruiseTree(baseDir) {
  const { output } = await cruise(
    ['src'],
    {
      baseDir,
      // Without it `import type` is invisible.
      tsPreCompilationDeps: true,
      doNotFollow: { path: ['(^|/)node_modules/', '^(?!src/)'] },
      ruleSet: { forbidden: rulesFromAllowList() },
      validate: true,
    },
    {
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.css', '.json'],
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'default'],
    },
  );
  if (typeof output === 'string') throw new Error('dependency-cruiser answered with text');
  return output;
}

/** The source files below src/ that a cruise has to have read. @param {string} root */
function sourceFiles(root) {
  const src = join(root, 'src');
  if (!existsSync(src)) return [];
  return readdirSync(src, { recursive: true, encoding: 'utf8' }).filter(
    (file) => /\.tsx?$/.test(file) && !file.endsWith('.d.ts'),
  );
}

/**
 * A cruiser that cannot read TypeScript finds no modules and no faults: count what it has read.
 *
 * @param {import('dependency-cruiser').ICruiseResult} result @param {number} expected @param {string} tree
 */
export function unread(result, expected, tree) {
  const read = result.modules.filter(
    ({ source }) => /^src\/.*\.tsx?$/.test(source) && !source.endsWith('.d.ts'),
  );
  if (expected > 0 && read.length >= expected) return [];
  return [`${tree}: only ${read.length} of ${expected} source files were read; the floors were not checked`];
}

/** @param {import('dependency-cruiser').IViolation} violation */
const described = ({ from, to, rule }) => {
  const comment = rulesFromAllowList().find(({ name }) => name === rule.name)?.comment;
  return `${from} imports ${to} (${rule.name}: ${comment})`;
};

/** The real tree against the allow-list: one check a rule. @param {string} root @returns {Promise<Outcome>} */
export async function checkTree(root) {
  const rules = rulesFromAllowList();
  const expected = sourceFiles(root).length;
  if (expected === 0) return { passed: 0, failed: 1, problems: ['src/: no source file found'] };
  const result = await cruiseTree(root);
  const violations = result.summary.violations;
  const lost = result.modules.flatMap(({ source, dependencies }) =>
    dependencies
      .filter(({ couldNotResolve, module }) => couldNotResolve && !module.startsWith('virtual:'))
      .map(({ module }) => `${source} imports ${module}, which is not there`),
  );
  const missing = unread(result, expected, 'src/');
  const broken = new Set(violations.map(({ rule }) => rule.name)).size;
  const failed = broken + (lost.length > 0 ? 1 : 0) + missing.length;
  const passed = missing.length > 0 ? 0 : rules.length - broken + (lost.length > 0 ? 0 : 1);
  return { passed, failed, problems: [...missing, ...violations.map(described), ...lost] };
}

/** Every planted violation against its own rule: one check a rule. @param {string} root @returns {Promise<Outcome>} */
export async function checkPlants(root) {
  const list = plants();
  // Inside the project, so that packages are found as they are from the real tree.
  const tree = join(root, '.cache', 'planted-floors');
  writePlants(tree, list);
  const result = await cruiseTree(tree);
  const missing = unread(result, sourceFiles(tree).length, 'planted tree');
  if (missing.length > 0) return { passed: 0, failed: missing.length, problems: missing };
  /** @type {Map<string, Set<string>>} */
  const reported = new Map();
  for (const { from, rule } of result.summary.violations) {
    reported.set(from, (reported.get(from) ?? new Set()).add(rule.name));
  }
  const wrong = list.flatMap(({ file, rule, what }) => {
    const names = [...(reported.get(file) ?? [])].join(', ');
    if (names === (rule ?? '')) return [];
    const said = `expected ${rule ?? 'no report'}, got ${names || 'no report'}`;
    return [{ rule, text: `planted: ${what}: ${said} (${file})` }];
  });
  // The check of a rule is that all its violations are reported; of the allowances, that none is.
  const checks = [...rulesFromAllowList().map(({ name }) => name), null];
  const failed = checks.filter(
    (rule) => wrong.some((one) => one.rule === rule) || !list.some((one) => one.rule === rule),
  );
  const unplanted = failed.filter((rule) => !list.some((one) => one.rule === rule));
  return {
    passed: checks.length - failed.length,
    failed: failed.length,
    problems: [
      ...wrong.map(({ text }) => text),
      ...unplanted.map((rule) => `planted: no violation for the rule ${rule}`),
    ],
  };
}

/** @param {string} root @returns {Promise<Outcome>} */
export async function checkFloors(root) {
  const real = await checkTree(root);
  const planted = await checkPlants(root);
  return {
    passed: real.passed + planted.passed,
    failed: real.failed + planted.failed,
    problems: [...real.problems, ...planted.problems],
  };
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const { passed, failed, problems } = await checkFloors(process.cwd());
  for (const problem of problems) console.error(problem);
  console.log(`floors: ${passed} passed, ${failed} failed`);
  process.exitCode = failed > 0 ? 1 : 0;
}
