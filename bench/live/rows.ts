import { test } from '../../test/browser/support/test.ts';
import type { Row } from '../../tools/bench.ts';

/** Puts a line into the table of the bench that runs. */
export function say(row: Row): void {
  test.info().annotations.push({ type: 'row', description: JSON.stringify({ ratio: null, ...row }) });
}

/** The value below which this share of all lies (0–1), by the nearest rank. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? Number.NaN;
}

/** How far prompts lay off their plan: how many there were, the median and the worst. */
export function sayDeviations(label: string, ms: readonly number[]): void {
  const off = ms.map(Math.abs);
  say({ label: `${label}, ${off.length} prompts: median`, value: quantile(off, 0.5), unit: 'ms' });
  say({ label: `${label}: worst`, value: Math.max(...off), unit: 'ms' });
}

/** Times of one kind: median, 95th percentile and longest. */
export function sayTimes(label: string, ms: readonly number[], most?: number): void {
  say({ label: `${label}, ${ms.length} times: median`, value: quantile(ms, 0.5), unit: 'ms' });
  say({
    label: `${label}: 95 of 100 within`,
    value: quantile(ms, 0.95),
    unit: 'ms',
    ...(most !== undefined && { most }),
  });
  say({ label: `${label}: longest`, value: Math.max(...ms), unit: 'ms' });
}
