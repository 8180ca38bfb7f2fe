import type { EntryBody } from '../journal/entry.ts';
import { isCovered } from '../journal/state.ts';
import { problem, type Result } from '../kernel/result.ts';
import type { PageMs } from '../kernel/units.ts';
import type { Manner } from '../model/observer.ts';
import type { Reading } from './clock.ts';
import type * as deeds from './deeds.ts';
import type { Beginning } from './liveSession.ts';
import { openAnew, tooNear } from './openAnew.ts';
import type { Stop } from './ports.ts';
import { resumption } from './resumption.ts';
import type { RoomSnapshot } from './roomSnapshot.ts';
import { type SessionInputs, type SessionParts, sessionParts } from './sessionParts.ts';
import { cuesGiven, type Standing, standing } from './standing.ts';
import { Telling } from './telling.ts';
import type { TouchWord } from './touchDesk.ts';
import { untilNext } from './untilNext.ts';

/** The session machine: what the observer taps and what the clocks bring becomes journal entries, cues and a snapshot. */
export class SessionRun {
  private readonly parts: SessionParts;
  private readonly telling = new Telling();
  private wake: Stop | null = null;
  private beginning: Promise<Result<{ readonly sound: boolean }>> | null = null;
  private disposed = false;
  private shown: RoomSnapshot | null = null;

  constructor(private readonly inputs: SessionInputs) {
    const { ports, options } = inputs;
    this.parts = sessionParts(inputs, () => this.changed());
    if (options.manner !== undefined) this.behave(options.manner);
    // The session may have come to its end while the tablet was dead: nothing is left to begin.
    const stand = resumption(this.parts.book.state, options.resumeFrom ?? [], ports.wall.now());
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
    const { touches, view, book } = this.parts;
    this.act(({ now }) => touches.arm(view.timedIn(book.state), now));
  }

  /** Flags the interval of this moment. */
  flag(): void {
    this.act(({ now }) => {
      this.parts.book.write(now, { kind: 'flagged', interval: this.snapshot().current?.number ?? null });
    });
  }

  end(words?: string): void {
    this.act(({ now }) => {
      this.finish(now, { reason: 'early', ...(words === undefined ? {} : { words }) });
    });
  }

  flush(): Promise<boolean> {
    return this.parts.book.keeper.flush();
  }

  dispose(): void {
    if (this.disposed) return;
    this.disposed = true;
    this.letGo();
    this.telling.forget();
    const { book, grip } = this.parts;
    // Another tab may go on with this journal only when all of it is there.
    book.keeper.whenAllKept(() => grip.giveBack());
  }

  behave(manner: Pick<Manner, 'confirm' | 'remind'>): void {
    this.parts.answer.wanted = manner.confirm;
    this.parts.recall.wanted = manner.remind;
  }

  private async reallyBegin(how: Beginning): Promise<Result<{ readonly sound: boolean }>> {
    const { ports, protocol } = this.inputs;
    const { book, time, grip, sound, cues } = this.parts;
    if (book.state.ended !== null) return problem('recorder.ended');
    const near = tooNear(ports, how);
    if (near !== null) return { ok: false, problem: near };
    const tapped = ports.page.now();
    const taken = await grip.take(protocol.cues, {
      wakeLock: () => this.changed(),
      visibility: () => {
        time.visibilityChanged();
        this.tick();
      },
      audio: (event) => {
        if (event.kind !== 'output' || event.change !== 'gone') this.tick();
        else this.say(sound.outputGone(event.output), () => cues.takeBack());
      },
    });
    if (!taken.ok) return taken;
    // Another window may have recorded on since this journal was read: what it wrote must not be written over.
    if (((await ports.store.stored?.()) ?? 0) > book.journal.length) {
      this.dispose();
      return problem('recorder.goneOn');
    }
    time.look();
    this.goOn(how, ports.page.now() - tapped);
    this.tick();
    return taken;
  }

  /** Starts session time: counting in, or where the grid of a session that was cut off stands now. */
  private goOn(how: Beginning, sinceTap = 0): void {
    const { ports, options } = this.inputs;
    const { book, cues } = this.parts;
    const { clock } = this.parts.time;
    const stand = resumption(book.state, options.resumeFrom ?? [], ports.wall.now());
    if (stand === null) {
      openAnew(book, clock, ports, options, how, sinceTap);
      return;
    }
    clock.start(ports.page.now(), stand.now);
    if (isCovered(book.state, 'paused')) clock.pause(ports.page.now());
    // A cue of this very moment is still due, unless the last run has told of it.
    cues.startAt(stand.now > stand.from ? stand.now - 1 : stand.now);
    const place = this.placeAt(stand.now);
    const to = Math.round(place.phase === 'over' ? Math.max(place.at, stand.from) : stand.now);
    book.write(to, { kind: 'gap', from: stand.from, to, cause: 'closed', estimated: true });
    if (place.phase === 'over') this.finish(to, { reason: 'complete' });
  }

