import type { Settings } from '../tasks/ports.ts';
import type { Core } from './core.ts';

export const noSettings: Settings = {
  theme: 'system',
  study: null,
  installation: null,
  lastBackup: null,
  prepared: null,
  tickChecked: null,
  frozenProtocols: [],
  sheets: [],
  paper: null,
};

/** Settings that name people; the others are needed before anything is unlocked. */
const sealedKeys: readonly string[] = ['prepared', 'sheets', 'paper'] satisfies (keyof Settings)[];

/** Settings of this tablet. Those that nobody has set stand at their defaults. */
export async function readSettings(core: Core): Promise<Settings> {
  const rows = await core.rows.read(['settings'], (reader) => reader.all('settings'));
  const open = await Promise.all(
    rows.map(async ({ key, value }) => [key, sealedKeys.includes(key) ? await core.seal.open(value) : value]),
  );
  return { ...noSettings, ...Object.fromEntries(open) };
}

export async function saveSettings(core: Core, changes: Partial<Settings>): Promise<void> {
  const rows = await Promise.all(
    Object.entries(changes).map(async ([key, value]) => ({
      key,
      value: sealedKeys.includes(key) ? await core.seal.seal(value) : value,
    })),
  );
  await core.rows.write(['settings'], (writer) => writer.put('settings', rows));
}
