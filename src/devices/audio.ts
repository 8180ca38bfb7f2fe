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
 * iOS), and "running" is believed only while the context's time moves. Each touch anywhere brings a stopped sound back;
 * what does not come back is made anew.
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

  /** Any touch may bring the sound back, for as long as the session lasts. */
  const revive = (): void => {
    if (running === null || state() === 'running') return;
    const { context } = stuck || running.context.state === 'closed' ? make() : running;
    void context.resume().then(tellState, () => undefined);
  };

  const watch = (): void => {
    let last = { generation, time: -1, still: 0 };
    const stop = setInterval(() => {
      if (running === null || running.context.state !== 'running') return tellState();
      const time = running.context.currentTime;
      const still = generation === last.generation && time === last.time ? last.still + 1 : 0;
      last = { generation, time, still };
      stuck = still >= 2;
      // It reads "running" and stands: only a new context helps, at once where the browser lets it, else at a touch.
      if (still === 3) revive();
      tellState();
    }, watchEvery);
    stops.push(() => clearInterval(stop));
    for (const event of ['pointerdown', 'keydown'] as const) {
      window.addEventListener(event, revive, { capture: true });
      stops.push(() => window.removeEventListener(event, revive, { capture: true }));
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
