import type { JournalEntry } from '../journal/entry.ts';
import type { Random } from '../kernel/random.ts';
import type { Result } from '../kernel/result.ts';
import type { AudioSeconds, EpochMs, PageMs } from '../kernel/units.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { CuePattern } from './cuePatterns.ts';

/** Stops what it was given for: a subscription, a wake-up. Calling it twice does no harm. */
export type Stop = () => void;

/** The page's monotonic clock, the one of `event.timeStamp`. */
export interface PageClock {
  now(): PageMs;
}

/** The wall clock: it is written down and compared, it measures nothing. */
export interface WallClock {
  now(): EpochMs;
  /** The zone's offset from UTC at that instant, in minutes, east positive. */
  offsetMinutes(at: EpochMs): number;
  timeZone(): string | null;
}

/** An imprecise wake-up: it may come late, in a hidden page very late, and never early. */
export interface Timer {
  wakeIn(ms: number, wake: () => void): Stop;
}

/** `silent`: no context yet, or one that is not running (locked, interrupted, closed) or whose time stands still. */
export type AudioState = 'silent' | 'running';

export interface AudioFacts {
  readonly sampleRate: number;
  /** From the context's clock to the ear, where the browser tells it. */
  readonly latencyMs: number | null;
  /** The output's name where the browser tells it. */
  readonly output: string | null;
}

/** One moment on two clocks: the sample that is heard at this page time. */
export interface ClockSample {
  readonly audio: AudioSeconds;
  readonly page: PageMs;
}

export type AudioEvent =
  /** The context stopped or came back, or a new one took its place: clocks have to be read anew. */
  | { readonly kind: 'state'; readonly state: AudioState }
  /** An output came or went (earpiece in or out), where the browser tells. */
  | { readonly kind: 'output'; readonly change: 'gone' | 'new'; readonly output: string | null };

export interface AudioPort {
  /** Called in a tap: creates and resumes, and is ok only when the context's time has moved. */
  unlock(): Promise<Result<AudioFacts>>;
  state(): AudioState;
  /** The context's time; what is laid has to lie after it. null while silent. */
  now(): AudioSeconds | null;
  /** null while silent. */
  sample(): ClockSample | null;
  /** Counts the contexts: laid cues die with theirs, and so does the reading of its clock. */
  generation(): number;
  settle(settings: Pick<CueSettings, 'channel' | 'volume'>): void;
  /** Lays a sound on the context's clock, its first tone at `at` exactly. Returns the way to take it back, also while it sounds. */
  lay(pattern: CuePattern, at: AudioSeconds): Stop;
  /** Plays at once (confirmation clicks, test tone); nothing while silent. */
  play(pattern: CuePattern): void;
  /** What the browser tells of the output now. */
  facts(): AudioFacts | null;
  /** True where the browser tells when an output comes or goes. */
  readonly tellsOutputChanges: boolean;
  subscribe(listener: (event: AudioEvent) => void): Stop;
  close(): void;
}

/** Whether the page is seen. Hidden pages are throttled, and nobody can touch them. */
export interface VisibilityPort {
  hidden(): boolean;
  /** Called at each change, also when a frozen page comes back. */
  subscribe(listener: () => void): Stop;
}

/** `idle`: not wanted. `missing`: the browser has no such thing. */
export type WakeLockState = 'idle' | 'held' | 'refused' | 'missing';

/** Keeps the screen on. The wish is kept apart from the lock: a lost lock is asked for again when the page is seen. */
export interface WakeLockPort {
  hold(): void;
  letGo(): void;
  state(): WakeLockState;
  subscribe(listener: () => void): Stop;
}

export interface VibrationPort {
  readonly available: boolean;
  /** On and off times in ms, beginning with on; false when it could not. */
  vibrate(pattern: readonly number[]): boolean;
}

/** Words in the earpiece. */
export interface SpeechPort {
  /** True when a voice is on the tablet itself: one that needs a network is never used. */
  available(): boolean;
  /** Speaks at once, quietly; a new word cuts the last one off. */
  speak(words: string, volume: number): void;
  hush(): void;
}

/** One tab records. */
export interface LockPort {
  /** The way to give it back; null while another tab holds it. */
  take(): Promise<Stop | null>;
  heldElsewhere(): Promise<boolean>;
}

/** Where the journal of one session is kept; its header is kept before. */
export interface SessionStore {
  /** How many entries of the session are kept; null when it cannot be told. */
  readonly stored?: () => Promise<number | null>;
  /** ok when the rows are durable; anything else, a rejection too, means that nothing of them is. */
  append(entries: readonly JournalEntry[]): Promise<Result<null>>;
  /** After the end: row by row becomes one record. */
  pack(): Promise<Result<null>>;
}

export interface BatteryPort {
  /** null where the browser does not tell. */
  read(): Promise<{ readonly level: number; readonly charging: boolean } | null>;
}

export interface DiskPort {
  /** Free bytes; null where the browser does not tell. */
  free(): Promise<number | null>;
  /** Whether the browser promised to keep what is stored. */
  kept(): Promise<boolean | null>;
  /** Asks for that promise; "no" is normal. */
  askToKeep(): Promise<boolean | null>;
}

/** A file whose bytes are ready before the tap. */
export interface FileToHandOver {
  readonly name: string;
  readonly type: string;
  readonly bytes: Uint8Array<ArrayBuffer>;
}

export interface SharePort {
  /** Called in a tap. `again`: the browser wants another tap. */
  handOver(file: FileToHandOver): Promise<'shared' | 'saved' | 'cancelled' | 'again'>;
}

/** All that a live session is handed. */
export interface RecorderPorts {
  readonly page: PageClock;
  readonly wall: WallClock;
  readonly timer: Timer;
  readonly audio: AudioPort;
  readonly visibility: VisibilityPort;
  readonly wakeLock: WakeLockPort;
  readonly vibration: VibrationPort;
  readonly speech: SpeechPort;
  readonly lock: LockPort;
  readonly store: SessionStore;
  readonly random: Random;
}
