import { byCodePoint } from '../kernel/compare.ts';
import { idFromContent } from '../kernel/idFromContent.ts';
import { type Code, type CodeRole, type CodeSet, labelsOfTable } from '../model/codeSet.ts';
import type { ReadOptions } from './types.ts';

const plain = (label: string): string => label.trim().toLowerCase();

/**
 * How a label counts: as somebody said, else as the study's code sets say, else by how it begins ("on-task",
 * "off task", …, or `on`, `off`, `1`, `0`). Null: nobody knows.
 */
export function roleOfLabel(label: string, options: ReadOptions): CodeRole | null {
  const key = plain(label);
  const among = (labels: readonly string[] | undefined): boolean =>
    labels?.some((one) => plain(one) === key) ?? false;
  if (among(options.on)) return 'on-task';
  if (among(options.off)) return 'off-task';
  if (among(options.other)) return 'other';
  for (const { codes } of options.study?.codeSets ?? []) {
    const code = codes.find((one) => plain(one.label) === key);
    if (code !== undefined) return code.role;
  }
  if (key === 'on' || key === '1' || /^on[- ]task/.test(key)) return 'on-task';
  if (key === 'off' || key === '0' || /^off[- ]task/.test(key)) return 'off-task';
  return null;
}

/** The code set of a session from a table, and its codes by label. */
export interface SessionCodes {
  readonly codeSet: CodeSet;
  readonly idOf: ReadonlyMap<string, string>;
}

/**
 * The study's first code set that has all of a session's labels, so that its marks meet those made on a tablet;
 * else a set of just these labels, in code-point order, whose ids are the labels themselves.
 */
export function codesOfSession(labels: ReadonlySet<string>, options: ReadOptions): SessionCodes {
  for (const codeSet of options.study?.codeSets ?? []) {
    const known = new Map(codeSet.codes.map(({ id, label }) => [plain(label), id]));
    if (labels.size === 0 || ![...labels].every((label) => known.has(plain(label)))) continue;
    return { codeSet, idOf: new Map([...labels].map((label) => [label, known.get(plain(label)) ?? label])) };
  }
  // A code set is never empty: a headcount, or a session with nothing but missing intervals, gets these two.
  const used = labels.size > 0 ? [...labels].sort(byCodePoint) : ['off-task', 'on-task'];
  const codes = used.map((label): Code => {
    const id = label.length <= 64 ? label : idFromContent('code', label);
    const role = roleOfLabel(label, options) ?? 'other';
    return { id, label, role, definition: '', examples: '', nonExamples: '' };
  });
  const idOf = new Map(codes.map(({ id, label }) => [label, id]));
  return { codeSet: { name: labelsOfTable, codes }, idOf };
}
