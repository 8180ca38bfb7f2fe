import type { EntryBody } from '../journal/entry.ts';
import { isCovered } from '../journal/state.ts';
import { problem, type Result } from '../kernel/result.ts';
import type { PageMs } from '../kernel/units.ts';
import type { Manner } from '../model/observer.ts';
import type { Protocol } from '../model/protocol.ts';
import type { SessionHeader } from '../model/session.ts';
import { Book } from './book.ts';
import type { Reading } from './clock.ts';
import { confirmationClick, confirmationRhythm } from './cuePatterns.ts';
import { CuePlayer } from './cuePlayer.ts';
import { CueRound } from './cueRound.ts';
import type * as deeds from './deeds.ts';
import type { Plan } from './grid.ts';
import { Grip } from './grip.ts';
import { HeadsUp } from './headsUp.ts';
import type { Beginning, LiveOptions } from './liveSession.ts';
import { openAnew, tooNear } from './openAnew.ts';
import type { RecorderPorts, Stop } from './ports.ts';
import { Recall } from './recall.ts';
import { resumption } from './resumption.ts';
import type { RoomSnapshot } from './roomSnapshot.ts';
import { RoomView } from './roomView.ts';
import { SoundDesk } from './soundDesk.ts';
import { cuesGiven, type Standing, standing } from './standing.ts';
import { Telling } from './telling.ts';
import { Timekeeper } from './timekeeper.ts';
import { TouchDesk, type TouchWord } from './touchDesk.ts';

/** Wired outputs take 10 to 60 ms; from here on the sound goes through the air. From memory, no source. */
const wirelessFromMs = 100;

/** A clock that seems to stand still has to be watched for a while before it can be believed again. */
const lookAgainMs: Partial<Record<Reading, number>> = { doubtful: 50, lost: 250 };

/** The session machine: what the observer taps and what the clocks bring becomes journal entries, cues and a snapshot. */
export class SessionRun {
  private readonly book: Book;
  private readonly time: Timekeeper;
  private readonly sound: SoundDesk;
  private readonly touches: TouchDesk;
  private readonly view: RoomView;
  private readonly cues: CueRound;
  private readonly grip: Grip;
  private readonly telling = new Telling();
  private wake: Stop | null = null;
  private beginning: Promise<Result<{ readonly sound: boolean }>> | null = null;
  private disposed = false;
  private shown: RoomSnapshot | null = null;
  private readonly headsUp: HeadsUp;
  private confirms = true;
  private readonly recall: Recall;

  constructor(
    header: SessionHeader,
    private readonly protocol: Protocol,
    private readonly plan: Plan,
    private readonly ports: RecorderPorts,
    private readonly options: LiveOptions,
  ) {
    const before = options.resumeFrom ?? [];
    this.book = new Book(header, ports, () => this.changed(), before, options.elsewhere ?? false);
    this.time = new Timekeeper(ports);
    this.sound = new SoundDesk(ports.audio, this.book.state);
    // A count is made up step by step: its first step is no late answer to the prompt before.
    const graceMs = protocol.method === 'headcount' ? 0 : protocol.graceMs;
    this.touches = new TouchDesk(graceMs, protocol.method);
    this.grip = new Grip(ports);
    this.view = new RoomView(header, plan);
    const player = new CuePlayer(ports.audio, this.time.clock);
    const leadIn = (): boolean => options.leadIn ?? (ports.audio.facts()?.latencyMs ?? 0) >= wirelessFromMs;
    this.headsUp = new HeadsUp({
      protocol,
      plan,
      book: this.book,
      speech: ports.speech,
      words: options.headsUp ?? null,
    });
    this.cues = new CueRound({
      plan,
      cues: protocol.cues,
      book: this.book,
      player,
      ports,
      leadIn,
      headsUpMs: () => this.headsUp.toneAheadMs,
      continuous: protocol.method === 'duration',
    });
    this.recall = new Recall({
      method: protocol.method,
      view: this.view,
      book: this.book,
      sound: this.sound,
      vibration: ports.vibration,
    });
    if (options.manner !== undefined) this.behave(options.manner);
    // The session may have come to its end while the tablet was dead: nothing is left to begin.
    const stand = resumption(this.book.state, before, ports.wall.now());
    if (stand !== null && this.placeAt(stand.now).phase === 'over') this.goOn({});
  }

  subscribe(listener: () => void): Stop {
    return this.telling.subscribe(listener);
  }

