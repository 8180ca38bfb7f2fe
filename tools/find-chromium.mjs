import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const names = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'chrome',
  'microsoft-edge',
  'microsoft-edge-stable',
];

const applications = [
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
];

/**
 * What the search touches, so that tests can hand in a machine of their own.
 *
 * @typedef {object} Machine
 * @property {Record<string, string | undefined>} env
 * @property {boolean} root whether the user is root
 * @property {(file: string) => boolean} exists
 * @property {(file: string, args: string[], show?: boolean) => boolean} run true when it ended well
 * @property {() => string | undefined} bundled the browser that Playwright itself would bring
 * @property {(text: string) => void} say
 */

/** @type {Machine} */
const thisMachine = {
  env: process.env,
  root: process.getuid?.() === 0,
  exists: existsSync,
  run: (file, args, show = false) =>
    spawnSync(file, args, {
      stdio: show ? 'inherit' : 'ignore',
      timeout: show ? undefined : 30_000,
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    }).status === 0,
  bundled: () => {
    const script =
      "import('@playwright/test').then((p) => process.stdout.write(p.chromium.executablePath()))";
    return (
      spawnSync(process.execPath, ['--input-type=module', '-e', script], { encoding: 'utf8' }).stdout ||
      undefined
    );
  },
  say: (text) => console.log(text),
};

/** A path is not enough: Ubuntu's /usr/bin/chromium-browser may be a stub that only asks for a snap. */
/** @param {Machine} machine @returns {string | undefined} */
function present(machine) {
  const folders = (machine.env.PATH ?? '').split(delimiter).concat('/usr/bin', '/usr/local/bin', '/snap/bin');
  const paths = [...names.flatMap((name) => folders.map((folder) => join(folder, name))), ...applications];
  const bundled = machine.bundled();
  return [...new Set([...paths, ...(bundled ? [bundled] : [])])].find(
    (path) => machine.exists(path) && machine.run(path, ['--version']),
  );
}

/** @param {Machine} machine */
function install(machine) {
  const [first, ...rest] = machine.root ? ['apt-get'] : ['sudo', '-n', 'apt-get'];
  const apt = String(first);
  machine.say('No Chromium found: installing chromium with apt-get.');
  machine.run(apt, [...rest, 'update', '-q'], true);
  machine.run(apt, [...rest, 'install', '-y', '-q', '--no-install-recommends', 'chromium'], true);
  const found = present(machine);
  if (found) return found;
  machine.say("apt-get brought no Chromium that runs: fetching Playwright's.");
  machine.run(
    process.execPath,
    ['node_modules/@playwright/test/cli.js', 'install', '--with-deps', 'chromium'],
    true,
  );
  return present(machine);
}

/**
 * Finds a Chromium that runs: CHROMIUM in the environment, then the usual places, then (with `install`)
 * Debian's or Ubuntu's package.
 *
 * @param {{ install?: boolean, machine?: Machine }} [options]
 * @returns {{ path: string | undefined, said: string }} `said` is one sentence for whoever runs it
 */
export function findChromium({ install: mayInstall = false, machine = thisMachine } = {}) {
  const wished = machine.env.CHROMIUM;
  if (wished) {
    return machine.exists(wished)
      ? { path: wished, said: `Browser: ${wished} (CHROMIUM).` }
      : { path: undefined, said: `CHROMIUM names ${wished}, which is not there.` };
  }
  const path = present(machine) ?? (mayInstall ? install(machine) : undefined);
  return path
    ? { path, said: `Browser: ${path}.` }
    : {
        path,
        said: 'No Chromium was found and none could be installed: install one and set CHROMIUM to its path.',
      };
}

/** How a Chromium for tests is started: nothing phoned home, and no sandbox where root has none. */
export const chromiumFlags = [
  ...(thisMachine.root ? ['--no-sandbox'] : []),
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const { path, said } = findChromium({ install: process.argv.includes('--install') });
  console.log(said);
  process.exitCode = path ? 0 : 1;
}
