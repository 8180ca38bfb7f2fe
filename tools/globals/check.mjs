import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { banned } from './banned.mjs';
import { findBannedGlobals } from './find.mjs';
import { plants } from './plants.mjs';

/** @typedef {{ passed: number, failed: number, problems: string[] }} Outcome */

/** Every source file on its own, one check a banned global. @param {string} root @returns {Outcome} */
export function checkSources(root) {
  const src = join(root, 'src');
  const files = (existsSync(src) ? readdirSync(src, { recursive: true, encoding: 'utf8' }) : [])
    .map((file) => `src/${file.replaceAll('\\', '/')}`)
    .filter((file) => /\.tsx?$/.test(file) && !file.endsWith('.d.ts'));
  if (files.length === 0) return { passed: 0, failed: 1, problems: ['src/: no source file found'] };
  const found = files.flatMap((file) => findBannedGlobals(file, readFileSync(join(root, file), 'utf8')));
  const failed = new Set(found.map(({ name }) => name)).size;
  return { passed: banned.length - failed, failed, problems: found.map(({ text }) => text) };
}

/** The planted uses: one check each. @returns {Outcome} */
export function checkPlants() {
  const problems = plants.flatMap(({ file, text, names }) => {
    const said = findBannedGlobals(file, text).map(({ name }) => name);
    if (said.join() === names.join()) return [];
    return [
      `planted: ${text}: expected ${names.join() || 'no report'}, got ${said.join() || 'no report'} (${file})`,
    ];
  });
  return { passed: plants.length - problems.length, failed: problems.length, problems };
}

/** @param {string} root @returns {Outcome} */
export function checkGlobals(root) {
  const [sources, planted] = [checkSources(root), checkPlants()];
  return {
    passed: sources.passed + planted.passed,
    failed: sources.failed + planted.failed,
    problems: [...sources.problems, ...planted.problems],
  };
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const { passed, failed, problems } = checkGlobals(process.cwd());
  for (const problem of problems) console.error(problem);
  console.log(`globals: ${passed} passed, ${failed} failed`);
  process.exitCode = failed > 0 ? 1 : 0;
}
