import type { JournalState } from '../journal/state.ts';
import type { CueSettings } from '../model/protocol.ts';
import type { Book } from './book.ts';
import type { Reading } from './clock.ts';
import { cueRhythm } from './cuePatterns.ts';
import { type CuePlayer, type LaidSound, soundsOf } from './cuePlayer.ts';
import { delivered, lostStretch } from './delivery.ts';
import { dueIn, type GridCue, gridCues, type Plan } from './grid.ts';
import type { RecorderPorts } from './ports.ts';
import { cuesGiven, standing } from './standing.ts';

interface Parts {
  readonly plan: Plan;
  readonly cues: CueSettings;
  readonly book: Book;
  readonly player: CuePlayer;
  /** Whether each tone needs something quiet before it. */
  readonly leadIn: () => boolean;
  /** So long before each look a soft tone; null for none. */
  readonly headsUpMs: () => number | null;
  /** What was just heard came so many milliseconds late. */
  readonly late: () => number;
  /** Nobody can touch a hidden page, which a record of onsets and offsets cannot do without. */
  readonly continuous: boolean;
  readonly ports: Pick<RecorderPorts, 'visibility' | 'vibration'>;
}

/** One stretch in which something kept cues from being delivered as they should be. */
interface Trouble {
  readonly cause: 'hidden' | 'sound';
  readonly from: number;
  readonly cues: { readonly at: number; readonly lost: boolean }[];
}

/** Walks along the grid: says in the journal how each cue was delivered, and what came to nobody. */
export class CueRound {
  /** Cues that the screen showed. */
  flash = 0;
  /** Everything up to this session time has been dealt with. */
  private done = Number.NEGATIVE_INFINITY;
  private hidden: Trouble | null = null;
  private stuck: Trouble | null = null;
  private basis:
    | (Pick<JournalState, 'origins' | 'closed'> & {
        readonly leadIn: boolean;
        readonly headsUpMs: number | null;
      })
    | null = null;
  private list: readonly GridCue[] = [];
  private sounds: readonly LaidSound[] = [];

  constructor(private readonly parts: Parts) {}

  all(): readonly GridCue[] {
    this.readGrid();
    return this.list;
  }

  startAt(now: number): void {
    this.done = now;
  }

  nextAfter(now: number): number {
    this.readGrid();
    return this.list.find((cue) => cue.at > now)?.at ?? Number.POSITIVE_INFINITY;
  }

  layAhead(now: number): void {
    this.readGrid();
    this.parts.player.layAhead(this.sounds, now);
  }

  takeBack(): void {
    this.parts.player.takeBack();
  }

  /** Deals with the cues due in (last time, now]. Skipped ones are said to be lost, never given afterwards. */
  deliver(now: number): void {
    const { book, plan, player, ports, cues: settings } = this.parts;
    const due = dueIn(this.all(), this.done, now);
    this.done = Math.max(this.done, now);
    for (const cue of due) {
      // In an interruption no cue is given, so there is none to speak of.
      if (!cuesGiven(standing(plan, book.state, cue.at))) continue;
      const body = delivered(cue, now, {
        heard: player.heard(cue.at),
        late: this.parts.late(),
        seen: !ports.visibility.hidden() && this.hidden === null,
        vibrate: () => settings.vibration && ports.vibration.vibrate(cueRhythm(cue.cue)),
      });
      book.write(now, body);
      if (body.by.includes('screen')) this.flash += 1;
      const told = { at: cue.at, lost: body.by.length === 0 };
      this.hidden?.cues.push(told);
      this.stuck?.cues.push(told);
    }
  }

  /** The tablet slept from session time `from` to `to`: what fell in between came to nobody. */
  slept(from: number, to: number): void {
    this.deliver(from);
    // A cue of the very moment of waking is still due.
    this.done = to - 1;
    this.takeBack();
    if (standing(this.parts.plan, this.parts.book.state, from).phase === 'paused') return;
    const stretch = { from: Math.round(from), to: Math.round(to) };
    this.parts.book.write(stretch.to, { kind: 'gap', ...stretch, cause: 'asleep', estimated: true });
  }

  /** Follows hidden pages and stuck sound from their beginning to their end, and lays cues anew where clocks jumped. */
  disruption(now: number, reading: Reading, clockRuns: boolean): void {
    const isHidden = this.parts.ports.visibility.hidden();
    if (reading === 'lost' || reading === 'anchored') this.takeBack();
    if (reading === 'slipped') {
      this.parts.player.takeBackAhead(now);
      if (now >= 0) this.over({ cause: 'sound', from: now, cues: [] }, now);
    }
    if (isHidden) this.hidden ??= { cause: 'hidden', from: now, cues: [] };
    else if (this.hidden !== null) this.hidden = this.over(this.hidden, now);
    if (reading === 'lost') this.stuck ??= { cause: 'sound', from: now, cues: [] };
    else if (clockRuns && this.stuck !== null) this.stuck = this.over(this.stuck, now);
  }

  /** At the end of the session: what still goes on ends with it. */
  closeDisruptions(at: number): void {
    if (this.hidden !== null) this.hidden = this.over(this.hidden, at);
    if (this.stuck !== null) this.stuck = this.over(this.stuck, at);
  }

  /** Cues in (from, to] of which the journal says nothing are said to be lost. */
  sayLost(from: number, to: number): void {
    const { book } = this.parts;
    for (const { interval, cue, at } of dueIn(this.all(), from, to)) {
      const said = book.state.cues.get(interval) ?? [];
      if (said.some((entry) => entry.cue === cue)) continue;
      book.write(to, { kind: 'cued', interval, cue, planned: at, delivered: null, by: [] });
    }
  }

  private over(trouble: Trouble, now: number): null {
    const stretch = { from: Math.round(trouble.from), to: Math.round(now) };
    const all = this.parts.continuous && trouble.cause === 'hidden';
    const lost = all ? stretch : lostStretch(trouble.cues, stretch);
    this.parts.book.write(now, { kind: 'gap', ...lost, cause: trouble.cause, estimated: false });
    return null;
  }

  private readGrid(): void {
    const { state } = this.parts.book;
    // The way to the ear is known only once the sound is unlocked, and may change with the output.
    const leadIn = this.parts.leadIn();
    const headsUpMs = this.parts.headsUpMs();
    const { basis } = this;
    if (
      basis?.origins === state.origins &&
      basis.closed === state.closed &&
      basis.leadIn === leadIn &&
      basis.headsUpMs === headsUpMs
    )
      return;
    this.basis = { origins: state.origins, closed: state.closed, leadIn, headsUpMs };
    this.list = gridCues(this.parts.plan, state);
    this.sounds = soundsOf(this.list, state.origins, leadIn, headsUpMs);
  }
}
