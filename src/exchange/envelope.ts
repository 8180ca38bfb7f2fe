import * as z from 'zod/mini';
import { entryStamp, knownEntry } from '../journal/entry.ts';
import { classroom } from '../model/classroom.ts';
import { shortText, wallTime } from '../model/common.ts';
import { observer } from '../model/observer.ts';
import { protocol } from '../model/protocol.ts';
import { sessionHeader } from '../model/session.ts';
import { study } from '../model/study.ts';
import { visitPlan } from '../model/visitPlan.ts';

/** The version that this program writes. Older ones are brought forward by `migrations.ts`. */
export const currentVersion = 1;

export const studyFormat = 'lookbell-study';
export const visitFormat = 'lookbell-visit';

const head = {
  version: z.int().check(z.minimum(1)),
  exportedAt: wallTime,
  app: z.string(),
  /** SHA-256, in hexadecimal, of the canonical JSON of all the other members. */
  checksum: z.string(),
};

/** An entry of a kind that a newer program knows: only who wrote it and when is looked at. */
export const unknownEntry = z.looseObject({ ...entryStamp.shape, kind: shortText });

const envelopeOf = <Session extends z.ZodMiniType>(session: Session) =>
  z.object({
    format: z.literal(studyFormat),
    ...head,
    study: z.nullable(study),
    classes: z.array(classroom),
    observers: z.array(observer),
    protocols: z.array(protocol),
    sessions: z.array(session),
    /** Visits that are planned and not yet recorded; absent where there are none. */
    visitPlans: z.optional(z.array(visitPlan)),
  });

/** The study file as it is published. */
export const studyEnvelope = envelopeOf(
  z.object({ header: sessionHeader, journal: z.array(z.union([knownEntry, unknownEntry])) }),
);

/** The study file without its journals' entries, which are looked at one by one, with the schema of their kind. */
export const studyFrame = envelopeOf(z.object({ header: sessionHeader, journal: z.array(z.unknown()) }));

export const visitEnvelope = z.object({ format: z.literal(visitFormat), ...head, visit: visitPlan });
