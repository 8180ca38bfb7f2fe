import { ok, type Result } from '../kernel/result.ts';
import type { CodeSet } from '../model/codeSet.ts';
import type { Protocol } from '../model/protocol.ts';
import type { Deps } from './ports.ts';
import { starterDraft } from './protocolDrafts.ts';
import { saveProtocol } from './protocols.ts';
import { sameName } from './text.ts';

/** A protocol that is over in a minute with the usual six children: two looks each, 5 s apart. The one of that name where it is there already. */
export async function tryShort(
  deps: Deps,
  study: string,
  { name, codeSet }: { readonly name: string; readonly codeSet: CodeSet },
): Promise<Result<Protocol>> {
  const protocols = await deps.store.protocols(study);
  if (!protocols.ok) return protocols;
  const there = protocols.value.find((one) => sameName(one.name, name));
  if (there !== undefined) return ok(there);
  return saveProtocol(deps, {
    ...starterDraft('momentary', study, name, codeSet),
    intervalMs: 5000,
    observeMs: 5000,
    partLength: { kind: 'rounds', rounds: 2 },
  });
}
