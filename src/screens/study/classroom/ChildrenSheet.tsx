import type { Child, Classroom } from '../../../model/classroom.ts';
import { removeChild } from '../../../tasks/index.ts';
import { restoreChild } from '../../../tasks/restore.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { AddChildren } from './AddChildren.tsx';
import { ChildRow } from './ChildRow.tsx';

/** The children of the class, and ways to add more. */
export function ChildrenSheet({ classroom }: { readonly classroom: Classroom }) {
  const { words, deps } = useServices();
  const { run, tell, notice } = useDoing();
  const children = classroom.children
    .filter((child) => !child.removed)
    .sort((a, b) => a.pseudonym.localeCompare(b.pseudonym, words.f.locale, { numeric: true }));
  const withdraw = async (child: Child) => {
    const seat = classroom.plan?.seats.find((one) => one.child === child.id)?.id ?? null;
    const done = await run(removeChild(deps, classroom.id, child.id));
    if (done.ok)
      tell(words.study.withdrawn({ name: child.pseudonym }), () =>
        restoreChild(deps, classroom.id, child.id, seat),
      );
  };
  return (
    <Sheet title={words.study.children} flush>
      <p className="line-lead second">
        {children.length === 0 ? `${words.study.noChildren} ` : ''}
        {words.study.consentFirst}
      </p>
      {notice !== null && <div className="line-lead">{notice}</div>}
      <div className="line-foot">
        <AddChildren classroom={classroom} />
      </div>
      <ul className="lines">
        {children.map((child) => (
          <ChildRow key={child.id} classroom={classroom} child={child} onWithdraw={() => withdraw(child)} />
        ))}
      </ul>
    </Sheet>
  );
}
