import { changedManner } from '../../model/manners.ts';
import type { Manner } from '../../model/observer.ts';
import { Check, Choice } from '../../ui/Choice.tsx';
import { useCoreWords } from '../coreServices.ts';

interface Props {
  readonly manner: Manner;
  readonly onChange: (manner: Manner) => void;
  /** Why eyes-up cannot be had here, or null. */
  readonly noEyesUp?: string | null;
}

/** How an observer likes the room to be. */
export function MannerFields({ manner, onChange, noEyesUp = null }: Props) {
  const { room } = useCoreWords();
  return (
    <div className="stack-tight">
      <Choice<Manner['layout']>
        legend={room.layout}
        value={noEyesUp === null ? manner.layout : 'plan'}
        onChange={(layout) => onChange(changedManner(manner, { layout }))}
        options={[
          { value: 'plan', label: room.layoutPlan, hint: room.layoutPlanHint },
          {
            value: 'eyes-up',
            label: room.layoutEyesUp,
            hint: noEyesUp ?? room.layoutEyesUpHint,
            disabled: noEyesUp !== null,
          },
        ]}
      />
      <Choice<Manner['hand']>
        legend={room.hand}
        value={manner.hand}
        onChange={(hand) => onChange({ ...manner, hand })}
        options={[
          { value: 'right', label: room.handRight, hint: room.handRightHint },
          { value: 'left', label: room.handLeft, hint: room.handLeftHint },
        ]}
      />
      <div className="choice-options">
        <Check
          label={room.confirm}
          hint={room.confirmHint}
          checked={manner.confirm}
          onChange={(confirm) => onChange({ ...manner, confirm })}
        />
        <Check
          label={room.remind}
          hint={room.remindHint}
          checked={manner.remind}
          onChange={(remind) => onChange({ ...manner, remind })}
        />
      </div>
    </div>
  );
}
