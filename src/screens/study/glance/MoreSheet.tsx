import { useState } from 'react';
import type { Study } from '../../../model/study.ts';
import { Button } from '../../../ui/Button.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import { BeginStudy } from './BeginStudy.tsx';
import { OpenDemo } from './OpenDemo.tsx';

/** Files, settings, methods, and the other studies on this tablet. */
export function MoreSheet({ study }: { readonly study: Study }) {
  const { words, store, useStored } = useServices();
  const [beginning, setBeginning] = useState(false);
  const { run, notice } = useDoing();
  const studies = useStored((reader) => reader.studies(), []);
  const others = studies?.ok ? studies.value.filter((one) => one.id !== study.id) : [];
  const hasDemo = study.demo || others.some((one) => one.demo);
  return (
    <Sheet title={words.study.more}>
      <div className="stack">
        <div className="row">
          <a className="button" href="#/study/files">
            {words.study.toFiles}
          </a>
          <a className="button" href="#/study/settings">
            {words.study.toSettings}
          </a>
          <a className="button" href="#/study/methods">
            {words.study.toMethods}
          </a>
        </div>
        {others.length > 0 && (
          <div className="stack-tight">
            <h3>{words.study.otherStudies}</h3>
            <div className="row">
              {others.map((one) => (
                <Button key={one.id} onClick={() => run(store.saveSettings({ study: one.id }))}>
                  {words.study.showStudy({ name: one.name })}
                </Button>
              ))}
            </div>
          </div>
        )}
        {notice}
        <div className="row">
          <Button aria-expanded={beginning} onClick={() => setBeginning(!beginning)}>
            {words.study.beginAnother}
          </Button>
          {!hasDemo && <OpenDemo />}
        </div>
        {beginning && <BeginStudy />}
      </div>
    </Sheet>
  );
}
