import type { Observer } from '../../model/observer.ts';
import type { Role } from '../../model/session.ts';
import type { LikelyObserver } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { useServices } from '../services.ts';
import { CheckRow } from './CheckRow.tsx';
import { type Purpose, PurposeChoice } from './PurposeChoice.tsx';
import { useNewObserver } from './useNewObserver.tsx';

/** Who records, beside whom, and whether it counts. */
export interface Who {
  readonly observer: string | null;
  readonly role: Role | null;
  readonly purpose: Purpose;
}

interface Props {
  readonly study: string;
  readonly observers: readonly Observer[];
  readonly who: Who;
  readonly onChange: (who: Who) => void;
}

interface CheckProps extends Props {
  /** Why somebody stands there whom nobody has chosen yet; null where the choice was made. */
  readonly why: LikelyObserver['why'] | null;
  readonly open: boolean;
  readonly onOpen: (open: boolean) => void;
}

export function ObserverCheck({ study, observers, who, why, open, onOpen, onChange }: CheckProps) {
  const { words } = useServices();
  const observer = observers.find((o) => o.id === who.observer);
  const role = {
    alone: words.before.roleShortAlone,
    primary: words.before.roleShortPrimary,
    second: words.before.roleShortSecond,
  }[who.role ?? 'alone'];
  return (
    <CheckRow
      name={words.before.observer}
      state={observer === undefined ? 'hold' : 'ready'}
      actions={<Button onClick={() => onOpen(true)}>{words.before.observerChoose}</Button>}
    >
      {observer === undefined
        ? words.before.observerNobody
        : words.before.observerWho({ name: observer.name, role, purpose: who.purpose })}
      {observer !== undefined && why !== null && ` ${words.before.observerWhy({ why })}`}
      {open && (
        <WhoDialog
          study={study}
          observers={observers}
          who={who}
          onChange={onChange}
          onClose={() => onOpen(false)}
        />
      )}
    </CheckRow>
  );
}

function WhoDialog({ study, observers, who, onChange, onClose }: Props & { readonly onClose: () => void }) {
  const { words } = useServices();
  const { field, take } = useNewObserver(study, ({ id }) => onChange({ ...who, observer: id }));
  // A name that stands in the field is meant, whether "Add" was tapped or not.
  const done = async (): Promise<void> => {
    if (await take()) onClose();
  };
  return (
    <Dialog
      title={words.before.observerDialog}
      onClose={onClose}
      actions={<Button onClick={done}>{words.common.done}</Button>}
    >
      {observers.length > 0 && (
        <Choice
          legend={words.before.observer}
          value={who.observer}
          onChange={(observer) => onChange({ ...who, observer })}
          options={observers.map((o) => ({ value: o.id, label: o.name }))}
        />
      )}
      {field}
      <Choice
        legend={words.before.role}
        value={who.role ?? 'alone'}
        onChange={(role) => onChange({ ...who, role: role === 'alone' ? null : role })}
        options={[
          { value: 'alone', label: words.before.roleAlone, hint: words.before.roleAloneHint },
          { value: 'primary', label: words.before.rolePrimary, hint: words.before.rolePrimaryHint },
          { value: 'second', label: words.before.roleSecond, hint: words.before.roleSecondHint },
        ]}
      />
      <PurposeChoice purpose={who.purpose} onChange={(purpose) => onChange({ ...who, purpose })} />
    </Dialog>
  );
}
