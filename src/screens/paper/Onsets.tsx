import { type FormEvent, useRef, useState } from 'react';
import { minutesAndSeconds } from '../../kernel/typedTime.ts';
import type { ScheduledInterval } from '../../schedule/layOut.ts';
import { paperNumbers } from '../../schedule/paperNumbers.ts';
import type { PaperOnset } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { SelectField, TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { useServices } from '../services.ts';
import { answerText } from './Lines.tsx';
import { meaningText } from './paperTexts.ts';
import { TypedSoFar } from './TypedSoFar.tsx';
import type { Typing } from './useTyping.ts';

interface Props {
  readonly typing: Typing;
  readonly intervals: readonly ScheduledInterval[];
}

/** The lines of a duration sheet: from when on what held. */
export function Onsets({ typing, intervals }: Props) {
  const { words } = useServices();
  const { paper } = words;
  const { draft } = typing;
  const { protocol, phases } = draft.plan.schedule;
  const [part, setPart] = useState(0);
  const [time, setTime] = useState('');
  const [number, setNumber] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const form = useRef<HTMLFormElement>(null);
  const numbers = paperNumbers(protocol);
  const lasts = intervals.find((line) => line.part === part)?.endMs ?? 0;
  const add = (event: FormEvent) => {
    event.preventDefault();
    const atMs = minutesAndSeconds(time);
    const found = numbers.find((one) => number !== '' && one.number === Number(number));
    const refuse = (text: string) => setProblem(text);
    if (atMs === null) return refuse(words.problems['paper.noOnset']({ found: time }));
    if (atMs >= lasts) return refuse(words.problems['paper.onsetOutside']({ at: atMs, length: lasts }));
    if (draft.onsets.some((one) => one.part === part && one.atMs === atMs))
      return refuse(words.problems['paper.onsetTwice']({ at: atMs }));
    if (found === undefined) {
      // Enter after the time goes on to the number.
      if (number !== '') refuse(words.problems['paper.noNumber']({ found: number }));
      form.current?.querySelector('select')?.focus();
      return;
    }
    const { means } = found;
    const answer: PaperOnset['answer'] =
      means.kind === 'missing'
        ? { missing: means.reason }
        : { codes: means.kind === 'none' ? [] : [means.code] };
    typing.onsets([...draft.onsets, { part, atMs, answer }]);
    setTime('');
    setNumber('');
    setProblem(null);
    (form.current?.querySelector('input:not([type=radio])') as HTMLInputElement | null)?.focus();
  };
  const sorted = [...draft.onsets].sort((a, b) => a.part - b.part || a.atMs - b.atMs);
  return (
    <div className="stack-tight">
      <form ref={form} className="typing-fields" onSubmit={add}>
        {phases.length > 1 && (
          <Choice
            legend={paper.onsetPart}
            value={String(part)}
            onChange={(value) => setPart(Number(value))}
            options={phases.map((phase, k) => ({ value: String(k), label: phase }))}
          />
        )}
        <TextField
          label={paper.onsetTime}
          inputMode="numeric"
          value={time}
          onChange={(event) => setTime(event.target.value)}
        />
        <SelectField
          label={paper.onsetWhat}
          value={number}
          onChange={(event) => setNumber(event.target.value)}
          onKeyDown={(event) => {
            if (event.key !== 'Enter') return;
            event.preventDefault();
            form.current?.requestSubmit();
          }}
        >
          <option value="">{paper.onsetChoose}</option>
          {numbers.map((one) => (
            <option key={one.number} value={one.number}>
              {paper.numbered({ number: one.number, text: meaningText(words, protocol, one.means) })}
            </option>
          ))}
        </SelectField>
        <Button type="submit">{paper.addLine}</Button>
      </form>
      <p className="second small">{paper.keysOnset}</p>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <ul className="lines">
        {sorted.map((onset) => {
          const at = paper.clock({ ms: onset.atMs });
          return (
            <li key={`${onset.part} ${onset.atMs}`}>
              <span className="grow">
                {phases.length > 1 && <span className="second">{phases[onset.part]} </span>}
                {paper.onsetSaid({ time: at, text: answerText(words, protocol, onset.answer) })}
              </span>
              <Button
                look="quiet"
                aria-label={paper.removeLine({ time: at })}
                onClick={() => typing.onsets(draft.onsets.filter((one) => one !== onset))}
              >
                {words.common.remove}
              </Button>
            </li>
          );
        })}
      </ul>
      <div className="row">
        <TypedSoFar
          typing={typing}
          onUndo={() => typing.undo?.()}
          progress={paper.onsetsTyped({ n: draft.onsets.length })}
        />
      </div>
    </div>
  );
}
