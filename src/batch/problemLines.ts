import type { Remark } from '../analysis/index.ts';
import type { FileProblem } from '../exchange/types.ts';
import { say } from '../words/say.ts';
import type { Words } from '../words/words.ts';

/** `FILE:LINE: sentence`, or `FILE: sentence` where there is no line. */
export function fileProblemLine(
  { file, line, path, problem }: FileProblem,
  { batch, problems }: Words,
): string {
  const sentence = oneLine(say(problems, problem));
  if (line !== null) return batch.atLine({ file, line, sentence });
  return path === null || path === ''
    ? batch.atFile({ file, sentence })
    : batch.atPath({ file, path, sentence });
}

/** The line of a remark, at the first of the files that hold the sessions it is about. */
export function remarkLine(
  remark: Remark,
  filesOf: ReadonlyMap<string, readonly string[]>,
  words: Words,
): string {
  const sentence = oneLine(say(words.remarks, remark));
  const file = remark.sessions.flatMap((session) => filesOf.get(session) ?? [])[0];
  return file === undefined ? words.batch.general({ sentence }) : words.batch.atFile({ file, sentence });
}

function oneLine(sentence: string): string {
  return sentence.replace(/\s*[\r\n]+\s*/g, ' ');
}
