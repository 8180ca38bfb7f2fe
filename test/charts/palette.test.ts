import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { paperPalette, screenPalette } from '../../src/charts/palette.ts';

const css = readFileSync(new URL('../../src/ui/tokens.css', import.meta.url), 'utf8');
const light = css.slice(0, css.indexOf('data-theme="dim"'));

test.each(Object.entries(paperPalette).filter(([name]) => name !== 'font'))(
  'the paper palette has the light token of %s',
  (name, colour) => {
    const token = screenPalette[name as keyof typeof screenPalette].replace(/var\((.*)\)/, '$1');
    expect(light).toContain(`${token}: ${colour};`);
  },
);
