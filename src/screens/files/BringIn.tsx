import { useRef, useState } from 'react';
import type { Problem } from '../../kernel/result.ts';
import {
  commitImport,
  type ImportOptions,
  type ImportPreview,
  type IncomingFile,
  importFiles,
} from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { FileButton } from '../../ui/FileButton.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { ImportChoice } from './ImportChoice.tsx';

type State =
  | { readonly is: 'idle' }
  | { readonly is: 'reading'; readonly count: number }
  | { readonly is: 'preview'; readonly files: readonly IncomingFile[]; readonly preview: ImportPreview }
  | { readonly is: 'taking' }
  | { readonly is: 'taken' }
  | { readonly is: 'failed'; readonly problem: Problem };

/** Files of other tablets come in: what they hold is shown first, and kept only when somebody says so. */
export function BringIn({ study }: { readonly study: string | null }) {
  const { words, deps, store } = useServices();
  const [state, setState] = useState<State>({ is: 'idle' });
  const run = useRef(0);

  const read = async (files: readonly IncomingFile[], options: ImportOptions) => {
    const mine = ++run.current;
    setState({ is: 'reading', count: files.length });
    const preview = await importFiles(deps, files, options);
    if (mine !== run.current) return;
    setState(
      preview.ok
        ? { is: 'preview', files, preview: preview.value }
        : { is: 'failed', problem: preview.problem },
    );
  };
  const choose = async (chosen: readonly File[]) => {
    if (chosen.length === 0) return;
    setState({ is: 'reading', count: chosen.length });
    const files = await Promise.all(
      chosen.map(async (file) => ({ name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) })),
    );
    await read(files, study === null ? {} : { study });
  };
  const take = async (preview: ImportPreview, revive: readonly string[]) => {
    setState({ is: 'taking' });
    const taken = await commitImport(deps, preview, { revive });
    if (!taken.ok) return setState({ is: 'failed', problem: taken.problem });
    const first = preview.bundles[0]?.study.id;
    if (study === null && first !== undefined) await store.saveSettings({ study: first });
    setState({ is: 'taken' });
  };
  const leave = () => {
    run.current += 1;
    setState({ is: 'idle' });
  };

  switch (state.is) {
    case 'reading':
      return (
        <div className="row" role="status">
          <span className="second">{words.files.reading({ count: state.count })}</span>
          <Button look="quiet" onClick={leave}>
            {words.files.stop}
          </Button>
        </div>
      );
    case 'taking':
      return (
        <p className="second" role="status">
          {words.files.taking}
        </p>
      );
    case 'preview':
      return (
        <ImportChoice
          preview={state.preview}
          study={study}
          onTake={(revive) => take(state.preview, revive)}
          onRead={(options) => read(state.files, options)}
          onLeave={leave}
        />
      );
    default:
      return (
        <div className="stack-tight">
          {state.is === 'taken' && <Notice kind="done">{words.files.taken}</Notice>}
          {state.is === 'failed' && <Notice kind="hold">{say(words.problems, state.problem)}</Notice>}
          <div>
            <FileButton accept=".json,.gz,.csv,.txt,application/json,text/csv" multiple onFiles={choose}>
              {words.files.choose}
            </FileButton>
          </div>
        </div>
      );
  }
}
