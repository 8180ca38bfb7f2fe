import type { Bundle } from '../../src/exchange/types.ts';
import type { JournalEntry } from '../../src/journal/entry.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import type { Classroom } from '../../src/model/classroom.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { SessionHeader } from '../../src/model/session.ts';
import type { Study } from '../../src/model/study.ts';
import type { VisitPlan } from '../../src/model/visitPlan.ts';

const revision = { counter: 2, writer: 'tablet-1' };
export const exportedAt = '2026-11-03T15:10:00.000+00:00';
export const writing = { exportedAt, app: '0.1.0' };

export const study: Study = {
  id: 'study-1',
  name: 'Breaks at Heron Hill',
  phases: ['before', 'after'],
  conditions: ['break', 'usual'],
  control: 'usual',
  lessonParts: ['whole class', 'group'],
  criterion: { agreement: 0.85, kappa: 0.6 },
  safeguarding: '',
  pairings: [],
  demo: false,
  removed: false,
  revision,
};

export const protocol: Protocol = {
  id: 'protocol-1',
  version: 1,
  study: study.id,
  name: 'Next child, every 15 seconds',
  method: 'momentary',
  intervalMs: 15_000,
  observeMs: 15_000,
  lookAt: 'end',
  rotation: { kind: 'next' },
  partLength: { kind: 'rounds', rounds: 2 },
  order: 'listed',
  childrenToDraw: 2,
  reserves: 0,
  graceMs: 400,
  codeSet: {
    name: 'On / off',
    codes: [
      { id: 'on', label: 'on-task', role: 'on-task', definition: 'At work.', examples: '', nonExamples: '' },
      {
        id: 'off',
        label: 'off-task',
        role: 'off-task',
        definition: 'Elsewhere.',
        examples: '',
        nonExamples: '',
      },
    ],
  },
  cues: { channel: 'both', volume: 0.4, flash: false, vibration: false },
  removed: false,
  revision,
};

const children = [
  { id: 'child-1', pseudonym: 'Otter-07', stratum: null },
  { id: 'child-2', pseudonym: 'Heron-02', stratum: 'b' },
];

export const classroom: Classroom = {
  id: 'class-1',
  study: study.id,
  name: '3B',
  condition: 'break',
  children: children.map((child) => ({ ...child, removed: false })),
  plan: null,
  draw: null,
  removed: false,
  revision,
};

export function laidHeader(id = 'session-1', observer = 'Quill'): SessionHeader {
  return {
    id,
    study: study.id,
    classroom: { id: classroom.id, name: classroom.name },
    condition: 'break',
    visit: 'visit-1',
    visitLabel: null,
    observer: { id: `observer-${observer}`, name: observer },
    role: 'primary',
    practice: false,
    date: '2026-11-03',
    plannedStart: null,
    children,
    plan: null,
    draw: null,
    orderSeed: null,
    schedule: { kind: 'laid', protocol, phases: ['before', 'after'] },
    app: '0.1.0',
    device: 'tablet',
    timeZone: 'Europe/London',
  };
}

/** A journal from what its entries say; `at` is session time in ms. */
export function journalOf(
  session: string,
  writer: string,
  says: readonly { readonly kind: string; readonly at: number; readonly [member: string]: unknown }[],
): JournalEntry[] {
  return says.map((say, seq) => ({
    session,
    writer,
    seq,
    wall: `2026-11-03T10:42:${String(seq % 60).padStart(2, '0')}.000+00:00`,
    ...say,
  }));
}

export function laidSession(id = 'session-1', writer = 'writer-1'): StoredSession {
  return {
    header: laidHeader(id),
    journal: journalOf(id, writer, [
      { kind: 'started', at: 0, checks: [], anyway: false },
      { kind: 'marked', at: 15_200, interval: 1, code: 'on' },
      { kind: 'marked', at: 30_100, interval: 2, code: 'off' },
      { kind: 'missing', at: 45_300, interval: 3, reason: 'out of view' },
      { kind: 'ended', at: 75_000, reason: 'early' },
    ]),
  };
}

export const visitPlan: VisitPlan = {
  visit: 'visit-2',
  study: {
    id: study.id,
    name: study.name,
    phases: study.phases,
    conditions: study.conditions,
    lessonParts: [],
  },
  classroom: { id: classroom.id, name: classroom.name },
  condition: 'break',
  plannedStart: '2026-11-04T10:40+00:00',
  children,
  plan: null,
  draw: null,
  orderSeed: 'seed',
  schedule: { kind: 'laid', protocol, phases: ['before', 'after'] },
};

export function sampleBundle(): Bundle {
  return {
    study,
    classes: [classroom],
    observers: [
      { id: 'observer-Quill', study: study.id, name: 'Quill', keyMap: null, removed: false, revision },
    ],
    protocols: [protocol],
    sessions: [laidSession()],
    visitPlans: [],
  };
}

/** Bytes as the JSON that they hold, and back. */
export function jsonOf(bytes: Uint8Array): Record<string, unknown> {
  return JSON.parse(new TextDecoder().decode(bytes));
}

export function bytesOf(value: unknown): Uint8Array {
  return new TextEncoder().encode(typeof value === 'string' ? value : JSON.stringify(value));
}
