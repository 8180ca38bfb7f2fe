import type { Result } from '../../../kernel/result.ts';
import { importDemo } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { type Services, useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

/** One tap: the demo study is taken over and shown. */
export function OpenDemo({ main = false }: { readonly main?: boolean }) {
  const services = useServices();
  const { words } = services;
  const { run, notice, busy } = useDoing();
  return (
    <div className="stack-tight">
      <div className="row">
        <Button look={main ? 'main' : 'plain'} disabled={busy} onClick={() => run(openDemo(services))}>
          {busy ? words.study.demoOpening : words.study.demoOpen}
        </Button>
      </div>
      {notice}
    </div>
  );
}

/** Reads the files that came with the program, keeps them, and shows their study. */
async function openDemo({ deps, demoFiles }: Services): Promise<Result<unknown>> {
  const files = await demoFiles();
  return files.ok ? importDemo(deps, files.value) : files;
}
