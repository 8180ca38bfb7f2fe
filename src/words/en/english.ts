import { afterwards } from './afterwards.ts';
import { batch } from './batch.ts';
import { before } from './before.ts';
import { common } from './common.ts';
import { missing } from './missing.ts';
import { problems } from './problems.ts';
import { remarks, warnings } from './remarks.ts';
import { room } from './room.ts';
import { starter } from './starter.ts';
import { study } from './study.ts';
import { figures, why } from './why.ts';

/** The English catalogue, one file an area. */
export const english = {
  afterwards,
  batch,
  before,
  common,
  figures,
  missing,
  problems,
  remarks,
  room,
  starter,
  study,
  warnings,
  why,
};
