import { type ProtocolWarning, protocolMeaning } from '../../../schedule/protocolMeaning.ts';
import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { Hold } from '../../../ui/Sign.tsx';
import { useWords } from '../../services.ts';
import { methodSentence } from '../methodSentence.ts';

/** What the protocol comes to, as it is being changed; warnings are said and stop nobody. */
export function Meaning({ draft }: { readonly draft: ProtocolDraft }) {
  const words = useWords();
  const { study } = words;
  const meaning = protocolMeaning(draft);
  const sentences: Record<ProtocolWarning, string> = {
    longInterval: study.warnLongInterval,
    longObserve: study.warnLongObserve,
    fewLooks: study.warnFewLooks,
    sweepTooLong: study.warnSweepTooLong,
  };
  return (
    <Sheet title={study.meansTitle}>
      <div className="stack-tight" role="status">
        <p>
          {meaning.intervals === 0
            ? study.meansNothing
            : study.means({
                fewest: meaning.fewest,
                most: meaning.most,
                watched: meaning.watched,
                minutes: meaning.lengthMs / 60_000,
              })}
        </p>
        <p className="second small">{methodSentence(words, draft)}</p>
        {meaning.warnings.map((warning) => (
          <p key={warning} className="recipe-warning">
            <Hold />
            <span>{sentences[warning]}</span>
          </p>
        ))}
      </div>
    </Sheet>
  );
}
