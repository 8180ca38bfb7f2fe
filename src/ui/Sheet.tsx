import type { ReactNode } from 'react';
import './sheet.css';

interface Props {
  readonly title?: ReactNode;
  readonly children: ReactNode;
  readonly className?: string;
  /** Without inner margins, for rows that reach the edges. */
  readonly flush?: boolean;
}

/** One sheet of paper, one thought. Sheets never lie in sheets. */
export function Sheet({ title, children, className = '', flush = false }: Props) {
  return (
    <section className={`sheet ${flush ? 'sheet-flush' : ''} ${className}`}>
      {title !== undefined && <h2 className="sheet-title">{title}</h2>}
      {children}
    </section>
  );
}
