import { looksAtEverybody, watchesOne } from '../../../schedule/orderOfDay.ts';
import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Check, Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import type { Change } from './change.ts';
import { LengthFields } from './LengthFields.tsx';
import { TurnFields } from './TurnFields.tsx';

/** How many children, whose turn it is, and how long a part takes. What the method has no use for is not asked. */
export function WhomFields({ draft, change }: { readonly draft: ProtocolDraft; readonly change: Change }) {
  const { study } = useWords();
  const everybody = looksAtEverybody(draft);
  const duration = draft.method === 'duration';
  const hasTurns = !everybody && !duration;
  return (
    <div className="stack">
      {everybody && <p className="second">{study.everybodyNote}</p>}
      {duration && <p className="second">{study.oneNote}</p>}
      {!everybody && (
        <div className="recipe-fields">
          {hasTurns && (
            <NumberField
              label={study.toDraw}
              min={1}
              max={60}
              value={draft.childrenToDraw}
              onValue={(childrenToDraw) => change({ childrenToDraw })}
            />
          )}
          <NumberField
            label={study.reserves}
            hint={study.reservesHint}
            min={0}
            max={60}
            value={draft.reserves}
            onValue={(reserves) => change({ reserves })}
          />
        </div>
      )}
      {hasTurns && (draft.reserves > 0 || draft.reservesStepIn === true || watchesOne(draft)) && (
        <Check
          label={study.stepIn}
          checked={draft.reservesStepIn === true}
          onChange={(reservesStepIn) => change({ reservesStepIn })}
        />
      )}
      {hasTurns && <TurnFields draft={draft} change={change} />}
      <LengthFields draft={draft} change={change} />
      {!duration && (
        <>
          <Choice<'missing' | 'repeat'>
            legend={study.afterPause}
            value={draft.afterPause ?? 'missing'}
            onChange={(afterPause) => change({ afterPause })}
            options={[
              { value: 'missing', label: study.afterPauseMissing },
              { value: 'repeat', label: study.afterPauseRepeat },
            ]}
          />
          <p className="second small recipe-note">{study.afterPauseHint}</p>
        </>
      )}
    </div>
  );
}
