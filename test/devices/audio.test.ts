import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { audio } from '../../src/devices/audio.ts';
import { audioSeconds } from '../../src/kernel/units.ts';
import { countInTick } from '../../src/recorder/cuePatterns.ts';
import type { AudioEvent, AudioPort } from '../../src/recorder/ports.ts';

/** What the browser does with contexts, by hand: its clock is the fake one of the test. */
interface Will {
  /** New and resumed contexts run; else they stay as they are. */
  letsRun: boolean;
}
let will: Will;
let contexts: FakeContext[];

class FakeNode {
  gain = { value: 1, setTargetAtTime: () => undefined };
  buffer: unknown = null;
  onended: unknown = null;
  starts: number[] = [];
  connect = (next: unknown) => next;
  disconnect = () => undefined;
  start = (at: number) => void this.starts.push(at);
  stop = () => undefined;
}

class FakeContext extends EventTarget {
  state: string = 'suspended';
  stands = false;
  readonly sampleRate = 8000;
  readonly baseLatency = 0.01;
  readonly destination = new FakeNode();
  readonly sources: FakeNode[] = [];
  resumes = 0;
  private ran = 0;
  private since = 0;

  constructor() {
    super();
    contexts.push(this);
  }

  get currentTime(): number {
    return (
      this.ran + (this.state === 'running' && !this.stands ? (performance.now() - this.since) / 1000 : 0)
    );
  }

  become(state: string): void {
    this.ran = this.currentTime;
    this.since = performance.now();
    this.state = state;
    this.dispatchEvent(new Event('statechange'));
  }

  /** It goes on to say "running", and its time stands. */
  freeze(): void {
    this.ran = this.currentTime;
    this.stands = true;
  }

  async resume(): Promise<void> {
    this.resumes += 1;
    if (will.letsRun && this.state !== 'running' && this.state !== 'closed') this.become('running');
  }

  async close(): Promise<void> {
    if (this.state !== 'closed') this.become('closed');
  }

  createGain = () => new FakeNode();
  createChannelMerger = () => new FakeNode();
  createBufferSource = () => {
    const source = new FakeNode();
    this.sources.push(source);
    return source;
  };
  createBuffer = () => ({ copyToChannel: () => undefined });
}

let page: EventTarget & { visibilityState: string };
let glass: EventTarget;
let port: AudioPort;
let told: AudioEvent[];

beforeEach(async () => {
  vi.useFakeTimers();
  will = { letsRun: true };
  contexts = [];
  page = Object.assign(new EventTarget(), { visibilityState: 'visible' });
  glass = new EventTarget();
  vi.stubGlobal('AudioContext', FakeContext);
  vi.stubGlobal('document', page);
  vi.stubGlobal('window', glass);
  vi.stubGlobal('navigator', {});
  port = audio();
  told = [];
  port.subscribe((event) => told.push(event));
  const unlocking = port.unlock();
  await vi.advanceTimersByTimeAsync(100);
  expect((await unlocking).ok).toBe(true);
  told.length = 0;
});
afterEach(() => {
  port.close();
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const states = (): string[] => told.flatMap((event) => (event.kind === 'state' ? [event.state] : []));
const newest = (): FakeContext => {
  const last = contexts.at(-1);
  if (last === undefined) throw new Error('no context');
  return last;
};
const touch = (): void => void glass.dispatchEvent(new Event('pointerdown'));

it.each(['suspended', 'interrupted'])(
  'a context that is %s is told at once, and asked to go on while the page is seen',
  async (state) => {
    newest().become(state);
    expect(states()).toEqual(['silent']);
    expect([port.state(), port.now(), port.sample()]).toEqual(['silent', null, null]);
    await vi.advanceTimersByTimeAsync(800);
    expect(states()).toEqual(['silent', 'running']);
    expect(contexts).toHaveLength(1);
  },
);

it('nothing is asked of it while the page is hidden', async () => {
  page.visibilityState = 'hidden';
  const before = newest().resumes;
  newest().become('interrupted');
  await vi.advanceTimersByTimeAsync(60_000);
  expect(newest().resumes).toBe(before);
  expect(contexts).toHaveLength(1);
  page.visibilityState = 'visible';
  await vi.advanceTimersByTimeAsync(800);
  expect(port.state()).toBe('running');
});

it('a context that does not come back is made anew, once, and then again at each touch that finds it silent', async () => {
  const generation = port.generation();
  will.letsRun = false;
  newest().become('interrupted');
  await vi.advanceTimersByTimeAsync(60_000);
  expect(contexts).toHaveLength(2);
  expect(contexts[0]?.state).toBe('closed');
  expect(port.generation()).toBe(generation + 1);
  expect(port.state()).toBe('silent');
  touch();
  expect(contexts).toHaveLength(3);
  await vi.advanceTimersByTimeAsync(100);
  will.letsRun = true;
  touch();
  await vi.advanceTimersByTimeAsync(0);
  // It had no time yet to prove that it does not come back: the same one goes on.
  expect(contexts).toHaveLength(3);
  expect(port.state()).toBe('running');
  expect(states()).toEqual(['silent', 'running']);
});

it('a context that says "running" while its time stands is silent within two seconds, and made anew', async () => {
  newest().freeze();
  expect(port.state()).toBe('running');
  await vi.advanceTimersByTimeAsync(2200);
  expect(contexts).toHaveLength(2);
  expect(states()).toEqual(['silent', 'running']);
  const at = audioSeconds((port.now() ?? 0) + 1);
  port.lay(countInTick, at);
  expect(newest().sources).toHaveLength(1);
  expect(newest().sources[0]?.starts).toEqual([Math.round(at * 8000) / 8000]);
});

it('a closed context is made anew', async () => {
  newest().become('closed');
  await vi.advanceTimersByTimeAsync(800);
  expect(contexts).toHaveLength(2);
  expect(port.state()).toBe('running');
});

it('a later interruption has its own new context', async () => {
  for (const count of [2, 3]) {
    will.letsRun = false;
    newest().become('interrupted');
    await vi.advanceTimersByTimeAsync(5000);
    will.letsRun = true;
    await vi.advanceTimersByTimeAsync(1500);
    expect(contexts).toHaveLength(count);
    expect(port.state()).toBe('running');
    await vi.advanceTimersByTimeAsync(1500);
  }
});

it('closed, it leaves nothing behind that makes sound', async () => {
  port.close();
  touch();
  await vi.advanceTimersByTimeAsync(5000);
  expect(contexts).toHaveLength(1);
  expect(contexts[0]?.state).toBe('closed');
});
