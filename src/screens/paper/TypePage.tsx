import { useWords } from '../services.ts';
import { useSettings } from '../useCurrentStudy.ts';
import { ChooseSheet } from './ChooseSheet.tsx';
import { TypeIn } from './TypeIn.tsx';
import './typing.css';

/** A written sheet comes back: first which one, then line by line. What was begun is there again after a reload. */
export function TypePage() {
  const words = useWords();
  const settings = useSettings();
  if (settings === undefined) return <p className="second">{words.common.loading}</p>;
  const { paper } = settings;
  return paper === null ? <ChooseSheet settings={settings} /> : <TypeIn key={paper.session} first={paper} />;
}
