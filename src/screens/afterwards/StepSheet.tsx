import type { PairDetails, StepCode } from '../../analysis/index.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { useStepWords } from './useStepWords.ts';

const signs: Record<StepCode, typeof Tick> = {
  inStep: Tick,
  apart: Hold,
  placeLost: Hold,
  disagreeing: Hold,
  unknown: Ring,
};

/** Whether two observers ran in step and in the same place: one verdict, what to do about it, the figures behind it. */
export function StepSheet({ pairs }: { readonly pairs: readonly PairDetails[] }) {
  const said = useStepWords(pairs);
  if (said === null) return null;
  const Sign = signs[said.code];
  return (
    <Sheet
      title={
        <span className="verdict">
          <Sign /> {said.title}
        </span>
      }
    >
      <div className="stack-tight">
        <p>{said.sentences.join(' ')}</p>
        {said.stretches.length > 0 && (
          <ul className="stack-tight">
            {said.stretches.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        )}
        {said.todo !== null && <p>{said.todo}</p>}
        {said.figures.length > 0 && (
          <ul className="second small">
            {said.figures.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        )}
      </div>
    </Sheet>
  );
}
