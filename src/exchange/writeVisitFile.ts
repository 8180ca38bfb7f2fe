import type { VisitPlan } from '../model/visitPlan.ts';
import { visitFormat } from './envelope.ts';
import type { WriteOptions } from './types.ts';
import { envelopeBytes } from './writeStudyFile.ts';

/** The bytes of a visit file (`.lookbell-visit.json`): the frozen schedule for a second tablet, nobody's marks. */
export function writeVisitFile(plan: VisitPlan, options: WriteOptions): Promise<Uint8Array> {
  return envelopeBytes(visitFormat, { visit: plan }, options);
}
