import { type ReactNode, useEffect, useId, useRef } from 'react';
import './dialog.css';

interface Props {
  readonly title: ReactNode;
  readonly children: ReactNode;
  /** Buttons, the safe one first. */
  readonly actions: ReactNode;
  readonly onClose: () => void;
}

/** The platform's own modal dialog: it traps focus, closes on Escape and gives focus back. Mounted = open. */
export function Dialog({ title, children, actions, onClose }: Props) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (dialog !== null && !dialog.open) dialog.showModal();
  }, []);
  return (
    <dialog ref={ref} className="dialog" aria-labelledby={titleId} onClose={onClose}>
      <h2 id={titleId}>{title}</h2>
      <div className="dialog-body">{children}</div>
      <div className="dialog-actions">{actions}</div>
    </dialog>
  );
}
