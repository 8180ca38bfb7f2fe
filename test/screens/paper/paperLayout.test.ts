import fc from 'fast-check';
import { expect, it } from 'vitest';
import type { VisitPlan } from '../../../src/model/visitPlan.ts';
import { layOutSchedule } from '../../../src/schedule/layOut.ts';
import {
  cell,
  columnHead,
  hasRounds,
  legendEntry,
  legendEntryHeight,
  type PaperForm,
  type PaperPage,
  type PaperSheet,
  type PaperSize,
  paperLayout,
  papers,
  roundHead,
  rowHeight,
} from '../../../src/screens/paper/paperLayout.ts';
import { shortVisit } from '../../browser/support/shortVisit.ts';

const visit = (
  children: number,
  rounds: number,
  phases: string[],
  more: Parameters<typeof shortVisit>[0]['protocol'] = {},
) =>
  shortVisit({
    key: 'layout',
    children,
    phases,
    protocol: { intervalMs: 15_000, observeMs: 15_000, partLength: { kind: 'rounds', rounds }, ...more },
  });

const waiting = (n: number) =>
  Array.from({ length: n }, (_, k) => ({ id: `r${k}`, pseudonym: `Heron-${k}`, stratum: null }));

const intervalsOf = (plan: VisitPlan) =>
  layOutSchedule(
    plan.schedule,
    plan.children.map(({ id }) => id),
  );

const numbersOf = ({ pages }: PaperSheet): number[] =>
  pages.flatMap(({ columns, bands }) => [
    ...columns.flat().flatMap((item) => (item.kind === 'row' ? item.line.number : [])),
    ...bands.flatMap((band) => band.rows.flatMap(({ cells }) => cells.flatMap((one) => one?.number ?? []))),
  ]);

/** Millimetres that the content of a page takes below its head. */
function heightOf(page: PaperPage): number {
  const column = (items: PaperPage['columns'][number]): number =>
    columnHead + items.reduce((sum, item) => sum + (item.kind === 'part' ? 8 : rowHeight), 0);
  return (
    page.legend.reduce((sum, entry) => sum + legendEntryHeight(entry), 0) +
    Math.max(0, ...page.columns.map(column)) +
    page.bands.reduce((sum, band) => sum + roundHead + band.rows.length * cell.height, 0)
  );
}

it('puts every interval of any schedule on the sheets once, in both forms, and no page overflows', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 1, max: 26 }),
      fc.integer({ min: 1, max: 40 }),
      fc.integer({ min: 1, max: 3 }),
      fc.constantFrom<PaperSize>('A4', 'Letter'),
      fc.constantFrom<PaperForm>('rows', 'rounds'),
      fc.integer({ min: 1, max: 14 }),
      fc.array(fc.string({ maxLength: 900 }), { maxLength: 9 }),
      fc.integer({ min: 0, max: 30 }),
      (children, rounds, parts, size, form, boxesPerRow, definitions, reserves) => {
        const bare = visit(children, rounds, ['before', 'after', 'later'].slice(0, parts), {
          reservesStepIn: true,
        });
        const plan = reserves === 0 ? bare : { ...bare, reserves: waiting(reserves) };
        if (form === 'rounds' && !hasRounds(plan, size)) return;
        const legend = definitions.map((text, k) => legendEntry(k + 1, 'off-task, by oneself', text));
        const sheet = paperLayout(plan, { size, form, legend, boxesPerRow });
        const numbers = numbersOf(sheet);
        expect([...numbers].sort((a, b) => a - b)).toEqual(intervalsOf(plan).map(({ number }) => number));
        if (form === 'rows') expect(numbers).toEqual([...numbers].sort((a, b) => a - b));
        expect(sheet.pages.flatMap((page) => page.legend)).toEqual(legend);
        for (const page of sheet.pages)
          expect(heightOf(page) + (page.first ? sheet.headHeight : 17)).toBeLessThanOrEqual(
            papers[size].height,
          );
        expect(sheet.columnWidth).toBeLessThanOrEqual(papers[size].width);
      },
    ),
    { numRuns: 150 },
  );
});

it('never leaves a heading of a part alone at the end of a column', () => {
  fc.assert(
    fc.property(fc.integer({ min: 2, max: 9 }), fc.integer({ min: 1, max: 30 }), (children, rounds) => {
      const plan = visit(children, rounds, ['before', 'after']);
      const sheet = paperLayout(plan, { size: 'A4', form: 'rows', legend: [], boxesPerRow: 2 });
      const ends = sheet.pages.flatMap(({ columns }) => columns.map((items) => items.at(-1)?.kind));
      expect(ends).not.toContain('part');
    }),
    { numRuns: 60 },
  );
});

it('offers the round sheet only where a round is a column', () => {
  const may = (...wish: Parameters<typeof visit>) => hasRounds(visit(...wish), 'A4');
  expect(may(6, 10, ['before'])).toBe(true);
  expect(may(6, 10, ['before'], { method: 'partial' })).toBe(false);
  expect(may(6, 10, ['before'], { rotation: { kind: 'block', intervals: 4 } })).toBe(false);
  expect(may(30, 2, ['before'])).toBe(false);
  const plan = visit(3, 1, ['before']);
  expect(hasRounds({ ...plan, schedule: { ...plan.schedule, turns: [[2, 0, 1]] } }, 'A4')).toBe(false);
});

it('gives each part of a duration a page, with lines enough', () => {
  const plan = visit(1, 1, ['before', 'after'], {
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 15 },
  });
  const { pages } = paperLayout(plan, { size: 'A4', form: 'rows', legend: [], boxesPerRow: 3 });
  const parts = pages.map(({ columns }) =>
    columns.flat().flatMap((item) => (item.kind === 'part' ? item.part : [])),
  );
  expect(parts.flat()).toEqual([0, 1]);
  expect(parts.every((own) => own.length <= 1)).toBe(true);
  const lines = pages.flatMap(({ columns }) => columns.flat()).filter(({ kind }) => kind === 'onset');
  expect(lines.length).toBeGreaterThanOrEqual(80);
});
