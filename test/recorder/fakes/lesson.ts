import { type IntervalRecord, readOut } from '../../../src/journal/readOut.ts';
import { fold } from '../../../src/journal/step.ts';
import { seededRandom } from '../../../src/kernel/random.ts';
import { pageMs } from '../../../src/kernel/units.ts';
import type { SessionHeader } from '../../../src/model/session.ts';
import { createLiveSession } from '../../../src/recorder/createLiveSession.ts';
import type { Beginning, LiveOptions, LiveSession } from '../../../src/recorder/liveSession.ts';
import type { RecorderPorts, Stop, WakeLockState } from '../../../src/recorder/ports.ts';
import { headerOf } from '../../support/session.ts';
import { FakeAudio } from './fakeAudio.ts';
import { FakeStore } from './fakeStore.ts';
import { HandClock } from './handClock.ts';

/** From the tap to session time 0: a quarter of a second to lay the first tick, then three, two, one. */
export const beforeZero = 3250;

/** A tablet in the hand of a test: its clocks, its sound, its store, and the session that runs on it. */
export class Lesson {
  readonly clock = new HandClock();
  readonly audio = new FakeAudio(this.clock);
  hidden = false;
  vibrations = 0;
  hasVoice = false;
  readonly spoken: { readonly words: string; readonly page: number }[] = [];
  wakeLock: WakeLockState = 'idle';
  lockHeld = false;
  lockTaken = false;
  /** Page time of session time 0, as long as nothing pauses. */
  zero = Number.NaN;
  private seen = new Set<() => void>();
  private made: LiveSession | null = null;
  readonly header: SessionHeader;
  readonly store: FakeStore;
  private readonly options: Partial<LiveOptions>;

  constructor({
    header = headerOf(),
    store = new FakeStore(),
    ...options
  }: Partial<LiveOptions> & { header?: SessionHeader; store?: FakeStore } = {}) {
    this.header = header;
    this.store = store;
    this.options = options;
  }

  get session(): LiveSession {
    this.made ??= createLiveSession(this.header, this.ports(), {
      checks: [],
      anyway: false,
      ...this.options,
    });
    return this.made;
  }

  /** The tap that begins. */
  async begin(how: Beginning = {}): Promise<this> {
    const wait = how.at === undefined ? beforeZero : how.at - (how.nudgeMs ?? 0) - this.clock.wall;
    this.zero = this.clock.page + wait;
    const answer = await this.session.begin(how);
    if (!answer.ok) throw new Error(answer.problem.code);
    return this;
  }

  /** Time goes by until this session time (of a session that was never paused). */
  async until(at: number): Promise<void> {
    await this.clock.advance(this.zero + at - this.clock.page);
  }

  /** Page time of this moment. */
  get now() {
    return pageMs(this.clock.page);
  }

  /** A touch at this moment. */
  touch(code: string | null): void {
    this.session.touch(code, pageMs(this.clock.page));
  }

  cannotSee(): void {
    this.session.cannotSee(pageMs(this.clock.page));
  }

  setHidden(hidden: boolean): void {
    this.hidden = hidden;
    for (const told of this.seen) told();
  }

  /** The intervals as the kept journal alone tells them. */
  kept(): IntervalRecord[] {
    return readOut(fold(this.header, this.store.journal()), { final: true });
  }

  /** The same in words: `on`, `off`, `on+off`, `none`, or why it is missing. */
  outcome(): string[] {
    return this.kept().map(outcomeOf);
  }

  /** What was written, a kind and what matters of it. */
  kinds(): string[] {
    return this.store
      .journal()
      .map((entry) => entry.kind)
      .filter((kind) => kind !== 'cued');
  }

  ports(): RecorderPorts {
    return {
      page: this.clock.pageClock,
      wall: this.clock.wallClock,
      timer: this.clock.timer,
      audio: this.audio,
      visibility: {
        hidden: () => this.hidden,
        subscribe: (listener): Stop => {
          this.seen.add(listener);
          return () => this.seen.delete(listener);
        },
      },
      wakeLock: {
        hold: () => {
          this.wakeLock = 'held';
        },
        letGo: () => {
          this.wakeLock = 'idle';
        },
        state: () => this.wakeLock,
        subscribe: () => () => undefined,
      },
      vibration: {
        available: true,
        vibrate: () => {
          this.vibrations += 1;
          return true;
        },
      },
      speech: {
        available: () => this.hasVoice,
        speak: (words) => this.spoken.push({ words, page: this.clock.page }),
        hush: () => undefined,
      },
      lock: {
        take: () => {
          if (this.lockTaken) return Promise.resolve(null);
          this.lockHeld = true;
          return Promise.resolve(() => {
            this.lockHeld = false;
          });
        },
        heldElsewhere: () => Promise.resolve(this.lockTaken),
      },
      store: this.store,
      random: seededRandom('writer'),
    };
  }
}

export function outcomeOf(interval: IntervalRecord): string {
  if (interval.status === 'scored') {
    const said = interval.codes?.length ? interval.codes.join('+') : 'none';
    return interval.late ? `${said} late` : said;
  }
  return interval.missing ?? interval.status;
}
