import { fold } from '../journal/step.ts';
import { ok, problem, type Result } from '../kernel/result.ts';
import { appendAfterwards } from './appendAfterwards.ts';
import type { Deps } from './ports.ts';
import { cleaned } from './text.ts';

export interface NoteWish {
  readonly text: string;
  /** The flag (or other entry) that the words are about; left out: the session as a whole. */
  readonly about?: { readonly writer: string; readonly seq: number };
}

/** Words added after the session, to a flag or to the whole; the journal grows, nothing in it changes. */
export function addNote(deps: Deps, session: string, wish: NoteWish): Promise<Result<null>> {
  return appendAfterwards(deps, session, (stored) => {
    const state = fold(stored.header, stored.journal);
    if (state.ended === null && stored.header.schedule.kind === 'laid') return problem('task.sessionRuns');
    const text = cleaned(wish.text);
    if (text === '') return problem('task.noWords');
    return ok({
      at: state.at,
      body: { kind: 'noted', text, ...(wish.about !== undefined && { about: wish.about }) },
    });
  });
}
