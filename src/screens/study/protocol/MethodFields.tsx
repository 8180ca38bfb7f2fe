import type { Method } from '../../../model/protocol.ts';
import { type ProtocolDraft, switchMethod } from '../../../tasks/index.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import type { Change } from './change.ts';

interface Props {
  readonly draft: ProtocolDraft;
  readonly change: Change;
}

/** The method, and its times. */
export function MethodFields({ draft, change }: Props) {
  const { study } = useWords();
  const moments = draft.method === 'momentary' || draft.method === 'headcount';
  return (
    <>
      <Choice<Method>
        legend={study.methodLegend}
        value={draft.method}
        onChange={(method) => change(switchMethod(draft, method))}
        options={[
          { value: 'momentary', label: study.momentary, hint: study.momentaryHint },
          { value: 'partial', label: study.partial, hint: study.partialHint },
          { value: 'whole', label: study.whole, hint: study.wholeHint },
          { value: 'headcount', label: study.headcount, hint: study.headcountHint },
          { value: 'duration', label: study.duration, hint: study.durationHint },
        ]}
      />
      {draft.method !== 'duration' && (
        <div className="recipe-fields">
          {moments ? (
            <IntervalField draft={draft} change={change} />
          ) : (
            <WatchFields draft={draft} change={change} />
          )}
          <NumberField
            label={study.grace}
            hint={study.graceHint}
            min={0}
            max={3}
            step={0.1}
            value={draft.graceMs / 1000}
            onValue={(next) => change({ graceMs: Math.round(next * 1000) })}
          />
        </div>
      )}
      {moments && (
        <>
          <Choice
            legend={draft.method === 'headcount' ? study.countAt : study.lookAt}
            value={draft.lookAt}
            onChange={(lookAt) => change({ lookAt })}
            options={[
              { value: 'end', label: study.lookAtEnd },
              { value: 'start', label: study.lookAtStart },
            ]}
          />
          <p className="second small recipe-note">{study.lookAtHint}</p>
        </>
      )}
    </>
  );
}

/** Looks are moments: nothing of the interval is watched or set aside for recording. */
function IntervalField({ draft, change }: Props) {
  const { study } = useWords();
  return (
    <NumberField
      label={study.interval}
      hint={study.intervalHint}
      min={3}
      max={600}
      value={draft.intervalMs / 1000}
      onValue={(next) => change({ intervalMs: next * 1000, observeMs: next * 1000 })}
    />
  );
}

/** Time to watch and time to record make the interval. */
function WatchFields({ draft, change }: Props) {
  const { study } = useWords();
  const recordMs = draft.intervalMs - draft.observeMs;
  return (
    <>
      <NumberField
        label={study.observe}
        hint={study.observeHint}
        min={3}
        max={600}
        value={draft.observeMs / 1000}
        onValue={(next) => change({ observeMs: next * 1000, intervalMs: next * 1000 + recordMs })}
      />
      <NumberField
        label={study.record}
        hint={study.recordHint}
        min={3}
        max={600}
        orNone
        problem={study.recordBetween}
        value={recordMs / 1000}
        onValue={(next) => change({ intervalMs: draft.observeMs + next * 1000 })}
      />
    </>
  );
}
