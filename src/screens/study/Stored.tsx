import type { ReactNode } from 'react';
import type { Result } from '../../kernel/result.ts';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

interface Props<T> {
  readonly answer: Result<T> | undefined;
  readonly children: (value: T) => ReactNode;
}

/** What is stored, once it is there; until then, and when it cannot be read, a sentence. */
export function Stored<T>({ answer, children }: Props<T>) {
  const words = useWords();
  if (answer === undefined) return <p className="second">{words.common.loading}</p>;
  if (!answer.ok) return <Notice kind="hold">{say(words.problems, answer.problem)}</Notice>;
  return <>{children(answer.value)}</>;
}

/** For an address of something that is not here, or no more. */
export function NotHere() {
  const { study } = useWords();
  return (
    <>
      <PageHead>{study.notHere}</PageHead>
      <p>
        <a className="button" href="#/study">
          {study.backToStudy}
        </a>
      </p>
    </>
  );
}
