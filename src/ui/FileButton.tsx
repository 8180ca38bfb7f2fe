import { type ReactNode, useRef } from 'react';
import { Button } from './Button.tsx';

interface Props {
  readonly accept: string;
  readonly multiple?: boolean;
  readonly children: ReactNode;
  readonly onFiles: (files: readonly File[]) => void;
}

/** A button that asks for files. */
export function FileButton({ accept, multiple = false, children, onFiles }: Props) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <Button onClick={() => input.current?.click()}>{children}</Button>
      <input
        ref={input}
        type="file"
        hidden
        accept={accept}
        multiple={multiple}
        onChange={(event) => {
          onFiles([...(event.target.files ?? [])]);
          // The same file may be chosen again after a correction.
          event.target.value = '';
        }}
      />
    </>
  );
}
