import { useState } from 'react';
import { adoptVisitFile } from '../../tasks/index.ts';
import { FileButton } from '../../ui/FileButton.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

type State = { readonly klass: string } | { readonly problem: string } | null;

/** A visit file of another tablet: its schedule is prepared here for the second observer. */
export function TakeVisit() {
  const { words, deps, store } = useServices();
  const [state, setState] = useState<State>(null);
  const take = async ([file]: readonly File[]) => {
    if (file === undefined) return;
    const bytes = new Uint8Array(await file.arrayBuffer());
    const adopted = await adoptVisitFile(deps, { name: file.name, bytes });
    if (!adopted.ok) return setState({ problem: say(words.problems, adopted.problem) });
    const kept = await store.saveSettings({ prepared: adopted.value, study: adopted.value.study.id });
    setState(
      kept.ok ? { klass: adopted.value.classroom.name } : { problem: say(words.problems, kept.problem) },
    );
  };
  return (
    <div className="stack-tight">
      <p className="second">{words.files.visitInText}</p>
      {state !== null && 'problem' in state && <Notice kind="hold">{state.problem}</Notice>}
      {state !== null && 'klass' in state && (
        <Notice
          kind="done"
          actions={
            <a className="button" href="#/before/ready">
              {words.files.visitGo}
            </a>
          }
        >
          {words.files.visitTaken(state)}
        </Notice>
      )}
      <div className="row">
        <a className="button button-plain" href="#/before/card">
          {words.pairing.read}
        </a>
        <FileButton accept=".json,.gz,application/json" onFiles={take}>
          {words.files.visitTake}
        </FileButton>
      </div>
    </div>
  );
}
