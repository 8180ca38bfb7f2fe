import type { Problem } from '../../kernel/result.ts';
import { Hold } from '../../ui/Sign.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** What to know before believing a figure: each a stroke and a sentence. It never blocks. */
export function WarningLines({
  warnings = [],
  remarks = [],
  continuous = false,
}: {
  readonly warnings?: readonly Problem[];
  readonly remarks?: readonly Problem[];
  /** The record is time, not intervals. */
  readonly continuous?: boolean;
}) {
  const words = useWords();
  const lines = [
    ...warnings.map((one) =>
      continuous && one.code === 'manyMissing'
        ? say(words.afterwards, { code: 'manyMissingTime', values: one.values })
        : say(words.warnings, one),
    ),
    ...remarks.map((one) => sentence(say(words.remarks, one))),
  ];
  if (lines.length === 0) return null;
  return (
    <ul className="warning-lines">
      {[...new Set(lines)].map((line) => (
        <li key={line}>
          <Hold size={20} />
          <span>{line}</span>
        </li>
      ))}
    </ul>
  );
}

/** Remarks are written for lines of the command line; on a page they are whole sentences. */
const sentence = (text: string): string =>
  `${text.slice(0, 1).toUpperCase()}${text.slice(1)}${/[.!?]$/.test(text) ? '' : '.'}`;
