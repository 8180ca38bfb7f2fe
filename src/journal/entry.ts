import * as z from 'zod/mini';
import { id, longText, shortText, wallTime, whole } from '../model/common.ts';
import { missingReason } from '../model/missing.ts';

const interval = z.int().check(z.minimum(1));
const at = z.int();
/** The identity of an entry inside its session. */
export const entryRef = z.object({ writer: id, seq: whole });
export type EntryRef = z.infer<typeof entryRef>;

/** Which cue: a momentary look, the next child of a sweep, or the beginning of an observe or a record part. */
export const cueKind = z.enum(['look', 'observe', 'record', 'next']);
export type CueKind = z.infer<typeof cueKind>;

export const cueCarrier = z.enum(['sound', 'screen', 'vibration']);
export type CueCarrier = z.infer<typeof cueCarrier>;

/** Why a stretch of the schedule ran without the tablet: closed (killed, battery), hidden, asleep, sound stuck, clock moved. */
export const gapCause = z.enum(['closed', 'hidden', 'asleep', 'sound', 'clock']);
export type GapCause = z.infer<typeof gapCause>;

export const awayReason = z.enum(['left the room', 'with another adult', 'not taking part']);
export type AwayReason = z.infer<typeof awayReason>;

/** Only where a table uses one interval number for several children: whose interval is meant. */
const ofChild = z.optional(id);

/** Headcount: children on-task and children present. */
const counts = z.object({ on: whole, present: whole });

/** What each kind of entry says beside who wrote it and when. */
export const bodies = {
  /** Recording began; `checks` are those that stood on hold, `anyway` says that the observer started all the same. */
  started: z.object({
    kind: z.literal('started'),
    checks: z.array(shortText),
    anyway: z.boolean(),
    audioLatencyMs: z.optional(z.number()),
    /** The second of the wall clock at which both observers had agreed to begin. */
    agreedStart: z.optional(wallTime),
  }),
  /** A cue as planned and as delivered; `by` empty means that it was neither heard nor shown. */
  cued: z.object({
    kind: z.literal('cued'),
    interval,
    cue: cueKind,
    planned: at,
    delivered: z.nullable(at),
    by: z.array(cueCarrier),
  }),
  /** A code touched for an interval; null = observed, none of the codes occurred. `late`: within the grace; `before`: by "child before". */
  marked: z.object({
    kind: z.literal('marked'),
    interval,
    child: ofChild,
    code: z.nullable(shortText),
    late: z.optional(z.boolean()),
    before: z.optional(z.boolean()),
    counts: z.optional(counts),
  }),
  missing: z.object({
    kind: z.literal('missing'),
    interval,
    child: ofChild,
    reason: missingReason,
    late: z.optional(z.boolean()),
    before: z.optional(z.boolean()),
  }),
  /** A correction in the room: from now on the interval holds this, whatever was touched before. */
  corrected: z.object({
    kind: z.literal('corrected'),
    interval,
    codes: z.nullable(z.array(shortText)),
    missing: z.nullable(missingReason),
    counts: z.optional(counts),
  }),
  /** The wrong child was watched: what stands at the two intervals of each pair changes places. */
  swapped: z.object({
    kind: z.literal('swapped'),
    pairs: z.array(z.tuple([interval, interval])).check(z.minLength(1)),
  }),
  /** A stretch of session time that is of no use: intervals whose cue lies in [from, to) are missing, with this reason. */
  unusable: z.object({
    kind: z.literal('unusable'),
    from: at,
    to: at,
    reason: missingReason,
    words: z.optional(longText),
  }),
  /** Undo: the named entry counts as not made. */
  withdrawn: z.object({ kind: z.literal('withdrawn'), target: entryRef }),
  interrupted: z.object({ kind: z.literal('interrupted') }),
  continued: z.object({ kind: z.literal('continued') }),
  paused: z.object({ kind: z.literal('paused') }),
  /** The schedule goes on; `repeats` names the interval that the pause broke and that begins anew: session time steps back to it. */
  resumed: z.object({ kind: z.literal('resumed'), repeats: z.optional(interval) }),
  /** `by`: the reserve who stands in until the child returns. */
  left: z.object({ kind: z.literal('left'), child: id, reason: awayReason, by: z.optional(id) }),
  returned: z.object({ kind: z.literal('returned'), child: id }),
  moved: z.object({ kind: z.literal('moved'), child: id, seat: id }),
  lessonPart: z.object({ kind: z.literal('lessonPart'), lessonPart: z.nullable(shortText) }),
  /** A phase opens: part `part` of the schedule begins at session time `origin`. */
  phaseStarted: z.object({ kind: z.literal('phaseStarted'), phase: shortText, part: whole, origin: at }),
  breakStarted: z.object({ kind: z.literal('breakStarted') }),
  breakEnded: z.object({
    kind: z.literal('breakEnded'),
    what: z.optional(longText),
    ledBy: z.optional(longText),
  }),
  flagged: z.object({ kind: z.literal('flagged'), interval: z.nullable(interval) }),
  noted: z.object({ kind: z.literal('noted'), text: longText, about: z.optional(entryRef) }),
  /** By the tick check: this tablet's wall clock has to be read so many milliseconds later (negative: earlier). Nudges add up. */
  clockNudged: z.object({ kind: z.literal('clockNudged'), by: at }),
  /** Sound switched: by hand (silence) or because the output changed (earpiece pulled out). */
  outputChanged: z.object({
    kind: z.literal('outputChanged'),
    sound: z.boolean(),
    cause: z.enum(['hand', 'device']),
    output: z.optional(z.string()),
  }),
  gap: z.object({ kind: z.literal('gap'), from: at, to: at, cause: gapCause, estimated: z.boolean() }),
  ended: z.object({
    kind: z.literal('ended'),
    reason: z.enum(['complete', 'early']),
    words: z.optional(longText),
  }),
  /** A correction after the session: `codes` (with `counts` in a headcount) or a missing reason, with why and by whom. */
  amended: z.object({
    kind: z.literal('amended'),
    interval,
    child: ofChild,
    codes: z.nullable(z.array(shortText)),
    missing: z.nullable(missingReason),
    counts: z.optional(counts),
    why: longText,
    by: shortText,
  }),
  /** An agreed code after review; it never replaces the mark. */
  settled: z.object({
    kind: z.literal('settled'),
    interval,
    codes: z.array(shortText),
    why: longText,
    by: shortText,
  }),
};

