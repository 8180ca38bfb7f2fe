import { useState } from 'react';
import { TextField } from '../../ui/Field.tsx';

interface Props {
  readonly label: string;
  readonly hint?: string;
  /** As it stands in the field to begin with. */
  readonly text: string;
  /** The same text tidied up; null where it is no such time. */
  readonly tidy: (text: string) => string | null;
  /** The sentence for what is none. */
  readonly wrong: (found: string) => string;
  readonly onText: (text: string) => void;
}

/** A time as it stands on a sheet. What is none stays as it was typed, and is told when the field is left. */
export function TimeField({ label, hint, text: first, tidy, wrong, onText }: Props) {
  const [text, setText] = useState(first);
  const [left, setLeft] = useState(true);
  return (
    <TextField
      label={label}
      hint={hint}
      inputMode="numeric"
      value={text}
      problem={left && text !== '' && tidy(text) === null ? wrong(text) : undefined}
      onChange={(event) => {
        setText(event.target.value);
        setLeft(false);
        onText(event.target.value);
      }}
      onBlur={() => {
        setLeft(true);
        setText(tidy(text) ?? text);
      }}
    />
  );
}
