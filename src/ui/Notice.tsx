import type { ReactNode } from 'react';
import { Hold, Tick } from './Sign.tsx';
import './notice.css';

interface Props {
  readonly kind: 'hold' | 'done';
  readonly children: ReactNode;
  readonly actions?: ReactNode;
}

/** One sentence that matters now, said to screen readers as well. */
export function Notice({ kind, children, actions }: Props) {
  return (
    <div className="notice" role={kind === 'hold' ? 'alert' : 'status'}>
      {kind === 'hold' ? <Hold /> : <Tick />}
      <div className="grow">{children}</div>
      {actions}
    </div>
  );
}
