// @vitest-environment happy-dom
import { render, screen } from '@testing-library/react';
import { describe, expect, test } from 'vitest';
import { paperPalette } from '../../src/charts/palette.ts';
import { RoundSheet, type SheetPart } from '../../src/charts/RoundSheet.tsx';
import { drawn } from './drawn.ts';
import { alonePart, cells, compared, comparedLegend, comparedParts, legend, rows } from './exampleSheet.ts';

const base = { palette: paperPalette, label: 'Round sheet of class Otter', rows, legend };

describe('RoundSheet', () => {
  test('keeps the picture of one observer', async () => {
    await expect(drawn(<RoundSheet {...base} width={1060} parts={alonePart} />)).toMatchFileSnapshot(
      'pictures/roundSheet.svg',
    );
  });

  test('keeps the picture of two observers', async () => {
    const chart = <RoundSheet {...base} width={1060} parts={comparedParts} legend={comparedLegend} />;
    await expect(drawn(chart)).toMatchFileSnapshot('pictures/roundSheetOfTwo.svg');
  });

  test('keeps the picture on a phone: parts under one another', async () => {
    await expect(drawn(<RoundSheet {...base} width={326} parts={alonePart} />)).toMatchFileSnapshot(
      'pictures/roundSheetNarrow.svg',
    );
  });

  test('keeps the picture of partial intervals: several codes as bands, nothing as an outline', async () => {
    const sets: SheetPart[] = [
      {
        name: 'before',
        cells: [
          [
            { marks: [{ kind: 'on' }, { kind: 'off', nth: 1 }] },
            { marks: [] },
            {
              marks: [
                { kind: 'off', nth: 1 },
                { kind: 'off', nth: 2 },
              ],
            },
            { marks: [{ kind: 'on' }, { kind: 'off', nth: 2 }], second: [{ kind: 'on' }], differs: true },
            { marks: [{ kind: 'missing' }] },
          ],
        ],
      },
    ];
    await expect(
      drawn(<RoundSheet {...base} width={600} rows={['Heron-04']} parts={sets} />),
    ).toMatchFileSnapshot('pictures/roundSheetOfSets.svg');
  });

  test('is one picture with a name', () => {
    render(<RoundSheet {...base} width={800} parts={alonePart} />);
    expect(screen.getByRole('img', { name: 'Round sheet of class Otter' })).toBeTruthy();
  });

  test('frames exactly the cells in which the two differ', () => {
    const part = { name: 'before', cells: [compared('++ao+', '+aao+'), compared('ab+++', 'ab++o')] };
    const svg = drawn(<RoundSheet {...base} width={800} rows={['A', 'B']} parts={[part]} legend={[]} />);
    expect(svg.match(/stroke-width="2.4"/g)).toHaveLength(1);
    // A look that either of them missed is a ring, not a difference.
    expect(svg.match(/<circle/g)).toHaveLength(2);
  });

  test('keeps a long part readable by breaking it into bands', () => {
    const long = { name: 'before', cells: [cells('+'.repeat(120))] };
    const svg = drawn(<RoundSheet {...base} width={600} rows={['Otter-02']} parts={[long]} legend={[]} />);
    const drawnCells = [...svg.matchAll(/<rect x="[\d.]+" y="[\d.]+" width="([\d.]+)"/g)].map((m) =>
      Number(m[1]),
    );
    expect(drawnCells).toHaveLength(120);
    expect(Math.min(...drawnCells)).toBeGreaterThanOrEqual(13);
  });

  test('labels stand on the middle of their row', () => {
    const svg = drawn(<RoundSheet {...base} width={1060} parts={alonePart} legend={[]} />);
    const label = /<text x="0" y="([\d.]+)"[^>]*>\s*Otter-02/.exec(svg);
    const cell = /<rect x="0" y="([\d.]+)" width="([\d.]+)"/.exec(svg);
    expect(Number(label?.[1])).toBeCloseTo(Number(cell?.[1]) + Number(cell?.[2]) / 2, 6);
  });
});
