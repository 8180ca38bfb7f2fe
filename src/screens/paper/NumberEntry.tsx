import { type ChangeEvent, type KeyboardEvent, useEffect, useRef, useState } from 'react';
import { actionOf } from '../../model/keyMap.ts';
import type { PaperMeaning, PaperNumber } from '../../schedule/paperNumbers.ts';
import { severalCodes } from '../../schedule/paperNumbers.ts';
import type { PaperDraft } from '../../tasks/index.ts';
import { TextField } from '../../ui/Field.tsx';
import { useServices } from '../services.ts';

interface Props {
  readonly draft: PaperDraft;
  /** null past the last line. */
  readonly line: number | null;
  readonly at: number;
  readonly numbers: readonly PaperNumber[];
  readonly onMean: (means: PaperMeaning) => void;
  readonly go: (at: number) => void;
  readonly empty: () => void;
  readonly onUndo: () => void;
  readonly onProblem: (text: string) => void;
}

/**
 * Where the number of the current line is typed. Numbers of one digit act at once; longer ones at Enter. Letters do what
 * they do for this observer in the room; digits always mean what the sheet says.
 */
export function NumberEntry({ draft, line, at, numbers, onMean, go, empty, onUndo, onProblem }: Props) {
  const { words, useStored } = useServices();
  const { paper } = words;
  const { protocol } = draft.plan.schedule;
  const several = severalCodes(protocol);
  const [digits, setDigits] = useState('');
  const field = useRef<HTMLDivElement>(null);
  const single = numbers.every(({ number }) => number <= 9);
  const observers = useStored((store) => store.observers(draft.plan.study.id), [draft.plan.study.id]);
  const keyMap =
    (observers?.ok ? observers.value : []).find(({ id }) => id === draft.observer)?.keyMap ?? null;
  // biome-ignore lint/correctness/useExhaustiveDependencies: another line has typed nothing yet
  useEffect(() => setDigits(''), [line]);
  const mean = (typed: string) => {
    const found = numbers.find(({ number }) => number === Number(typed));
    if (found === undefined) onProblem(words.problems['paper.noNumber']({ found: typed }));
    else onMean(found.means);
    setDigits('');
  };
  const letter = (key: string) => {
    const action = actionOf(keyMap, key);
    if (action === 'undo') return onUndo();
    const code = /^code:(\d)$/.exec(action ?? '')?.[1];
    const id = code === undefined ? undefined : protocol.codeSet.codes[Number(code) - 1]?.id;
    if (id !== undefined) return onMean({ kind: 'code', code: id });
    if (action === 'cannot see') return onMean({ kind: 'missing', reason: 'out of view' });
    const none = numbers.find(({ means }) => means.kind === 'none');
    if (action === 'nothing' && none !== undefined) return onMean(none.means);
    onProblem(words.problems['paper.noNumber']({ found: key }));
  };
  const onChange = ({ target: { value } }: ChangeEvent<HTMLInputElement>) => {
    const typed = value.slice(-1);
    if (value.length < digits.length) return setDigits(value);
    if (/^\d$/.test(typed)) {
      if (single) mean(typed);
      else setDigits(value.replace(/\D/g, '').slice(0, 3));
    } else if (typed.trim() !== '') letter(typed);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const { key } = event;
    if (key === 'Enter') {
      if (digits !== '') mean(digits);
      else go(at + 1);
    } else if (key === 'ArrowDown') go(at + 1);
    else if (key === 'ArrowUp') go(at - 1);
    else if (key === 'PageDown') go(at + 10);
    else if (key === 'PageUp') go(at - 10);
    else if ((key === 'Backspace' || key === 'Delete') && digits === '') empty();
    else if (key === 'z' && (event.ctrlKey || event.metaKey)) onUndo();
    else return;
    event.preventDefault();
  };
  return (
    <div ref={field} className="typing-entry">
      <TextField
        label={paper.numberField}
        hint={!single ? paper.keysLong : several ? paper.keysSeveral : paper.keysOne}
        inputMode="numeric"
        value={digits}
        onChange={onChange}
        onKeyDown={onKeyDown}
      />
    </div>
  );
}
