import { type ReactNode, useState } from 'react';
import type { Result } from '../../kernel/result.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

type Said =
  | { readonly kind: 'hold'; readonly text: string }
  | { readonly kind: 'done'; readonly text: string; readonly undo: (() => Promise<Result<unknown>>) | null };

export interface Doing {
  /** Does something; when it cannot be, its problem is said. */
  readonly run: <T>(task: Promise<Result<T>>) => Promise<Result<T>>;
  /** Says what was done, and offers to take it back. */
  readonly tell: (text: string, undo?: () => Promise<Result<unknown>>) => void;
  readonly hold: (text: string) => void;
  readonly forget: () => void;
  /** True while something is being done. */
  readonly busy: boolean;
  readonly notice: ReactNode;
}

/** Runs use cases for a page and says how they went, in one place. */
export function useDoing(): Doing {
  const { words } = useServices();
  const [said, setSaid] = useState<Said | null>(null);
  const [busy, setBusy] = useState(false);
  const run: Doing['run'] = async (task) => {
    setBusy(true);
    try {
      const answer = await task;
      setSaid(answer.ok ? null : { kind: 'hold', text: say(words.problems, answer.problem) });
      return answer;
    } finally {
      setBusy(false);
    }
  };
  const undo = async (back: () => Promise<Result<unknown>>) => {
    const answer = await run(back());
    if (answer.ok) setSaid({ kind: 'done', text: words.study.undone, undo: null });
  };
  const back = said?.kind === 'done' ? said.undo : null;
  return {
    run,
    tell: (text, undo) => setSaid({ kind: 'done', text, undo: undo ?? null }),
    hold: (text) => setSaid({ kind: 'hold', text }),
    forget: () => setSaid(null),
    busy,
    notice: said && (
      <Notice
        kind={said.kind}
        actions={back && <Button onClick={() => undo(back)}>{words.common.undo}</Button>}
      >
        {said.text}
      </Notice>
    ),
  };
}
