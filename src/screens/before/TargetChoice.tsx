import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import { type OrderOfDay, watchesOne } from '../../schedule/orderOfDay.ts';
import { SelectField } from '../../ui/Field.tsx';
import { useServices } from '../services.ts';

interface Props {
  readonly classroom: Classroom;
  readonly protocol: Protocol;
  /** The day's order with nobody chosen: its first child is the one that chance (or the draw) gives. */
  readonly byItself: OrderOfDay;
  readonly absent: ReadonlySet<string>;
  readonly first: string | null;
  readonly onChange: (first: string | null) => void;
}

/** Which child is the target, or the only one: as chance has it, or chosen by name before the schedule is frozen. */
export function TargetChoice({ classroom, protocol, byItself, absent, first, onChange }: Props) {
  const { words } = useServices();
  const { before } = words;
  const there = classroom.children.filter((child) => !child.removed && !absent.has(child.id));
  const drawn = new Set(classroom.draw?.chosen ?? []);
  const given = there.find(({ id }) => id === byItself.children[0])?.pseudonym;
  const groups = [
    { label: before.targetDrawn, of: there.filter(({ id }) => drawn.has(id)) },
    { label: before.targetOthers, of: there.filter(({ id }) => !drawn.has(id)) },
  ].filter(({ of }) => of.length > 0);
  return (
    <SelectField
      label={watchesOne(protocol) ? before.onlyChild : before.targetChild}
      hint={watchesOne(protocol) ? before.onlyChildHint : before.targetChildHint}
      value={first ?? ''}
      onChange={(event) => onChange(event.target.value === '' ? null : event.target.value)}
    >
      <option value="">
        {given === undefined
          ? before.targetOpen
          : protocol.order === 'listed'
            ? before.targetAsDrawn({ name: given })
            : before.targetByChance({ name: given })}
      </option>
      {groups.map(({ label, of }) => (
        <optgroup key={label} label={label}>
          {of.map(({ id, pseudonym }) => (
            <option key={id} value={id}>
              {pseudonym}
            </option>
          ))}
        </optgroup>
      ))}
    </SelectField>
  );
}
