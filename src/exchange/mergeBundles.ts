import { byCodePoint } from '../kernel/compare.ts';
import type { Problem } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import type { Study } from '../model/study.ts';
import { type MergedRecords, mergeRecords } from './mergeRecords.ts';
import { mergeSessions } from './mergeSessions.ts';
import { excerpt, fault } from './problemValues.ts';
import { addedUp, tableWriter } from './tableRecords.ts';
import type { Bundle, BundleRecord, MergeConflict, Merged, RecordNoun } from './types.ts';

/**
 * Brings bundles together: a union by identity, idempotent, commutative and associative. Of mutable records the
 * highest revision is kept, removals with their tombstones; journals are united; nothing is decided by the order.
 */
export function mergeBundles(bundles: readonly Bundle[]): Merged {
  const studies = mergeRecords(
    bundles.flatMap(({ study }) => (study === null ? [] : [study])),
    ({ id }) => id,
    ({ revision }) => revision,
  );
  const classes = mergeRecords(
    bundles.flatMap((bundle) => bundle.classes),
    ({ id }) => id,
    ({ revision }) => revision,
    (a, b) => (fromTable(a) && fromTable(b) ? addedUp(a, b) : null),
  );
  const observers = mergeRecords(
    bundles.flatMap((bundle) => bundle.observers),
    ({ id }) => id,
    ({ revision }) => revision,
  );
  const protocols = mergeRecords(
    bundles.flatMap((bundle) => bundle.protocols),
    ({ id, version }) => `${id} ${version}`,
    ({ revision }) => revision,
  );
  const visits = mergeRecords(
    bundles.flatMap((bundle) => bundle.visitPlans),
    ({ visit }) => visit,
    () => null,
  );
  const { sessions, conflicts } = mergeSessions(bundles.flatMap((bundle) => bundle.sessions));
  const history: Merged['history'] = [];
  const note = <Item extends BundleRecord>(noun: RecordNoun, merged: MergedRecords<Item>): void => {
    for (const { id, states } of merged.conflicts) conflicts.push({ kind: 'record', noun, id, states });
    for (const record of merged.older) history.push({ noun, record });
  };
  note('study', studies);
  note('class', classes);
  note('observer', observers);
  note('protocol', protocols);
  note('visit', visits);
  const bundle: Bundle = {
    study: studies.records[0] ?? null,
    classes: classes.records,
    observers: observers.records,
    protocols: protocols.records,
    sessions,
    visitPlans: visits.records,
  };
  const notices = [...conflicts.map((conflict) => told(conflict, bundle)), ...strangers(studies.records)];
  return { bundle, conflicts, notices, history };
}

const fromTable = ({ revision }: Classroom): boolean =>
  revision.counter === 0 && revision.writer === tableWriter;

/** A bundle holds one study: of several the first by identifier, so that the order of files decides nothing. */
function strangers([kept, ...others]: readonly Study[]): Problem[] {
  if (kept === undefined) return [];
  return others.map((other) =>
    fault('merge.studies', { kept: excerpt(kept.name), other: excerpt(other.name) }),
  );
}

function told(conflict: MergeConflict, { sessions }: Bundle): Problem {
  if (conflict.kind === 'record') {
    const names = conflict.states.map((state) => ('name' in state ? state.name : state.classroom.name));
    const name = excerpt(names.sort(byCodePoint)[0] ?? conflict.id);
    return fault('merge.record', { noun: conflict.noun, name });
  }
  const header = sessions.find((session) => session.header.id === conflict.session)?.header;
  const session = excerpt(header?.sessionLabel ?? conflict.session);
  if (conflict.kind === 'entry')
    return fault('merge.entry', { session, writer: conflict.writer, seq: conflict.seq });
  const observer = excerpt(header?.observer.name ?? '');
  return fault('merge.session', { session, observer, n: conflict.headers.length });
}
