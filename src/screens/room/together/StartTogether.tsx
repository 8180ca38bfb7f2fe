import { Button } from '../../../ui/Button.tsx';
import { Choice } from '../../../ui/Choice.tsx';
import { useCoreServices } from '../../coreServices.ts';
import { AgreedSecond } from './AgreedSecond.tsx';
import type { Together } from './useTogether.ts';
import './together.css';

/** How two observers begin: what the tick check found, and by a count or by a second. */
export function StartTogether({ together }: { readonly together: Together }) {
  const { room } = useCoreServices().words;
  const { by, now, at, checkedAgo, nudgeMs } = together;
  const checked = checkedAgo !== null;
  return (
    <div className="together">
      <div className="together-check">
        <p className="second">{checked ? room.tickKept({ ms: nudgeMs, ago: checkedAgo }) : room.tickNone}</p>
        <Button onClick={together.openCheck}>{checked ? room.tickAgain : room.tickOpen}</Button>
      </div>
      <Choice
        legend={room.howToStart}
        value={by}
        onChange={together.choose}
        options={[
          { value: 'count', label: room.byCount, hint: room.byCountHint },
          {
            value: 'second',
            label: room.bySecond,
            hint: checked ? room.bySecondChecked : room.bySecondHint,
          },
        ]}
      />
      {by === 'second' && <AgreedSecond now={now} at={at} onChange={together.agree} />}
    </div>
  );
}
