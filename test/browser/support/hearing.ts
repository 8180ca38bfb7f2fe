import { readFileSync } from 'node:fs';
import type { BrowserContext, Page } from '@playwright/test';

/** One sound that reached the output of an audio context, in frames of that context's clock. */
export interface Sound {
  /** Frame of the first sample that is not silent. */
  onset: number;
  /** Frame after the last one. */
  end: number;
  /** Loudest sample of each channel, 0 to 1. */
  left: number;
  right: number;
  sampleRate: number;
  /** Which audio context of the page, counted from 0: an app may make a new one. */
  context: number;
  /** The onset on the page's clock (ms), as finely as the browser tells how the two clocks stand (some ms). */
  page: number;
}

interface Heard {
  sounds: Sound[];
  listening: boolean[];
}

const script = readFileSync('test/browser/support/worklets/capture.js', 'utf8');

/** Runs in the page, before anything of the app does. */
function tapSpeakers({ ms, code }: { ms: number; code: string }): void {
  const heard: Heard = { sounds: [], listening: [] };
  Object.assign(globalThis, { heard });
  const { connect, disconnect } = AudioNode.prototype;
  const hubs = new WeakMap<BaseAudioContext, GainNode>();

  async function tap(audio: AudioContext): Promise<void> {
    const context = heard.listening.push(false) - 1;
    const hub = audio.createGain();
    hubs.set(audio, hub);
    await audio.audioWorklet.addModule(URL.createObjectURL(new Blob([code], { type: 'text/javascript' })));
    const node = new AudioWorkletNode(audio, 'capture', {
      channelCount: 2,
      channelCountMode: 'explicit',
      processorOptions: { silence: Math.round((ms / 1000) * audio.sampleRate) },
    });
    // How the clocks stand is read when a sound begins: at its end the audio clock may have slipped.
    let page = 0;
    node.port.onmessage = ({ data: { kind, ...sound } }) => {
      if (kind === 'listening') heard.listening[context] = true;
      else if (kind === 'begun') {
        const { contextTime = 0, performanceTime = 0 } = audio.getOutputTimestamp();
        page = performanceTime + 1000 * (sound.onset / audio.sampleRate - contextTime);
      } else heard.sounds.push({ ...sound, sampleRate: audio.sampleRate, context, page });
    };
    // The listener itself is silent; a node is run only when it leads to the speakers.
    Reflect.apply(connect, hub, [node]);
    Reflect.apply(connect, node, [audio.destination]);
  }

  globalThis.AudioContext = class AudioContext extends globalThis.AudioContext {
    constructor(options?: AudioContextOptions) {
      super(options);
      void tap(this);
    }
  };
  const hubOf = (target: unknown) =>
    target instanceof AudioDestinationNode ? hubs.get(target.context) : undefined;
  AudioNode.prototype.connect = function (this: AudioNode, ...args: unknown[]) {
    const hub = hubOf(args[0]);
    if (hub) Reflect.apply(connect, this, [hub]);
    return Reflect.apply(connect, this, args);
  } as typeof connect;
  AudioNode.prototype.disconnect = function (this: AudioNode, ...args: unknown[]) {
    const hub = hubOf(args[0]);
    if (hub) Reflect.apply(disconnect, this, [hub]);
    return Reflect.apply(disconnect, this, args);
  } as typeof disconnect;
}

/**
 * Listens to all that the pages of a browser send to their speakers, sample by sample: for `tabletOptions.prepare`,
 * before a page is opened. It works without network, too, so the listener comes from no address but out of the page
 * itself, which the app's policy forbids: the tablet needs `bypassPolicy: true`.
 *
 * @param silenceMs how long it must be silent for the next sound to be another one
 */
export async function listen(context: BrowserContext, silenceMs = 10): Promise<void> {
  await context.addInitScript(tapSpeakers, { ms: silenceMs, code: script });
}

/** The same as source text, for a browser that is driven in another way. */
export const listenSource = (silenceMs = 10): string =>
  `(${tapSpeakers})(${JSON.stringify({ ms: silenceMs, code: script })})`;

/** Waits until the page's newest audio context is being listened to. */
export async function listening(page: Page): Promise<void> {
  await page.waitForFunction(
    () => (globalThis as unknown as { heard: Heard }).heard.listening.at(-1) === true,
  );
}

/** What was heard in the page until now, in the order in which it ended. Waits for `atLeast` sounds. */
export async function soundsOf(page: Page, atLeast = 0): Promise<Sound[]> {
  const handle = await page.waitForFunction(
    (count) => {
      const { sounds } = (globalThis as unknown as { heard: Heard }).heard;
      return sounds.length >= count ? [...sounds] : undefined;
    },
    atLeast,
    { timeout: 0 },
  );
  return (await handle.jsonValue()) ?? [];
}
