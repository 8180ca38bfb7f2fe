import { comparedPairs, type PairDetails, pairDetails, recordsOf, visits } from '../../src/analysis/index.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { SessionHeader } from '../../src/model/session.ts';
import { headerOf, journalOf } from '../support/session.ts';

type Said = readonly [number, EntryBody];

export interface Recorded {
  /** One sign a look: `1` on-task, `0` off-task, `-` nothing said, anything else that code. */
  readonly looks: string;
  /** How many ms after its planned moment each cue came by this tablet's wall clock. */
  readonly lag?: (interval: number) => number;
  /** No cue entries. */
  readonly silent?: boolean;
  readonly more?: readonly Said[];
  readonly protocol?: Partial<Protocol>;
  readonly header?: Partial<SessionHeader>;
}

/** Three children in turn, every 15 s unless the protocol says otherwise, as an observer's tablet records them. */
export function recordedBy(observer: string, recorded: Recorded): StoredSession {
  const { looks, lag = () => 0, silent = false, more = [], protocol = {}, header = {} } = recorded;
  const every = protocol.intervalMs ?? 15_000;
  const length = { kind: 'minutes', minutes: (looks.length * every) / 60_000 } as const;
  const said = [...looks].flatMap((sign, k): Said[] => {
    const interval = k + 1;
    const at = interval * every;
    const cue: Said = [
      at,
      { kind: 'cued', interval, cue: 'look', planned: at, delivered: at, by: ['sound'] },
    ];
    const code = sign === '1' ? 'on' : sign === '0' ? 'off' : sign;
    const mark: Said = [at + 900, { kind: 'marked', interval, code }];
    return [...(silent ? [] : [cue]), ...(sign === '-' ? [] : [mark])];
  });
  const end = (looks.length + 1) * every;
  const all = [
    [0, { kind: 'started', checks: [], anyway: false }] as Said,
    ...said,
    ...more,
    [end, { kind: 'ended', reason: 'complete' }] as Said,
  ].sort(([x], [y]) => x - y);
  const journal = journalOf(...all).map((entry) => {
    const late = 'interval' in entry ? lag(entry.interval ?? 0) : lag(Math.round(entry.at / every));
    const wall = new Date(Date.parse(entry.wall) + late).toISOString().replace('Z', '+00:00');
    return { ...entry, session: observer, writer: observer, wall };
  });
  const own = { id: observer, observer: { id: observer, name: observer }, ...header };
  return { header: headerOf({ partLength: length, ...protocol }, ['before'], own), journal };
}

/** What the study says of Marsh and Quill, who recorded this. */
export function pairOfRecorded(marsh: Recorded, quill: Recorded): PairDetails {
  const sessions = [recordedBy('Marsh', marsh), recordedBy('Quill', quill)];
  const [pair] = comparedPairs(visits(recordsOf(sessions)));
  if (pair === undefined) throw new Error('no pair');
  return pairDetails(pair, { agreement: 0.8, kappa: 0.6 });
}
