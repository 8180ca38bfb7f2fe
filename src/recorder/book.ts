import type { EntryBody, JournalEntry, KnownEntry } from '../journal/entry.ts';
import { inOrder } from '../journal/order.ts';
import { emptyState, type JournalState } from '../journal/state.ts';
import { fold, step } from '../journal/step.ts';
import { type Id, newId } from '../kernel/ids.ts';
import type { SessionHeader } from '../model/session.ts';
import { JournalWriter } from './journalWriter.ts';
import { Keeper } from './keeper.ts';
import type { RecorderPorts } from './ports.ts';

/** The journal of the running session: what is written goes at once into the state and into the write queue. */
export class Book {
  private folded: JournalState;
  /** All that was written, what was withdrawn included. */
  readonly journal: JournalEntry[];
  private readonly writer: JournalWriter;
  readonly keeper: Keeper;

  /** @param before entries of a session that was cut off; @param elsewhere they were written on another tablet */
  constructor(
    header: SessionHeader,
    ports: Pick<RecorderPorts, 'store' | 'timer' | 'wall' | 'random'>,
    changed: () => void,
    before: readonly JournalEntry[],
    elsewhere: boolean,
  ) {
    this.journal = [...before];
    this.folded = before.length === 0 ? emptyState(header) : fold(header, before);
    const { writer, seq } = nextIdentity(before, elsewhere) ?? { writer: newId(ports.random), seq: 0 };
    this.writer = new JournalWriter(header.id, writer, seq, ports.wall);
    this.keeper = new Keeper(ports.store, ports.timer, changed, before.length);
  }

  get state(): JournalState {
    return this.folded;
  }

  write(at: number, body: EntryBody): KnownEntry {
    const entry = this.writer.entry(at, body);
    this.journal.push(entry);
    this.folded = step(this.folded, entry);
    this.keeper.add(entry);
    return entry;
  }
}

/**
 * On the same tablet the same writer goes on, so that the order of the journal does not hang on a wall clock that may
 * have been set back meanwhile. Elsewhere a new one does, so that two tablets never claim the same entry.
 */
function nextIdentity(
  before: readonly JournalEntry[],
  elsewhere: boolean,
): { writer: Id; seq: number } | null {
  const last = inOrder(before).at(-1);
  return last === undefined || elsewhere ? null : { writer: last.writer, seq: last.seq + 1 };
}
