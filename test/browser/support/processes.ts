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

/** Whether a process is there and not merely waiting to be collected. */
export function isAlive(pid: number): boolean {
  try {
    readlinkSync(`/proc/${pid}/exe`);
    return true;
  } catch {
    return false;
  }
}
