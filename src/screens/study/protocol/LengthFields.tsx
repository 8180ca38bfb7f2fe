import type { PartLength } from '../../../model/protocol.ts';
import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import type { Change } from './change.ts';

/** How long a part takes: by minutes or by rounds; a duration by minutes. */
export function LengthFields({ draft, change }: { readonly draft: ProtocolDraft; readonly change: Change }) {
  const { study } = useWords();
  const { partLength } = draft;
  return (
    <>
      {draft.method !== 'duration' && (
        <Choice<PartLength['kind']>
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
      )}
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
          hint={`${study.roundsHint({ kind: draft.method === 'headcount' ? 'headcount' : draft.rotation.kind })} ${study.partLengthHint}`}
          min={1}
          max={1000}
          value={partLength.rounds}
          onValue={(rounds) => change({ partLength: { kind: 'rounds', rounds } })}
        />
      )}
    </>
  );
}
