import type { VisitPlan } from '../../model/visitPlan.ts';
import { layOutSchedule, type ScheduledInterval } from '../../schedule/layOut.ts';
import { intervalsInRound } from '../../schedule/turns.ts';
import { hasStandIns } from '../../tasks/index.ts';

export type PaperSize = 'A4' | 'Letter';
/** `rows`: one row an interval; `rounds`: one row a child, one column a round. */
export type PaperForm = 'rows' | 'rounds';

/** All lengths in millimetres. A page is a little shorter than its paper leaves, so that no printer makes two of it. */
export const papers: Readonly<Record<PaperSize, { readonly width: number; readonly height: number }>> = {
  A4: { width: 186, height: 272 },
  Letter: { width: 191, height: 254 },
};

const foot = 2;
const headLater = 17;
const headFirst = 46;
const headPart = 10;
const gutter = 6;
export const rowHeight = 7.2;
const partHeight = 8;
export const columnHead = 27;
export const roundHead = 11;
export const cell = { width: 12, height: 10.4 };
export const childWidth = 28;
/** A box to tick or to write in. */
export const boxWidth = 8;
/** More codes than these do not fit side by side: then their numbers are written into one box. */
const mostBoxes = 10;
/** The other columns of a row; `child` is the least that a pseudonym gets. */
export const widths = { number: 9, time: 13, onset: 26, child: 23, count: 13, write: 18, reason: 11 };

export type PaperItem =
  | { readonly kind: 'part'; readonly part: number; readonly phase: string; readonly line: ScheduledInterval }
  | { readonly kind: 'row'; readonly line: ScheduledInterval; readonly newRound: boolean }
  | { readonly kind: 'onset'; readonly number: number };

/** Some rounds of one part: `rows` by child, `null` where a part ends within a round. */
export interface Band {
  readonly part: number;
  readonly phase: string;
  readonly rounds: readonly { readonly round: number; readonly startMs: number }[];
  readonly rows: readonly { readonly child: string; readonly cells: readonly (ScheduledInterval | null)[] }[];
}

export interface PaperPage {
  readonly number: number;
  readonly first: boolean;
  /** Which legend entries are on it. */
  readonly legend: readonly LegendEntry[];
  readonly columns: readonly (readonly PaperItem[])[];
  readonly bands: readonly Band[];
}

export interface LegendEntry {
  readonly number: number | null;
  readonly label: string;
  readonly text: string;
  readonly lines: number;
}

export interface PaperSheet {
  readonly form: PaperForm;
  readonly pages: readonly PaperPage[];
  readonly headHeight: number;
  /** Where it is written who stepped in for whom, as part of the head: how many lines, how high the text over them and all of it; null where nobody can. */
  readonly standIns: { readonly lines: number; readonly text: number; readonly height: number } | null;
  /** Tick boxes for the codes; false = one box for their numbers. */
  readonly boxes: boolean;
  readonly columnWidth: number;
  /** Page that the legend begins on. */
  readonly legendPage: number;
}

const lineHeight = 4.1;
/** Characters that surely fit on one line: of a label, of a definition, of the whole width. */
const fits = { label: 24, text: 84, across: 104 };
const mostLines = 14;

/** How high a legend entry is, estimated from its length so that a page can be filled without measuring it. */
export function legendEntry(number: number | null, label: string, text: string): LegendEntry {
  const linesOf = (content: string, width: number): number =>
    content.split('\n').reduce((sum, piece) => sum + Math.max(1, Math.ceil(piece.length / width)), 0);
  const lines = Math.max(linesOf(label, fits.label), linesOf(text, fits.text));
  return { number, label, text, lines: Math.min(mostLines, lines) };
}

export const legendEntryHeight = ({ lines }: LegendEntry): number => lines * lineHeight + 1.4;
const legendHead = 8;
const legendFoot = 12;

/** True where the children keep one order all through, so that a round is a column. */
export function hasRounds({ schedule, children }: VisitPlan, size: PaperSize): boolean {
  const { method, rotation } = schedule.protocol;
  return (
    method === 'momentary' &&
    (rotation.kind === 'next' || rotation.kind === 'sweep') &&
    schedule.turns === undefined &&
    children.length > 1 &&
    bandHeight(children.length) <= papers[size].height - headLater - foot
  );
}

const bandHeight = (children: number): number => roundHead + children * cell.height + 3;

