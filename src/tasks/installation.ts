import { newId } from '../kernel/ids.ts';
import { ok, type Result } from '../kernel/result.ts';
import type { Deps } from './ports.ts';

/** This installation's writer id, made on the first start. It stays on the tablet: a restored copy gets another. */
export async function ensureInstallation({
  store,
  random,
}: Pick<Deps, 'store' | 'random'>): Promise<Result<string>> {
  const settings = await store.settings();
  if (!settings.ok) return settings;
  if (settings.value.installation !== null) return ok(settings.value.installation);
  const installation = newId(random);
  const kept = await store.saveSettings({ installation });
  return kept.ok ? ok(installation) : kept;
}
