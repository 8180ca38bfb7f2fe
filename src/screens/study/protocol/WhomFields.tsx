import type { Rotation } from '../../../model/protocol.ts';
import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import type { Change } from './change.ts';

/** A rotation with its usual numbers. */
function rotationOf(kind: Rotation['kind']): Rotation {
  if (kind === 'block') return { kind, intervals: 4 };
  if (kind === 'sweep') return { kind, eachMs: 3000 };
  return kind === 'target' ? { kind, peerEvery: 4 } : { kind };
}

/** How many children, whose turn it is, and how long a part takes. */
export function WhomFields({ draft, change }: { readonly draft: ProtocolDraft; readonly change: Change }) {
  const { study } = useWords();
  const { rotation, partLength } = draft;
  return (
    <div className="stack">
      <div className="recipe-fields">
        <NumberField
          label={study.toDraw}
          min={1}
          max={60}
          value={draft.childrenToDraw}
          onValue={(childrenToDraw) => change({ childrenToDraw })}
        />
        <NumberField
          label={study.reserves}
          min={0}
          max={60}
          value={draft.reserves}
          onValue={(reserves) => change({ reserves })}
        />
      </div>
      <Choice<Rotation['kind']>
        legend={study.turns}
        value={rotation.kind}
        onChange={(kind) => change({ rotation: rotationOf(kind) })}
        options={[
          { value: 'next', label: study.turnsNext },
          { value: 'block', label: study.turnsBlock },
          { value: 'one', label: study.turnsOne },
        ]}
      />
      {rotation.kind === 'block' && (
        <NumberField
          label={study.inRow}
          min={1}
          max={240}
          value={rotation.intervals}
          onValue={(intervals) => change({ rotation: { kind: 'block', intervals } })}
        />
      )}
      <Choice<ProtocolDraft['order']>
        legend={study.order}
        value={draft.order}
        onChange={(order) => change({ order })}
        options={[
          { value: 'random', label: study.orderRandom },
          { value: 'listed', label: study.orderListed },
        ]}
      />
      <Choice
        legend={study.partLength}
        value={partLength.kind}
        onChange={(kind) =>
          change({ partLength: kind === 'minutes' ? { kind, minutes: 15 } : { kind, rounds: 10 } })
        }
        options={[
          { value: 'minutes', label: study.byMinutes },
          { value: 'rounds', label: study.byRounds },
        ]}
      />
      {partLength.kind === 'minutes' ? (
        <NumberField
          label={study.minutes}
          hint={study.partLengthHint}
          min={0.25}
          max={180}
          step={0.25}
          value={partLength.minutes}
          onValue={(minutes) => change({ partLength: { kind: 'minutes', minutes } })}
        />
      ) : (
        <NumberField
          label={study.rounds}
          hint={study.partLengthHint}
          min={1}
          max={1000}
          value={partLength.rounds}
          onValue={(rounds) => change({ partLength: { kind: 'rounds', rounds } })}
        />
      )}
    </div>
  );
}
