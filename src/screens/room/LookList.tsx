import type { IntervalRecord } from '../../journal/readOut.ts';
import { Button } from '../../ui/Button.tsx';
import { CodeSign, Ring } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { useHeld } from './useHeld.ts';

interface Props {
  readonly looks: readonly IntervalRecord[];
  readonly onChoose: (look: IntervalRecord) => void;
}

/** The looks that may be meant, the latest first: whose, and what each holds. */
export function LookList({ looks, onChoose }: Props) {
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const held = useHeld();
  return (
    <ul className="look-list">
      {looks.toReversed().map((look) => (
        <li key={look.number}>
          <Button className="look-choice" onClick={() => onChoose(look)}>
            <HeldSign look={look} />
            <span className="look-whose">
              {room.lookNumber({
                number: look.number,
                name: look.child === null ? '' : (pseudonyms.get(look.child) ?? ''),
              })}
            </span>
            <span className="look-held">{held(look)}</span>
          </Button>
        </li>
      ))}
    </ul>
  );
}

function HeldSign({ look }: { readonly look: IntervalRecord }) {
  const { codes } = useFacts();
  if (look.missing !== null) return <Ring size={18} />;
  const sign = look.codes?.[0] === undefined ? undefined : codes.get(look.codes[0])?.sign;
  return sign === undefined ? <span className="look-no-sign" /> : <CodeSign kind={sign} size={18} />;
}
