import { ok, problem, type Result } from '../kernel/result.ts';
import { audioSeconds, pageMs } from '../kernel/units.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { AudioEvent, AudioFacts, AudioPort, AudioState, ClockSample } from '../recorder/ports.ts';
import { layTones } from './layTones.ts';
import { onOutputChange, tellsOutputChanges } from './outputChanges.ts';

/** How often the watchdog looks whether the context's time still moves. */
const watchEvery = 500;
/** So long a context may stand still before a new one takes its place. */
const patience = 3000;
/** A context that has not moved after so long is locked. */
const unlockPatience = 1500;

interface Line {
  readonly context: AudioContext;
  readonly volume: GainNode;
  readonly panner: StereoPannerNode;
}

/**
 * The tablet's sound. Contexts lie: one may say "running" while its time stands still (after a call, a lock screen),
 * or sit in states of its own (`interrupted`); so only moving time counts as running, a watchdog looks at it, and a
 * context that does not come back is replaced by a new one.
 */
export function audio(): AudioPort {
  const listeners = new Set<(event: AudioEvent) => void>();
  let line: Line | null = null;
  let generation = 0;
  let settings: Pick<CueSettings, 'channel' | 'volume'> = { channel: 'both', volume: 0.4 };
  let state: AudioState = 'silent';
  let lastTime = -1;
  let movedAt = 0;
  let watching: ReturnType<typeof setInterval> | null = null;
  let stopOutputs: (() => void) | null = null;

  const tell = (event: AudioEvent): void => {
    for (const listener of listeners) listener(event);
  };
  const become = (next: AudioState): void => {
    if (next === state) return;
    state = next;
    tell({ kind: 'state', state });
  };
  const settle = (): void => {
    if (line === null) return;
    line.volume.gain.value = settings.volume;
    line.panner.pan.value = { left: -1, both: 0, right: 1 }[settings.channel];
  };
  const open = (): Line => {
    // iPads mute web audio with the silent switch unless the page says that it plays.
    const session = (navigator as { audioSession?: { type: string } }).audioSession;
    if (session !== undefined) session.type = 'playback';
    const context = new AudioContext({ latencyHint: 'interactive' });
    const volume = new GainNode(context);
    const panner = new StereoPannerNode(context);
    volume.connect(panner).connect(context.destination);
    context.addEventListener('statechange', look);
    line = { context, volume, panner };
    generation += 1;
    lastTime = -1;
    movedAt = performance.now();
    settle();
    return line;
  };
  function look(): void {
    if (line === null) return;
    const { context } = line;
    const time = context.currentTime;
    const now = performance.now();
    const moved = time > lastTime;
    if (moved) {
      lastTime = time;
      movedAt = now;
    }
    if (context.state === 'running' && now - movedAt < 2 * watchEvery) {
      if (moved && time > 0) become('running');
      return;
    }
    become('silent');
    if (document.visibilityState === 'hidden') return;
    if (now - movedAt > patience) {
      void context.close().catch(() => {});
      open();
    }
    void line.context.resume().catch(() => {});
  }
  const watch = (): void => {
    watching ??= setInterval(look, watchEvery);
    stopOutputs ??= onOutputChange((change) => tell({ kind: 'output', ...change }));
  };
  const moves = (context: AudioContext): Promise<boolean> =>
    new Promise((resolve) => {
      const begun = performance.now();
      const from = context.currentTime;
      const ask = (): void => {
        if (context.currentTime > from) resolve(true);
        else if (performance.now() - begun > unlockPatience) resolve(false);
        else setTimeout(ask, 20);
      };
      ask();
    });
  const facts = (): AudioFacts | null => {
    if (line === null) return null;
    const { baseLatency, outputLatency, sampleRate } = line.context;
    const latency = (baseLatency ?? Number.NaN) + (outputLatency ?? 0);
    return { sampleRate, latencyMs: Number.isNaN(latency) ? null : Math.round(latency * 1000), output: null };
  };

  return {
    unlock: async (): Promise<Result<AudioFacts>> => {
      try {
        const { context } = line ?? open();
        // Not awaited: on some systems it settles only much later, or never.
        void context.resume().catch(() => {});
        if (!(await moves(context))) return problem('audio.locked');
      } catch {
        return problem('audio.missing');
      }
      watch();
      look();
      return ok(facts() ?? { sampleRate: 0, latencyMs: null, output: null });
    },
    state: () => state,
    now: () => (line === null || state === 'silent' ? null : audioSeconds(line.context.currentTime)),
    sample: (): ClockSample | null => {
      if (line === null || state === 'silent') return null;
      const { contextTime, performanceTime } = line.context.getOutputTimestamp();
      if (contextTime && performanceTime)
        return { audio: audioSeconds(contextTime), page: pageMs(performanceTime) };
      return { audio: audioSeconds(line.context.currentTime), page: pageMs(performance.now()) };
    },
    generation: () => generation,
    settle: (wanted) => {
      settings = wanted;
      settle();
    },
    lay: (pattern, at) => (line === null ? () => {} : layTones(line.context, line.volume, pattern, at)),
    play: (pattern) => {
      if (line !== null && state === 'running')
        layTones(line.context, line.volume, pattern, line.context.currentTime + 0.005);
    },
    facts,
    tellsOutputChanges: tellsOutputChanges(),
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    close: () => {
      if (watching !== null) clearInterval(watching);
      stopOutputs?.();
      watching = null;
      stopOutputs = null;
      void line?.context.close().catch(() => {});
      line = null;
      become('silent');
    },
  };
}
