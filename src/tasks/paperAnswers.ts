import { problem } from '../kernel/result.ts';
import type { ScheduledInterval } from '../schedule/layOut.ts';
import { severalCodes } from '../schedule/paperNumbers.ts';
import type { Fault, PaperAnswer, PaperDraft } from './paperDraft.ts';
import { standInsFault } from './paperStandIns.ts';

/** More children than a class can have: somebody typed two numbers as one. */
const mostPresent = 200;

/** The first thing on a sheet that cannot be, or null. */
export function answersFault(draft: PaperDraft, intervals: readonly ScheduledInterval[]): Fault | null {
  const { protocol } = draft.plan.schedule;
  const last = intervals.length;
  if (Object.keys(draft.answers).length === 0 && draft.onsets.length === 0) return problem('paper.nothing');
  const { stoppedAfter } = draft;
  if (stoppedAfter !== null && (!Number.isInteger(stoppedAfter) || stoppedAfter < 1 || stoppedAfter > last))
    return problem('paper.stoppedNowhere', { found: stoppedAfter, last });
  for (const [key, answer] of Object.entries(draft.answers)) {
    const interval = Number(key);
    if (!intervals.some(({ number }) => number === interval))
      return problem('task.noSuchInterval', { interval });
    if (stoppedAfter !== null && interval > stoppedAfter)
      return problem('paper.markAfterStop', { interval, stoppedAfter });
    const fault = answerFault(draft, answer, interval);
    if (fault !== null) return fault;
  }
  if (protocol.method !== 'duration') return standInsFault(draft, intervals);
  const seen = new Set<string>();
  for (const { part, atMs, answer } of draft.onsets) {
    const line = intervals.find((one) => one.part === part);
    if (line === undefined || atMs < 0 || atMs >= line.endMs)
      return problem('paper.onsetOutside', { at: atMs, length: line?.endMs ?? 0 });
    if (seen.has(`${part} ${atMs}`)) return problem('paper.onsetTwice', { at: atMs });
    seen.add(`${part} ${atMs}`);
    const fault = answerFault(draft, answer, line.number);
    if (fault !== null) return fault;
  }
  return null;
}

/** What is impossible about one answer, or null. */
export function answerFault({ plan }: PaperDraft, answer: PaperAnswer, interval: number): Fault | null {
  const { protocol } = plan.schedule;
  if ('missing' in answer) return null;
  if ((protocol.method === 'headcount') !== 'on' in answer) return problem('paper.otherMethod', { interval });
  if ('on' in answer) {
    const { on, present } = answer;
    const whole = [on, present].every((n) => Number.isInteger(n) && n >= 0);
    if (!whole) return problem('paper.noCount', { interval });
    if (present > mostPresent) return problem('paper.tooMany', { interval, present });
    return on > present ? problem('paper.onOverPresent', { interval, on, present }) : null;
  }
  const strange = answer.codes.find((code) => !protocol.codeSet.codes.some(({ id }) => id === code));
  if (strange !== undefined) return problem('task.noSuchCode', { code: strange });
  if (new Set(answer.codes).size < answer.codes.length) return problem('task.codeTwice');
  if (protocol.method === 'momentary' && answer.codes.length !== 1) return problem('task.oneCode');
  if (!severalCodes(protocol) && answer.codes.length > 1) return problem('task.oneCode');
  return null;
}
