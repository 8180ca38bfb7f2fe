import { useState } from 'react';
import type { PairDetails } from '../../analysis/index.ts';
import { Choice } from '../../ui/Choice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { useServices } from '../services.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';
import { HeldBackPage } from './HeldBack.tsx';
import { PageFoot } from './PageFoot.tsx';
import { PairPage } from './PairPage.tsx';
import { useFigures } from './useFigures.ts';
import { useListed } from './useListed.ts';
import { useStamp } from './useStamp.ts';
import { Working } from './Working.tsx';

/** Agreement at one visit. `id`: one of its sessions, or its visit id. */
export function VisitPage({ id }: { readonly id: string }) {
  const { words, useStored } = useServices();
  const study = useCurrentStudy();
  const session = useStored((store) => store.session(id), [id]);
  const stamp = useStamp(study?.id);
  const [chosen, setChosen] = useState<string | null>(null);
  const listed = useListed(study?.id);
  const own = session?.ok === true ? session.value : null;
  const practice = own?.practice === true;
  const familiarisation = own?.familiarisation === true;
  const figures = useFigures(
    { kind: 'agreement', study: study?.id ?? '', visit: id, practice, familiarisation },
    session === undefined || !study ? undefined : stamp,
  );
  if (study === null) return <PageHead>{words.afterwards.noStudy}</PageHead>;
  if (listed === undefined) return <p className="second">{words.common.loading}</p>;
  const visit = own === null ? id : listed.visitOf(own);
  if (listed.sessions.some((one) => listed.visitOf(one) === visit && listed.held.has(one.id)))
    return <HeldBackPage />;
  return (
    <Working figures={figures}>
      {({ pairs }) => {
        const groups = byPair(pairs);
        const keys = [...groups.keys()];
        const key = chosen !== null && groups.has(chosen) ? chosen : keys[0];
        const own = key === undefined ? undefined : groups.get(key);
        if (own === undefined) {
          return (
            <div className="stack">
              <PageHead>{words.agreement.aloneTitle}</PageHead>
              <p className="second">{words.agreement.aloneText}</p>
              <PageFoot />
            </div>
          );
        }
        return (
          <PairPage key={key} pairs={own}>
            {keys.length > 1 && (
              <Choice
                legend={words.agreement.observers}
                value={key ?? null}
                options={keys.map((one) => ({
                  value: one,
                  label: words.f.list(groups.get(one)?.[0]?.row.observers ?? []),
                }))}
                onChange={setChosen}
              />
            )}
          </PairPage>
        );
      }}
    </Working>
  );
}

/** The phases of one pair of records belong together. */
function byPair(pairs: readonly PairDetails[]): Map<string, PairDetails[]> {
  const groups = new Map<string, PairDetails[]>();
  for (const pair of pairs) {
    const key = pair.sessionIds.join(' ');
    groups.set(key, [...(groups.get(key) ?? []), pair]);
  }
  return groups;
}
