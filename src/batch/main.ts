import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import process from 'node:process';
import type { IncomingFile } from '../exchange/types.ts';
import { byCodePoint } from '../kernel/compare.ts';
import { say } from '../words/say.ts';
import { wordsFor } from '../words/words.ts';
import { parseArguments } from './parseArguments.ts';
import { runCommand } from './runCommand.ts';

const words = wordsFor();
const { batch } = words;

/** Files of a folder that are read; what lies deeper is not. */
const readable = /\.(csv|json|gz)$/i;

interface Found {
  readonly files: IncomingFile[];
  readonly missing: string[];
}

function find(paths: readonly string[]): Found {
  const files = new Map<string, IncomingFile>();
  const missing: string[] = [];
  for (const path of paths) take(path, { files, missing });
  return { files: [...files.values()], missing };
}

/** Puts a file or a folder's files to the others; says what keeps one from being read. */
function take(
  path: string,
  { files, missing }: { files: Map<string, IncomingFile>; missing: string[] },
): void {
  const tell = (file: string, sentence: string): void => {
    missing.push(batch.atFile({ file, sentence }));
  };
  const read = (file: string): void => {
    try {
      files.set(file, { name: file, bytes: new Uint8Array(readFileSync(file)) });
    } catch {
      tell(file, batch.unreadable);
    }
  };
  try {
    if (!statSync(path).isDirectory()) {
      read(path);
      return;
    }
    const names = readdirSync(path, { withFileTypes: true })
      .filter((entry) => !entry.isDirectory() && readable.test(entry.name) && !entry.name.startsWith('.'))
      .map(({ name }) => name)
      .sort(byCodePoint);
    for (const name of names) read(join(path, name));
    if (names.length === 0) tell(path, batch.emptyFolder);
  } catch (thrown) {
    const gone = thrown instanceof Error && 'code' in thrown && thrown.code === 'ENOENT';
    tell(path, gone ? batch.noSuchFile : batch.unreadable);
  }
}

async function run(): Promise<number> {
  const parsed = parseArguments(process.argv.slice(2));
  if (!parsed.ok) {
    process.stderr.write(`${batch.general({ sentence: say(batch, parsed.problem) })}\n`);
    return 2;
  }
  if (parsed.value === 'help') {
    process.stdout.write(batch.help);
    return 0;
  }
  const { files, missing } = find(parsed.value.files);
  const { out, err, status } = await runCommand(parsed.value, files, words);
  for (const line of [...missing, ...err]) process.stderr.write(`${line}\n`);
  process.stdout.write(out);
  return status === 0 && missing.length > 0 ? 1 : status;
}

// A reader that closes early (`| head`) is no failure.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
});

run().then(
  (status) => {
    process.exitCode = status;
  },
  (thrown: unknown) => {
    const what = thrown instanceof Error ? thrown.message : String(thrown);
    process.stderr.write(`${batch.wentWrong({ what })}\n`);
    process.exitCode = 1;
  },
);
