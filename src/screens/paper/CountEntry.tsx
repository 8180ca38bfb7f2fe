import { type KeyboardEvent, useRef, useState } from 'react';
import type { PaperAnswer, PaperDraft } from '../../tasks/index.ts';
import { answerFault } from '../../tasks/paperAnswers.ts';
import { TextField } from '../../ui/Field.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

interface Props {
  readonly draft: PaperDraft;
  readonly line: number;
  readonly at: number;
  readonly answer: PaperAnswer | undefined;
  /** How many were present at the count before. */
  readonly carried: number | null;
  readonly onAnswer: (answer: PaperAnswer | undefined) => void;
  readonly go: (at: number) => void;
  readonly empty: () => void;
  readonly onUndo: () => void;
  readonly onProblem: (text: string) => void;
}

/** Two numbers of a headcount: Enter goes from one to the other and on to the next line. */
export function CountEntry({
  draft,
  line,
  at,
  answer,
  carried,
  onAnswer,
  go,
  empty,
  onUndo,
  onProblem,
}: Props) {
  const { words } = useServices();
  const { paper } = words;
  const counts = answer !== undefined && 'on' in answer ? answer : null;
  const [on, setOn] = useState(counts === null ? '' : String(counts.on));
  const [present, setPresent] = useState(String(counts?.present ?? carried ?? ''));
  const fields = useRef<HTMLDivElement>(null);
  /** Keeps what is typed; false where it cannot be. */
  const commit = (): boolean => {
    if (on === '') return true;
    const given = { on: Number(on), present: present === '' ? Number.NaN : Number(present) };
    const fault = answerFault(draft, given, line);
    if (fault !== null) {
      onProblem(say(words.problems, fault.problem));
      return false;
    }
    if (counts?.on !== given.on || counts.present !== given.present) onAnswer(given);
    return true;
  };
  const move = (to: number) => {
    if (commit()) go(to);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>, second: boolean) => {
    const { key } = event;
    if (key === 'Enter' && !second && on !== '') {
      const other = fields.current?.querySelectorAll('input')[1];
      other?.focus();
      other?.select();
    } else if (key === 'Enter' || key === 'ArrowDown') move(at + 1);
    else if (key === 'ArrowUp') move(at - 1);
    else if (key === 'Backspace' && !second && on === '') empty();
    else if (key === 'z' && (event.ctrlKey || event.metaKey)) onUndo();
    else return;
    event.preventDefault();
  };
  const digits = (text: string) => text.replace(/\D/g, '').slice(0, 4);
  return (
    <div ref={fields} className="typing-counts">
      <TextField
        label={paper.onTask}
        inputMode="numeric"
        value={on}
        // The line before has just been left by the keyboard: typing goes on here.
        autoFocus={at > 0}
        onChange={(event) => setOn(digits(event.target.value))}
        onKeyDown={(event) => onKeyDown(event, false)}
      />
      <TextField
        label={paper.present}
        inputMode="numeric"
        value={present}
        onChange={(event) => setPresent(digits(event.target.value))}
        onKeyDown={(event) => onKeyDown(event, true)}
        onBlur={commit}
      />
      <p className="second small grow">{paper.keysCount}</p>
    </div>
  );
}
