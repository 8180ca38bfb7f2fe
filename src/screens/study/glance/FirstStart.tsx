import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';
import { BeginStudy } from './BeginStudy.tsx';
import { OpenDemo } from './OpenDemo.tsx';

/** Nothing is here yet: look around, or begin. */
export function FirstStart() {
  const { study, before } = useWords();
  return (
    <div className="stack">
      <PageHead about={before.appIs} note={study.firstNote}>
        {study.firstTitle}
      </PageHead>
      <div className="columns">
        <Sheet title={study.demoTitle}>
          <div className="stack-tight">
            <p className="second">{study.demoText}</p>
            <OpenDemo main />
          </div>
        </Sheet>
        <Sheet title={study.ownTitle}>
          <BeginStudy />
        </Sheet>
      </div>
      <p>
        <a href="#/study/files">{study.firstFiles}</a>
      </p>
    </div>
  );
}
