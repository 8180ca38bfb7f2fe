import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { methods, type Protocol } from '../../src/model/protocol.ts';
import { recipeProblem, starterDraft, switchMethod } from '../../src/tasks/index.ts';
import { withoutIdleParts } from '../../src/tasks/protocolDrafts.ts';
import { say } from '../../src/words/say.ts';
import { wordsFor } from '../../src/words/words.ts';
import { onOff, protocolOf } from '../support/session.ts';

const usual: Partial<Protocol> = {
  partLength: { kind: 'minutes', minutes: 15 },
  childrenToDraw: 6,
  order: 'random',
};
const found = (changes: Partial<Protocol>) =>
  recipeProblem(protocolOf({ ...usual, ...changes }))?.code ?? null;
const watching = (observe: number, record: number): Partial<Protocol> => ({
  method: 'partial',
  observeMs: observe * 1000,
  intervalMs: (observe + record) * 1000,
});
const sound = { channel: 'both', volume: 0.3, flash: false, vibration: false } as const;

describe('what a protocol may ask for', () => {
  it('an interval of whole seconds from 3 s to 10 min', () => {
    const every = (ms: number) =>
      found({ intervalMs: ms, observeMs: ms, partLength: { kind: 'minutes', minutes: 60 } });
    expect([3000, 15_000, 600_000].map(every)).toEqual([null, null, null]);
    expect([2000, 3500, 601_000].map(every)).toEqual(Array(3).fill('task.intervalOutOfRange'));
  });

  it('watching and recording of whole seconds from 3 s to 10 min each, recording also none', () => {
    const long = { partLength: { kind: 'minutes', minutes: 60 } } as const;
    expect(found({ ...watching(600, 600), ...long })).toBeNull();
    expect(found(watching(3, 3))).toBeNull();
    expect(found(watching(10, 0))).toBeNull();
    expect(found(watching(2, 5))).toBe('task.observeOutOfRange');
    expect(found(watching(4.5, 5.5))).toBe('task.observeOutOfRange');
    expect(found(watching(10, 2))).toBe('task.recordOutOfRange');
    expect(found({ ...watching(10, 601), ...long })).toBe('task.recordOutOfRange');
  });

  it('a sweep that fits into the interval, with momentary looks', () => {
    const sweep = { rotation: { kind: 'sweep', eachMs: 3000 } } as const;
    expect(found({ ...sweep, intervalMs: 18_000, observeMs: 18_000 })).toBeNull();
    expect(found(sweep)).toBe('task.sweepTooLong');
    expect(found({ ...sweep, ...watching(20, 0) })).toBe('task.sweepIsMomentary');
    // What has no turns does not care for them.
    expect(found({ ...sweep, method: 'headcount' })).toBeNull();
  });

  it('a target with a peer, and a heads-up that comes after the look before', () => {
    const target = { rotation: { kind: 'target', peerEvery: 4 } } as const;
    expect(found(target)).toBeNull();
    expect(found({ ...target, childrenToDraw: 1 })).toBe('task.targetAlone');
    const ahead = (aheadMs: number) =>
      found({ intervalMs: 5000, observeMs: 5000, cues: { ...sound, headsUp: { says: 'child', aheadMs } } });
    expect([ahead(4000), ahead(5000)]).toEqual([null, 'task.headsUpTooEarly']);
  });

  it('a part of three hours at most, also in rounds, and a duration by minutes', () => {
    expect(found({ partLength: { kind: 'minutes', minutes: 180 } })).toBeNull();
    expect(found({ partLength: { kind: 'rounds', rounds: 120 } })).toBeNull();
    expect(found({ partLength: { kind: 'rounds', rounds: 121 } })).toBe('task.partTooLong');
    expect(found({ method: 'duration', partLength: { kind: 'rounds', rounds: 2 } })).toBe(
      'task.durationByMinutes',
    );
    expect(
      found({ intervalMs: 300_000, observeMs: 300_000, partLength: { kind: 'minutes', minutes: 2 } }),
    ).toBe('task.noInterval');
  });

  it('says each refusal in one clear sentence', () => {
    const problem = recipeProblem(protocolOf({ ...usual, rotation: { kind: 'sweep', eachMs: 3000 } }));
    if (problem === null) throw new Error('nothing is refused');
    expect(say(wordsFor().problems, problem)).toBe(
      'A sweep of 6 children takes 18 s, and the interval has 15 s. Make the interval longer, or give each child less.',
    );
  });
});

describe('the usual protocol of each method', () => {
  it.each(methods)('%s can be recorded with as it is, also when it was switched to', (method) => {
    const fresh = starterDraft(method, 'study', 'x', onOff);
    expect(recipeProblem(fresh)).toBeNull();
    for (const from of methods) {
      const switched = switchMethod(starterDraft(from, 'study', 'x', onOff), method);
      expect(switched.method).toBe(method);
      expect(recipeProblem(withoutIdleParts(switched))).toBeNull();
    }
  });

  it('has the times of the trade: 15 s, 10 s and 5 s, a count a minute, one child', () => {
    const times = methods.map((method) => {
      const { intervalMs, observeMs, childrenToDraw } = starterDraft(method, 'study', 'x', onOff);
      return [method, intervalMs / 1000, observeMs / 1000, childrenToDraw];
    });
    expect(times).toEqual([
      ['momentary', 15, 15, 6],
      ['partial', 15, 10, 6],
      ['whole', 15, 10, 6],
      ['headcount', 60, 60, 6],
      ['duration', 15, 15, 1],
    ]);
  });

  it('comes back as it was when a method is tried and left again', () => {
    fc.assert(
      fc.property(fc.constantFrom(...methods), (method) => {
        const draft = { ...starterDraft('momentary', 'study', 'x', onOff), childrenToDraw: 4, reserves: 1 };
        expect(switchMethod(switchMethod(draft, method), 'momentary')).toEqual(draft);
      }),
    );
  });

  it('keeps nothing that means nothing: no heads-up where nobody is told apart', () => {
    const cues = { ...sound, headsUp: { says: 'child', aheadMs: 3000 } } as const;
    const full = { ...starterDraft('momentary', 'study', 'x', onOff), cues, reservesStepIn: true };
    expect(withoutIdleParts(full)).toEqual(full);
    const counted = withoutIdleParts(switchMethod(full, 'headcount'));
    expect(counted.cues).toEqual(sound);
    expect('reservesStepIn' in counted).toBe(false);
    expect(withoutIdleParts({ ...full, rotation: { kind: 'one' } })).toMatchObject({
      cues: sound,
      reservesStepIn: true,
    });
  });
});
