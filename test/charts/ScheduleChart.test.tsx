import { describe, expect, test } from 'vitest';
import { paperPalette, screenPalette } from '../../src/charts/palette.ts';
import { ScheduleChart } from '../../src/charts/ScheduleChart.tsx';
import { drawn } from './drawn.ts';
import { inTurn } from './exampleSchedule.ts';

const minute = 60_000;
const shared = { palette: paperPalette, label: 'The schedule', unit: 'min' };
const parts = [
  { name: 'before', lengthMs: 15 * minute },
  { name: 'after', lengthMs: 15 * minute },
];
const usual = { ...shared, rows: inTurn(6, 15_000, 15 * minute, 2), parts, heads: ['in all'] };
const everybody = {
  ...shared,
  rows: [
    {
      label: 'everybody',
      ends: ['15'],
      spans: [Array.from({ length: 15 }, (_, k) => [(k + 1) * minute, (k + 1) * minute] as const)],
    },
  ],
  parts: [{ name: '', lengthMs: 15 * minute }],
  heads: ['counts'],
};

/** One subpath for each look. */
const marksIn = (svg: string): number[] =>
  [...svg.matchAll(/<path d="([^"]*z)"/g)].map(([, d]) => (d?.match(/z/g) ?? []).length);

describe('the picture of a schedule', () => {
  test('keeps the picture: six children in turn, two parts side by side', async () => {
    await expect(drawn(<ScheduleChart {...usual} width={960} />)).toMatchFileSnapshot(
      'pictures/scheduleChart.svg',
    );
  });

  test('keeps the picture: the same on a phone, parts under one another', async () => {
    await expect(drawn(<ScheduleChart {...usual} width={310} />)).toMatchFileSnapshot(
      'pictures/scheduleChartNarrow.svg',
    );
  });

  test('keeps the picture: time watched, ten seconds of fifteen', async () => {
    const rows = inTurn(3, 15_000, 5 * minute, 1, 10_000);
    const props = {
      ...shared,
      rows,
      parts: [{ name: '', lengthMs: 5 * minute }],
      heads: ['looks', 'watched'],
    };
    await expect(drawn(<ScheduleChart {...props} width={700} />)).toMatchFileSnapshot(
      'pictures/scheduleChartWatched.svg',
    );
  });

  test('keeps the picture: a headcount is one row', async () => {
    await expect(drawn(<ScheduleChart {...everybody} width={700} />)).toMatchFileSnapshot(
      'pictures/scheduleChartEverybody.svg',
    );
  });

  test('keeps the picture: a duration is one bar', async () => {
    const rows = [{ label: 'Otter-07', ends: ['15 min'], spans: [[[0, 15 * minute] as const]] }];
    const props = { ...shared, rows, parts: [{ name: '', lengthMs: 15 * minute }], heads: ['watched'] };
    await expect(drawn(<ScheduleChart {...props} width={700} />)).toMatchFileSnapshot(
      'pictures/scheduleChartDuration.svg',
    );
  });

  test.each([310, 700, 1200])('has one mark for each of 720 looks of three hours, %i px wide', (width) => {
    const rows = inTurn(6, 15_000, 180 * minute, 1);
    const svg = drawn(
      <ScheduleChart
        {...{ ...shared, rows, width, heads: ['looks'] }}
        parts={[{ name: '', lengthMs: 180 * minute }]}
      />,
    );
    expect(marksIn(svg).reduce((sum, n) => sum + n, 0)).toBe(720);
    // One path a row and band, however many looks: a few dozen elements in all.
    expect(svg.match(/</g)?.length).toBeLessThan(400);
  });

  test('says what stands at the end of each row, once', () => {
    const svg = drawn(<ScheduleChart {...usual} width={310} />);
    expect(svg.match(/>20</g)).toHaveLength(6);
    expect(svg.match(/>in all</g)).toHaveLength(1);
  });

  test('draws in ink alone, from the palette that is handed in', () => {
    const colours = (svg: string) =>
      new Set([...svg.matchAll(/(?:fill|stroke)="([^"]+)"/g)].map(([, c]) => c));
    const { ink, ink2, rule } = paperPalette;
    expect(colours(drawn(<ScheduleChart {...usual} width={960} />))).toEqual(
      new Set([ink, ink2, rule, 'none']),
    );
    const onScreen = colours(drawn(<ScheduleChart {...usual} palette={screenPalette} width={960} />));
    expect(onScreen).toEqual(new Set(['var(--ink)', 'var(--ink-2)', 'var(--rule)', 'none']));
  });
});
