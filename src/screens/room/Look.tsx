import type { ReactNode } from 'react';

interface Props {
  readonly lead: ReactNode;
  readonly then: ReactNode;
  /** The largest words on the glass. */
  readonly children: ReactNode;
}

/** Three lines that never change their places. */
export function Look({ lead, then, children }: Props) {
  return (
    <div className="look">
      <p className="look-lead">{lead}</p>
      <h1 className="look-name">{children}</h1>
      <div className="look-then">{then}</div>
    </div>
  );
}
