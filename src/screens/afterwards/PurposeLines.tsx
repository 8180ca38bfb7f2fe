import type { SessionHeader } from '../../model/session.ts';
import { useWords } from '../services.ts';

/** What sets a record apart from those that count and were recorded here: in a line each, mostly none. */
export function PurposeLines({ header }: { readonly header: SessionHeader }) {
  const { afterwards } = useWords();
  return (
    <>
      {header.practice && <p className="second">{afterwards.practiceLine}</p>}
      {header.familiarisation === true && <p className="second">{afterwards.familiarisationLine}</p>}
      {header.fromPaper === true && <p className="second">{afterwards.fromPaperLine}</p>}
    </>
  );
}
