import type { JournalEntry, KnownEntry } from '../../../src/journal/entry.ts';
import { ok, problem, type Result } from '../../../src/kernel/result.ts';
import type { SessionStore } from '../../../src/recorder/ports.ts';

/** Rows as a store keeps them: by identity, all of an append or nothing. */
export class FakeStore implements SessionStore {
  readonly rows = new Map<string, JournalEntry>();
  readonly appends: number[] = [];
  packed = 0;
  /** `hangs`: the answer comes when `letGo` is called. `kept, then lost`: written, but the answer says that it was not. */
  mood: 'keeps' | 'refuses' | 'throws' | 'hangs' | 'kept, then lost' = 'keeps';
  private hanging: (() => void)[] = [];

  async append(entries: readonly JournalEntry[]): Promise<Result<null>> {
    this.appends.push(entries.length);
    await Promise.resolve();
    if (this.mood === 'refuses') return problem('store.full');
    if (this.mood === 'throws') throw new Error('the connection is gone');
    if (this.mood === 'hangs') await new Promise<void>((go) => this.hanging.push(go));
    for (const entry of entries) {
      const key = `${entry.writer} ${entry.seq}`;
      const known = this.rows.get(key);
      if (known !== undefined && JSON.stringify(known) !== JSON.stringify(entry))
        throw new Error(`two contents for ${key}`);
      this.rows.set(key, entry);
    }
    return this.mood === 'kept, then lost' ? problem('store.full') : ok(null);
  }

  async stored(): Promise<number> {
    return this.rows.size;
  }

  async pack(): Promise<Result<null>> {
    this.packed += 1;
    return ok(null);
  }

  letGo(): void {
    for (const go of this.hanging.splice(0)) go();
  }

  /** What is kept, in the order of writing. */
  journal(): KnownEntry[] {
    return [...this.rows.values()] as KnownEntry[];
  }
}
