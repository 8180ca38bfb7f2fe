import type { ReactNode } from 'react';
import type { Result } from '../../kernel/result.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { say } from '../../words/say.ts';
import type { QuestionKind, Questions } from '../../worker/questions.ts';
import { useWords } from '../services.ts';
import type { Figures } from './useFigures.ts';

interface Props<Kind extends QuestionKind> {
  readonly figures: Figures<Kind>;
  readonly children: (answer: Questions[Kind]['answer']) => ReactNode;
  /** What to show instead of a problem, where the page knows better. */
  readonly otherwise?: (problem: Extract<Result<never>, { ok: false }>['problem']) => ReactNode;
}

/** A page that waits for figures: progress with a way to stop, a problem in one sentence, or the answer. */
export function Working<Kind extends QuestionKind>({ figures, children, otherwise }: Props<Kind>) {
  const words = useWords();
  const { pending, stopped, stop, again } = figures;
  if (stopped) {
    return (
      <>
        <PageHead>{words.afterwards.stopped}</PageHead>
        <Button onClick={again}>{words.afterwards.again}</Button>
      </>
    );
  }
  if (pending.state === 'working') {
    const { progress } = pending;
    return (
      <div className="row" role="status">
        <p className="second">
          {progress === null ? words.afterwards.working : words.afterwards.workingShare({ share: progress })}
        </p>
        {progress !== null && (
          <progress className="working-bar" max={1} value={progress} aria-hidden="true" />
        )}
        <Button look="quiet" onClick={stop}>
          {words.afterwards.stop}
        </Button>
      </div>
    );
  }
  const { answer } = pending;
  if (answer.ok) return children(answer.value);
  const instead = otherwise?.(answer.problem);
  if (instead !== undefined && instead !== null) return instead;
  return <Notice kind="hold">{say(words.problems, answer.problem)}</Notice>;
}
