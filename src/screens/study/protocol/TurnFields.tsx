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

/** Whose turn it is, with the numbers of that rotation, and in which order. */
export function TurnFields({ draft, change }: { readonly draft: ProtocolDraft; readonly change: Change }) {
  const { study } = useWords();
  const { method, rotation } = draft;
  const sweeps = method === 'momentary' || rotation.kind === 'sweep';
  return (
    <>
      <Choice<Rotation['kind']>
        legend={study.turns}
        value={rotation.kind}
        onChange={(kind) => change({ rotation: rotationOf(kind) })}
        options={[
          { value: 'next', label: study.turnsNext, hint: study.turnsNextHint },
          { value: 'block', label: study.turnsBlock, hint: study.turnsBlockHint },
          ...(sweeps
            ? [{ value: 'sweep' as const, label: study.turnsSweep, hint: study.turnsSweepHint }]
            : []),
          { value: 'target', label: study.turnsTarget, hint: study.turnsTargetHint },
          { value: 'one', label: study.turnsOne, hint: study.turnsOneHint },
        ]}
      />
      {rotation.kind === 'block' && (
        <NumberField
          label={study.inRow}
          hint={study.inRowHint}
          min={1}
          max={240}
          value={rotation.intervals}
          onValue={(intervals) => change({ rotation: { kind: 'block', intervals } })}
        />
      )}
      {rotation.kind === 'sweep' && (
        <NumberField
          label={study.eachSeconds}
          hint={study.eachHint}
          min={1}
          max={60}
          value={rotation.eachMs / 1000}
          onValue={(seconds) => change({ rotation: { kind: 'sweep', eachMs: seconds * 1000 } })}
        />
      )}
      {rotation.kind === 'target' && (
        <NumberField
          label={study.peerEvery}
          hint={study.peerEveryHint}
          min={2}
          max={60}
          value={rotation.peerEvery}
          onValue={(peerEvery) => change({ rotation: { kind: 'target', peerEvery } })}
        />
      )}
      {rotation.kind !== 'one' && (
        <Choice<ProtocolDraft['order']>
          legend={study.order}
          value={draft.order}
          onChange={(order) => change({ order })}
          options={[
            { value: 'random', label: study.orderRandom },
            { value: 'random each round', label: study.orderEachRound, hint: study.orderEachRoundHint },
            { value: 'listed', label: study.orderListed },
          ]}
        />
      )}
    </>
  );
}
