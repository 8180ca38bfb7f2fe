import type { JournalEntry } from '../journal/entry.ts';
import type { Protocol } from '../model/protocol.ts';
import type { SessionHeader } from '../model/session.ts';
import { Book } from './book.ts';
import { CuePlayer } from './cuePlayer.ts';
import { CueRound } from './cueRound.ts';
import type { Plan } from './grid.ts';
import { Grip } from './grip.ts';
import { HeadsUp } from './headsUp.ts';
import type { LiveOptions } from './liveSession.ts';
import type { RecorderPorts } from './ports.ts';
import { Recall } from './recall.ts';
import { RoomView } from './roomView.ts';
import { SoundDesk } from './soundDesk.ts';
import { Timekeeper } from './timekeeper.ts';
import { TouchAnswer } from './touchAnswer.ts';
import { TouchDesk } from './touchDesk.ts';

/** Wired outputs take 10 to 60 ms; from here on the sound goes through the air. From memory, no source. */
const wirelessFromMs = 100;

/** What one session is recorded with. */
export interface SessionInputs {
  readonly header: SessionHeader;
  readonly protocol: Protocol;
  readonly plan: Plan;
  readonly ports: RecorderPorts;
  readonly options: LiveOptions;
  /** The journal so far of a session whose start was called off: it is gone on with, and the session begins anew. */
  readonly calledOff?: readonly JournalEntry[];
}

/** What a session run is put together from; each part knows its own matter alone. */
export type SessionParts = ReturnType<typeof sessionParts>;

/** @param kept called when the store has taken or refused what was written */
export function sessionParts(inputs: SessionInputs, kept: () => void) {
  const { header, protocol, plan, ports, options } = inputs;
  const before = options.resumeFrom ?? inputs.calledOff ?? [];
  const book = new Book(header, ports, kept, before, options.elsewhere ?? false);
  const time = new Timekeeper(ports);
  const sound = new SoundDesk(ports.audio, book.state);
  const view = new RoomView(header, plan);
  const words = options.headsUp ?? null;
  const headsUp = new HeadsUp({ protocol, plan, book, speech: ports.speech, words });
  const cues = new CueRound({
    plan,
    cues: protocol.cues,
    book,
    player: new CuePlayer(ports.audio, time.clock),
    ports,
    leadIn: () => options.leadIn ?? (ports.audio.facts()?.latencyMs ?? 0) >= wirelessFromMs,
    headsUpMs: () => headsUp.toneAheadMs,
    late: () => time.clock.late,
    continuous: protocol.method === 'duration',
  });
  const { method } = protocol;
  // A count is made up step by step: its first step is no late answer to the prompt before.
  const touches = new TouchDesk(method === 'headcount' ? 0 : protocol.graceMs, method);
  const recall = new Recall({ method, view, book, sound, vibration: ports.vibration });
  const answer = new TouchAnswer(protocol.codeSet.codes, sound, ports.vibration);
  return { book, time, sound, view, headsUp, cues, touches, recall, answer, grip: new Grip(ports) };
}
