import { type KeyboardEvent, type ReactNode, useEffect, useId, useRef } from 'react';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';

interface Props {
  readonly title: ReactNode;
  readonly children: ReactNode;
  readonly actions?: ReactNode;
  readonly closeLabel?: string;
  readonly onClose: () => void;
}

/**
 * Stands beside the seating plan, below it on upright glass. It is no modal dialog: prompts, the child to look at and
 * the targets at both edges go on while it is open.
 */
export function Panel({ title, children, actions, closeLabel, onClose }: Props) {
  const { common } = useCoreWords();
  const heading = useRef<HTMLHeadingElement>(null);
  const id = useId();
  useEffect(() => {
    const before = document.activeElement;
    heading.current?.focus({ preventScroll: true });
    return () => {
      if (before instanceof HTMLElement && before.isConnected) before.focus({ preventScroll: true });
    };
  }, []);
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'Escape') onClose();
  };
  return (
    <section className="panel" role="dialog" aria-labelledby={id} onKeyDown={onKeyDown}>
      <h2 id={id} ref={heading} tabIndex={-1}>
        {title}
      </h2>
      <div className="panel-body">{children}</div>
      <div className="panel-actions">
        <Button onClick={onClose}>{closeLabel ?? common.cancel}</Button>
        {actions}
      </div>
    </section>
  );
}
