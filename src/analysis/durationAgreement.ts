import { cohenKappa, confusionTable } from '../stats/index.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';

/** How long each observer saw one code, in seconds, and the smaller of the two as a percentage of the larger. */
export interface CodeDurations {
  readonly code: string;
  readonly a: number;
  readonly b: number;
  /** 0–100; null where neither saw it. */
  readonly ratio: number | null;
}

/** Two duration records of one child side by side. */
export interface DurationAgreement {
  /** Whole seconds in which both watched. */
  readonly compared: number;
  /** Whole seconds in which only one did, or none. */
  readonly excluded: number;
  /** Share of the compared seconds in which both had the same code, 0–100; null of none. */
  readonly percentAgreement: number | null;
  /** Of the same seconds; null where undefined. It has no standard error: neighbouring seconds are no separate looks. */
  readonly kappa: number | null;
  readonly codes: readonly CodeDurations[];
}

/**
 * Compares two duration records second by second (what holds in the middle of each second from the beginning of the
 * part) and by each code's total duration. Totals agree although the moments may not, so they flatter: both are given.
 * null unless both are durations of the same child with known times.
 * Source: exact agreement by seconds and total duration are two of the algorithms that Mudford et al. 2009 compare.
 */
export function durationAgreement(a: SessionRecord, b: SessionRecord): DurationAgreement | null {
  if (a.method !== 'duration' || b.method !== 'duration') return null;
  const [first, second] = [lineOf(a), lineOf(b)];
  if (first === null || second === null || childOf(a) !== childOf(b)) return null;
  const until = Math.ceil(Math.max(first.at(-1)?.to ?? 0, second.at(-1)?.to ?? 0));
  const from = Math.floor(Math.min(first[0]?.from ?? 0, second[0]?.from ?? 0));
  const pairs: [string, string][] = [];
  for (let s = from; s < until; s++) {
    const [x, y] = [wordAt(first, s + 0.5), wordAt(second, s + 0.5)];
    if (x !== null && y !== null) pairs.push([x, y]);
  }
  const words = [...new Set(pairs.flat())];
  const same = pairs.filter(([x, y]) => x === y).length;
  const kappa = cohenKappa(
    confusionTable(
      pairs.map(([x]) => x),
      pairs.map(([, y]) => y),
      words,
    ),
  ).kappa;
  const labels = [...new Set([...first, ...second].flatMap(({ word }) => (word ? [word] : [])))];
  return {
    compared: pairs.length,
    excluded: until - from - pairs.length,
    percentAgreement: pairs.length === 0 ? null : (100 * same) / pairs.length,
    kappa: Number.isNaN(kappa) ? null : kappa,
    codes: labels.map((code) => durationsOf(code, first, second)),
  };
}

/** A stretch in seconds from the beginning of its part; `word` is what was scored ("" = none of the codes), null = nothing. */
interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly word: string | null;
}

function lineOf(record: SessionRecord): Stretch[] | null {
  const stretches = record.looks.map((look) => stretchOf(look, record));
  if (stretches.some(({ from, to }) => Number.isNaN(from) || Number.isNaN(to))) return null;
  return stretches.sort((x, y) => x.from - y.from);
}

function stretchOf(look: Look, { laid, state }: SessionRecord): Stretch {
  // The tablets' session times run from each one's own beginning of the part.
  const origin = laid ? (state.origins[look.part] ?? Number.NaN) : 0;
  return {
    from: (look.openAt - origin) / 1000,
    to: (look.closeAt - origin) / 1000,
    word: look.labels === null ? null : [...look.labels].sort().join(' | '),
  };
}

const childOf = ({ looks, children }: SessionRecord): string | null => {
  const id = looks[0]?.child ?? null;
  return children.find((child) => child.id === id)?.label ?? id;
};

function wordAt(line: readonly Stretch[], at: number): string | null {
  return line.find(({ from, to }) => from <= at && at < to)?.word ?? null;
}

function durationsOf(code: string, first: readonly Stretch[], second: readonly Stretch[]): CodeDurations {
  const total = (line: readonly Stretch[]): number =>
    line.reduce((sum, { from, to, word }) => (word === code ? sum + to - from : sum), 0);
  const [a, b] = [total(first), total(second)];
  const larger = Math.max(a, b);
  return { code, a, b, ratio: larger === 0 ? null : (100 * Math.min(a, b)) / larger };
}
