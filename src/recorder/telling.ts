import type { Stop } from './ports.ts';

/** Who wants to know that something has changed. */
export class Telling {
  private readonly listeners = new Set<() => void>();
  private nested = 0;
  private untold = false;

  subscribe(listener: () => void): Stop {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  /** Changes that belong together are told once: a touch is answered sooner when screens look only once. */
  together(work: () => void): void {
    this.nested += 1;
    try {
      work();
    } finally {
      this.nested -= 1;
      if (this.nested === 0 && this.untold) this.tell();
    }
  }

  tell(): void {
    this.untold = this.nested > 0;
    if (this.untold) return;
    for (const listener of this.listeners) listener();
  }

  forget(): void {
    this.listeners.clear();
  }
}
