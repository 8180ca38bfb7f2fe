import { afterwards } from './afterwards.ts';
import { agreement } from './agreement.ts';
import { batch } from './batch.ts';
import { before } from './before.ts';
import { change } from './change.ts';
import { common } from './common.ts';
import { corrections } from './corrections.ts';
import { files } from './files.ts';
import { keeping } from './keeping.ts';
import { methods } from './methods.ts';
import { missing } from './missing.ts';
import { problems } from './problems.ts';
import { refusals } from './refusals.ts';
import { remarks, warnings } from './remarks.ts';
import { room } from './room.ts';
import { starter } from './starter.ts';
import { study } from './study.ts';
import { figures, why } from './why.ts';

/** The English catalogue, one file an area. */
export const english = {
  afterwards: { ...afterwards, ...corrections },
  agreement,
  batch,
  before,
  change,
  common,
  figures,
  files,
  methods,
  missing,
  problems: { ...problems, ...keeping, ...refusals },
  remarks,
  room,
  starter,
  study,
  warnings,
  why,
};
