import { expect, test } from 'vitest';
import { ChildLines } from '../../src/charts/ChildLines.tsx';
import { paperPalette } from '../../src/charts/palette.ts';
import { drawn } from './drawn.ts';

// The six children of the check data: 70/90, 80/90, 50/70, 88.9/100, 55.6/87.5, 100/90; means 74.1 and 87.9.
const lines = [
  [70, 90],
  [80, 90],
  [50, 70],
  [88.889, 100],
  [55.556, 87.5],
  [100, 90],
].map(([before = 0, after = 0], k) => ({ child: `Otter-0${k + 1}`, before, after }));

const props = {
  palette: paperPalette,
  label: 'Class Otter, each child before and after',
  before: 'before',
  after: 'after',
  lines,
  mean: { before: 74.0741, after: 87.9167 },
  meanLabels: { before: '74 %', after: '88 %', name: 'class' },
};

test('keeps the picture', async () => {
  await expect(drawn(<ChildLines {...props} width={460} />)).toMatchFileSnapshot('pictures/childLines.svg');
});

test('draws one thin line a child and the mean last, on top of them', () => {
  const widths = [
    ...drawn(<ChildLines {...props} width={460} />).matchAll(/<path[^>]*stroke-width="([\d.]+)"/g),
  ];
  expect(widths.map((m) => Number(m[1]))).toEqual([1.6, 1.6, 1.6, 1.6, 1.6, 1.6, 5]);
});

test('without a mean there is no thick line', () => {
  const svg = drawn(<ChildLines {...props} width={460} lines={[]} mean={null} />);
  expect(svg).not.toContain('<path');
});
