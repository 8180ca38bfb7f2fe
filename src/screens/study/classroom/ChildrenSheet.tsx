import { useRef, useState } from 'react';
import type { Child, Classroom } from '../../../model/classroom.ts';
import { removeChild } from '../../../tasks/index.ts';
import { restoreChild } from '../../../tasks/restore.ts';
import { Button } from '../../../ui/Button.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { AddChildren } from './AddChildren.tsx';
import { ChangeChild } from './ChangeChild.tsx';

/** The children of the class, each to be opened by a tap, and ways to add more. */
export function ChildrenSheet({ classroom }: { readonly classroom: Classroom }) {
  const { words, deps } = useServices();
  const { study, f } = words;
  const { run, tell, notice } = useDoing();
  const children = classroom.children
    .filter((child) => !child.removed)
    .sort((a, b) => a.pseudonym.localeCompare(b.pseudonym, f.locale, { numeric: true }));
  const [opened, open] = useState<string | null>(null);
  const [adding, setAdding] = useState(children.length === 0);
  const list = useRef<HTMLUListElement>(null);
  const child = children.find((one) => one.id === opened);
  const close = () => {
    // The keyboard stays with the child whose form goes away.
    list.current?.querySelector<HTMLElement>('[aria-expanded="true"]')?.focus();
    open(null);
  };
  const withdraw = async ({ id, pseudonym }: Child) => {
    const seat = classroom.plan?.seats.find((one) => one.child === id)?.id ?? null;
    const done = await run(removeChild(deps, classroom.id, id));
    if (!done.ok) return;
    list.current?.focus();
    open(null);
    tell(study.withdrawn({ name: pseudonym }), () => restoreChild(deps, classroom.id, id, seat));
  };
  return (
    <Sheet title={study.children}>
      <div className="stack">
        {notice}
        {children.length === 0 && <p className="second">{`${study.noChildren} ${study.consentFirst}`}</p>}
        {children.length > 0 && (
          <div className="stack-tight">
            <ul className="child-list" aria-label={study.children} tabIndex={-1} ref={list}>
              {children.map((one) => (
                <li key={one.id}>
                  <Button
                    className="child-open"
                    aria-expanded={one.id === opened}
                    onClick={() => open(one.id === opened ? null : one.id)}
                  >
                    <span>{one.pseudonym}</span>
                    {one.stratum !== null && <span className="second small">{one.stratum}</span>}
                  </Button>
                </li>
              ))}
            </ul>
            {child === undefined ? (
              <p className="second small">{study.tapToChange}</p>
            ) : (
              <ChangeChild
                key={child.id}
                classroom={classroom.id}
                child={child}
                onWithdraw={() => void withdraw(child)}
                onDone={close}
              />
            )}
          </div>
        )}
        {children.length > 0 && (
          <div className="row">
            <Button aria-expanded={adding} onClick={() => setAdding(!adding)}>
              {study.addMore}
            </Button>
          </div>
        )}
        {adding && children.length > 0 && <p className="second">{study.consentFirst}</p>}
        {adding && <AddChildren classroom={classroom} />}
      </div>
    </Sheet>
  );
}
