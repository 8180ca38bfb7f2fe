/** What one measure is, where it comes from, and a check that any device can recompute. */
export interface About {
  /** The exported function's name. */
  readonly name: string;
  /** What it tells, in one plain sentence. */
  readonly sentence: string;
  /** The formula, as plain text. */
  readonly formula: string;
  /** Author, year, and journal or book. */
  readonly source: string;
  readonly check: {
    /** The call whose result is compared, as it would be typed. */
    readonly input: string;
    readonly expected: number;
    /** Where the expected value comes from. */
    readonly source: string;
    /** Relative for values away from zero, absolute (the same number) near it. */
    readonly tolerance: number;
  };
  /** Recomputes the check here and now. */
  readonly recompute: () => number;
}

/** Whether recomputing the check gives the expected value, within its tolerance. */
export function checkHolds(about: About): boolean {
  const { expected, tolerance } = about.check;
  const got = about.recompute();
  return Math.abs(got - expected) <= tolerance * Math.max(1, Math.abs(expected));
}