  private placeAt(now: number): Standing {
    return standing(this.inputs.plan, this.parts.book.state, now);
  }

  /** Brings the session up to the present: jumps of clocks, cues that are due, the end; then lays cues ahead. */
  private tick(mayEnd = true): void {
    const { book, time, cues, sound, headsUp, recall } = this.parts;
    if (!time.clock.started || this.disposed || book.state.ended !== null) return;
    const news = time.look();
    if (news.jump.kind === 'slept') cues.slept(news.lastLook, time.clock.at(news.page));
    const now = time.clock.at(news.page);
    if (news.jump.kind === 'moved') {
      const at = Math.round(now);
      book.write(at, { kind: 'gap', from: at, to: at, cause: 'clock', estimated: false });
    }
    cues.deliver(now);
    cues.disruption(now, news.reading, time.clock.hasAudio);
    const place = this.placeAt(now);
    if (place.phase === 'over' && mayEnd) {
      this.finish(place.at, { reason: 'complete' });
      return;
    }
    if (cuesGiven(place) && sound.on) cues.layAhead(now);
    headsUp.speak(cues.all(), now, cuesGiven(place) && sound.on);
    if (place.phase === 'running') recall.due(now);
    this.sleepUntilNext(now, place, news.reading);
    this.changed();
  }

  private sleepUntilNext(now: number, place: Standing, reading: Reading): void {
    const { cues, headsUp, recall } = this.parts;
    this.wake?.();
    const given = cuesGiven(place) ? [cues.nextAfter(now), headsUp.nextAfter(cues.all(), now)] : [];
    const ms = untilNext(now, place, reading, [...given, recall.nextAfter(now)]);
    this.wake = this.inputs.ports.timer.wakeIn(ms, () => this.tick());
  }

  /** Something that the observer did: time is brought up to the present before and after it. */
  act(what: (present: deeds.Present) => void): void {
    const { time, book } = this.parts;
    if (!time.clock.started) return;
    this.telling.together(() => {
      this.tick();
      if (this.disposed || book.state.ended !== null) return;
      const page = this.inputs.ports.page.now();
      const now = time.clock.at(page);
      what({ now, page, place: this.placeAt(now) });
      this.shown = null;
      this.tick();
    });
  }

  deed(deed: deeds.Deed): void {
    const { protocol, plan } = this.inputs;
    const { clock } = this.parts.time;
    this.act((present) => deed({ ...this.parts, protocol, plan, clock }, present));
  }

  say(body: EntryBody, then?: () => void): void {
    this.act(({ now }) => {
      this.parts.book.write(now, body);
      then?.();
    });
  }

  take(word: TouchWord, page: PageMs): void {
    const { time, book, touches, view, answer } = this.parts;
    if (!time.clock.started || book.state.ended !== null) {
      touches.refuse('not running');
      this.changed();
      return;
    }
    this.telling.together(() => {
      // A touch that went down before the end is taken even when it is told after it.
      this.tick(false);
      const at = time.clock.at(page);
      const { state } = book;
      const before = touches.felt;
      const body = touches.take(word, { page, at }, state, view.timedIn(state));
      if (body !== null) book.write(at, body);
      if (touches.felt !== before) answer.give(word);
      this.tick();
      this.changed();
    });
  }

  private finish(at: number, how: { reason: 'complete' | 'early'; words?: string }): void {
    const { cues, book, grip } = this.parts;
    cues.takeBack();
    cues.closeDisruptions(at);
    book.write(at, { kind: 'ended', ...how });
    this.letGo();
    book.keeper.whenAllKept(() => {
      void this.inputs.ports.store.pack().catch(() => undefined);
      grip.giveBack();
    });
    this.changed();
  }

  private letGo(): void {
    this.inputs.ports.speech.hush();
    this.wake?.();
    this.parts.cues.takeBack();
    this.parts.grip.letGo();
  }

  private changed(): void {
    this.shown = null;
    this.telling.tell();
  }

  private lookAround(): RoomSnapshot {
    const { protocol, ports, options } = this.inputs;
    const { book, time, touches, cues, recall } = this.parts;
    const { state, keeper } = book;
    const begun = time.clock.started;
    const resuming = (options.resumeFrom ?? []).length > 0;
    const now = begun ? time.now() : resuming ? state.at : -1;
    const sound = this.parts.sound.now(time.clock.hasAudio);
    return this.parts.view.snapshot({
      begun,
      resuming: resuming && !begun,
      now: state.ended?.at ?? now,
      state,
      standing: this.placeAt(now),
      cues: cues.all(),
      armedBefore: touches.armedBefore(now),
      kept: keeper.status(),
      sound,
      wakeLock: ports.wakeLock.state(),
      vibrates: protocol.cues.vibration && ports.vibration.available,
      reminded: recall.count,
      flash: cues.flash,
      flashStrongly: protocol.cues.flash || !sound.heard,
      felt: touches.felt,
      refusal: touches.refusal,
    });
  }
}
