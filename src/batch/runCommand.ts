import {
  type Analysed,
  agreementReport,
  changeReport,
  emptyChange,
  onTaskReport,
  recordsOf,
  visits,
  waysOf,
} from '../analysis/index.ts';
import type { IncomingFile } from '../exchange/types.ts';
import type { StoredSession } from '../journal/stored.ts';
import { say } from '../words/say.ts';
import type { Words } from '../words/words.ts';
import { checkReport, textOfCheck } from './checkReport.ts';
import { contradictions } from './contradictions.ts';
import { type Gathered, gather } from './gather.ts';
import { jsonDocument } from './jsonDocument.ts';
import type { Request } from './parseArguments.ts';
import { fileProblemLine, remarkLine } from './problemLines.ts';
import { textOfAgreement } from './textOfAgreement.ts';
import { textOfChange } from './textOfChange.ts';
import { textOfOnTask } from './textOfOnTask.ts';

/** What goes to standard output and standard error, and the exit status. */
export interface Outcome {
  readonly out: string;
  readonly err: readonly string[];
  readonly status: 0 | 1 | 2;
}

/** Runs one command over files that are read already: the same figures as on screens, from the same functions. */
export async function runCommand(
  request: Request,
  files: readonly IncomingFile[],
  words: Words,
): Promise<Outcome> {
  const { on, off } = request;
  const gathered = await gather(files, { on, off });
  const against = contradictions(gathered, words);
  const answer = answerTo(request, gathered, against.sessions, words);
  const failed = against.failed || gathered.outcomes.some((one) => !one.ok);
  return {
    out: answer.out,
    err: [...linesOfFiles(gathered, words), ...against.lines, ...answer.err],
    status: answer.status !== 0 ? answer.status : failed ? 1 : 0,
  };
}

function linesOfFiles({ outcomes }: Gathered, words: Words): string[] {
  return outcomes.flatMap((one) => {
    const lines = (one.ok ? one.notices : one.problems).map((found) => fileProblemLine(found, words));
    const visit = one.ok && one.form === 'visit';
    return visit
      ? [...lines, words.batch.atFile({ file: one.file, sentence: words.batch.visitFile })]
      : lines;
  });
}

function answerTo(
  request: Request,
  gathered: Gathered,
  sessions: readonly StoredSession[],
  words: Words,
): Outcome {
  const { bundle } = gathered.merged;
  const records = recordsOf(sessions, request);
  const print = <Report>(report: Report, text: (report: Report, words: Words) => string): string =>
    request.json ? jsonDocument(report, words) : `${text(report, words)}\n`;
  const told = <Report>(
    { report, problems, notices }: Analysed<Report>,
    text: (report: Report, words: Words) => string,
  ): Outcome => ({
    out: print(report, text),
    err: [...problems, ...notices].map((remark) => remarkLine(remark, gathered.filesOf, words)),
    status: problems.length > 0 ? 1 : 0,
  });
  // The documents have no place for it; people read a figure with how it came about.
  const withWays =
    <Report>(text: (report: Report, words: Words) => string) =>
    (report: Report, all: Words): string => {
      const ways = waysOf(records);
      return ways.some(({ lookAt }) => lookAt !== null)
        ? `${text(report, all)}\n\n${all.batch.recordedBy({ ways })}`
        : text(report, all);
    };
  const pairings = bundle.study?.pairings ?? [];
  switch (request.command) {
    case 'ontask':
      return told(onTaskReport(records), (report, all) =>
        textOfOnTask(
          report,
          all,
          (session) => records.find(({ label }) => label === session)?.facts.lookAt ?? null,
        ),
      );
    case 'agreement':
      return told(agreementReport(visits(records, pairings)), withWays(textOfAgreement));
    case 'check':
      return { out: print(checkReport(gathered, request, words), textOfCheck), err: [], status: 0 };
    case 'change': {
      if (records.length === 0) return { out: print(emptyChange, textOfChange), err: [], status: 0 };
      const { before, after, control, observer } = request;
      const studyControl = bundle.study?.control ?? null;
      const asked = { before, after, control, observer, studyControl };
      const answer = changeReport(visits(records, pairings), asked);
      if (answer.ok) return told(answer.value, withWays(textOfChange));
      const sentence = words.batch.general({ sentence: say(words.batch, answer.problem) });
      if (answer.problem.code !== 'tooFewPhases') return { out: '', err: [sentence], status: 2 };
      return { out: print(emptyChange, textOfChange), err: [sentence], status: 1 };
    }
  }
}
