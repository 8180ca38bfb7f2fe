import { TextField } from '../../../ui/Field.tsx';
import { useWords } from '../../services.ts';

/** A child as it is typed; an empty stratum is none. */
export interface TypedChild {
  readonly pseudonym: string;
  readonly stratum: string;
}

/** The same as it is kept. */
export const childOf = ({ pseudonym, stratum }: TypedChild) => ({
  pseudonym,
  stratum: stratum.trim() === '' ? null : stratum,
});

interface Props {
  readonly value: TypedChild;
  readonly onChange: (value: TypedChild) => void;
  /** True where somebody has just asked to change the child. */
  readonly autoFocus?: boolean;
}

/** What is asked of a child: a pseudonym, and the stratum that the draw keeps to. */
export function ChildFields({ value, onChange, autoFocus = false }: Props) {
  const { study } = useWords();
  return (
    <>
      <TextField
        label={study.pseudonym}
        hint={study.pseudonymHint}
        maxLength={200}
        autoFocus={autoFocus}
        value={value.pseudonym}
        onChange={(event) => onChange({ ...value, pseudonym: event.target.value })}
      />
      <TextField
        label={study.stratum}
        hint={study.stratumHint}
        maxLength={200}
        value={value.stratum}
        onChange={(event) => onChange({ ...value, stratum: event.target.value })}
      />
    </>
  );
}
