import { mergeBundles } from '../exchange/mergeBundles.ts';
import { readIncoming } from '../exchange/readIncoming.ts';
import type { Bundle, IncomingFile, Merged, ReadOptions, ReadOutcome } from '../exchange/types.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { CodeSet } from '../model/codeSet.ts';

/** All files read and brought together. */
export interface Gathered {
  readonly outcomes: readonly ReadOutcome[];
  readonly merged: Merged;
  /** Session id → the files that hold it, in code-point order. */
  readonly filesOf: ReadonlyMap<string, readonly string[]>;
}

/**
 * Reads the files and merges what could be read. Tables beside the files of one study are read as its tables: its
 * codes, classes and observers are recognised by name. The order of the files decides nothing.
 */
export async function gather(files: readonly IncomingFile[], options: ReadOptions): Promise<Gathered> {
  const sorted = [...files].sort((a, b) => byCodePoint(a.name, b.name));
  const outcomes: ReadOutcome[] = [];
  for (const file of sorted) outcomes.push(await readIncoming(file, options));
  const study = studyOf(outcomes.flatMap((one) => (one.ok && one.form === 'study' ? [one.bundle] : [])));
  if (study !== null) {
    for (const [i, outcome] of outcomes.entries()) {
      const file = sorted[i];
      const table = outcome.ok ? outcome.form === 'table' : outcome.askRoles !== undefined;
      if (table && file !== undefined) outcomes[i] = await readIncoming(file, { ...options, study });
    }
  }
  const taken = outcomes.flatMap((one) => (one.ok ? [one] : []));
  const filesOf = new Map<string, string[]>();
  for (const { file, bundle } of taken) {
    for (const { header } of bundle.sessions)
      filesOf.set(header.id, [...(filesOf.get(header.id) ?? []), file]);
  }
  return { outcomes, merged: mergeBundles(taken.map(({ bundle }) => bundle)), filesOf };
}

function studyOf(bundles: readonly Bundle[]): NonNullable<ReadOptions['study']> | null {
  const ids = [...new Set(bundles.flatMap(({ study }) => study?.id ?? []))];
  const [id] = ids;
  if (id === undefined || ids.length > 1) return null;
  const sets = new Map<string, CodeSet>();
  for (const { protocols } of bundles) {
    for (const { codeSet } of protocols) sets.set(`${codeSet.name} ${JSON.stringify(codeSet)}`, codeSet);
  }
  return {
    id,
    codeSets: [...sets].sort(([a], [b]) => byCodePoint(a, b)).map(([, codeSet]) => codeSet),
    classes: bundles.flatMap(({ classes }) => classes),
    observers: bundles.flatMap(({ observers }) => observers),
  };
}
