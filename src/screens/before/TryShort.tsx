import { useState } from 'react';
import type { Protocol } from '../../model/protocol.ts';
import { tryShort } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { starterSets } from '../study/starterTexts.ts';

interface Props {
  readonly study: string;
  readonly onTake: (protocol: Protocol) => void;
}

/** For a first try: a protocol that is over in a minute, made and chosen by one tap. */
export function TryShort({ study, onTake }: Props) {
  const { words, deps } = useServices();
  const { before } = words;
  const [problem, setProblem] = useState<string | null>(null);
  const take = async () => {
    const [codeSet] = starterSets(words);
    if (codeSet === undefined) return;
    const made = await tryShort(deps, study, { name: before.tryShortName, codeSet });
    setProblem(made.ok ? null : say(words.problems, made.problem));
    if (made.ok) onTake(made.value);
  };
  return (
    <div className="row">
      <Button onClick={take}>{before.tryShort}</Button>
      <p className="second small grow">{before.tryShortHint}</p>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
    </div>
  );
}
