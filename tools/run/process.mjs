import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';

/**
 * Runs a program of the project and waits for it.
 *
 * @param {string[]} args what Node is to run
 * @param {{ show?: boolean, env?: Record<string, string> }} [options] `show`: print as it comes
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runNode(args, { show = false, env = {} } = {}) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, {
      stdio: show ? 'inherit' : ['ignore', 'pipe', 'pipe'],
      env: { ...process.env, ...env },
    });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.on('data', (chunk) => {
        output += chunk;
      });
    }
    child.on('error', (error) => resolve({ code: 1, output: String(error) }));
    child.on('close', (code) => resolve({ code: code ?? 1, output }));
  });
}

/** A report that a runner wrote, or undefined when it wrote none. @template T @param {string} file @returns {T | undefined} */
export function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}
