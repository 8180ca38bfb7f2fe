import { canonicalJson } from '../kernel/canonicalJson.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import type { Classroom } from '../model/classroom.ts';
import { drawChildren } from '../schedule/drawChildren.ts';
import { editClassroom } from './edits.ts';
import type { Deps } from './ports.ts';
import { newSeed } from './seeds.ts';
import { cleaned } from './text.ts';

/** Draws the target children of a class by chance, and keeps the draw with its seed. One draw stands until undone. */
export function drawTargets(
  deps: Deps,
  classroom: string,
  protocol: { readonly id: string; readonly version?: number },
  seed?: string,
): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, async (before) => {
    if (before.draw !== null) return problem('task.alreadyDrawn');
    const recipe = await deps.store.protocol(protocol.id, protocol.version);
    if (!recipe.ok) return recipe;
    if (recipe.value === null || recipe.value.study !== before.study)
      return problem('task.noProtocol', { id: protocol.id });
    const children = before.children.filter((child) => !child.removed);
    if (children.length === 0) return problem('task.noChildren');
    const given = cleaned(seed ?? '');
    const { childrenToDraw, reserves } = recipe.value;
    return ok({ draw: drawChildren(children, childrenToDraw, reserves, given || newSeed(deps.random)) });
  });
}

/** Forgets a draw that no session has used yet: a draw that was used is part of the record. */
export function undoDraw(deps: Deps, classroom: string): Promise<Result<Classroom>> {
  return editClassroom(deps, classroom, async (before) => {
    const { draw } = before;
    if (draw === null) return problem('task.notDrawn');
    const sessions = await deps.store.listSessions(before.study);
    if (!sessions.ok) return sessions;
    for (const { id, classroom: of } of sessions.value) {
      if (of.id !== before.id) continue;
      const session = await deps.store.readSession(id);
      if (!session.ok) return session;
      if (canonicalJson(session.value?.header.draw ?? null) === canonicalJson(draw))
        return problem('task.drawWasUsed');
    }
    return ok({ draw: null });
  });
}
