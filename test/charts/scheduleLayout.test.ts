import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { scheduleLayout } from '../../src/charts/scheduleLayout.ts';
import { inTurn } from './exampleSchedule.ts';

const minute = 60_000;
const partsOf = (n: number, minutes: number) =>
  Array.from({ length: n }, (_, k) => ({ name: `part ${k + 1}`, lengthMs: minutes * minute }));

describe('where a schedule stands', () => {
  test('two parts of a quarter of an hour stand side by side on a tablet and below one another on a phone', () => {
    const rows = inTurn(6, 15_000, 15 * minute, 2);
    const wide = scheduleLayout(960, rows, partsOf(2, 15), ['looks'], 15, 15);
    const narrow = scheduleLayout(310, rows, partsOf(2, 15), ['looks'], 15, 15);
    expect(wide.bands.map(({ stretches }) => stretches.map(({ part }) => part))).toEqual([[0, 1]]);
    expect(narrow.bands.map(({ stretches }) => stretches.map(({ part }) => part))).toEqual([[0], [1]]);
  });

  test('three hours of one child every 15 s are broken into bands in which looks stay apart', () => {
    const layout = scheduleLayout(
      1100,
      inTurn(1, 15_000, 180 * minute, 1),
      partsOf(1, 180),
      ['looks'],
      15,
      15,
    );
    expect(layout.bands.length).toBeGreaterThan(1);
    expect(layout.nearestPx).toBeGreaterThanOrEqual(4);
  });

  test('every moment of every part stands in exactly one stretch, within the width, whatever the schedule', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 280, max: 1400 }),
        fc.integer({ min: 1, max: 30 }),
        fc.integer({ min: 1, max: 3 }),
        fc.integer({ min: 2, max: 180 }),
        fc.integer({ min: 3, max: 600 }),
        (width, children, n, minutes, seconds) => {
          const rows = inTurn(children, seconds * 1000, minutes * minute, n);
          const layout = scheduleLayout(width, rows, partsOf(n, minutes), ['looks'], 15, 15);
          const stretches = layout.bands.flatMap((band) => band.stretches);
          for (let part = 0; part < n; part++) {
            const own = stretches.filter((one) => one.part === part);
            expect(own[0]?.fromMs).toBe(0);
            expect(own.at(-1)?.toMs).toBe(minutes * minute);
            own.forEach((one, k) => {
              if (k > 0) expect(one.fromMs).toBe(own[k - 1]?.toMs);
            });
          }
          for (const { x, fromMs, toMs } of stretches) {
            expect(x).toBeGreaterThanOrEqual(layout.labelWidth);
            expect(x + (toMs - fromMs) * layout.pxPerMs).toBeLessThanOrEqual(width);
          }
          expect(layout.height).toBeLessThan(1300 * 2);
        },
      ),
      { numRuns: 150 },
    );
  });
});
