import { ok, problem, type Result } from '../kernel/result.ts';
import { usualManner } from '../model/manners.ts';
import type { Manner } from '../model/observer.ts';
import type { SessionHeader } from '../model/session.ts';
import { createLiveSession } from '../recorder/createLiveSession.ts';
import type { LiveOptions, LiveSession } from '../recorder/liveSession.ts';
import type { RecorderPorts } from '../recorder/ports.ts';
import { headsUpWords } from '../screens/plan/headsUpWords.ts';
import type { OpenOptions, RecorderDesk } from '../screens/services.ts';
import type { Store } from '../tasks/ports.ts';
import type { CoreWords } from '../words/coreWords.ts';

/**
 * The one recorder of this tab, outside React. `makePorts` gives everything but where the session's journal is kept,
 * freshly for each session (an audio context is not used twice).
 */
export function recorderDesk(
  store: Store,
  words: CoreWords,
  makePorts: () => Omit<RecorderPorts, 'store'>,
): RecorderDesk {
  let live: { readonly session: LiveSession; readonly id: string } | null = null;
  const listeners = new Set<() => void>();
  const tell = (): void => {
    for (const listener of listeners) listener();
  };

  const mannerOf = async ({ observer }: SessionHeader): Promise<Manner> => {
    const found = await store.observer(observer.id);
    return (found.ok ? found.value?.manner : undefined) ?? usualManner;
  };

  const begin = (header: SessionHeader, options: LiveOptions): Result<LiveSession> => {
    live?.session.dispose();
    const ports: RecorderPorts = {
      ...makePorts(),
      store: {
        append: (entries) => store.appendEntries(header.id, entries),
        pack: () => store.pack(header.id),
        stored: async () => {
          const read = await store.readSession(header.id);
          return read.ok ? (read.value?.journal.length ?? 0) : null;
        },
      },
    };
    const says = header.schedule.kind === 'laid' ? header.schedule.protocol.cues.headsUp?.says : undefined;
    const session = createLiveSession(header, ports, {
      ...(says === undefined ? {} : { headsUp: headsUpWords(says, header, words) }),
      ...options,
    });
    live = { session, id: header.id };
    tell();
    return ok(session);
  };

  return {
    current: () => live?.session ?? null,
    currentId: () => live?.id ?? null,
    open: async (header: SessionHeader, { checks, anyway }: OpenOptions) => {
      const manner = await mannerOf(header);
      if (live !== null && live.session.snapshot().phase !== 'ended') return problem('session.running');
      return begin(header, { manner, checks, anyway });
    },
    resume: async (session) => {
      if (live?.id === session) return ok(live.session);
      const read = await store.readSession(session);
      if (!read.ok) return read;
      if (read.value === null) return problem('session.notThere');
      const { header, journal } = read.value;
      if (journal.some((entry) => entry.kind === 'ended')) return problem('session.ended');
      const manner = await mannerOf(header);
      if (live?.id === session) return ok(live.session);
      return begin(header, { manner, checks: [], anyway: false, resumeFrom: journal });
    },
    close: () => {
      live?.session.dispose();
      live = null;
      tell();
    },
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