  snapshot(): RoomSnapshot {
    this.shown ??= this.lookAround();
    return this.shown;
  }

  begin(how: Beginning): Promise<Result<{ readonly sound: boolean }>> {
    this.beginning ??= this.reallyBegin(how).then((answer) => {
      if (!answer.ok) this.beginning = null;
      return answer;
    });
    return this.beginning;
  }

  /** The next touch marks the interval before; a second call takes that back. */
  armBefore(): void {
    this.act(({ now }) => this.touches.arm(this.view.timedIn(this.book.state), now));
  }

  /** Flags the interval of this moment. */
  flag(): void {
    this.act(({ now }) => {
      this.book.write(now, { kind: 'flagged', interval: this.snapshot().current?.number ?? null });
    });
  }

  end(words?: string): void {
    this.act(({ now }) => {
      this.finish(now, { reason: 'early', ...(words === undefined ? {} : { words }) });
    });
  }

  flush(): Promise<boolean> {
    return this.book.keeper.flush();
  }

  dispose(): void {
    if (this.disposed) return;
    this.disposed = true;
    this.letGo();
    this.telling.forget();
    // Another tab may go on with this journal only when all of it is there.
    this.book.keeper.whenAllKept(() => this.grip.giveBack());
  }

  behave(manner: Pick<Manner, 'confirm' | 'remind'>): void {
    this.confirms = manner.confirm;
    this.recall.wanted = manner.remind;
  }

  private async reallyBegin(how: Beginning): Promise<Result<{ readonly sound: boolean }>> {
    if (this.book.state.ended !== null) return problem('recorder.ended');
    const near = tooNear(this.ports, how);
    if (near !== null) return { ok: false, problem: near };
    const taken = await this.grip.take(this.protocol.cues, {
      wakeLock: () => this.changed(),
      visibility: () => {
        this.time.visibilityChanged();
        this.tick();
      },
      audio: (event) => {
        if (event.kind !== 'output' || event.change !== 'gone') this.tick();
        else this.say(this.sound.outputGone(event.output), () => this.cues.takeBack());
      },
    });
    if (!taken.ok) return taken;
    this.time.look();
    this.goOn(how);
    this.tick();
    return taken;
  }

  /** Starts session time: counting in, or where the grid of a session that was cut off stands now. */
  private goOn(how: Beginning): void {
    const { page, wall } = this.ports;
    const stand = resumption(this.book.state, this.options.resumeFrom ?? [], wall.now());
    if (stand === null) {
      openAnew(this.book, this.time.clock, this.ports, this.options, how);
      return;
    }
    this.time.clock.start(page.now(), stand.now);
    if (isCovered(this.book.state, 'paused')) this.time.clock.pause(page.now());
    // A cue of this very moment is still due, unless the last run has told of it.
    this.cues.startAt(stand.now > stand.from ? stand.now - 1 : stand.now);
    const place = this.placeAt(stand.now);
    const to = Math.round(place.phase === 'over' ? Math.max(place.at, stand.from) : stand.now);
    this.book.write(to, { kind: 'gap', from: stand.from, to, cause: 'closed', estimated: true });
    if (place.phase === 'over') this.finish(to, { reason: 'complete' });
  }

  private placeAt(now: number): Standing {
    return standing(this.plan, this.book.state, now);
  }

  /** Brings the session up to the present: jumps of clocks, cues that are due, the end; then lays cues ahead. */
  private tick(mayEnd = true): void {
    if (!this.time.clock.started || this.disposed || this.book.state.ended !== null) return;
    const news = this.time.look();
    if (news.jump.kind === 'slept') this.cues.slept(news.lastLook, this.time.clock.at(news.page));
    const now = this.time.clock.at(news.page);
    if (news.jump.kind === 'moved') {
      const at = Math.round(now);
      this.book.write(at, { kind: 'gap', from: at, to: at, cause: 'clock', estimated: false });
    }
    this.cues.deliver(now);
    this.cues.disruption(now, news.reading, this.time.clock.hasAudio);
    const place = this.placeAt(now);
    if (place.phase === 'over' && mayEnd) {
      this.finish(place.at, { reason: 'complete' });
      return;
    }
    if (cuesGiven(place) && this.sound.on) this.cues.layAhead(now);
    this.headsUp.speak(this.cues.all(), now, cuesGiven(place) && this.sound.on);
    if (place.phase === 'running') this.recall.due(now);
    this.sleepUntilNext(now, place, news.reading);
    this.changed();
  }

