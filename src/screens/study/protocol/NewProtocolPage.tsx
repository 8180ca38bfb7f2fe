import { useState } from 'react';
import type { Study } from '../../../model/study.ts';
import { starterDraft } from '../../../tasks/index.ts';
import { PageHead } from '../../../ui/PageHead.tsx';
import { useServices } from '../../services.ts';
import { useCurrentStudy } from '../../useCurrentStudy.ts';
import { NotHere } from '../Stored.tsx';
import { starterSets } from '../starterTexts.ts';
import { ProtocolForm } from './ProtocolForm.tsx';

/** /study/protocols/new: a protocol with the field's usual choices, to be changed. */
export function NewProtocolPage() {
  const { words } = useServices();
  const study = useCurrentStudy();
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  return study === null ? <NotHere /> : <NewProtocol study={study} />;
}

function NewProtocol({ study }: { readonly study: Study }) {
  const { words } = useServices();
  const [draft] = useState(() => {
    const set = starterSets(words)[0] ?? { name: '', codes: [] };
    return starterDraft('momentary', study.id, '', set);
  });
  return (
    <>
      <PageHead about={<a href="#/study">{study.name}</a>}>{words.study.protocolNewTitle}</PageHead>
      <ProtocolForm first={draft} nextVersion={null} />
    </>
  );
}
