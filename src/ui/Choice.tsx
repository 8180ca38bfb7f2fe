import { type ReactNode, useId } from 'react';
import './choice.css';

export interface Option<Value extends string> {
  readonly value: Value;
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly disabled?: boolean;
}

interface Props<Value extends string> {
  readonly legend: ReactNode;
  readonly options: readonly Option<Value>[];
  readonly value: Value | null;
  readonly onChange: (value: Value) => void;
  readonly legendHidden?: boolean;
}

/** One of a few, all laid out. */
export function Choice<Value extends string>({
  legend,
  options,
  value,
  onChange,
  legendHidden = false,
}: Props<Value>) {
  const name = useId();
  return (
    <fieldset className="choice">
      <legend className={legendHidden ? 'visually-hidden' : 'choice-legend'}>{legend}</legend>
      <div className="choice-options">
        {options.map((option) => (
          <label key={option.value} className="choice-option">
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              disabled={option.disabled ?? false}
              onChange={() => onChange(option.value)}
            />
            <span className="choice-text">
              <span>{option.label}</span>
              {option.hint !== undefined && <span className="choice-hint">{option.hint}</span>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}

interface CheckProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly checked: boolean;
  readonly onChange: (checked: boolean) => void;
  readonly disabled?: boolean;
}

/** Yes or no. */
export function Check({ label, hint, checked, onChange, disabled = false }: CheckProps) {
  return (
    <label className="choice-option">
      <input
        type="checkbox"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
      />
      <span className="choice-text">
        <span>{label}</span>
        {hint !== undefined && <span className="choice-hint">{hint}</span>}
      </span>
    </label>
  );
}
