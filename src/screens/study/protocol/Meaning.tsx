import { type ProtocolWarning, protocolMeaning } from '../../../schedule/protocolMeaning.ts';
import { type ProtocolDraft, recipeProblem } from '../../../tasks/index.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { Hold } from '../../../ui/Sign.tsx';
import { say } from '../../../words/say.ts';
import { useWords } from '../../services.ts';
import { methodSentence } from '../methodSentence.ts';

/** What the protocol comes to, as it is being changed. What cannot be recorded with is said; warnings stop nobody. */
export function Meaning({ draft }: { readonly draft: ProtocolDraft }) {
  const words = useWords();
  const { study } = words;
  const problem = recipeProblem(draft);
  const { warnings } = protocolMeaning(draft);
  const sentences: Record<ProtocolWarning, string> = {
    longInterval: study.warnLongInterval,
    longObserve: study.warnLongObserve,
    fewLooks: draft.method === 'headcount' ? study.warnFewCounts : study.warnFewLooks,
    sweepTooLong: study.warnSweepTooLong,
    shortPart: study.warnShortPart,
  };
  const holds = [
    ...(problem === null ? [] : [{ key: problem.code, text: say(words.problems, problem) }]),
    ...warnings
      .filter((warning) => problem?.code !== `task.${warning}`)
      .map((warning) => ({ key: warning, text: sentences[warning] })),
  ];
  return (
    <Sheet title={study.meansTitle}>
      <div className="stack-tight" role="status">
        <p>{useMeans(draft)}</p>
        <p className="second small">{methodSentence(words, draft)}</p>
        {holds.map(({ key, text }) => (
          <p key={key} className="recipe-warning">
            <Hold />
            <span>{text}</span>
          </p>
        ))}
      </div>
    </Sheet>
  );
}

/** Looks and minutes in one sentence. */
function useMeans(draft: ProtocolDraft): string {
  const { study } = useWords();
  const { intervals, lengthMs, watched, fewest, most } = protocolMeaning(draft);
  const minutes = lengthMs / 60_000;
  if (intervals === 0) return study.meansNothing;
  if (draft.method === 'headcount') return study.meansEverybody({ counts: intervals, minutes });
  if (draft.method === 'duration') return study.meansDuration({ minutes });
  if (draft.rotation.kind === 'target' && watched > 1)
    return study.meansTarget({ target: most, fewest, peers: watched - 1, minutes });
  return study.means({ fewest, most, watched, minutes });
}
