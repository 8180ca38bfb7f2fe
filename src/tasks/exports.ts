import { writeIntervalTable } from '../exchange/writeIntervalTable.ts';
import { writeStudyFile } from '../exchange/writeStudyFile.ts';
import { writeVisitFile } from '../exchange/writeVisitFile.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { isForTheRecord } from '../model/forTheRecord.ts';
import type { VisitPlan } from '../model/visitPlan.ts';
import { fileName, secretWords } from './fileNames.ts';
import { toBundle } from './joinBundles.ts';
import type { Deps, ExportedFile, HandOver, StudyBundle } from './ports.ts';
import { freezeVersions } from './usedVersions.ts';

/** The study file: everything, nothing lost. */
export async function exportStudy(
  deps: Deps,
  study: string,
  options: { readonly compress?: boolean } = {},
): Promise<Result<ExportedFile>> {
  // Read before the journals: what comes in between is in the file and counts as not handed over, never the reverse.
  const listed = await deps.store.listSessions(study);
  if (!listed.ok) return listed;
  const found = await requireBundle(deps, study);
  if (!found.ok) return found;
  const bundle = found.value;
  const frozen = await freezeVersions(deps, bundle.protocols);
  if (!frozen.ok) return frozen;
  const wall = deps.clock.wall();
  const compress = options.compress ?? false;
  const bytes = await writeStudyFile(toBundle(bundle), { exportedAt: wall, app: deps.app, compress });
  const covers = listed.value.flatMap(({ id, own }): HandOver[] => (own > 0 ? [{ session: id, own }] : []));
  return ok({
    name: nameOf(bundle, wall, compress ? '.lookbell.json.gz' : '.lookbell.json'),
    type: compress ? 'application/gzip' : 'application/json',
    bytes: new Uint8Array(bytes),
    covers,
  });
}

/** The visit file: the frozen schedule for a second tablet, nobody's marks. */
export async function exportVisit(deps: Deps, plan: VisitPlan): Promise<Result<ExportedFile>> {
  const frozen = await freezeVersions(deps, [plan.schedule.protocol]);
  if (!frozen.ok) return frozen;
  const wall = deps.clock.wall();
  const bytes = await writeVisitFile(plan, { exportedAt: wall, app: deps.app });
  const children = plan.children.map((child) => ({ ...child, removed: false }));
  const name = fileName(
    `visit ${plan.classroom.name}`,
    plan.plannedStart ?? wall,
    '.lookbell-visit.json',
    secretWords(plan.study, [{ children }]),
  );
  return ok({ name, type: 'application/json', bytes: new Uint8Array(bytes), covers: [] });
}

/** The interval table: one row an interval, practice and familiarisation visits left out. It loses the journal, so it hands nothing over. */
export async function exportTable(deps: Deps, study: string): Promise<Result<ExportedFile>> {
  const found = await requireBundle(deps, study);
  if (!found.ok) return found;
  const sessions = found.value.sessions.filter(({ header }) => isForTheRecord(header));
  if (sessions.length === 0) return problem('task.noSessions');
  const bytes = new TextEncoder().encode(writeIntervalTable(sessions));
  return ok({
    name: nameOf(found.value, deps.clock.wall(), '.csv'),
    type: 'text/csv',
    bytes,
    covers: [],
  });
}

/** Notes that a file has left the tablet, and with it all that it covers. */
export async function markHandedOver(deps: Deps, covers: readonly HandOver[]): Promise<Result<null>> {
  if (covers.length === 0) return ok(null);
  const marked = await deps.store.markHandedOver(covers);
  if (!marked.ok) return marked;
  return deps.store.saveSettings({ lastBackup: deps.clock.wall() });
}

async function requireBundle(deps: Deps, study: string): Promise<Result<StudyBundle>> {
  const found = await deps.store.bundle(study);
  if (!found.ok) return found;
  return found.value === null ? problem('task.noStudy', { id: study }) : ok(found.value);
}

const nameOf = ({ study, classes }: StudyBundle, wall: string, ending: string): string =>
  fileName(study.name, wall, ending, secretWords(study, classes));
