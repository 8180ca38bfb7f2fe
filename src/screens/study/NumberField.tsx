import { type ReactNode, useState } from 'react';
import { TextField } from '../../ui/Field.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly value: number;
  readonly min: number;
  readonly max: number;
  readonly step?: number;
  /** 0 fits too, whatever the least number is. */
  readonly orNone?: boolean;
  /** The sentence for what does not fit, where a range alone would not say it. */
  readonly problem?: string;
  readonly onValue: (value: number) => void;
}

/** A number to type in. What does not fit stays in the field, with a sentence, and the last number that fits counts. */
export function NumberField(props: Props) {
  const { label, hint, value, min, max, step = 1, orNone = false, problem, onValue } = props;
  const { study } = useWords();
  const [text, setText] = useState(String(value));
  const [from, setFrom] = useState(value);
  // A value that came from elsewhere (another protocol, an undo) replaces what was typed.
  if (from !== value) {
    setFrom(value);
    if (Number(text) !== value) setText(String(value));
  }
  const typed = numberIn(text);
  const fits = (number: number | null): number is number =>
    number !== null &&
    ((number >= min && number <= max) || (orNone && number === 0)) &&
    (step !== 1 || Number.isInteger(number));
  return (
    <TextField
      label={label}
      {...(hint === undefined ? {} : { hint })}
      problem={fits(typed) ? undefined : (problem ?? study.between({ min, max }))}
      inputMode={step === 1 ? 'numeric' : 'decimal'}
      value={text}
      onChange={(event) => {
        setText(event.target.value);
        const next = numberIn(event.target.value);
        if (!fits(next)) return;
        setFrom(next);
        onValue(next);
      }}
    />
  );
}

/** A decimal comma is as good as a point. */
function numberIn(text: string): number | null {
  const value = Number(text.trim().replace(',', '.'));
  return text.trim() === '' || !Number.isFinite(value) ? null : value;
}