const body = z.discriminatedUnion('kind', [
  bodies.started,
  bodies.cued,
  bodies.marked,
  bodies.missing,
  bodies.corrected,
  bodies.swapped,
  bodies.unusable,
  bodies.withdrawn,
  bodies.interrupted,
  bodies.continued,
  bodies.paused,
  bodies.resumed,
  bodies.left,
  bodies.returned,
  bodies.moved,
  bodies.lessonPart,
  bodies.phaseStarted,
  bodies.breakStarted,
  bodies.breakEnded,
  bodies.flagged,
  bodies.noted,
  bodies.clockNudged,
  bodies.outputChanged,
  bodies.gap,
  bodies.ended,
  bodies.amended,
  bodies.settled,
]);

/** What an entry says. */
export type EntryBody = z.infer<typeof body>;
export type EntryKind = EntryBody['kind'];

/**
 * Who wrote an entry and when: (session, writer, seq) is its identity; `at` is session time in integer
 * milliseconds; `wall` is the wall clock with offset, which measures nothing.
 */
export const entryStamp = z.object({ session: id, writer: id, seq: whole, at, wall: wallTime });
export type EntryStamp = z.infer<typeof entryStamp>;

export const knownEntry = z.intersection(entryStamp, body);
export type KnownEntry = EntryStamp & EntryBody;

/** An entry of a kind that this version does not know: kept as it is and passed on. */
export type UnknownEntry = EntryStamp & { readonly kind: string } & Readonly<Record<string, unknown>>;

export type JournalEntry = KnownEntry | UnknownEntry;
