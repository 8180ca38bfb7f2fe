import { ok, problem, type Result } from '../kernel/result.ts';
import { audioSeconds } from '../kernel/units.ts';
import type { AudioEvent, AudioFacts, AudioPort, AudioState } from '../recorder/ports.ts';
import { layPattern } from './layPattern.ts';
import { type Mixer, mixer } from './mixer.ts';
import { tellsOutputChanges, watchOutputs } from './outputChanges.ts';
import { latencyOf, readAudioClock } from './readAudioClock.ts';

/** How long unlocking may take, and how often the context's time is looked at meanwhile (ms). */
const unlockWithin = 2500;
const lookEvery = 25;

/** The watchdog looks this often (ms); a clock that stood still for two looks is stuck. */
const watchEvery = 700;

/** A context that was asked to go on and does not within this time (ms) is given up for a new one. */
const comesBackWithin = 2000;

/** iOS keeps web sound apart from the silent switch only when the page says that it plays. */
interface WithAudioSession {
  audioSession?: { type: string };
}

interface Running {
  readonly context: AudioContext;
  readonly mixer: Mixer;
}

/**
 * Web Audio as a port. Every state that is not `running` is treated alike (suspended, closed, the `interrupted` of
 * iOS), and "running" is believed only while the context's time moves. While the page is seen a stopped sound is asked to
 * go on, by the watchdog and by each touch anywhere; what does not come back is made anew.
 */
export function audio(): AudioPort {
  const listeners = new Set<(event: AudioEvent) => void>();
  let running: Running | null = null;
  let generation = 0;
  let stuck = false;
  let told: AudioState = 'silent';
  let settings: { channel: 'both' | 'left' | 'right'; volume: number } = { channel: 'both', volume: 0.4 };
  let stops: (() => void)[] = [];

  const tell = (event: AudioEvent): void => {
    for (const listener of listeners) listener(event);
  };
  const state = (): AudioState => (running?.context.state === 'running' && !stuck ? 'running' : 'silent');
  const tellState = (): void => {
    if (state() === told) return;
    told = state();
    tell({ kind: 'state', state: told });
  };

  const make = (): Running => {
    if (running !== null) void running.context.close().catch(() => undefined);
    const session = (navigator as WithAudioSession).audioSession;
    if (session !== undefined) session.type = 'playback';
    const context = new AudioContext({ latencyHint: 'interactive' });
    generation += 1;
    stuck = false;
    context.addEventListener('statechange', tellState);
    const made = { context, mixer: mixer(context) };
    made.mixer.settle(settings);
    running = made;
    return made;
  };

  /** Since when the stopped context is asked to go on; null while it runs. */
  let askedSince: number | null = null;
  /** Whether a new context has been made since a sound was last heard or the glass was last touched. */
  let renewed = false;

  /**
   * Browsers that want a touch for it keep a new context locked as well: without one, one new context is enough.
   */
  const revive = (touched: boolean): void => {
    if (running === null) return;
    if (state() === 'running') {
      askedSince = null;
      renewed = false;
      return;
    }
    const now = performance.now();
    const staysAway = askedSince !== null && now - askedSince >= comesBackWithin;
    const lost = stuck || running.context.state === 'closed' || staysAway;
    if (lost && (touched || !renewed)) {
      make();
      renewed = !touched;
      askedSince = null;
    }
    askedSince ??= now;
    void running.context.resume().then(tellState, () => undefined);
  };
  const touched = (): void => revive(true);

  const watch = (): void => {
    let last = { generation, time: -1, still: 0 };
    const stop = setInterval(() => {
      if (running?.context.state === 'running') {
        const time = running.context.currentTime;
        const still = generation === last.generation && time === last.time ? last.still + 1 : 0;
        last = { generation, time, still };
        // It reads "running" and stands: only a new context helps.
        stuck = still >= 2;
      }
      tellState();
      if (document.visibilityState === 'visible') revive(false);
    }, watchEvery);
    stops.push(() => clearInterval(stop));
    for (const event of ['pointerdown', 'keydown'] as const) {
      window.addEventListener(event, touched, { capture: true });
      stops.push(() => window.removeEventListener(event, touched, { capture: true }));
    }
    stops.push(watchOutputs((change) => tell({ kind: 'output', change, output: null })));
  };

  const facts = (): AudioFacts | null => {
    if (running === null) return null;
    const latency = latencyOf(running.context);
    return {
      sampleRate: running.context.sampleRate,
      latencyMs: latency > 0 ? Math.round(latency * 1000) : null,
      output: null,
    };
  };

  return {
    unlock: async (): Promise<Result<AudioFacts>> => {
      try {
        const { context } = running !== null && running.context.state !== 'closed' ? running : make();
        if (stops.length === 0) watch();
        const from = context.currentTime;
        // Not awaited: it may stay pending, or resolve while time stands at 0.
        void context.resume().catch(() => undefined);
        const moved = await timeMoves(context, from);
        tellState();
        const found = facts();
        return moved && found !== null ? ok(found) : problem('recorder.noSound');
      } catch (error) {
        return problem('recorder.noSound', { why: error instanceof Error ? error.message : String(error) });
      }
    },
    state,
    now: () => (state() === 'running' && running !== null ? audioSeconds(running.context.currentTime) : null),
    sample: () => (state() === 'running' && running !== null ? readAudioClock(running.context) : null),
    generation: () => generation,
    settle: ({ channel, volume }) => {
      settings = { channel, volume };
      running?.mixer.settle(settings);
    },
    lay: (pattern, at) =>
      running === null ? () => undefined : layPattern(running.context, running.mixer.input, pattern, at),
    play: (pattern) => {
      if (running === null || state() !== 'running') return;
      const soon = audioSeconds(running.context.currentTime + 0.01);
      layPattern(running.context, running.mixer.input, pattern, soon);
    },
    facts,
    tellsOutputChanges: tellsOutputChanges(),
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    close: () => {
      for (const stop of stops) stop();
      stops = [];
      const last = running;
      running = null;
      told = 'silent';
      void last?.context.close().catch(() => undefined);
    },
  };
}

function timeMoves(context: AudioContext, from: number): Promise<boolean> {
  return new Promise((resolve) => {
    const begun = performance.now();
    const look = (): void => {
      if (context.currentTime > from) resolve(true);
      else if (performance.now() - begun > unlockWithin) resolve(false);
      else setTimeout(look, lookEvery);
    };
    look();
  });
}
