import type { ButtonHTMLAttributes } from 'react';
import './button.css';

interface Props extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** `plain` for most; `main` once a page, for what the page is for; `quiet` where a border would shout; `round` none. */
  readonly look?: 'plain' | 'main' | 'quiet';
}

/** A button says what happens. */
export function Button({ look = 'plain', className = '', type = 'button', ...rest }: Props) {
  return <button type={type} className={`button button-${look} ${className}`} {...rest} />;
}
