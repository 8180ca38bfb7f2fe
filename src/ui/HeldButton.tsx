import { type ComponentProps, useId } from 'react';
import { Button } from './Button.tsx';

interface Props extends ComponentProps<typeof Button> {
  /** Why it cannot be used yet, in one sentence; null when it can. */
  readonly why: string | null;
  /** Leads to what is missing. */
  readonly onWhy?: () => void;
}

/** A button that says beside it why it cannot be used, and leads to what is missing when it is touched all the same. */
export function HeldButton({ why, onWhy, onClick, ...rest }: Props) {
  const id = useId();
  if (why === null) return <Button {...rest} {...(onClick === undefined ? {} : { onClick })} />;
  return (
    <>
      <Button {...rest} type="button" aria-disabled="true" aria-describedby={id} onClick={() => onWhy?.()} />
      <span id={id} className="second small">
        {why}
      </span>
    </>
  );
}
