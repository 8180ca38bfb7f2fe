/** Throws a RangeError that begins with the argument's name. For arguments that make no sense, never for data that leave a figure undefined. */
export function requireThat(holds: boolean, argument: string, expected: string): asserts holds {
  if (!holds) throw new RangeError(`${argument}: ${expected}`);
}

/** A confidence lies strictly between 0 and 1. */
export function requireConfidence(confidence: number): void {
  requireThat(confidence > 0 && confidence < 1, 'confidence', 'must lie between 0 and 1');
}

/** Neither NaN nor infinite nor missing. */
export function requireFinite(values: ArrayLike<number>, argument: string): void {
  for (let i = 0; i < values.length; i++) {
    requireThat(Number.isFinite(values[i]), argument, 'must hold finite numbers only');
  }
}

/** Two lists that belong together place by place. `names`: both, as in `a, b`. */
export function requireSameLength(a: ArrayLike<unknown>, b: ArrayLike<unknown>, names: string): void {
  requireThat(a.length === b.length, names, 'must be equally long');
}
