import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { afterAll, expect, it } from 'vitest';

const planted: [rule: string, file: string, text: string][] = [
  ['noExplicitAny', 'src/kernel/any.ts', 'export const x = (a: any) => String(a);\n'],
  ['noSkippedTests', 'test/skip.test.ts', "import { it } from 'vitest';\nit.skip('a', () => {});\n"],
  [
    'noSkippedTests',
    'test/browser/skip.spec.ts',
    "import { test } from './t.ts';\ntest.skip('a', () => {});\n",
  ],
  ['noFocusedTests', 'test/only.test.ts', "import { it } from 'vitest';\nit.only('a', () => {});\n"],
  [
    'useHookAtTopLevel',
    'src/ui/Top.tsx',
    "import { useId } from 'react';\nexport const Top = ({ a }: { a: boolean }) => (a ? useId() : null);\n",
  ],
  [
    'useExhaustiveDependencies',
    'src/ui/Deps.tsx',
    "import { useEffect } from 'react';\nexport const Deps = ({ a }: { a: () => void }) => {\n  useEffect(() => a(), []);\n  return null;\n};\n",
  ],
  ['nothing', 'src/kernel/plain.ts', 'export const x = (a: number) => String(a);\n'],
];

// Outside of the project, since the real settings leave out what git ignores.
const root = mkdtempSync(join(tmpdir(), 'lint-'));
afterAll(() => rmSync(root, { recursive: true }));

const settings = JSON.parse(readFileSync('biome.json', 'utf8'));
for (const [, file, text] of [
  ['', 'biome.json', JSON.stringify({ ...settings, $schema: undefined, vcs: undefined })],
  ...planted,
]) {
  mkdirSync(dirname(join(root, String(file))), { recursive: true });
  writeFileSync(join(root, String(file)), String(text));
}
const biome = resolve('node_modules/@biomejs/biome/bin/biome');
const args = [biome, 'lint', '--reporter=json', '--max-diagnostics=none', '.'];
const { stdout } = spawnSync(process.execPath, args, { cwd: root, encoding: 'utf8' });
const { diagnostics } = JSON.parse(stdout) as {
  diagnostics: { category: string; location: { path: string | { file: string } } }[];
};

it.each(planted)('the linter reports %s in %s', (rule, file) => {
  const said = diagnostics
    .filter(({ location }) => JSON.stringify(location.path).includes(file))
    .map(({ category }) => category.split('/').at(-1));
  expect(said).toEqual(rule === 'nothing' ? [] : [rule]);
});
