import { execFileSync } from 'node:child_process';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { csvOf, looksOf, pairOf } from '../analysis/sessionsFrom.ts';
import { workedClass } from '../analysis/workedClass.ts';
import { folder, lookbell } from './command.ts';

// Starting a process takes a second or two; everything that needs none is tested beside this file.
describe('the batch command, as a process', () => {
  const files = folder();
  const worked = files.put('worked.csv', csvOf(workedClass));

  test('npm run --silent batch prints one JSON document and nothing else', { timeout: 30_000 }, () => {
    const out = execFileSync('npm', ['run', '--silent', 'batch', '--', 'ontask', worked, '--json'], {
      encoding: 'utf8',
    });
    const { sessions } = JSON.parse(out);
    expect(sessions.map((row: { session: string }) => row.session)).toEqual(['s1', 's2']);
    expect(sessions[0].percentOnTask).toBe((100 * 43) / 58);
  });

  test('a folder: its tables, not what lies deeper; a bad file is told, the others are reported', {
    timeout: 30_000,
  }, async () => {
    const inner = join(files.path, 'inner');
    mkdirSync(join(inner, 'deeper'), { recursive: true });
    const [first, second] = ['s1', 's2'].map((session) =>
      workedClass.filter((row) => row.session === session),
    );
    files.put('inner/b.csv', csvOf(second ?? []));
    files.put('inner/a.csv', csvOf(first ?? []));
    files.put('inner/notes.txt', 'not a table');
    files.put('inner/deeper/c.csv', csvOf(pairOf([1, 0, 0, 1])));
    const page = files.put('inner/page.json', '<!doctype html>\n<html><body>Sign in</body></html>\n');
    const gone = join(files.path, 'gone.csv');
    const { out, err, status } = await lookbell('check', inner, gone, '--json');
    expect(status).toBe(1);
    const document = JSON.parse(out);
    expect(document).toMatchObject({
      sessions: 2,
      visits: 2,
      phases: ['after', 'before'],
      classes: ['Otters'],
    });
    expect(document.files.map(({ file, ok }: { file: string; ok: boolean }) => [file, ok])).toEqual([
      [join(inner, 'a.csv'), true],
      [join(inner, 'b.csv'), true],
      [page, false],
    ]);
    const lines = err.trimEnd().split('\n');
    expect(lines).toHaveLength(2);
    expect(lines[0]?.startsWith(`${gone}: `)).toBe(true);
    expect(lines[1]?.startsWith(`${page}:1: `)).toBe(true);
    expect(err).not.toMatch(/Error:|\n\s+at /);
  });

  test('semicolons with decimal commas, and a phase that changes within a session', {
    timeout: 30_000,
  }, async () => {
    const rows = looksOf({ session: 's' }, { A: '1101' }).map((row, i) => ({
      ...row,
      start_s: `${i * 7},5`,
      phase: i < 2 ? 'before' : 'after',
    }));
    const file = files.put('semicolons.csv', `\uFEFF${csvOf(rows, ';')}`);
    const { out, status } = await lookbell('ontask', file, '--json');
    expect(status).toBe(0);
    const { sessions } = JSON.parse(out);
    const shown = sessions.map((row: { phase: string; percentOnTask: number }) => [
      row.phase,
      row.percentOnTask,
    ]);
    expect(shown).toEqual([
      ['before', 100],
      ['after', 50],
    ]);
  });

  test('wrong usage is exit 2 with one sentence; help is no failure', { timeout: 30_000 }, async () => {
    const wrong = await lookbell('frobnicate', worked);
    expect(wrong).toMatchObject({ out: '', status: 2 });
    expect(wrong.err).toMatch(/^[^\n]*no command "frobnicate"[^\n]*\n$/);
    const help = await lookbell('--help');
    expect(help).toMatchObject({ err: '', status: 0 });
    expect(help.out).toContain('npm run --silent batch --');
  });
});
