import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';

const lockfile = readFileSync('package-lock.json', 'utf8');

it('the lockfile names packages and sums, and no registry to fetch them from', () => {
  const { packages } = JSON.parse(lockfile) as { packages: Record<string, { resolved?: string }> };
  expect(Object.keys(packages).length).toBeGreaterThan(100);
  const addressed = Object.entries(packages).filter(([, { resolved }]) => resolved !== undefined);
  expect(addressed).toEqual([]);
});

it('every package of package.json is pinned exactly', () => {
  const { dependencies, devDependencies } = JSON.parse(readFileSync('package.json', 'utf8')) as Record<
    'dependencies' | 'devDependencies',
    Record<string, string>
  >;
  const loose = Object.entries({ ...dependencies, ...devDependencies }).filter(
    ([, version]) => !/^(npm:[\w-]+@)?\d+\.\d+\.\d+$/.test(version),
  );
  expect(loose).toEqual([]);
});
