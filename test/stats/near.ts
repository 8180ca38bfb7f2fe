import { expect } from 'vitest';

/** Equal to a relative 1e-10 (absolute 1e-12 near zero), or what is given. */
export function expectNear(got: number, want: number, relative = 1e-10): void {
  const allowed = Math.max(1e-12, relative * Math.abs(want));
  expect(Math.abs(got - want) <= allowed, `got ${got}, want ${want}`).toBe(true);
}
