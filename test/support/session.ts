import type { EntryBody, KnownEntry } from '../../src/journal/entry.ts';
import type { CodeSet } from '../../src/model/codeSet.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { SessionHeader } from '../../src/model/session.ts';

export const onOff: CodeSet = {
  name: 'On / off',
  codes: [
    { id: 'on', label: 'on-task', role: 'on-task', definition: '', examples: '', nonExamples: '' },
    { id: 'off', label: 'off-task', role: 'off-task', definition: '', examples: '', nonExamples: '' },
  ],
};

/** A small momentary protocol, 15 s, next child, two rounds a part; what a test needs otherwise it says. */
export function protocolOf(changes: Partial<Protocol> = {}): Protocol {
  return {
    id: 'protocol-1',
    version: 1,
    study: 'study-1',
    name: 'Next child, every 15 seconds',
    method: 'momentary',
    intervalMs: 15_000,
    observeMs: 15_000,
    lookAt: 'end',
    rotation: { kind: 'next' },
    partLength: { kind: 'rounds', rounds: 2 },
    order: 'listed',
    childrenToDraw: 3,
    reserves: 0,
    graceMs: 400,
    codeSet: onOff,
    cues: { channel: 'both', volume: 0.4, flash: true, vibration: false },
    removed: false,
    revision: { counter: 0, writer: 'w' },
    ...changes,
  };
}

/** A header with children c1, c2, c3 and the phases given. */
export function headerOf(
  changes: Partial<Protocol> = {},
  phases: string[] = ['before'],
  more: Partial<SessionHeader> = {},
): SessionHeader {
  return {
    id: 'session-1',
    study: 'study-1',
    classroom: { id: 'class-1', name: 'Class Otter' },
    condition: 'break',
    visit: 'visit-1',
    visitLabel: null,
    observer: { id: 'observer-1', name: 'Quill' },
    role: 'primary',
    practice: false,
    date: '2026-11-03',
    plannedStart: null,
    children: ['c1', 'c2', 'c3'].map((id) => ({ id, pseudonym: `Otter-0${id.slice(1)}`, stratum: null })),
    plan: null,
    draw: null,
    orderSeed: null,
    schedule: { kind: 'laid', protocol: protocolOf(changes), phases },
    app: '0.1.0',
    device: 'test',
    timeZone: 'Europe/London',
    ...more,
  };
}

/** Entries of one writer, numbered as they come: `write([at, body], …)`. */
export function journalOf(...said: readonly (readonly [number, EntryBody])[]): KnownEntry[] {
  return said.map(([at, body], seq) => ({
    session: 'session-1',
    writer: 'writer-1',
    seq,
    at,
    wall: new Date(Date.UTC(2026, 10, 3, 10) + at).toISOString().replace('Z', '+00:00'),
    ...body,
  }));
}
