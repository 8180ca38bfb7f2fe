import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll } from 'vitest';
import { parseArguments } from '../../src/batch/parseArguments.ts';
import { runCommand } from '../../src/batch/runCommand.ts';
import { wordsFor } from '../../src/words/words.ts';

/** What a run of the command left behind. */
export interface Ran {
  readonly out: string;
  readonly err: string;
  readonly status: number;
}

/** Runs the real command in a process of its own. */
export function lookbell(...words: readonly string[]): Promise<Ran> {
  const command = ['--import', 'tsx', 'src/batch/main.ts', ...words];
  return new Promise((resolve) => {
    execFile(process.execPath, command, { encoding: 'utf8', maxBuffer: 1e8 }, (error, out, err) => {
      resolve({ out, err, status: error === null ? 0 : Number(error.code) });
    });
  });
}

/** The same without a process, over texts in memory: every word but the files' names. Names are those of `files`. */
export async function answer(
  words: readonly string[],
  files: Readonly<Record<string, string>>,
): Promise<{ readonly out: string; readonly err: readonly string[]; readonly status: number }> {
  const request = parseArguments([...words, ...Object.keys(files)]);
  if (!request.ok || request.value === 'help') throw new Error('not a request');
  const encoder = new TextEncoder();
  const incoming = Object.entries(files).map(([name, text]) => ({ name, bytes: encoder.encode(text) }));
  return runCommand(request.value, incoming, wordsFor());
}

/** The document that `--json` prints. */
export async function documentOf(words: readonly string[], files: Readonly<Record<string, string>>) {
  const answered = await answer([...words, '--json'], files);
  return { ...answered, document: JSON.parse(answered.out) };
}

/** A folder for the files of one test file; it is removed at the end. */
export function folder(): { readonly path: string; readonly put: (name: string, text: string) => string } {
  const path = mkdtempSync(join(tmpdir(), 'lookbell-batch-'));
  afterAll(() => rmSync(path, { recursive: true, force: true }));
  return {
    path,
    put: (name, text) => {
      const file = join(path, name);
      writeFileSync(file, text);
      return file;
    },
  };
}
