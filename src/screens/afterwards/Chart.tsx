import { type ReactNode, useLayoutEffect, useRef, useState } from 'react';

/** Gives a chart the width that is there, so that its letters keep their size on every glass. */
export function Chart({ children }: { readonly children: (width: number) => ReactNode }) {
  const ref = useRef<HTMLElement>(null);
  const [width, setWidth] = useState(0);
  useLayoutEffect(() => {
    const frame = ref.current;
    if (frame === null) return;
    const measure = (): void => setWidth(Math.floor(frame.clientWidth));
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(frame);
    return () => observer.disconnect();
  }, []);
  return (
    <figure ref={ref} className="chart">
      {children(width === 0 ? 960 : width)}
    </figure>
  );
}
