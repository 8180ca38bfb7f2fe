import { readIncoming } from '../exchange/readIncoming.ts';
import type { FileForm, FileProblem, IncomingFile, ReadFile, ReadOptions } from '../exchange/types.ts';
import { canonicalJson } from '../kernel/canonicalJson.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import { joinBundles, mergeStates } from './joinBundles.ts';
import type { Deps, StudyBundle } from './ports.ts';
import { bundlesOfTable } from './tableStudies.ts';
import { adoptedBundle } from './visitFiles.ts';

export interface ImportOptions {
  /** Labels of a table that count as on-task, as off-task, as neither. */
  readonly on?: readonly string[];
  readonly off?: readonly string[];
  readonly other?: readonly string[];
  /** The study that takes the sessions of tables; left out: the one study of the same files, else one of their own. */
  readonly study?: string;
}

export interface Counts {
  readonly new: number;
  readonly known: number;
  readonly changed: number;
}

/** What one file would bring. A file with a problem contributes nothing; the others go on. */
export interface FilePreview {
  readonly name: string;
  readonly form: FileForm | null;
  readonly studies: readonly { readonly id: string; readonly name: string; readonly removedHere: boolean }[];
  readonly sessions: Counts;
  readonly classes: Counts;
  readonly observers: Counts;
  readonly protocols: Counts;
  readonly problems: readonly FileProblem[];
  readonly notices: readonly FileProblem[];
  /** Labels that somebody has to call on-task, off-task or neither before the table can be read. */
  readonly askRoles: readonly string[];
}

export interface ImportPreview {
  readonly files: readonly FilePreview[];
  /** What `commitImport` will keep. */
  readonly bundles: readonly StudyBundle[];
}

/** Reads files and says what they would bring; nothing is kept yet. */
export async function importFiles(
  deps: Deps,
  files: readonly IncomingFile[],
  options: ImportOptions = {},
): Promise<Result<ImportPreview>> {
  const { study, ...labels } = options;
  const read = new Map<IncomingFile, Awaited<ReturnType<typeof readIncoming>>>();
  // Study files first: they may tell which study the tables of the same import belong to.
  for (const file of files) read.set(file, await readIncoming(file, labels));
  const home = study ?? onlyStudy([...read.values()].filter((one) => one.ok));
  const state: Incoming = { deps, kept: new Map(), removed: new Map() };
  const order = [...files].sort((a, b) => place(read.get(a)) - place(read.get(b)));
  const previews = new Map<IncomingFile, FilePreview>();
  const bundles: StudyBundle[] = [];
  for (const file of order) {
    let outcome = read.get(file);
    if (home !== undefined && (outcome?.ok !== true || outcome.form === 'table')) {
      const target = await keptState(state, home);
      if (!target.ok) return target;
      if (target.value !== null)
        outcome = await readIncoming(file, { ...labels, study: forTables(target.value) });
    }
    if (outcome === undefined) continue;
    if (!outcome.ok) {
      previews.set(file, {
        ...empty(file.name),
        problems: outcome.problems,
        askRoles: outcome.askRoles ?? [],
      });
      continue;
    }
    const brought = await bundlesOf(state, outcome);
    if (!brought.ok) {
      if (brought.problem.code.startsWith('store.')) return brought;
      previews.set(file, {
        ...empty(file.name),
        form: outcome.form,
        problems: [at(file.name, brought.problem)],
      });
      continue;
    }
    const preview = await weighed(state, outcome, brought.value);
    if (!preview.ok) return preview;
    previews.set(file, preview.value);
    bundles.push(...brought.value);
  }
  return ok({ files: files.flatMap((file) => previews.get(file) ?? []), bundles });
}

/** Keeps what a preview showed, all of it in one transaction. `revive` names removed studies that are to come back. */
export function commitImport(
  deps: Deps,
  preview: Pick<ImportPreview, 'bundles'>,
  options: { readonly revive?: readonly string[] } = {},
): Promise<Result<null>> {
  if (preview.bundles.length === 0) return Promise.resolve(problem('task.nothingToImport'));
  return deps.store.applyBundles(preview.bundles, joinBundles, options);
}

/** Brings in the demo and shows it, also when it was removed before. */
export async function importDemo(deps: Deps, files: readonly IncomingFile[]): Promise<Result<ImportPreview>> {
  const preview = await importFiles(deps, files);
  if (!preview.ok) return preview;
  const wrong = preview.value.files.flatMap((file) => file.problems)[0];
  if (wrong !== undefined) return { ok: false, problem: wrong.problem };
  const ids = preview.value.bundles.map((bundle) => bundle.study.id);
  const kept = await commitImport(deps, preview.value, { revive: ids });
  if (!kept.ok) return kept;
  const shown = await deps.store.saveSettings({ study: ids[0] ?? null });
  return shown.ok ? preview : shown;
}

interface Incoming {
  readonly deps: Deps;
  /** Each study as it would stand after the files before; null for one that is not here. */
  readonly kept: Map<string, StudyBundle | null>;
  readonly removed: Map<string, boolean>;
}

