/**
 * Source text that remembers every audio context of a page as `window.contexts`, so that a test can do to them what a
 * system does: stop the newest, or hold it down so that asking it to go on is of no use.
 */
export const rememberContexts = `
  window.contexts = [];
  window.AudioContext = class extends window.AudioContext {
    constructor(options) { super(options); window.contexts.push(this); }
  };
`;

interface WithContexts {
  readonly contexts: AudioContext[];
}

/** Stops the newest context from outside, as a system does. To be evaluated in the page. */
export function stopSound(): void {
  void (window as unknown as WithContexts).contexts.at(-1)?.suspend();
}

/** Stops the newest context and leaves it so, whoever asks it to go on. To be evaluated in the page. */
export function holdSoundDown(): void {
  const context = (window as unknown as WithContexts).contexts.at(-1);
  if (context === undefined) return;
  void context.suspend();
  context.resume = () => new Promise(() => undefined);
}

/** How many contexts the page has made. To be evaluated in the page. */
export const contextsMade = (): number => (window as unknown as WithContexts).contexts.length;

/** Source text that puts a wall clock in a page which a test moves: `moveWallClock(ms)`. Nothing else is touched. */
export const movableWallClock = `
  let moved = 0;
  const RealDate = Date;
  window.moveWallClock = (ms) => { moved += ms; };
  window.Date = class Date extends RealDate {
    constructor(...given) { if (given.length === 0) super(RealDate.now() + moved); else super(...given); }
    static now() { return RealDate.now() + moved; }
  };
`;

/** To be evaluated in the page. */
export function moveWallClock(ms: number): void {
  (window as unknown as { moveWallClock(ms: number): void }).moveWallClock(ms);
}
