import {
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
  useId,
} from 'react';
import './field.css';

interface Common {
  readonly label: ReactNode;
  /** One line that helps before anything went wrong. */
  readonly hint?: ReactNode;
  /** One sentence: what was found and what to do. */
  readonly problem?: ReactNode;
}

function Frame({
  label,
  hint,
  problem,
  id,
  children,
}: Common & { readonly id: string; readonly children: ReactNode }) {
  return (
    <div className={problem ? 'field field-wrong' : 'field'}>
      <label className="field-label" htmlFor={id}>
        {label}
      </label>
      {children}
      {hint !== undefined && (
        <p className="field-hint" id={`${id}-hint`}>
          {hint}
        </p>
      )}
      {problem ? (
        <p className="field-problem" id={`${id}-problem`} role="alert">
          {problem}
        </p>
      ) : null}
    </div>
  );
}

const described = (
  id: string,
  hint: ReactNode,
  problem: ReactNode,
): { 'aria-describedby'?: string; 'aria-invalid'?: true } => {
  const ids = [hint !== undefined ? `${id}-hint` : '', problem ? `${id}-problem` : '']
    .filter((s) => s !== '')
    .join(' ');
  return {
    ...(ids === '' ? {} : { 'aria-describedby': ids }),
    ...(problem ? { 'aria-invalid': true as const } : {}),
  };
};

/** A line to type in. */
export function TextField({ label, hint, problem, ...rest }: Common & InputHTMLAttributes<HTMLInputElement>) {
  const id = useId();
  return (
    <Frame label={label} hint={hint} problem={problem} id={id}>
      <input id={id} className="field-input" autoComplete="off" {...described(id, hint, problem)} {...rest} />
    </Frame>
  );
}

/** Several lines to type in or paste. */
export function TextArea({
  label,
  hint,
  problem,
  ...rest
}: Common & TextareaHTMLAttributes<HTMLTextAreaElement>) {
  const id = useId();
  return (
    <Frame label={label} hint={hint} problem={problem} id={id}>
      <textarea id={id} className="field-input field-area" {...described(id, hint, problem)} {...rest} />
    </Frame>
  );
}

/** One of many, when there are too many to lay out. */
export function SelectField({
  label,
  hint,
  problem,
  children,
  ...rest
}: Common & SelectHTMLAttributes<HTMLSelectElement>) {
  const id = useId();
  return (
    <Frame label={label} hint={hint} problem={problem} id={id}>
      <select id={id} className="field-input" {...described(id, hint, problem)} {...rest}>
        {children}
      </select>
    </Frame>
  );
}
