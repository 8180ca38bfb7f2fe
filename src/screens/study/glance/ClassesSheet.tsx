import type { Classroom } from '../../../model/classroom.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';

/** The classes of the study; each line opens one. */
export function ClassesSheet({ classes }: { readonly classes: readonly Classroom[] }) {
  const { study } = useWords();
  return (
    <Sheet title={study.classes} flush>
      {classes.length === 0 && <p className="line-lead second">{study.noClasses}</p>}
      <nav className="lines" aria-label={study.classes}>
        {classes.map((one) => (
          <a key={one.id} className="line" href={`#/study/class/${one.id}`}>
            <span className="grow">
              <strong>{one.name}</strong>
              <br />
              <span className="second small">
                {study.classLine({
                  children: one.children.filter((child) => !child.removed).length,
                  chosen: one.draw?.chosen.length ?? null,
                  reserves: one.draw?.reserves.length ?? 0,
                  condition: one.condition,
                })}
              </span>
            </span>
          </a>
        ))}
      </nav>
      <p className="line-foot">
        <a className={classes.length === 0 ? 'button button-main' : 'button'} href="#/study/class/new">
          {study.addClass}
        </a>
      </p>
    </Sheet>
  );
}
