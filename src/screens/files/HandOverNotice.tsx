import { exportStudy } from '../../tasks/index.ts';
import { Notice } from '../../ui/Notice.tsx';
import { useServices } from '../services.ts';
import { HandOut } from './HandOut.tsx';
import { useWaiting } from './useWaiting.ts';

/** How many records are only on this tablet, until a file has left it; nothing where none was recorded here. */
export function HandOverNotice({ study }: { readonly study: string }) {
  const { words, deps } = useServices();
  const waiting = useWaiting(study);
  if (waiting === undefined || waiting.recorded === 0) return null;
  if (waiting.sessions === 0) return <Notice kind="done">{words.common.handedOver}</Notice>;
  return (
    <Notice
      kind="hold"
      actions={<HandOut make={() => exportStudy(deps, study)}>{words.files.handOver}</HandOut>}
    >
      {words.common.notHandedOver({ n: waiting.sessions })}
    </Notice>
  );
}
