import { expect, test } from 'vitest';
import { Composition } from '../../src/charts/Composition.tsx';
import { paperPalette } from '../../src/charts/palette.ts';
import { drawn } from './drawn.ts';

const props = { palette: paperPalette, label: 'What off-task was made of' };
const widths = (svg: string): number[] =>
  [...svg.matchAll(/<rect x="[\d.]+" y="1" width="([\d.]+)"/g)].map((m) => Number(m[1]));

test('keeps the picture', async () => {
  const shares = [
    { label: 'off-task, by oneself: 14 of 21', size: 14 },
    { label: 'off-task, with others: 6 of 21', size: 6 },
    { label: 'out of seat: 1 of 21', size: 1 },
  ];
  await expect(drawn(<Composition {...props} width={700} shares={shares} />)).toMatchFileSnapshot(
    'pictures/composition.svg',
  );
});

test('parts are as long as their share and leave nothing over', () => {
  const shares = [
    { label: 'a', size: 3 },
    { label: 'b', size: 1 },
  ];
  expect(widths(drawn(<Composition {...props} width={402} shares={shares} />))).toEqual([300, 100]);
});

test('a kind that did not occur has no part, and nothing at all gives no bar', () => {
  const none = [
    { label: 'a', size: 0 },
    { label: 'b', size: 0 },
  ];
  expect(widths(drawn(<Composition {...props} width={402} shares={none} />))).toEqual([]);
});
