import { describe, expect, it } from 'vitest';
import { findChromium } from '../../tools/find-chromium.mjs';

/** A machine on which `there` exists and runs, and where apt-get brings `brought`. */
function machine(
  there: string[],
  { root = true, brought = [] as string[], env = {}, stubs = [] as string[] } = {},
) {
  const files = new Set(there);
  const ran: string[] = [];
  const said: string[] = [];
  return {
    ran,
    said,
    machine: {
      env: { PATH: '/usr/bin', ...env },
      root,
      exists: (file: string) => files.has(file),
      run: (file: string, args: string[]) => {
        if (args[0] === '--version') return !stubs.includes(file);
        ran.push([file, ...args].join(' '));
        if (args.includes('install')) for (const one of brought) files.add(one);
        return true;
      },
      bundled: () => undefined,
      say: (text: string) => void said.push(text),
    },
  };
}

describe('findChromium', () => {
  it('takes what CHROMIUM names before all else', () => {
    const { machine: m } = machine(['/usr/bin/chromium', '/opt/c'], { env: { CHROMIUM: '/opt/c' } });
    expect(findChromium({ machine: m }).path).toBe('/opt/c');
  });

  it('does not quietly take another when CHROMIUM names nothing', () => {
    const { machine: m } = machine(['/usr/bin/chromium'], { env: { CHROMIUM: '/opt/c' } });
    expect(findChromium({ machine: m, install: true })).toEqual({
      path: undefined,
      said: 'CHROMIUM names /opt/c, which is not there.',
    });
  });

  it('passes over a stub that does not run', () => {
    const { machine: m } = machine(['/usr/bin/chromium', '/usr/bin/google-chrome'], {
      stubs: ['/usr/bin/chromium'],
    });
    expect(findChromium({ machine: m }).path).toBe('/usr/bin/google-chrome');
  });

  it('installs nothing unless told to', () => {
    const { machine: m, ran } = machine([]);
    expect(findChromium({ machine: m }).path).toBeUndefined();
    expect(ran).toEqual([]);
  });

  it('installs with apt-get and says so', () => {
    const { machine: m, ran, said } = machine([], { brought: ['/usr/bin/chromium'] });
    expect(findChromium({ machine: m, install: true }).path).toBe('/usr/bin/chromium');
    expect(ran[1]).toMatch(/^apt-get install .*chromium$/);
    expect(said[0]).toContain('apt-get');
  });

  it('asks sudo when it is not root', () => {
    const { machine: m, ran } = machine([], { root: false, brought: ['/usr/bin/chromium'] });
    findChromium({ machine: m, install: true });
    expect(ran.every((line) => line.startsWith('sudo -n apt-get '))).toBe(true);
  });

  it('fails in one sentence when nothing helps', () => {
    const { machine: m } = machine([]);
    const { path, said } = findChromium({ machine: m, install: true });
    expect(path).toBeUndefined();
    expect(said.match(/\./g)).toHaveLength(1);
  });
});
