import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { type PlanPreset, setSeatingPlan } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Choice } from '../../../ui/Choice.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import { pseudonymsOf } from './pseudonymsOf.ts';
import type { PlanEdits } from './usePlanEdits.ts';

type Kind = PlanPreset['kind'];
const perTable = { pairs: 2, fours: 4 } as const;

/** Rooms as they often stand, to begin with. */
export function PresetForm({
  classroom,
  edits,
}: {
  readonly classroom: Classroom;
  readonly edits: PlanEdits;
}) {
  const { words, deps } = useServices();
  const { study } = words;
  const children = Math.max(1, pseudonymsOf(classroom).size);
  const [kind, setKind] = useState<Kind>('pairs');
  const [across, setAcross] = useState(3);
  const [deep, setDeep] = useState<number | null>(null);
  const [count, setCount] = useState(Math.min(50, Math.max(3, children)));
  const rowsNeeded = (of: 'pairs' | 'fours') => Math.min(7, Math.ceil(children / (across * perTable[of])));
  const rows = kind === 'horseshoe' ? 0 : (deep ?? rowsNeeded(kind));
  const preset: PlanPreset = kind === 'horseshoe' ? { kind, seats: count } : { kind, columns: across, rows };
  const seats = kind === 'horseshoe' ? count : across * rows * perTable[kind];
  return (
    <Sheet title={classroom.plan === null ? study.preset : study.presetAgain}>
      <div className="stack-tight">
        {classroom.plan !== null && <p className="second">{study.presetKeeps}</p>}
        <Choice<Kind>
          legend={study.preset}
          legendHidden
          value={kind}
          onChange={setKind}
          options={[
            { value: 'pairs', label: study.presetPairs },
            { value: 'fours', label: study.presetFours },
            { value: 'horseshoe', label: study.presetHorseshoe },
          ]}
        />
        {kind === 'horseshoe' ? (
          <NumberField label={study.seatCount} min={3} max={50} value={count} onValue={setCount} />
        ) : (
          <div className="row row-top">
            <NumberField label={study.tablesAcross} min={1} max={7} value={across} onValue={setAcross} />
            <NumberField label={study.tablesDeep} min={1} max={7} value={rows} onValue={setDeep} />
          </div>
        )}
        <div className="row">
          <Button
            look={classroom.plan === null ? 'main' : 'plain'}
            onClick={() => edits.step(() => setSeatingPlan(deps, classroom.id, preset))}
          >
            {study.presetPut({ seats })}
          </Button>
          {edits.undo !== null && <Button onClick={edits.undo}>{words.common.undo}</Button>}
        </div>
      </div>
    </Sheet>
  );
}
