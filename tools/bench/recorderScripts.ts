import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

/** What the recorder may weigh: gzip, in kB of 1000 bytes. */
export const recorderBudget = 130;

/** A script of the built app and its size as it travels. */
export interface Script {
  /** Its path in the built folder. */
  readonly file: string;
  /** gzip, in kB of 1000 bytes. */
  readonly kB: number;
}

interface Chunk {
  readonly file: string;
  readonly imports?: readonly string[];
}

/** Where loading begins: the page, and the one screen that is asked for. */
const roots = ['index.html', 'src/screens/room/Room.tsx'];

/**
 * All scripts that are loaded from opening the address of an unfinished session until it is recorded, largest first.
 * The browser tests hold this list against what a browser really asks for.
 */
export function recorderScripts(dist = 'dist'): Script[] {
  const list = join(dist, '.vite/manifest.json');
  if (!existsSync(list)) throw new Error('There is no built app: run "npm run build" first.');
  const chunks = JSON.parse(readFileSync(list, 'utf8')) as Record<string, Chunk>;
  const files = new Set<string>();
  const add = (name: string): void => {
    const chunk = chunks[name];
    if (chunk === undefined) throw new Error(`The build has no ${name}.`);
    if (files.has(chunk.file)) return;
    files.add(chunk.file);
    for (const needed of chunk.imports ?? []) add(needed);
  };
  for (const root of roots) add(root);
  return [...files]
    .map((file) => ({ file, kB: gzipSync(readFileSync(join(dist, file)), { level: 9 }).length / 1000 }))
    .sort((a, b) => b.kB - a.kB);
}

/** The size of several scripts together, in kB. */
export const together = (scripts: readonly Script[]): number => scripts.reduce((sum, { kB }) => sum + kB, 0);
