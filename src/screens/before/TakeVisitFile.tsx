import { useState } from 'react';
import { useLocation } from 'wouter';
import { adoptVisitFile } from '../../tasks/index.ts';
import { FileButton } from '../../ui/FileButton.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

/** The second tablet takes over the schedule of the first. */
export function TakeVisitFile() {
  const { words, deps, store } = useServices();
  const [, go] = useLocation();
  const [problem, setProblem] = useState<string | null>(null);
  const take = async (files: readonly File[]) => {
    const file = files[0];
    if (file === undefined) return;
    const adopted = await adoptVisitFile(deps, {
      name: file.name,
      bytes: new Uint8Array(await file.arrayBuffer()),
    });
    if (!adopted.ok) return setProblem(say(words.problems, adopted.problem));
    const kept = await store.saveSettings({ prepared: adopted.value, study: adopted.value.study.id });
    if (!kept.ok) return setProblem(say(words.problems, kept.problem));
    go('/before/ready');
  };
  return (
    <Sheet title={words.before.secondTitle}>
      <div className="row">
        <p className="grow second">{words.before.secondText}</p>
        <a className="button button-plain" href="#/before/card">
          {words.pairing.read}
        </a>
        <FileButton accept=".json,.gz,application/json" onFiles={take}>
          {words.before.secondTake}
        </FileButton>
      </div>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
    </Sheet>
  );
}
