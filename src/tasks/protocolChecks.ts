import { type Problem, problem } from '../kernel/result.ts';
import type { Protocol } from '../model/protocol.ts';
import { intervalsInPart, partMs } from '../schedule/layOut.ts';
import { looksAtEverybody, watchesOne } from '../schedule/orderOfDay.ts';

type Recipe = Pick<
  Protocol,
  'method' | 'intervalMs' | 'observeMs' | 'lookAt' | 'rotation' | 'partLength' | 'childrenToDraw' | 'cues'
>;

const shortestMs = 3000;
const longestMs = 600_000;
const longestPartMs = 3 * 60 * 60_000;

const fits = (ms: number): boolean => ms >= shortestMs && ms <= longestMs && ms % 1000 === 0;

/**
 * What keeps a recipe from being recorded with, one thing at a time; null where nothing does. Watching and recording
 * take whole seconds from 3 s to 10 min each (recording may be left out), a part three hours at most.
 */
export function recipeProblem(recipe: Recipe): Problem | null {
  return timesProblem(recipe) ?? turnsProblem(recipe) ?? lengthProblem(recipe);
}

function timesProblem({ method, intervalMs, observeMs }: Recipe): Problem | null {
  if (method === 'duration') return null;
  if (observeMs > intervalMs) return said('task.observeLongerThanInterval');
  if (method === 'momentary' || method === 'headcount')
    return fits(intervalMs) ? null : said('task.intervalOutOfRange');
  if (!fits(observeMs)) return said('task.observeOutOfRange');
  return observeMs === intervalMs || fits(intervalMs - observeMs) ? null : said('task.recordOutOfRange');
}

function turnsProblem(recipe: Recipe): Problem | null {
  const { method, rotation, childrenToDraw, intervalMs, cues } = recipe;
  if (looksAtEverybody(recipe) || method === 'duration') return null;
  if (rotation.kind === 'sweep') {
    if (method !== 'momentary') return said('task.sweepIsMomentary');
    if (rotation.eachMs * childrenToDraw > intervalMs)
      return said('task.sweepTooLong', {
        children: childrenToDraw,
        seconds: (rotation.eachMs * childrenToDraw) / 1000,
        interval: intervalMs / 1000,
      });
  }
  if (rotation.kind === 'target' && childrenToDraw < 2) return said('task.targetAlone');
  if (cues.headsUp !== undefined && !watchesOne(recipe) && cues.headsUp.aheadMs >= intervalMs)
    return said('task.headsUpTooEarly', {
      seconds: cues.headsUp.aheadMs / 1000,
      interval: intervalMs / 1000,
    });
  return null;
}

function lengthProblem(recipe: Recipe): Problem | null {
  const { method, partLength, childrenToDraw } = recipe;
  if (method === 'duration' && partLength.kind === 'rounds') return said('task.durationByMinutes');
  const length = partMs(partLength, recipe, childrenToDraw);
  if (length > longestPartMs) return said('task.partTooLong', { minutes: Math.round(length / 60_000) });
  return intervalsInPart(partLength, recipe, childrenToDraw) < 1 ? said('task.noInterval') : null;
}

const said = (code: string, values: Problem['values'] = {}): Problem => problem(code, values).problem;
