import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { useWords } from '../services.ts';
import type { Listed } from './useListed.ts';

/** Instead of the other observer's record, while one's own of the same visit has not ended. */
export function HeldBackPage() {
  const { afterwards } = useWords();
  return (
    <div className="stack">
      <PageHead note={afterwards.heldBackText}>{afterwards.heldBackTitle}</PageHead>
      <div className="row">
        <a className="button" href="#/room">
          {afterwards.heldBackGo}
        </a>
        <a href="#/afterwards">{afterwards.toVisits}</a>
      </div>
    </div>
  );
}

/** On pages of many visits: how many records are left out for that reason. */
export function HeldBackNote({ listed }: { readonly listed: Listed | undefined }) {
  const { afterwards } = useWords();
  const n = listed?.held.size ?? 0;
  return n === 0 ? null : <Notice kind="hold">{afterwards.heldBackSome({ n })}</Notice>;
}
