import { type ReactNode, useRef } from 'react';
import type { PairDetails } from '../../analysis/index.ts';
import { recordingFacts } from '../../journal/headerFacts.ts';
import { Button } from '../../ui/Button.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { useServices } from '../services.ts';
import { CodeTables } from './CodeTables.tsx';
import { Companions } from './Companions.tsx';
import { Differences } from './Differences.tsx';
import { DurationSheet } from './DurationSheet.tsx';
import { PageFoot } from './PageFoot.tsx';
import { SheetPicture } from './SheetPicture.tsx';
import { StepSheet } from './StepSheet.tsx';
import { usePairSentences } from './usePairSentences.ts';
import { WarningLines } from './WarningLines.tsx';

interface Props {
  /** The same two records, phase by phase. */
  readonly pairs: readonly PairDetails[];
  readonly children: ReactNode;
}

/** What the line under the heading and the verdict on their step have said already. */
const saidInNote: ReadonlySet<string> = new Set([
  'nearlyAlwaysOnTask',
  'nearlyNeverOnTask',
  'oftenOutOfStep',
]);

/** How far two observers of one visit agree. */
export function PairPage({ pairs, children }: Props) {
  const { words, useStored } = useServices();
  const sentences = usePairSentences(pairs);
  const list = useRef<HTMLDivElement>(null);
  const [first] = pairs;
  const header = useStored((store) => store.readSession(first?.sessionIds[0] ?? ''), [first?.sessionIds[0]]);
  if (first === undefined) return null;
  const { observers } = first.row;
  const codeSet = header?.ok && header.value !== null ? recordingFacts(header.value.header).codeSet : null;
  const differences = pairs.flatMap((pair) =>
    pair.differences.map((difference) => ({ ...difference, phase: pair.row.phase })),
  );
  const alone = pairs.length === 1;
  const toList = () => {
    list.current?.scrollIntoView({ block: 'start' });
    list.current?.focus({ preventScroll: true });
  };
  return (
    <div className="stack">
      <PageHead about={sentences.about} note={sentences.note}>
        {sentences.title}
      </PageHead>
      {children}
      <WarningLines
        warnings={pairs.flatMap((pair) => pair.warnings).filter(({ code }) => !saidInNote.has(code))}
      />
      <StepSheet pairs={pairs} />
      {codeSet !== null && first.method !== 'headcount' && first.method !== 'duration' && (
        <Sheet>
          <SheetPicture
            sheets={pairs.map((pair) => pair.sheet)}
            codeSet={codeSet}
            klass={first.row.class ?? ''}
            observers={observers}
          />
        </Sheet>
      )}
      <Companions pairs={pairs} />
      <DurationSheet pairs={pairs} />
      {differences.length > 0 && (
        <div className="not-in-print">
          <Button onClick={toList}>{words.agreement.differencesOpen({ n: differences.length })}</Button>
        </div>
      )}
      {pairs.map((pair) => (
        <CodeTables key={pair.key} pair={pair} alone={alone} />
      ))}
      <Sheet title={words.agreement.excludedTitle}>
        <Excluded pairs={pairs} />
      </Sheet>
      <div ref={list} tabIndex={-1} className="not-in-print">
        <Sheet title={words.agreement.differencesTitle({ n: differences.length })}>
          {differences.length > 0 && <Differences differences={differences} observers={observers} />}
        </Sheet>
      </div>
      <p className="second small how">{sentences.how}</p>
      <PageFoot />
    </div>
  );
}

function Excluded({ pairs }: { readonly pairs: readonly PairDetails[] }) {
  const { words } = useServices();
  const lines = pairs.flatMap((pair) =>
    pair.row.observers.flatMap((observer) => {
      const own = pair.excludedBy.filter((one) => one.observer === observer);
      if (own.length === 0) return [];
      const sentence = words.agreement.excluded({
        observer: pairs.length > 1 && pair.row.phase !== null ? `${observer} (${pair.row.phase})` : observer,
        reasons: own.map(({ reason, n }) => ({ reason: reason === null ? null : words.missing[reason], n })),
      });
      return [sentence];
    }),
  );
  if (lines.length === 0) return <p className="second">{words.agreement.excludedNone}</p>;
  return (
    <ul className="stack-tight">
      {lines.map((line) => (
        <li key={line}>{line}</li>
      ))}
    </ul>
  );
}
