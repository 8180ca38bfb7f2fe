import { ok, type Result } from '../kernel/result.ts';
import type { Protocol } from '../model/protocol.ts';
import type { Deps } from './ports.ts';

type Version = Pick<Protocol, 'id' | 'version'>;

export const versionName = ({ id, version }: Version): string => `${id} ${version}`;

/** True when somebody may have recorded with this version, here or elsewhere. */
export async function versionWasUsed({ store, writer }: Deps, protocol: Protocol): Promise<Result<boolean>> {
  if (protocol.revision.writer !== writer) return ok(true);
  const settings = await store.settings();
  if (!settings.ok) return settings;
  if (settings.value.frozenProtocols.includes(versionName(protocol))) return ok(true);
  const sessions = await store.listSessions(protocol.study);
  if (!sessions.ok) return sessions;
  return ok(
    sessions.value.some(
      (session) => session.protocol?.id === protocol.id && session.protocol.version === protocol.version,
    ),
  );
}

/** Notes that these versions were prepared for a visit or are about to leave the tablet: from now on they stand. */
export async function freezeVersions({ store }: Deps, versions: readonly Version[]): Promise<Result<null>> {
  const settings = await store.settings();
  if (!settings.ok) return settings;
  const standing = settings.value.frozenProtocols;
  const fresh = versions.map(versionName).filter((name) => !standing.includes(name));
  if (fresh.length === 0) return ok(null);
  return store.saveSettings({ frozenProtocols: [...standing, ...new Set(fresh)] });
}
