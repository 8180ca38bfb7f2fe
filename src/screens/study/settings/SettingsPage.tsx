import type { Study } from '../../../model/study.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useCurrentStudy, useSettings } from '../../useCurrentStudy.ts';
import { useDoing } from '../useDoing.tsx';
import { RemoveStudy } from './RemoveStudy.tsx';
import { StudyForm } from './StudyForm.tsx';

/** /study/settings: the tablet's colours, the study's words, the cautions, and the way to remove the study. */
export function SettingsPage() {
  const { words } = useServices();
  const study = useCurrentStudy();
  if (study === undefined) return <p className="second">{words.common.loading}</p>;
  return (
    <div className="stack">
      <PageHead {...(study === null ? {} : { about: <a href="#/study">{study.name}</a> })}>
        {words.study.settingsTitle}
      </PageHead>
      <Colours />
      {study !== null && <OfStudy key={study.id} study={study} />}
      <Cautions study={study} />
      {study !== null && <RemoveStudy study={study} />}
    </div>
  );
}

function OfStudy({ study }: { readonly study: Study }) {
  const { words } = useServices();
  return (
    <Sheet title={words.study.wordsOfStudy}>
      <StudyForm study={study} />
    </Sheet>
  );
}

function Colours() {
  const { words, store } = useServices();
  const theme = useSettings()?.theme ?? null;
  const { run, notice } = useDoing();
  return (
    <Sheet title={words.study.thisTablet}>
      <div className="stack-tight">
        <Choice
          legend={words.common.theme}
          value={theme}
          onChange={(next) => void run(store.saveSettings({ theme: next }))}
          options={[
            { value: 'system', label: words.common.themeSystem },
            { value: 'light', label: words.common.themeLight },
            { value: 'dim', label: words.common.themeDim },
          ]}
        />
        {notice}
      </div>
    </Sheet>
  );
}

function Cautions({ study }: { readonly study: Study | null }) {
  const { words } = useServices();
  return (
    <Sheet title={words.study.cautions}>
      <ul className="cautions">
        <li>{words.study.cautionConsent}</li>
        <li>{words.study.cautionPseudonyms}</li>
        <li>{words.study.cautionGroups}</li>
        <li>
          {words.study.cautionSafeguarding}
          {study !== null && study.safeguarding !== '' && <strong> {study.safeguarding}</strong>}
        </li>
        <li>{words.study.cautionBreaks}</li>
        <li>{words.study.cautionDesign}</li>
      </ul>
    </Sheet>
  );
}
