import type { ReactNode } from 'react';
import './pageHead.css';

interface Props {
  /** What the page is about, small, above. */
  readonly about?: ReactNode;
  /** The sentence that is the page. */
  readonly children: ReactNode;
  /** What to know before believing it. */
  readonly note?: ReactNode;
}

/** Head of a page: one small line, one sentence, one line of what to know. The heading takes focus on arrival. */
export function PageHead({ about, children, note }: Props) {
  return (
    <header className="page-head">
      {about !== undefined && <p className="page-about">{about}</p>}
      <h1 tabIndex={-1}>{children}</h1>
      {note !== undefined && <p className="page-note">{note}</p>}
    </header>
  );
}
