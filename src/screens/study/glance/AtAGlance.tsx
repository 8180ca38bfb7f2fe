import { useEffect } from 'react';
import type { Study } from '../../../model/study.ts';
import { PageHead } from '../../../ui/PageHead.tsx';
import { useServices } from '../../services.ts';
import { useCurrentStudy } from '../../useCurrentStudy.ts';
import { useFarewell } from '../farewell.ts';
import { Stored } from '../Stored.tsx';
import { ClassesSheet } from './ClassesSheet.tsx';
import { FirstStart } from './FirstStart.tsx';
import { MoreSheet } from './MoreSheet.tsx';
import { ObserversSheet, ProtocolsSheet } from './PeopleAndProtocols.tsx';

/** /study: what there is, or the two ways to begin. */
export function AtAGlance() {
  const { words } = useServices();
  const study = useCurrentStudy();
  const { notice, forget } = useFarewell();
  // biome-ignore lint/correctness/useExhaustiveDependencies: said once, for as long as this page is open
  useEffect(() => forget, []);
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  return (
    <div className="stack">
      {notice}
      {study === null ? <FirstStart /> : <Glance key={study.id} study={study} />}
    </div>
  );
}

function Glance({ study }: { readonly study: Study }) {
  const { words, useStored } = useServices();
  const answer = useStored(
    async (store) => {
      const classes = await store.classes(study.id);
      if (!classes.ok) return classes;
      const protocols = await store.protocols(study.id);
      if (!protocols.ok) return protocols;
      const observers = await store.observers(study.id);
      if (!observers.ok) return observers;
      return {
        ok: true as const,
        value: { classes: classes.value, protocols: protocols.value, observers: observers.value },
      };
    },
    [study.id],
  );
  return (
    <Stored answer={answer}>
      {({ classes, protocols, observers }) => {
        const children = classes.flatMap((one) => one.children).filter((child) => !child.removed).length;
        return (
          <div className="stack">
            <PageHead
              {...(study.demo ? { about: words.study.demoSign } : {})}
              note={words.study.glanceNote({
                phases: study.phases,
                conditions: study.conditions,
                control: study.control,
              })}
            >
              {words.study.glance({
                name: study.name,
                classes: classes.length,
                children,
                observers: observers.length,
              })}
            </PageHead>
            <div className="columns">
              <ClassesSheet classes={classes} />
              <div className="stack">
                <ProtocolsSheet protocols={protocols} />
                <ObserversSheet observers={observers} />
              </div>
            </div>
            {classes.length > 0 && (
              <p>
                <a className="button button-main" href="#/before">
                  {words.study.prepareVisit}
                </a>
              </p>
            )}
            <MoreSheet study={study} />
          </div>
        );
      }}
    </Stored>
  );
}
