import { expect, test } from 'vitest';
import { ChangeForest, type ForestGroup } from '../../src/charts/ChangeForest.tsx';
import { paperPalette } from '../../src/charts/palette.ts';
import { drawn } from './drawn.ts';

const row = (label: string, estimate: number, lower: number | null, upper: number | null) => ({
  label,
  estimate,
  lower,
  upper,
  figures: lower === null ? `+${estimate}` : `+${estimate} (${lower} to ${upper})`,
});

const groups: ForestGroup[] = [
  {
    name: 'break',
    rows: [row('Otter', 13.8, -1, 28.6), row('Heron', 9.1, 1.4, 17)],
    pooled: { ...row('both classes', 11, 4.2, 17.8), predictionLower: -3, predictionUpper: 25 },
  },
  {
    name: 'no break',
    rows: [row('Lark', 2.4, -5, 9.8), row('Newt', -1.5, null, null)],
    pooled: null,
  },
];

const props = {
  palette: paperPalette,
  label: 'Change of each class in points',
  groups,
  tick: (n: number) => (n > 0 ? `+${n}` : String(n).replace('-', '−')),
  axis: 'change in points',
};

test('keeps the picture', async () => {
  await expect(drawn(<ChangeForest {...props} width={640} />)).toMatchFileSnapshot(
    'pictures/changeForest.svg',
  );
});

test('keeps the picture on a phone: figures under the lines', async () => {
  await expect(drawn(<ChangeForest {...props} width={326} />)).toMatchFileSnapshot(
    'pictures/changeForestNarrow.svg',
  );
});

test('zero is on the axis also when all changes lie to one side', () => {
  const far: ForestGroup[] = [{ name: null, rows: [row('Otter', 30, 25, 35)], pooled: null }];
  expect(drawn(<ChangeForest {...props} groups={far} width={640} />)).toContain(
    '>\n0</text>'.replace('\n', ''),
  );
});

test('a class without an interval keeps its square and gets no line', () => {
  const only: ForestGroup[] = [{ name: null, rows: [row('Newt', -1.5, null, null)], pooled: null }];
  const svg = drawn(<ChangeForest {...props} groups={only} width={640} />);
  expect(svg.match(/<rect/g)).toHaveLength(1);
  expect(svg.match(/<line/g)).toHaveLength(1);
});
