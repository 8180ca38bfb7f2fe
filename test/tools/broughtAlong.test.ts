import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { build } from 'vite';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { broughtAlong } from '../../tools/vite/broughtAlong.ts';

let root: string;

const plant = (file: string, text: string) => {
  mkdirSync(dirname(join(root, file)), { recursive: true });
  writeFileSync(join(root, file), text);
};

/** What a build of the planted tree puts out, by file name. */
async function built(): Promise<Record<string, string>> {
  const result = await build({
    root,
    configFile: false,
    logLevel: 'silent',
    build: { write: false },
    plugins: [broughtAlong()],
  });
  if (Array.isArray(result) || !('output' in result)) throw new Error('one output expected');
  return Object.fromEntries(
    result.output.map((file) => [file.fileName, file.type === 'asset' ? String(file.source) : file.code]),
  );
}

beforeAll(() => {
  mkdirSync('.cache', { recursive: true });
  root = mkdtempSync('.cache/brought-');
  plant('index.html', '<p>page</p>');
});
afterAll(() => rmSync(root, { recursive: true }));

it('without a demo and without schemas the build goes through', async () => {
  expect(JSON.parse((await built())['demo-sessions/index.json'] ?? '')).toEqual({ files: [] });
});

it('the demo files, their list and the schemas lie beside the app', async () => {
  plant('demo-sessions/b.json', '{"b":1}');
  plant('demo-sessions/a.csv', 'a');
  plant('demo-sessions/README.md', 'not brought along');
  plant('src/exchange/leaf.ts', 'export const title = "Study";');
  plant(
    'src/exchange/jsonSchemas.ts',
    'import { title } from "./leaf.ts";\nexport const jsonSchemas = () => ({ study: { title } });',
  );
  const files = await built();
  expect(JSON.parse(files['demo-sessions/index.json'] ?? '')).toEqual({ files: ['a.csv', 'b.json'] });
  expect(files['demo-sessions/b.json']).toBe('{"b":1}');
  expect(files['demo-sessions/README.md']).toBeUndefined();
  expect(JSON.parse(files['schema/study.json'] ?? '')).toEqual({ title: 'Study' });
});
