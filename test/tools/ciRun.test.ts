import { spawnSync } from 'node:child_process';
import { chmodSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, it } from 'vitest';

const bin = mkdtempSync(join(tmpdir(), 'npm-'));
afterAll(() => rmSync(bin, { recursive: true }));

/** .ci/run with an npm that only says and returns what it is told to. */
function ciRun({ ci = 0, says = '', code = 0 }) {
  const npm = join(bin, 'npm');
  writeFileSync(
    npm,
    `#!/bin/sh\nif [ "$1" = ci ]; then exit ${ci}; fi\nprintf '%s\\n' "${says}"\nexit ${code}\n`,
  );
  chmodSync(npm, 0o755);
  const env = { ...process.env, PATH: `${bin}:${process.env.PATH}` };
  const { stdout, status } = spawnSync('.ci/run', { env, encoding: 'utf8' });
  return { last: stdout.trimEnd().split('\n').at(-1), status };
}

it.each([
  ['all is well', { says: '12 passed, 0 failed' }, '12 passed, 0 failed', 0],
  ['something failed', { says: '11 passed, 1 failed', code: 1 }, '11 passed, 1 failed', 1],
  ['npm ends well although something failed', { says: '11 passed, 1 failed' }, '11 passed, 1 failed', 1],
  ['npm fails although nothing did', { says: '12 passed, 0 failed', code: 3 }, '12 passed, 0 failed', 3],
  ['nothing ran', { says: '0 passed, 0 failed' }, '0 passed, 0 failed', 1],
  ['no line was printed', { says: 'well', code: 0 }, '0 passed, 1 failed', 1],
  ['npm ci fails', { ci: 1 }, '0 passed, 1 failed', 1],
])('.ci/run closes with the sum and says it by its exit code: %s', (_, told, last, status) => {
  expect(ciRun(told)).toEqual({ last, status });
});
