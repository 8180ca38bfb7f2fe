import type { IntervalRecord } from '../../journal/readOut.ts';
import type { MissingReason } from '../../model/missing.ts';
import type { Correction } from '../../recorder/liveSession.ts';
import { Button } from '../../ui/Button.tsx';
import { CodeSign, Ring } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import { type Count, type CountStep, counted } from './countSteps.ts';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

/** Why a look may be missing after the fact: what nobody but the tablet can know is not among them. */
const lookReasons: readonly MissingReason[] = [
  'missed',
  'out of view',
  'left the room',
  'with another adult',
  'not taking part',
  'class interrupted',
  'other',
];
const scanReasons: readonly MissingReason[] = ['missed', 'out of view', 'class interrupted', 'other'];

interface Props {
  readonly look: IntervalRecord;
  readonly to: Correction | null;
  readonly onChange: (to: Correction) => void;
}

/** What a look should be: a code, several, a count, or missing. */
export function ShouldBe({ look, to, onChange }: Props) {
  const { room, missing } = useCoreWords();
  const { unit, latched } = useFacts();
  return (
    <div className="should-be">
      <h3>{latched ? room.shouldBeSeveral : room.shouldBe}</h3>
      {unit === 'scan' ? (
        <CountChoice look={look} to={to} onChange={onChange} />
      ) : (
        <CodeChoice look={look} to={to} onChange={onChange} />
      )}
      <h3>{room.orMissing}</h3>
      <div className="panel-choices">
        {(unit === 'scan' ? scanReasons : lookReasons).map((reason) => (
          <Button
            key={reason}
            aria-pressed={to !== null && 'missing' in to && to.missing === reason}
            onClick={() => onChange({ missing: reason })}
          >
            <Ring size={18} />
            {missing[reason]}
          </Button>
        ))}
      </div>
    </div>
  );
}

function CodeChoice({ look, to, onChange }: Props) {
  const { room } = useCoreWords();
  const { codes, latched, withNone } = useFacts();
  const chosen = to === null ? (latched ? (look.codes ?? []) : []) : 'codes' in to ? to.codes : [];
  const choose = (code: string): void => {
    if (!latched) onChange({ codes: [code] });
    else if (chosen.includes(code)) onChange({ codes: chosen.filter((one) => one !== code) });
    else onChange({ codes: [...chosen, code] });
  };
  return (
    <div className="panel-choices">
      {[...codes.values()].map(({ code, sign }) => (
        <Button key={code.id} aria-pressed={chosen.includes(code.id)} onClick={() => choose(code.id)}>
          <CodeSign kind={sign} size={20} />
          {code.label}
        </Button>
      ))}
      {withNone && (
        <Button
          aria-pressed={to !== null && 'codes' in to && to.codes.length === 0}
          onClick={() => onChange({ codes: [] })}
        >
          {room.noneOfThese}
        </Button>
      )}
    </div>
  );
}

function CountChoice({ look, to, onChange }: Props) {
  const { room } = useCoreWords();
  const present = useRoom((s) => s.present);
  const counts = to !== null && 'counts' in to ? to.counts : look.counts;
  const count: Count = {
    on: counts?.on ?? null,
    present: counts?.present ?? present,
    last: null,
    tapped: new Set(),
  };
  const step = (what: CountStep) => (): void => {
    // Who was present is said with a count, so one begins with nobody.
    const next = counted({ ...count, on: what.kind === 'fewer' ? count.on : (count.on ?? 0) }, what);
    if (next !== null) onChange({ counts: { on: next.on ?? 0, present: next.present } });
  };
  return (
    <div className="count-choice">
      <p className="count-choice-figure">{room.countOf(count)}</p>
      <div className="panel-choices">
        <Button onClick={step({ kind: 'fewer' })}>{room.onTaskFewer}</Button>
        <Button onClick={step({ kind: 'more' })}>{room.onTaskMore}</Button>
        <Button onClick={step({ kind: 'nobody' })}>{room.nobodyOnTask}</Button>
        <Button onClick={step({ kind: 'all', seated: [] })}>{room.allOnTask}</Button>
        <Button onClick={step({ kind: 'gone' })}>{room.presentFewer}</Button>
        <Button onClick={step({ kind: 'arrived' })}>{room.presentMore}</Button>
      </div>
    </div>
  );
}
