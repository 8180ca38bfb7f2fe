import type { EntryKind } from '../journal/entry.ts';

/** What a member has to be for the program to work with it. */
export type Shape = 'string' | 'number' | 'boolean' | 'array' | 'object';

/** Members that must be there, by name; with a leading `?` null may stand instead. */
export type Shapes = Readonly<Record<string, Shape | `?${Shape}`>>;

/**
 * What is looked at when a row is read. Rows are written by this program, and files are validated in full before
 * they become rows; this finds a damaged row, without a validator in what has to be loaded before a lesson can be
 * recorded. A test holds the tables to the schemas.
 */
export const recordShapes = {
  study: {
    id: 'string',
    name: 'string',
    phases: 'array',
    conditions: 'array',
    control: '?string',
    lessonParts: 'array',
    criterion: 'object',
    safeguarding: 'string',
    pairings: 'array',
    demo: 'boolean',
    removed: 'boolean',
    revision: 'object',
  },
  classroom: {
    id: 'string',
    study: 'string',
    name: 'string',
    condition: '?string',
    children: 'array',
    plan: '?object',
    draw: '?object',
    removed: 'boolean',
    revision: 'object',
  },
  observer: {
    id: 'string',
    study: 'string',
    name: 'string',
    keyMap: '?object',
    removed: 'boolean',
    revision: 'object',
  },
  protocol: {
    id: 'string',
    version: 'number',
    study: 'string',
    name: 'string',
    method: 'string',
    intervalMs: 'number',
    observeMs: 'number',
    lookAt: 'string',
    rotation: 'object',
    partLength: 'object',
    order: 'string',
    childrenToDraw: 'number',
    reserves: 'number',
    graceMs: 'number',
    codeSet: 'object',
    cues: 'object',
    removed: 'boolean',
    revision: 'object',
  },
  header: {
    id: 'string',
    study: 'string',
    classroom: 'object',
    condition: '?string',
    visit: 'string',
    visitLabel: '?string',
    observer: 'object',
    role: '?string',
    practice: 'boolean',
    date: '?string',
    plannedStart: '?string',
    children: 'array',
    plan: '?object',
    draw: '?object',
    orderSeed: '?string',
    schedule: 'object',
    app: 'string',
    device: 'string',
    timeZone: '?string',
  },
} as const satisfies Record<string, Shapes>;

/** Who wrote an entry and when; all that is looked at in kinds of newer versions. */
export const stampShapes: Shapes = {
  session: 'string',
  writer: 'string',
  seq: 'number',
  at: 'number',
  wall: 'string',
};

export const entryShapes: Readonly<Record<EntryKind, Shapes>> = {
  started: { checks: 'array', anyway: 'boolean' },
  cued: { interval: 'number', cue: 'string', planned: 'number', delivered: '?number', by: 'array' },
  marked: { interval: 'number', code: '?string' },
  missing: { interval: 'number', reason: 'string' },
  corrected: { interval: 'number', codes: '?array', missing: '?string' },
  swapped: { pairs: 'array' },
  unusable: { from: 'number', to: 'number', reason: 'string' },
  withdrawn: { target: 'object' },
  interrupted: {},
  continued: {},
  paused: {},
  resumed: {},
  left: { child: 'string', reason: 'string' },
  returned: { child: 'string' },
  moved: { child: 'string', seat: 'string' },
  lessonPart: { lessonPart: '?string' },
  phaseStarted: { phase: 'string', part: 'number', origin: 'number' },
  breakStarted: {},
  breakEnded: {},
  flagged: { interval: '?number' },
  noted: { text: 'string' },
  clockNudged: { by: 'number' },
  outputChanged: { sound: 'boolean', cause: 'string' },
  gap: { from: 'number', to: 'number', cause: 'string', estimated: 'boolean' },
  ended: { reason: 'string' },
  amended: { interval: 'number', codes: '?array', missing: '?string', why: 'string', by: 'string' },
  settled: { interval: 'number', codes: 'array', why: 'string', by: 'string' },
};

/** The first member that is not what it has to be; null when all are. `''` = the value is no object at all. */
export function misshapen(value: unknown, shapes: Shapes): string | null {
  if (shapeOf(value) !== 'object') return '';
  const members = value as Readonly<Record<string, unknown>>;
  for (const [name, wanted] of Object.entries(shapes)) {
    const found = members[name];
    if (found === null && wanted.startsWith('?')) continue;
    if (shapeOf(found) !== wanted.replace('?', '')) return name;
  }
  return null;
}

function shapeOf(value: unknown): string {
  if (Array.isArray(value)) return 'array';
  return value === null ? 'null' : typeof value;
}
