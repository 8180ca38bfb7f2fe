import { canonicalJson } from '../kernel/canonicalJson.ts';
import { newId } from '../kernel/ids.ts';
import { ok, type Problem, problem, type Result } from '../kernel/result.ts';
import { type Protocol, protocol as protocolSchema } from '../model/protocol.ts';
import { nextRevision } from '../model/revision.ts';
import { requireStudy } from './edits.ts';
import type { Deps } from './ports.ts';
import { recipeProblem } from './protocolChecks.ts';
import { type ProtocolDraft, withoutIdleParts } from './protocolDrafts.ts';
import { cleaned, nameFrom, sameName } from './text.ts';
import { versionWasUsed } from './usedVersions.ts';

/**
 * Keeps a protocol. A version that was used (recorded with, prepared for a visit, handed over, or made on another
 * tablet) is never changed: the edit becomes the next version. One that nobody has used is edited in place.
 */
export async function saveProtocol(deps: Deps, draft: ProtocolDraft): Promise<Result<Protocol>> {
  const study = await requireStudy(deps, draft.study);
  if (!study.ok) return study;
  const { id, ...content } = draft;
  const found = id === null ? ok(null) : await deps.store.protocol(id);
  if (!found.ok) return found;
  const newest = found.value;
  if (id !== null && (newest === null || newest.study !== draft.study))
    return problem('task.noProtocol', { id });
  // What nobody touched is not judged again: it may be older than a rule.
  if (newest !== null && sameContent(newest, content)) return ok(newest);
  const checked = await checkedContent(deps, content, newest?.id ?? null);
  if (!checked.ok) return checked;
  if (newest === null) {
    const revision = nextRevision(null, deps.writer);
    return keep(
      deps,
      { ...checked.value, id: newId(deps.random), version: 1, removed: false, revision },
      null,
    );
  }
  if (sameContent(newest, checked.value)) return ok(newest);
  const used = await versionWasUsed(deps, newest);
  if (!used.ok) return used;
  const next = { ...checked.value, id: newest.id, removed: false };
  return used.value
    ? keep(deps, { ...next, version: newest.version + 1, revision: nextRevision(null, deps.writer) }, null)
    : keep(
        deps,
        { ...next, version: newest.version, revision: nextRevision(newest.revision, deps.writer) },
        newest,
      );
}

/** Takes a protocol off the lists; sessions keep the version with which they were recorded. */
export async function removeProtocol(deps: Deps, protocol: string): Promise<Result<null>> {
  const found = await deps.store.protocol(protocol);
  if (!found.ok) return found;
  const newest = found.value;
  if (newest === null || newest.removed) return problem('task.noProtocol', { id: protocol });
  const record = { ...newest, removed: true, revision: nextRevision(newest.revision, deps.writer) };
  const kept = await keep(deps, record, newest);
  return kept.ok ? ok(null) : kept;
}

async function keep(deps: Deps, record: Protocol, previous: Protocol | null): Promise<Result<Protocol>> {
  const kept = await deps.store.put({ protocols: [{ record, previous: previous?.revision ?? null }] });
  return kept.ok ? ok(record) : kept;
}

type Content = Omit<Protocol, 'id' | 'version' | 'removed' | 'revision'>;

function sameContent(newest: Protocol, content: Content): boolean {
  const { id: _id, version: _version, revision: _revision, removed, ...standing } = newest;
  return !removed && canonicalJson(standing) === canonicalJson(content);
}

async function checkedContent(
  deps: Deps,
  content: Content,
  self: string | null,
): Promise<Result<Content, Problem>> {
  const name = nameFrom(content.name, 'protocol');
  if (!name.ok) return name;
  const others = await deps.store.protocols(content.study);
  if (!others.ok) return others;
  if (others.value.some((other) => other.id !== self && sameName(other.name, name.value)))
    return problem('task.nameTaken', { what: 'protocol', name: name.value });
  const codes = content.codeSet.codes.map((code) => ({ ...code, label: cleaned(code.label) }));
  const checked = withoutIdleParts({ ...content, name: name.value, codeSet: { ...content.codeSet, codes } });
  const recipe = recipeProblem(checked);
  if (recipe !== null) return problem(recipe.code, recipe.values);
  // In the room there are six places for codes at the screen's edges.
  if (codes.length < 1 || codes.length > 6) return problem('task.codesOutOfRange', { most: 6 });
  if (new Set(codes.map((code) => code.id)).size < codes.length) return problem('task.codeTwice');
  const twice = codes.find((code, i) => codes.findIndex((other) => sameName(other.label, code.label)) < i);
  if (twice !== undefined) return problem('task.nameTaken', { what: 'code', name: twice.label });
  const place = { id: 'x', version: 1, removed: false, revision: { counter: 0, writer: 'x' } };
  const parsed = protocolSchema.safeParse({ ...checked, ...place });
  if (!parsed.success)
    return problem('task.protocolOutOfRange', {
      where: (parsed.error.issues[0]?.path ?? []).map(String).join('.'),
    });
  return ok(checked);
}
