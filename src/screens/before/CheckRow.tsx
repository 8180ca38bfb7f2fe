import type { ReactNode } from 'react';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { useWords } from '../services.ts';
import './checks.css';

export type CheckState = 'ready' | 'hold' | 'unknown';

interface Props {
  readonly name: ReactNode;
  readonly state: CheckState;
  readonly children: ReactNode;
  readonly actions?: ReactNode;
}

/** One thing that could spoil the visit: told by a shape, a word for those who do not see it, and a sentence. */
export function CheckRow({ name, state, children, actions }: Props) {
  const words = useWords();
  const sign = { ready: <Tick />, hold: <Hold />, unknown: <Ring /> }[state];
  return (
    <li className="check">
      <span className="check-sign">
        {sign}
        <span className="visually-hidden">{words.before[state]}</span>
      </span>
      <strong className="check-name">{name}</strong>
      <div className="check-text">{children}</div>
      {actions !== undefined && <div className="check-actions">{actions}</div>}
    </li>
  );
}
