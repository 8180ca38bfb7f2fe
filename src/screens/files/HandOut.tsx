import { type ReactNode, useRef, useState } from 'react';
import type { Problem, Result } from '../../kernel/result.ts';
import { markHandedOver } from '../../tasks/index.ts';
import type { ExportedFile } from '../../tasks/ports.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

interface Props {
  readonly make: () => Promise<Result<ExportedFile>>;
  /** What the button says that makes the file. */
  readonly children: ReactNode;
  readonly look?: 'plain' | 'main';
}

type State =
  | { readonly is: 'idle' }
  | { readonly is: 'making' }
  | { readonly is: 'ready'; readonly file: ExportedFile; readonly again: boolean }
  | { readonly is: 'done'; readonly how: 'shared' | 'saved' | 'cancelled'; readonly file: ExportedFile }
  | { readonly is: 'failed'; readonly problem: Problem };

/**
 * Makes a file, then hands it over in a tap of its own: the tablet's share sheet opens only in a tap with the bytes
 * ready. What has left counts as handed over.
 */
export function HandOut({ make, children, look = 'plain' }: Props) {
  const { words, deps, device } = useServices();
  const [state, setState] = useState<State>({ is: 'idle' });
  const run = useRef(0);
  const begin = async () => {
    const mine = ++run.current;
    setState({ is: 'making' });
    const made = await make();
    if (mine !== run.current) return;
    setState(
      made.ok ? { is: 'ready', file: made.value, again: false } : { is: 'failed', problem: made.problem },
    );
  };
  const stop = () => {
    run.current += 1;
    setState({ is: 'idle' });
  };
  const give = async (file: ExportedFile) => {
    const how = await device.handOver(file);
    if (how === 'again') return setState({ is: 'ready', file, again: true });
    if (how !== 'cancelled') {
      const marked = await markHandedOver(deps, file.covers);
      if (!marked.ok) return setState({ is: 'failed', problem: marked.problem });
    }
    setState({ is: 'done', how, file });
  };
  switch (state.is) {
    case 'idle':
      return (
        <Button look={look} onClick={begin}>
          {children}
        </Button>
      );
    case 'making':
      return (
        <div className="row" role="status">
          <span className="second">{words.files.making}</span>
          <Button look="quiet" onClick={stop}>
            {words.files.stop}
          </Button>
        </div>
      );
    case 'ready':
      return (
        <div className="row">
          <span className="small">
            {words.files.ready({ name: state.file.name, bytes: state.file.bytes.length })}
          </span>
          <Button look="main" onClick={() => give(state.file)}>
            {words.files.give}
          </Button>
          {state.again && (
            <span className="second small" role="status">
              {words.files.againTap}
            </span>
          )}
        </div>
      );
    case 'done':
      return (
        <Notice
          kind={state.how === 'cancelled' ? 'hold' : 'done'}
          actions={
            <Button look="quiet" onClick={state.how === 'cancelled' ? () => give(state.file) : stop}>
              {state.how === 'cancelled' ? words.files.give : words.common.done}
            </Button>
          }
        >
          {words.files[state.how]}
        </Notice>
      );
    case 'failed':
      return (
        <Notice
          kind="hold"
          actions={
            <Button look="quiet" onClick={stop}>
              {words.common.close}
            </Button>
          }
        >
          {say(words.problems, state.problem)}
        </Notice>
      );
  }
}
