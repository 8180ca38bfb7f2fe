import type { Classroom } from '../../../model/classroom.ts';
import type { Study } from '../../../model/study.ts';
import { PageHead } from '../../../ui/PageHead.tsx';
import { useServices } from '../../services.ts';
import { NotHere, Stored } from '../Stored.tsx';
import { ChildrenSheet } from './ChildrenSheet.tsx';
import { ClassFacts } from './ClassFacts.tsx';
import { DrawSheet } from './DrawSheet.tsx';
import { SeatsSheet } from './SeatsSheet.tsx';
import { useClass } from './useClass.ts';
import './classPage.css';

/** /study/class/:id: children, draw, seats, and the class's own facts. */
export function ClassPage({ id }: { readonly id: string }) {
  return (
    <Stored answer={useClass(id)}>
      {(found) => (found === null ? <NotHere /> : <Pages classroom={found.classroom} study={found.study} />)}
    </Stored>
  );
}

function Pages({ classroom, study }: { readonly classroom: Classroom; readonly study: Study }) {
  const { words } = useServices();
  return (
    <div className="stack">
      <PageHead
        about={
          <>
            <a href="#/study">{study.name}</a>
            {classroom.condition === null ? '' : ` · ${classroom.condition}`}
          </>
        }
      >
        {words.study.classTitle({
          name: classroom.name,
          children: classroom.children.filter((child) => !child.removed).length,
          chosen: classroom.draw?.chosen.length ?? null,
        })}
      </PageHead>
      <div className="columns">
        <ChildrenSheet classroom={classroom} />
        <div className="stack">
          <DrawSheet classroom={classroom} />
          <SeatsSheet classroom={classroom} />
          <ClassFacts classroom={classroom} study={study} />
        </div>
      </div>
    </div>
  );
}
