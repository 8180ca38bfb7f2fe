import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import type { Change } from './change.ts';

/** Method, interval and moment of the look. */
export function MethodFields({ draft, change }: { readonly draft: ProtocolDraft; readonly change: Change }) {
  const { study } = useWords();
  const momentary = draft.method === 'momentary';
  const seconds = draft.intervalMs / 1000;
  // A momentary look watches no part of the interval; a partial one keeps time to record where it can.
  const observeFor = (method: string, intervalMs: number, observeMs: number) =>
    method === 'momentary' ? intervalMs : Math.min(observeMs, intervalMs);
  return (
    <>
      <Choice<string>
        legend={study.methodLegend}
        value={draft.method}
        onChange={(method) => {
          if (method === 'momentary') change({ method, observeMs: draft.intervalMs });
          if (method === 'partial')
            change({ method, observeMs: Math.max(1000, Math.round((draft.intervalMs * 2) / 3000) * 1000) });
        }}
        options={[
          { value: 'momentary', label: study.momentary, hint: study.momentaryHint },
          { value: 'partial', label: study.partial, hint: study.partialHint },
        ]}
      />
      <div className="recipe-fields">
        <NumberField
          label={study.interval}
          min={3}
          max={600}
          value={seconds}
          onValue={(next) =>
            change({
              intervalMs: next * 1000,
              observeMs: observeFor(draft.method, next * 1000, draft.observeMs),
            })
          }
        />
        {!momentary && (
          <NumberField
            label={study.observe}
            hint={study.observeHint}
            min={1}
            max={seconds}
            value={draft.observeMs / 1000}
            onValue={(next) => change({ observeMs: next * 1000 })}
          />
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
      {momentary && (
        <Choice
          legend={study.lookAt}
          value={draft.lookAt}
          onChange={(lookAt) => change({ lookAt })}
          options={[
            { value: 'end', label: study.lookAtEnd },
            { value: 'start', label: study.lookAtStart },
          ]}
        />
      )}
    </>
  );
}
