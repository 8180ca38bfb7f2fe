import { expect, it } from 'vitest';
import { clockTime, minutesAndSeconds } from '../../src/kernel/typedTime.ts';
import { epochOf } from '../../src/kernel/wallTime.ts';
import { instantOf, offsetAt, offsetOf, wallIn } from '../../src/kernel/zoneTime.ts';

it('reads clock times as people write them', () => {
  const read = [
    '9:05',
    '0905',
    '905',
    '9.05',
    '09:05:30',
    '090530',
    ' 23:59 ',
    '24:00',
    '9:60',
    '9',
    '9:5',
    'noon',
    '',
  ];
  expect(read.map(clockTime)).toEqual([
    '09:05',
    '09:05',
    '09:05',
    '09:05',
    '09:05:30',
    '09:05:30',
    '23:59',
    null,
    null,
    null,
    null,
    null,
    null,
  ]);
});

it('reads minutes and seconds as people write them', () => {
  const read = ['3:20', '3.20', '320', '45', '7', '0:00', '120:05', '3:60', '', 'x', '3:2'];
  expect(read.map(minutesAndSeconds)).toEqual([
    200_000,
    200_000,
    200_000,
    45_000,
    7000,
    0,
    7_205_000,
    null,
    null,
    null,
    null,
  ]);
});

it('knows the offset of a day in its own zone', () => {
  expect(offsetAt(epochOf('2026-07-01T12:00:00Z'), 'Europe/London')).toBe(60);
  expect(offsetAt(epochOf('2026-12-01T12:00:00Z'), 'Europe/London')).toBe(0);
  expect(offsetAt(epochOf('2026-12-01T12:00:00Z'), 'Asia/Kathmandu')).toBe(345);
  expect(offsetAt(epochOf('2026-12-01T12:00:00Z'), 'Nowhere/Land')).toBeNull();
  expect(offsetOf('2026-12-01T12:00:00.000-03:30')).toBe(-210);
});

it('turns a local date and time into its instant and back, also when clocks change', () => {
  const back = (date: string, time: string) => {
    const instant = instantOf(date, time, 'Europe/London', 0);
    return instant === null ? null : wallIn(instant, 'Europe/London', 0);
  };
  expect(back('2026-10-24', '10:41')).toBe('2026-10-24T10:41:00.000+01:00');
  expect(back('2026-10-26', '10:41:07')).toBe('2026-10-26T10:41:07.000+00:00');
  // 25 October 2026: summer time ends, 01:30 comes twice; 29 March: 01:30 does not come at all.
  expect(back('2026-10-25', '01:30')).toBe('2026-10-25T01:30:00.000+01:00');
  expect(back('2026-03-29', '01:30')).toBe('2026-03-29T02:30:00.000+01:00');
  expect([back('2026-02-30', '10:00'), back('2026-02-03', '9:00'), back('', '10:00')]).toEqual([
    null,
    null,
    null,
  ]);
  expect(instantOf('2026-11-03', '10:00', null, 60)).toBe(epochOf('2026-11-03T10:00:00+01:00'));
});
