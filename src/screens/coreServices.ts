import { createContext, useContext } from 'react';
import type { Result } from '../kernel/result.ts';
import type { WallTime } from '../kernel/units.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { SessionHeader } from '../model/session.ts';
import type { LiveSession } from '../recorder/liveSession.ts';
import type { TickPorts } from '../recorder/tickCheck.ts';
import type { Deps, ExportedFile, Store, StoreReader } from '../tasks/ports.ts';
import type { CoreWords } from '../words/coreWords.ts';
import type { Ask } from '../worker/questions.ts';

/** A picture, 4 bytes a pixel (red, green, blue, opacity), row by row from the top. */
export interface Pixels {
  readonly data: Uint8ClampedArray;
  readonly width: number;
  readonly height: number;
}

/** A camera that is open; it shows what it sees in the element that it was given. */
export interface Camera {
  /** The square in the middle of what it sees now, at most `edge` a side; null until it sees something. */
  frame(edge: number): Pixels | null;
  /** True when the tablet has taken the camera away meanwhile. */
  lost(): boolean;
  stop(): void;
}

/** What the screens ask of the tablet itself; `app/` fulfils it from `devices/`. */
export interface Device {
  /** Plays the protocol's look cue once. Called in a tap, since sound starts locked. */
  playTestTone(cues: CueSettings): Promise<{
    readonly played: boolean;
    /** The output's name where the browser tells it. */
    readonly output: string | null;
    readonly latencyMs: number | null;
  }>;
  /** True where a voice is on the tablet itself. Some browsers know their voices only a moment after the start. */
  hasVoice(): boolean;
  /** What comes ahead of a look: these words by that voice, or else the soft tones. Called in a tap. */
  tryHeadsUp(words: string, cues: CueSettings): Promise<'voice' | 'tones' | 'nothing'>;
  /** True where the browser tells when an earpiece is pulled out. */
  readonly tellsOutputChanges: boolean;
  wakeLock(): Promise<'held' | 'refused' | 'missing'>;
  /** Free bytes and whether the browser promised to keep them; null where it does not tell. */
  room(): Promise<{ readonly free: number | null; readonly kept: boolean | null }>;
  battery(): Promise<{ readonly level: number; readonly charging: boolean } | null>;
  otherTabRecords(): Promise<boolean>;
  /** True when everything needed is on the tablet and a start without network will work. */
  readyOffline(): Promise<boolean>;
  now(): { readonly wall: WallTime; readonly timeZone: string | null };
  readonly vibrates: boolean;
  /** Share sheet where it takes the file, else download. Called in a tap with the bytes ready; `again`: the browser wants another tap. */
  handOver(
    file: Pick<ExportedFile, 'name' | 'type' | 'bytes'>,
  ): Promise<'shared' | 'saved' | 'cancelled' | 'again'>;
  print(): void;
  /** The camera at the back. `busy`: another program holds it, or it does not answer. */
  openCamera(shown: HTMLVideoElement): Promise<Camera | 'refused' | 'missing' | 'busy'>;
  /** A picture file, made smaller where a side is longer than `edge`; null when it is no picture. */
  pixelsOf(picture: Blob, edge: number): Promise<Pixels | null>;
  /** False where the browser does not let it. */
  copyText(text: string): Promise<boolean>;
  /** Sound and clocks for one tick check; silent until it is started. */
  tickPorts(): TickPorts;
  /** Calls once, after about so long. Returns the way to stop it. */
  wakeIn(ms: number, wake: () => void): () => void;
}

export interface OpenOptions {
  /** Checks that stood on hold when the observer went in. */
  readonly checks: readonly string[];
  readonly anyway: boolean;
}

/** The one recorder of this tab. Its state lives here, not in React: it survives a broken screen. */
export interface RecorderDesk {
  /** The running session, or null. */
  current(): LiveSession | null;
  /** Whose session it is. */
  currentId(): string | null;
  /** Opens a new session or resumes an unfinished one; fails when another tab records. */
  open(header: SessionHeader, options: OpenOptions): Promise<Result<LiveSession>>;
  /** Resumes an unfinished session from its journal. */
  resume(session: string): Promise<Result<LiveSession>>;
  /** Puts the session away after it has ended. */
  close(): void;
  subscribe(listener: () => void): () => void;
}

/** What every screen is given, the recording screen too. */
export interface CoreServices {
  readonly words: CoreWords;
  readonly store: Store;
  readonly deps: Deps;
  readonly ask: Ask;
  readonly device: Device;
  readonly recorder: RecorderDesk;
  /** A stored answer that follows the store; undefined until the first answer. */
  readonly useStored: <T>(
    query: (store: StoreReader) => Promise<Result<T>>,
    dependencies: readonly unknown[],
  ) => Result<T> | undefined;
  /** Reads the demo files that come with the program. */
  readonly demoFiles: () => Promise<Result<{ name: string; bytes: Uint8Array }[]>>;
}

export const CoreServicesContext = createContext<CoreServices | null>(null);

/** The services of the app; a screen outside it is a bug. */
export function useCoreServices(): CoreServices {
  const services = useContext(CoreServicesContext);
  if (services === null) throw new Error('A screen was rendered outside the app.');
  return services;
}

/** The words of the recording screen, for short. */
export function useCoreWords(): CoreWords {
  return useCoreServices().words;
}