/** Lays a schedule out on pages: every interval once, in order, no row over the end of a page. */
export function paperLayout(
  plan: VisitPlan,
  {
    size,
    form,
    legend,
    boxesPerRow,
  }: { size: PaperSize; form: PaperForm; legend: readonly LegendEntry[]; boxesPerRow: number },
): PaperSheet {
  const { width, height } = papers[size];
  const { schedule, children } = plan;
  const intervals = layOutSchedule(
    schedule,
    children.map(({ id }) => id),
  );
  const standIns = standInsOf(plan);
  const headHeight = headFirst + headPart * (schedule.phases.length - 1) + (standIns?.height ?? 0);
  const boxes = boxesPerRow <= mostBoxes;
  const duration = schedule.protocol.method === 'duration';
  const fixed =
    widths.number + widths.time + (boxes ? boxesPerRow * boxWidth : widths.write) + boxWidth + widths.reason;
  const withChild = fixed + (duration || schedule.protocol.method === 'headcount' ? 0 : widths.child);
  const across = Math.max(1, Math.min(2, Math.floor((width + gutter) / (withChild + gutter))));
  const columnWidth = Math.min((width - gutter * (across - 1)) / across, withChild + 30);
  const body = form === 'rounds' ? bandsOf(plan, intervals, size) : itemsOf(plan, intervals);
  const legendHeight =
    legendHead + legendFoot + legend.reduce((sum, entry) => sum + legendEntryHeight(entry), 0);
  // A legend that would leave too little of the first page has pages of its own, at the end.
  const inFront = headHeight + legendHeight < height * 0.62;
  const pages: Draft[] = [newPage(true)];
  let left = height - headHeight - foot - (inFront ? legendHeight : 0);
  if (inFront) (pages[0] as Draft).legend = [...legend];
  const turn = (): Draft => {
    const page = newPage(false);
    pages.push(page);
    left = height - headLater - foot;
    return page;
  };
  let page = pages[0] as Draft;
  if (body.kind === 'bands') {
    for (const band of body.bands) {
      const needed = bandHeight(band.rows.length);
      if (needed > left) page = turn();
      page.bands.push(band);
      left -= needed;
    }
  } else {
    let room = left - columnHead;
    page.columns.push([]);
    let filled = false;
    for (const [k, item] of body.items.entries()) {
      if (item.kind === 'part') filled = false;
      if (filled) continue;
      // A heading stays with the first row under it.
      const needed = item.kind === 'part' ? partHeight + rowHeight : rowHeight;
      // A duration has each part on pages of its own.
      const newPart = duration && item.kind === 'part' && k > 0;
      if (needed > room || newPart) {
        const full = page.columns.length >= across && !newPart;
        if (full && item.kind === 'onset' && item.number > onsetsPerPart) {
          filled = true;
          continue;
        }
        if (page.columns.length >= across || newPart) {
          page = turn();
        }
        room = left - columnHead;
        page.columns.push([]);
      }
      (page.columns.at(-1) as PaperItem[]).push(item);
      room -= item.kind === 'part' ? partHeight : rowHeight;
    }
  }
  let legendPage = 1;
  if (!inFront) {
    let rest = 0;
    for (const [k, entry] of legend.entries()) {
      if (k === 0 || legendEntryHeight(entry) > rest) {
        page = turn();
        if (k === 0) legendPage = pages.length;
        rest = left - legendHead - legendFoot;
      }
      page.legend.push(entry);
      rest -= legendEntryHeight(entry);
    }
  }
  return {
    form,
    pages: pages.map((one, k) => ({ ...one, number: k + 1 })),
    headHeight,
    standIns,
    boxes,
    columnWidth,
    legendPage,
  };
}

/** Of the lines for stand-ins: their heads, one line, and what the sentences over them have beside the reserves' names. */
const standInHead = 5;
const standInChars = 190;
const standInLine = 7.2;
const standInGap = 3;

/** An absence for each reserve and one to spare, since a child may leave again. */
function standInsOf(plan: VisitPlan): PaperSheet['standIns'] {
  if (!hasStandIns(plan)) return null;
  const reserves = plan.reserves ?? [];
  const lines = Math.min(4, reserves.length + 1);
  const chars = reserves.reduce((sum, { pseudonym }) => sum + pseudonym.length + 2, standInChars);
  const text = Math.min(mostLines, Math.ceil(chars / fits.across)) * lineHeight + 1;
  return { lines, text, height: text + standInHead + lines * standInLine + standInGap };
}

interface Draft {
  first: boolean;
  legend: LegendEntry[];
  columns: PaperItem[][];
  bands: Band[];
}

const newPage = (first: boolean): Draft => ({ first, legend: [], columns: [], bands: [] });

type Body =
  | { readonly kind: 'items'; readonly items: readonly PaperItem[] }
  | { readonly kind: 'bands'; readonly bands: readonly Band[] };

/** A duration sheet has at least so many lines a part, and more where they fill its last page. */
const onsetsPerPart = 40;
const mostOnsets = 200;

function itemsOf({ schedule, children }: VisitPlan, intervals: readonly ScheduledInterval[]): Body {
  // A line after every row would set nothing apart.
  const rounds = intervalsInRound(schedule.protocol, children.length) > 1;
  const items: PaperItem[] = [];
  let before: ScheduledInterval | null = null;
  for (const line of intervals) {
    const newPart = before === null || line.part !== before.part;
    if (newPart && (schedule.phases.length > 1 || schedule.protocol.method === 'duration'))
      items.push({ kind: 'part', part: line.part, phase: line.phase, line });
    if (schedule.protocol.method === 'duration')
      for (let k = 1; k <= mostOnsets; k++) items.push({ kind: 'onset', number: k });
    else items.push({ kind: 'row', line, newRound: rounds && !newPart && line.round !== before?.round });
    before = line;
  }
  return { kind: 'items', items };
}

function bandsOf(
  { schedule, children }: VisitPlan,
  intervals: readonly ScheduledInterval[],
  size: PaperSize,
): Body {
  const across = Math.floor((papers[size].width - childWidth) / cell.width);
  const bands = schedule.phases.flatMap((phase, part): Band[] => {
    const own = intervals.filter((line) => line.part === part);
    const rounds = [...new Set(own.map(({ round }) => round))];
    const made: Band[] = [];
    for (let k = 0; k < rounds.length; k += across) {
      const some = rounds.slice(k, k + across);
      const at = new Map(own.map((line) => [`${line.round} ${line.child}`, line]));
      made.push({
        part,
        phase,
        rounds: some.map((round) => ({
          round,
          startMs: own.find((line) => line.round === round)?.cueMs ?? 0,
        })),
        rows: children.map(({ id, pseudonym }) => ({
          child: pseudonym,
          cells: some.map((round) => at.get(`${round} ${id}`) ?? null),
        })),
      });
    }
    return made;
  });
  return { kind: 'bands', bands };
}