async function keptState(state: Incoming, study: string): Promise<Result<StudyBundle | null>> {
  const before = state.kept.get(study);
  if (before !== undefined) return ok(before);
  const found = await state.deps.store.bundle(study);
  if (!found.ok) return found;
  if (found.value === null) {
    const record = await state.deps.store.study(study);
    if (!record.ok) return record;
    state.removed.set(study, record.value?.removed ?? false);
  }
  state.kept.set(study, found.value);
  return found;
}

async function bundlesOf(state: Incoming, file: ReadFile): Promise<Result<StudyBundle[]>> {
  const { study, visitPlans, ...records } = file.bundle;
  if (file.form === 'visit') {
    const plan = visitPlans[0];
    if (plan === undefined) return problem('task.noVisitFile', { file: file.file });
    const kept = await keptState(state, plan.study.id);
    return kept.ok ? ok([adoptedBundle(plan, kept.value)]) : kept;
  }
  if (file.form === 'study' && study !== null) return ok([{ study, ...records }]);
  for (const id of new Set(file.bundle.sessions.map(({ header }) => header.study))) {
    const kept = await keptState(state, id);
    if (!kept.ok) return kept;
  }
  return ok(bundlesOfTable(file.bundle, file.file, (id) => state.kept.get(id)?.study));
}

async function weighed(
  state: Incoming,
  file: ReadFile,
  bundles: readonly StudyBundle[],
): Promise<Result<FilePreview>> {
  let preview: FilePreview = { ...empty(file.file), form: file.form, notices: file.notices };
  for (const bundle of bundles) {
    const { id, name } = bundle.study;
    const kept = await keptState(state, id);
    if (!kept.ok) return kept;
    const before = kept.value;
    const { bundle: after, notices } = mergeStates(before === null ? [bundle, bundle] : [before, bundle]);
    state.kept.set(id, after);
    preview = {
      ...preview,
      studies: [...preview.studies, { id, name, removedHere: state.removed.get(id) ?? false }],
      sessions: plus(
        preview.sessions,
        bundle.sessions,
        before?.sessions,
        after.sessions,
        (one) => one.header.id,
        // Journals are joined by union: one that has not grown has not changed.
        (one) => canonicalJson({ header: one?.header, entries: one?.journal.length }),
      ),
      classes: plus(preview.classes, bundle.classes, before?.classes, after.classes, (one) => one.id),
      observers: plus(
        preview.observers,
        bundle.observers,
        before?.observers,
        after.observers,
        (one) => one.id,
      ),
      protocols: plus(
        preview.protocols,
        bundle.protocols,
        before?.protocols,
        after.protocols,
        (one) => `${one.id} ${one.version}`,
      ),
      notices: [...preview.notices, ...notices.map((notice) => at(file.file, notice))],
    };
  }
  return ok(preview);
}

function plus<Item>(
  counts: Counts,
  brought: readonly Item[],
  before: readonly Item[] = [],
  after: readonly Item[],
  idOf: (item: Item) => string,
  textOf: (item: Item | undefined) => string = canonicalJson,
): Counts {
  const old = new Map(before.map((item) => [idOf(item), item]));
  const next = new Map(after.map((item) => [idOf(item), item]));
  let [fresh, known, changed] = [counts.new, counts.known, counts.changed];
  for (const id of new Set(brought.map(idOf))) {
    const was = old.get(id);
    if (was === undefined) fresh += 1;
    else if (textOf(was) === textOf(next.get(id))) known += 1;
    else changed += 1;
  }
  return { new: fresh, known, changed };
}

const none: Counts = { new: 0, known: 0, changed: 0 };

const empty = (name: string): FilePreview => ({
  name,
  form: null,
  studies: [],
  sessions: none,
  classes: none,
  observers: none,
  protocols: none,
  problems: [],
  notices: [],
  askRoles: [],
});

const at = (file: string, found: Problem): FileProblem => ({ file, line: null, path: null, problem: found });

const place = (outcome: { ok: boolean; form?: FileForm } | undefined): number =>
  outcome?.ok && outcome.form !== 'table' ? 0 : 1;

function onlyStudy(files: readonly ReadFile[]): string | undefined {
  const ids = new Set(files.flatMap(({ bundle }) => bundle.study?.id ?? []));
  return ids.size === 1 ? [...ids][0] : undefined;
}

const forTables = ({
  study,
  classes,
  observers,
  protocols,
  sessions,
}: StudyBundle): NonNullable<ReadOptions['study']> => ({
  id: study.id,
  codeSets: codeSetsOf(protocols, sessions),
  classes,
  observers,
});

/** Every code set that the study has used, each once, the newest first. */
function codeSetsOf(protocols: StudyBundle['protocols'], sessions: StudyBundle['sessions']) {
  const sets = [
    ...[...protocols].reverse().map((one) => one.codeSet),
    ...sessions.map(({ header }) =>
      header.schedule.kind === 'laid' ? header.schedule.protocol.codeSet : header.schedule.codeSet,
    ),
  ];
  return [...new Map(sets.map((set) => [canonicalJson(set), set])).values()];
}
