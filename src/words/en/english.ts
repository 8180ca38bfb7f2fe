import { afterwards } from './afterwards.ts';
import { before } from './before.ts';
import { common } from './common.ts';
import { missing } from './missing.ts';
import { problems } from './problems.ts';
import { room } from './room.ts';
import { starter } from './starter.ts';
import { study } from './study.ts';

/** The English catalogue, one file an area. */
export const english = { afterwards, before, common, missing, problems, room, starter, study };
