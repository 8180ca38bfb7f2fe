import type { Protocol } from '../../../model/protocol.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';
import { methodSentence } from '../methodSentence.ts';

/** The versions of a protocol, the newest first, each in one line. */
export function Versions({ versions }: { readonly versions: readonly Protocol[] }) {
  const words = useWords();
  return (
    <Sheet title={words.study.versions} flush>
      <ul className="lines">
        {versions.map((one) => (
          <li key={one.version}>
            <span className="grow">
              <strong>{words.study.version({ n: one.version })}</strong>
              <br />
              <span className="second small">
                {methodSentence(words, one)} · {words.f.list(one.codeSet.codes.map((code) => code.label))}
              </span>
            </span>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