  private sleepUntilNext(now: number, place: Standing, reading: Reading): void {
    this.wake?.();
    // Whole seconds for the screen, and each cue at its own moment.
    const second = (Math.floor(now / 1000) + 1) * 1000;
    const given = cuesGiven(place);
    const cue = given ? this.cues.nextAfter(now) : Number.POSITIVE_INFINITY;
    const words = given ? this.headsUp.nextAfter(this.cues.all(), now) : Number.POSITIVE_INFINITY;
    const recall = this.recall.nextAfter(now);
    const due = place.phase === 'paused' ? 1000 : Math.min(second, cue, words, recall) - now;
    // A strange reading of the audio clock is looked at again soon, before a cue comes out at a wrong moment or not at all.
    const ms = Math.min(due, lookAgainMs[reading] ?? due);
    this.wake = this.ports.timer.wakeIn(Math.max(1, Math.ceil(ms)), () => this.tick());
  }

  /** Something that the observer did: time is brought up to the present before and after it. */
  act(what: (present: deeds.Present) => void): void {
    if (!this.time.clock.started) return;
    this.telling.together(() => {
      this.tick();
      if (this.disposed || this.book.state.ended !== null) return;
      const page = this.ports.page.now();
      const now = this.time.clock.at(page);
      what({ now, page, place: this.placeAt(now) });
      this.shown = null;
      this.tick();
    });
  }

  deed(deed: deeds.Deed): void {
    const { protocol, plan, book, cues, sound, touches, headsUp } = this;
    const { clock } = this.time;
    this.act((present) => deed({ protocol, plan, book, cues, sound, touches, headsUp, clock }, present));
  }

  say(body: EntryBody, then?: () => void): void {
    this.act(({ now }) => {
      this.book.write(now, body);
      then?.();
    });
  }

  take(word: TouchWord, page: PageMs): void {
    if (!this.time.clock.started || this.book.state.ended !== null) {
      this.touches.refuse('not running');
      this.changed();
      return;
    }
    this.telling.together(() => {
      // A touch that went down before the end is taken even when it is told after it.
      this.tick(false);
      const at = this.time.clock.at(page);
      const { state } = this.book;
      const before = this.touches.felt;
      const body = this.touches.take(word, { page, at }, state, this.view.timedIn(state));
      if (body !== null) this.book.write(at, body);
      if (this.touches.felt !== before && this.confirms) this.confirm(word);
      this.tick();
      this.changed();
    });
  }

  /** The answer to a touch that was taken, in ear and hand, different for each code. */
  private confirm(word: TouchWord): void {
    const place =
      word.kind === 'code' ? this.protocol.codeSet.codes.findIndex(({ id }) => id === word.code) : -1;
    const touched = place < 0 ? 'other' : place;
    this.sound.play(confirmationClick(touched));
    const { vibration } = this.ports;
    if (vibration.available) vibration.vibrate(confirmationRhythm(touched));
  }

  private finish(at: number, how: { reason: 'complete' | 'early'; words?: string }): void {
    this.cues.takeBack();
    this.cues.closeDisruptions(at);
    this.book.write(at, { kind: 'ended', ...how });
    this.letGo();
    this.book.keeper.whenAllKept(() => {
      void this.ports.store.pack().catch(() => undefined);
      this.grip.giveBack();
    });
    this.changed();
  }

  private letGo(): void {
    this.ports.speech.hush();
    this.wake?.();
    this.cues.takeBack();
    this.grip.letGo();
  }

  private changed(): void {
    this.shown = null;
    this.telling.tell();
  }

  private lookAround(): RoomSnapshot {
    const { state, keeper } = this.book;
    const begun = this.time.clock.started;
    const resuming = (this.options.resumeFrom ?? []).length > 0;
    const now = begun ? this.time.now() : resuming ? state.at : -1;
    const sound = this.sound.now(this.time.clock.hasAudio);
    return this.view.snapshot({
      begun,
      resuming: resuming && !begun,
      now: state.ended?.at ?? now,
      state,
      standing: this.placeAt(now),
      cues: this.cues.all(),
      armedBefore: this.touches.armedBefore(now),
      kept: keeper.status(),
      sound,
      wakeLock: this.ports.wakeLock.state(),
      vibrates: this.protocol.cues.vibration && this.ports.vibration.available,
      reminded: this.recall.count,
      flash: this.cues.flash,
      flashStrongly: this.protocol.cues.flash || !sound.heard,
      felt: this.touches.felt,
      refusal: this.touches.refusal,
    });
  }
}
