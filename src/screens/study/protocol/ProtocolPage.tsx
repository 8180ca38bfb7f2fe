import type { Protocol } from '../../../model/protocol.ts';
import type { Study } from '../../../model/study.ts';
import { versionWasUsed } from '../../../tasks/usedVersions.ts';
import { PageHead } from '../../../ui/PageHead.tsx';
import { useServices } from '../../services.ts';
import { useAnswer } from '../../useAnswer.ts';
import { NotHere, Stored } from '../Stored.tsx';
import { ProtocolForm } from './ProtocolForm.tsx';
import { Versions } from './Versions.tsx';

interface Found {
  readonly study: Study;
  readonly versions: readonly Protocol[];
}

/** /study/protocol/:id: the newest version, to be changed, and the ones before it. */
export function ProtocolPage({ id }: { readonly id: string }) {
  const { useStored } = useServices();
  const answer = useStored<Found | null>(
    async (store) => {
      const versions = await store.protocolVersions(id);
      if (!versions.ok) return versions;
      const newest = [...versions.value].sort((a, b) => b.version - a.version);
      const first = newest[0];
      if (first === undefined || first.removed) return { ok: true, value: null };
      const study = await store.study(first.study);
      if (!study.ok) return study;
      return { ok: true, value: study.value === null ? null : { study: study.value, versions: newest } };
    },
    [id],
  );
  return (
    <Stored answer={answer}>
      {(found) => {
        const newest = found?.versions[0];
        if (found === null || newest === undefined) return <NotHere />;
        return <Page study={found.study} newest={newest} versions={found.versions} />;
      }}
    </Stored>
  );
}

function Page({ study, newest, versions }: Found & { readonly newest: Protocol }) {
  const { words, deps } = useServices();
  const used = useAnswer(
    () => versionWasUsed(deps, newest),
    `${newest.id} ${newest.version} ${newest.revision.counter}`,
  );
  const { id, version, removed: _removed, revision: _revision, ...content } = newest;
  if (used.state === 'working') return <p className="second">{words.common.loading}</p>;
  return (
    <Stored answer={used.answer}>
      {(wasUsed) => (
        <div className="stack">
          <PageHead
            about={<a href="#/study">{study.name}</a>}
            note={wasUsed ? words.study.protocolUsed({ version }) : words.study.protocolUnused}
          >
            {words.study.protocolTitle({ name: newest.name, version })}
          </PageHead>
          <ProtocolForm key={id} first={{ ...content, id }} nextVersion={wasUsed ? version + 1 : version} />
          {versions.length > 1 && <Versions versions={versions} />}
        </div>
      )}
    </Stored>
  );
}
