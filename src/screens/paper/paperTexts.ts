import type { AwayReason } from '../../journal/entry.ts';
import type { Protocol } from '../../model/protocol.ts';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { type PaperMeaning, type PaperNumber, paperNumbers } from '../../schedule/paperNumbers.ts';
import type { Words } from '../../words/words.ts';
import { type LegendEntry, legendEntry, type PaperForm } from './paperLayout.ts';

/** The number that stands on a sheet for why a child is away. */
export const awayNumber = (protocol: Protocol, reason: AwayReason): number =>
  paperNumbers(protocol).find(({ means }) => means.kind === 'missing' && means.reason === reason)?.number ??
  0;

/** What a number on a sheet means, in words. */
export function meaningText({ paper, missing }: Words, protocol: Protocol, means: PaperMeaning): string {
  if (means.kind === 'none') return paper.none;
  if (means.kind === 'code')
    return protocol.codeSet.codes.find(({ id }) => id === means.code)?.label ?? means.code;
  return means.reason === 'out of view' ? paper.cannotSee : missing[means.reason];
}

/** The codes, and "none of them", with their definitions. */
export function legendOf(words: Words, { schedule: { protocol } }: VisitPlan): LegendEntry[] {
  if (protocol.method === 'headcount')
    return protocol.codeSet.codes
      .filter(({ role, definition }) => role === 'on-task' && definition !== '')
      .map(({ label, definition }) => legendEntry(null, label, definition));
  return paperNumbers(protocol).flatMap(({ number, means }) => {
    if (means.kind === 'missing') return [];
    const definition =
      means.kind === 'code'
        ? (protocol.codeSet.codes.find(({ id }) => id === means.code)?.definition ?? '')
        : words.paper.noneDefinition;
    return [legendEntry(number, meaningText(words, protocol, means), definition)];
  });
}

/** The reasons with their numbers, in one line. */
export function reasonsLine(words: Words, protocol: Protocol): string {
  const list = paperNumbers(protocol)
    .filter(({ means }) => means.kind === 'missing')
    .map(({ number, means }) => words.paper.numbered({ number, text: meaningText(words, protocol, means) }));
  return words.paper.reasons({ list });
}

/** What an observer with a pencil has to do, in one sentence. */
export function howTo({ paper }: Words, protocol: Protocol, form: PaperForm): string {
  const { method, observeMs, intervalMs } = protocol;
  if (method === 'duration') return paper.durationHow;
  if (method === 'headcount') return paper.countAtTime;
  if (method === 'momentary') return form === 'rounds' ? paper.roundsHow : paper.lookAtTime;
  const parted =
    observeMs < intervalMs
      ? paper.recordPart({ observe: observeMs / 1000, record: (intervalMs - observeMs) / 1000 })
      : paper.watchFrom;
  return `${parted} ${method === 'whole' ? paper.wholeHow : paper.partialHow}`;
}

/** The columns of boxes of a row, beside "cannot see". */
export const boxNumbers = (protocol: Protocol): PaperNumber[] =>
  paperNumbers(protocol).filter(({ means }) => means.kind !== 'missing');
