import { afterwards } from './afterwards.ts';
import { agreement } from './agreement.ts';
import { batch } from './batch.ts';
import { before } from './before.ts';
import { change } from './change.ts';
import { core } from './core.ts';
import { corrections } from './corrections.ts';
import { files } from './files.ts';
import { inStepWords } from './inStep.ts';
import { methods } from './methods.ts';
import { cardProblems, pairing } from './pairing.ts';
import { paper, paperProblems } from './paper.ts';
import { problems } from './problems.ts';
import { purpose } from './purpose.ts';
import { refusals } from './refusals.ts';
import { remarks, warnings } from './remarks.ts';
import { starter } from './starter.ts';
import { study } from './study.ts';
import { timing } from './timing.ts';
import { twoRecords } from './twoRecords.ts';
import { figures, why } from './why.ts';

/** The English catalogue, one file an area. */
export const english = {
  ...core,
  afterwards: { ...afterwards, ...corrections, ...timing, ...twoRecords },
  agreement: { ...agreement, ...inStepWords },
  batch,
  before: { ...before, ...purpose },
  change,
  figures,
  files,
  methods,
  pairing,
  paper,
  problems: { ...core.problems, ...problems, ...cardProblems, ...refusals, ...paperProblems },
  remarks,
  starter,
  study,
  warnings,
  why,
};
