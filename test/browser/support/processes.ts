import { readdirSync, readFileSync, readlinkSync } from 'node:fs';

/** The command line of a process, or nothing when it is gone. */
function commandLine(pid: number): string[] {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
  } catch {
    return [];
  }
}

/** The browser that runs on a profile: the one process that names the profile and is no helper of another. */
export function browserPid(profile: string): number | undefined {
  return readdirSync('/proc')
    .map(Number)
    .filter((pid) => Number.isInteger(pid) && pid > 0)
    .find((pid) => {
      const words = commandLine(pid);
      return (
        words.includes(`--user-data-dir=${profile}`) && !words.some((word) => word.startsWith('--type='))
      );
    });
}

/** The process that started another one; nothing when it is gone. */
function parentOf(pid: number): number | undefined {
  try {
    // The name, in brackets, may hold anything; state and parent come after it.
    return Number(readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1)?.split(' ')[1]);
  } catch {
    return undefined;
  }
}

/** A process and all that came of it. */
export function familyOf(pid: number): number[] {
  const all = readdirSync('/proc').map(Number).filter(Number.isInteger);
  const family = new Set([pid]);
  for (let before = 0; before < family.size; ) {
    before = family.size;
    for (const one of all) if (family.has(parentOf(one) ?? -1)) family.add(one);
  }
  return [...family];
}

/** Whether a process is there and not merely waiting to be collected. */
export function isAlive(pid: number): boolean {
  try {
    readlinkSync(`/proc/${pid}/exe`);
    return true;
  } catch {
    return false;
  }
}
