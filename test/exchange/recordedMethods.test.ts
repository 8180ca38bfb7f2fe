import { describe, expect, it } from 'vitest';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import { headerOf, journalOf } from '../support/session.ts';
import { bytesOf } from './sampleStudy.ts';
import { sentence } from './sentence.ts';
import { rowsOf } from './tableText.ts';

const started: readonly [number, EntryBody] = [0, { kind: 'started', checks: [], anyway: false }];

/** The table of a session that was recorded here. */
const tableOf = (protocol: Partial<Protocol>, ...said: (readonly [number, EntryBody])[]): string =>
  writeIntervalTable([{ header: headerOf(protocol), journal: journalOf(started, ...said) }]);

/** How many intervals the table holds for whoever reads it. */
async function readAgain(text: string): Promise<number> {
  const read = await readIncoming({ name: 'table.csv', bytes: bytesOf(text) });
  if (!read.ok) throw new Error(read.problems.map(sentence).join(' '));
  const [session] = read.bundle.sessions;
  return session?.header.schedule.kind === 'listed' ? session.header.schedule.intervals.length : 0;
}

describe('a recorded headcount as a table', () => {
  const scans = {
    method: 'headcount',
    intervalMs: 60_000,
    observeMs: 60_000,
    partLength: { kind: 'minutes', minutes: 3 },
  } as const;
  const text = tableOf(
    scans,
    [61_000, { kind: 'marked', interval: 1, code: null, counts: { on: 17, present: 22 } }],
    [62_000, { kind: 'marked', interval: 1, code: null, counts: { on: 18, present: 22 } }],
    [121_000, { kind: 'missing', interval: 2, reason: 'out of view' }],
    [240_000, { kind: 'ended', reason: 'complete' }],
  );

  it('has both counts, nobody by name, no code, and where each interval begins', () => {
    const rows = rowsOf(text).map((row) => [
      row.interval,
      row.child,
      row.code,
      row.on_count,
      row.present_count,
      row.missing,
      row.start_s,
      row.end_s,
    ]);
    expect(rows).toEqual([
      ['1', '', '', '18', '22', '', '0', ''],
      ['2', '', '', '', '', 'out of view', '60', ''],
      ['3', '', '', '', '', 'missed', '120', ''],
    ]);
  });

  it('is read again without a fault', async () => {
    expect(await readAgain(text)).toBe(3);
  });
});

describe('a recorded duration as a table', () => {
  const text = tableOf(
    { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
    [1250, { kind: 'marked', interval: 1, code: 'on' }],
    [41_007, { kind: 'marked', interval: 1, code: 'off' }],
    [60_000, { kind: 'missing', interval: 1, reason: 'out of view' }],
    [70_000, { kind: 'marked', interval: 1, code: 'on' }],
    [100_000, { kind: 'ended', reason: 'early' }],
  );

  it('has a row for each stretch, with its onset and offset in seconds', () => {
    const rows = rowsOf(text).map((row) => [
      row.interval,
      row.child,
      row.code,
      row.missing,
      row.start_s,
      row.end_s,
    ]);
    expect(rows).toEqual([
      ['1', 'Otter-01', '', 'missed', '0', '1.25'],
      ['2', 'Otter-01', 'on-task', '', '1.25', '41.007'],
      ['3', 'Otter-01', 'off-task', '', '41.007', '60'],
      ['4', 'Otter-01', '', 'out of view', '60', '70'],
      ['5', 'Otter-01', 'on-task', '', '70', '100'],
      ['6', 'Otter-01', '', 'ended early', '100', '120'],
    ]);
  });

  it('is read again without a fault', async () => {
    expect(await readAgain(text)).toBe(6);
  });
});
