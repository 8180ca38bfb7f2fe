import { describe, expect, it } from 'vitest';
import { durationAgreement } from '../../src/analysis/durationAgreement.ts';
import { sessionRecords } from '../../src/analysis/index.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import { headerOf, journalOf } from '../support/session.ts';
import { sessionsFrom } from './sessionsFrom.ts';

const recordOf = (...said: readonly (readonly [number, EntryBody])[]) => {
  const header = headerOf({
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 2 },
  });
  const journal = journalOf(...said, [120_000, { kind: 'ended', reason: 'complete' }]);
  const [record] = sessionRecords({ header, journal });
  if (record === undefined) throw new Error('no record');
  return record;
};
const touch = (code: string): EntryBody => ({ kind: 'marked', interval: 1, code });

describe('two duration records', () => {
  it('second by second and in total, by hand', () => {
    // First: on 0–60, off 60–120. Second, one second late at 60 and out of view from 110 on.
    const a = recordOf([0, touch('on')], [60_000, touch('off')]);
    const b = recordOf(
      [0, touch('on')],
      [64_000, touch('off')],
      [110_000, { kind: 'missing', interval: 1, reason: 'out of view' }],
    );
    const found = durationAgreement(a, b);
    // 110 seconds both watched; 60 to 64 differ: 106 of 110. On: 60 and 64 s; off: 60 and 46 s.
    expect(found).toMatchObject({ compared: 110, excluded: 10 });
    expect(found?.percentAgreement).toBeCloseTo((100 * 106) / 110, 10);
    expect(found?.codes).toEqual([
      { code: 'on-task', a: 60, b: 64, ratio: (100 * 60) / 64 },
      { code: 'off-task', a: 60, b: 46, ratio: (100 * 46) / 60 },
    ]);
    // Both on 60, first off and second on 4, both off 46: po = 106/110, pe = (60·64 + 50·46)/110².
    const [po, pe] = [106 / 110, (60 * 64 + 50 * 46) / 110 ** 2];
    expect(found?.kappa).toBeCloseTo((po - pe) / (1 - pe), 12);
  });

  it('the same totals at other moments: totals agree, seconds do not', () => {
    const found = durationAgreement(
      recordOf([0, touch('on')], [60_000, touch('off')]),
      recordOf([0, touch('off')], [60_000, touch('on')]),
    );
    expect(found?.percentAgreement).toBe(0);
    expect(found?.codes.map(({ ratio }) => ratio)).toEqual([100, 100]);
  });

  it('one code only has no kappa', () => {
    const found = durationAgreement(recordOf([0, touch('on')]), recordOf([0, touch('on')]));
    expect(found).toMatchObject({ compared: 120, percentAgreement: 100, kappa: null });
  });

  it('is nothing for other methods, and for two children', async () => {
    const [momentary] = sessionRecords({ header: headerOf(), journal: [] });
    const a = recordOf([0, touch('on')]);
    expect(durationAgreement(a, momentary as typeof a)).toBeNull();
    const row = {
      observer: 'Marsh',
      interval: 1,
      code: 'on-task',
      method: 'duration',
      start_s: 0,
      end_s: 120,
    };
    const tables = await sessionsFrom([
      { ...row, session: 's', child: 'Otter-01' },
      { ...row, session: 't', child: 'Otter-02' },
    ]);
    const [same, other] = tables.flatMap(sessionRecords);
    expect(durationAgreement(a, same as typeof a)).toMatchObject({ compared: 120, percentAgreement: 100 });
    expect(durationAgreement(a, other as typeof a)).toBeNull();
  });
});
