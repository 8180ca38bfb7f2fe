import { memo, useEffect, useMemo, useRef, useState } from 'react';
import type { Protocol } from '../../model/protocol.ts';
import type { ScheduledInterval } from '../../schedule/layOut.ts';
import { type PaperMeaning, paperNumbers, severalCodes } from '../../schedule/paperNumbers.ts';
import { type PaperAnswer, watchedOnPaper } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import type { Words } from '../../words/words.ts';
import { useServices } from '../services.ts';
import { CountEntry } from './CountEntry.tsx';
import { NumberEntry } from './NumberEntry.tsx';
import { meaningText } from './paperTexts.ts';
import { TypedSoFar } from './TypedSoFar.tsx';
import type { Typing } from './useTyping.ts';

interface Props {
  readonly typing: Typing;
  readonly intervals: readonly ScheduledInterval[];
}

/** The lines of a sheet in its order: one is being typed, the others are read. */
export function Lines({ typing, intervals }: Props) {
  const { words } = useServices();
  const { paper } = words;
  const { draft } = typing;
  const { protocol } = draft.plan.schedule;
  const { answers } = draft;
  const [at, setAt] = useState(
    () => 1 + intervals.findLastIndex(({ number }) => answers[number] !== undefined),
  );
  const [problem, setProblem] = useState<string | null>(null);
  const pseudonyms = useMemo(
    () =>
      new Map(
        [...draft.plan.children, ...(draft.plan.reserves ?? [])].map(({ id, pseudonym }) => [id, pseudonym]),
      ),
    [draft.plan.children, draft.plan.reserves],
  );
  const line = intervals[at];
  const answer = line === undefined ? undefined : answers[line.number];
  const nameOf = (id: string): string => pseudonyms.get(id) ?? '';
  const childOf = ({ child, number }: ScheduledInterval): string => {
    if (child === null) return paper.everybody;
    const watched = watchedOnPaper(draft.standIns ?? [], child, number);
    return watched === child ? nameOf(child) : paper.standsFor({ by: nameOf(watched), child: nameOf(child) });
  };
  const go = (to: number) => {
    setProblem(null);
    setAt(Math.max(0, Math.min(intervals.length, to)));
  };
  const put = (given: PaperAnswer | undefined) => {
    if (line === undefined) return;
    setProblem(null);
    if (given !== undefined || answer !== undefined) typing.answer(line.number, given);
  };
  const pastEnd = () => setProblem(words.problems['paper.pastEnd']({ last: intervals.length }));
  const mean = (means: PaperMeaning) => {
    if (line === undefined) return pastEnd();
    put(answerOf(protocol, means, answer));
    if (!severalCodes(protocol)) setAt(at + 1);
  };
  const back = () => {
    const undone = typing.undo?.();
    const where = intervals.findIndex(({ number }) => number === undone?.interval);
    if (where >= 0) go(where);
  };
  const empty = () => {
    if (answer !== undefined) put(undefined);
    else go(at - 1);
  };
  const entry = { at, go, empty, onUndo: back, onProblem: setProblem };
  const numbers = paperNumbers(protocol);
  const headcount = protocol.method === 'headcount';
  return (
    <div className="typing-lines">
      <div className="typing-now">
        <p className="typing-where" aria-live="polite">
          {line === undefined
            ? paper.stopHere
            : paper.now({ number: line.number, time: paper.clock({ ms: line.cueMs }), child: childOf(line) })}
          <span className="second">
            {' '}
            {answer === undefined ? paper.empty : answerText(words, protocol, answer)}
          </span>
        </p>
        {!headcount && (
          <NumberEntry {...entry} line={line?.number ?? null} draft={draft} numbers={numbers} onMean={mean} />
        )}
        {headcount && line !== undefined && (
          <CountEntry
            {...entry}
            key={line.number}
            line={line.number}
            answer={answer}
            carried={presentBefore(intervals, answers, at)}
            onAnswer={put}
            draft={draft}
          />
        )}
        <div className="row">
          {numbers.map(({ number, means }) => (
            <Button
              key={number}
              aria-pressed={says(answer, means)}
              className={says(answer, means) ? 'typing-said' : ''}
              onClick={() => mean(means)}
            >
              {paper.numbered({ number, text: meaningText(words, protocol, means) })}
            </Button>
          ))}
        </div>
        {problem !== null && <Notice kind="hold">{problem}</Notice>}
        <div className="row">
          <Button look="quiet" onClick={() => (at === 0 ? setProblem(paper.firstLine) : go(at - 1))}>
            {paper.back}
          </Button>
          <Button look="quiet" onClick={() => (line === undefined ? pastEnd() : go(at + 1))}>
            {paper.next}
          </Button>
          <Button
            look="quiet"
            onClick={() => (answer === undefined ? setProblem(paper.emptyAlready) : put(undefined))}
          >
            {paper.emptyLine}
          </Button>
          <TypedSoFar
            typing={typing}
            onUndo={back}
            progress={paper.progress({ done: Object.keys(answers).length, of: intervals.length })}
          />
        </div>
      </div>
      <List {...{ intervals, answers, at, protocol }} childOf={childOf} onGo={go} />
    </div>
  );
}

