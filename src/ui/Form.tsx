import type { ComponentProps } from 'react';

interface Props extends Omit<ComponentProps<'form'>, 'onSubmit'> {
  /** What Enter and the submit button do. */
  readonly onSubmit: () => unknown;
}

/** Fields that are sent off together, by Enter as well; the page stays where it is. */
export function Form({ onSubmit, className = 'stack-tight', ...rest }: Props) {
  return (
    <form
      className={className}
      onSubmit={(event) => {
        event.preventDefault();
        onSubmit();
      }}
      {...rest}
    />
  );
}
