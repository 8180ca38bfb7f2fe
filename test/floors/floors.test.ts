import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { floors } from '../../tools/floors/allowList.mjs';
import { checkTree, unread } from '../../tools/floors/check.mjs';

let root: string;

beforeEach(() => {
  mkdirSync('.cache', { recursive: true });
  root = mkdtempSync('.cache/floors-');
});

afterEach(() => rmSync(root, { recursive: true }));

function plant(file: string, text: string) {
  mkdirSync(dirname(join(root, file)), { recursive: true });
  writeFileSync(join(root, file), text);
}

describe('the floors check', () => {
  it('fails when it finds nothing to check', async () => {
    const { passed, failed } = await checkTree(root);
    expect([passed, failed]).toEqual([0, 1]);
  });

  it('fails when the cruiser has read less than there is, as one does that cannot read TypeScript', () => {
    const result = { modules: [], summary: { violations: [] } } as unknown as Parameters<typeof unread>[0];
    expect(unread(result, 3, 'src/')).toHaveLength(1);
  });

  // By hand, apart from the allow-list, so that a slip in the list shows.
  it.each([
    ['recorder', 'exchange'],
    ['charts', 'analysis'],
    ['stats', 'kernel'],
    ['kernel', 'model'],
    ['model', 'words'],
    ['journal', 'analysis'],
    ['analysis', 'storage'],
    ['exchange', 'analysis'],
    ['storage', 'recorder'],
    ['devices', 'recorder'],
    ['tasks', 'storage'],
    ['tasks', 'recorder'],
    ['screens', 'storage'],
    ['screens', 'devices'],
    ['screens', 'exchange'],
    ['screens', 'app'],
    ['ui', 'words'],
    ['batch', 'storage'],
    ['words', 'model'],
  ])('%s may not import %s', async (from, to) => {
    plant(`src/${to}/leaf.ts`, 'export const leaf = 1;\n');
    plant(`src/${from}/plant.ts`, `import { leaf } from '../${to}/leaf.ts';\nexport const x = leaf;\n`);
    const { failed, problems } = await checkTree(root);
    expect(failed).toBe(1);
    expect(problems[0]).toContain(`src/${from}/plant.ts imports src/${to}/leaf.ts`);
  });

  it('reports an import of something that is not there', async () => {
    plant('src/kernel/plant.ts', "import './gone.ts';\n");
    const { problems } = await checkTree(root);
    expect(problems.join()).toContain('./gone.ts');
  });

  it('knows every floor of the map, and no other', () => {
    const map =
      'app screens charts ui words batch worker tasks recorder devices storage exchange analysis journal schedule model stats kernel';
    expect(Object.keys(floors).sort()).toEqual(map.split(' ').sort());
  });
});