/** What a line says after this number: codes of a set come and go, everything else stands alone. */
function answerOf(
  protocol: Protocol,
  means: PaperMeaning,
  before: PaperAnswer | undefined,
): PaperAnswer | undefined {
  if (means.kind === 'missing') return { missing: means.reason };
  if (means.kind === 'none') return { codes: [] };
  if (!severalCodes(protocol)) return { codes: [means.code] };
  const codes = before !== undefined && 'codes' in before ? before.codes : [];
  if (!codes.includes(means.code)) return { codes: [...codes, means.code] };
  const rest = codes.filter((code) => code !== means.code);
  return rest.length === 0 ? undefined : { codes: rest };
}

function says(answer: PaperAnswer | undefined, means: PaperMeaning): boolean {
  if (answer === undefined) return false;
  if (means.kind === 'missing') return 'missing' in answer && answer.missing === means.reason;
  if (!('codes' in answer)) return false;
  return means.kind === 'none' ? answer.codes.length === 0 : answer.codes.includes(means.code);
}

/** How many were present at the last count before this line. */
function presentBefore(
  intervals: readonly ScheduledInterval[],
  answers: Readonly<Record<number, PaperAnswer>>,
  at: number,
): number | null {
  for (let k = at - 1; k >= 0; k--) {
    const answer = answers[intervals[k]?.number ?? 0];
    if (answer !== undefined && 'on' in answer) return answer.present;
  }
  return null;
}

export function answerText(words: Words, protocol: Protocol, answer: PaperAnswer): string {
  if ('on' in answer) return words.paper.counts(answer);
  if ('missing' in answer) return meaningText(words, protocol, { kind: 'missing', reason: answer.missing });
  if (answer.codes.length === 0) return words.paper.none;
  return words.f.list(answer.codes.map((code) => meaningText(words, protocol, { kind: 'code', code })));
}

interface ListProps {
  readonly intervals: readonly ScheduledInterval[];
  readonly answers: Readonly<Record<number, PaperAnswer>>;
  readonly at: number;
  readonly protocol: Protocol;
  readonly childOf: (line: ScheduledInterval) => string;
  readonly onGo: (at: number) => void;
}

function List({ intervals, answers, at, protocol, childOf, onGo }: ListProps) {
  const { words } = useServices();
  const here = useRef<HTMLOListElement>(null);
  const goTo = useRef(onGo);
  goTo.current = onGo;
  const onLine = useMemo(() => (k: number) => goTo.current(k), []);
  useEffect(() => {
    // Within the list alone: the page stays where it is.
    const list = here.current;
    const current = list?.children[at];
    if (!(list instanceof HTMLElement) || !(current instanceof HTMLElement)) return;
    list.scrollTop = current.offsetTop - (list.clientHeight - current.offsetHeight) / 2;
  }, [at]);
  return (
    <ol className="typing-list" aria-label={words.paper.linesTitle} ref={here}>
      {intervals.map((line, k) => {
        const answer = answers[line.number];
        return (
          <Row
            key={line.number}
            k={k}
            number={line.number}
            time={words.paper.clock({ ms: line.cueMs })}
            child={line.child === null ? '' : childOf(line)}
            text={answer === undefined ? '' : answerText(words, protocol, answer)}
            current={k === at}
            onLine={onLine}
          />
        );
      })}
    </ol>
  );
}

interface RowProps {
  readonly k: number;
  readonly number: number;
  readonly time: string;
  readonly child: string;
  readonly text: string;
  readonly current: boolean;
  readonly onLine: (k: number) => void;
}

const Row = memo(function Row({ k, number, time, child, text, current, onLine }: RowProps) {
  return (
    <li>
      <button
        type="button"
        className="typing-line"
        aria-current={current ? 'step' : undefined}
        tabIndex={current ? 0 : -1}
        onClick={(event) => {
          onLine(k);
          // With a mouse there is a keyboard: it goes on with this line. A finger would only get the screen's keys.
          if ((event.nativeEvent as PointerEvent).pointerType === 'mouse')
            event.currentTarget.closest('.typing-lines')?.querySelector('input')?.focus();
        }}
      >
        <b>{number}</b>
        <span className="second">{time}</span>
        <span>{child}</span>
        <strong>{text}</strong>
      </button>
    </li>
  );
});
