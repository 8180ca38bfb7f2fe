import type { ReactElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';

/** A chart as the file it would be saved as, one element a line so that a change can be read. */
export function drawn(chart: ReactElement): string {
  return `${renderToStaticMarkup(chart).replaceAll('><', '>\n<')}\n`;
}
