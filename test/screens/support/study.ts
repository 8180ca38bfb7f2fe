import type { Services } from '../../../src/screens/services.ts';
import { newStudyTexts } from '../../../src/screens/study/starterTexts.ts';
import { addClass, createStudy, drawTargets, importClassList } from '../../../src/tasks/index.ts';
import { must } from './studyOf.ts';

/** A small study with one class of eight children, of whom six are drawn. */
export async function studyWithClass(services: Services) {
  const { deps, words, store } = services;
  const study = must(await createStudy(deps, { name: 'Breaks', texts: newStudyTexts(words) }));
  const classroom = must(await addClass(deps, study.id, { name: 'Otter', condition: 'break' }));
  const content = Array.from({ length: 8 }, (_, i) => `Otter-0${i + 1}`).join('\n');
  must(await importClassList(deps, classroom.id, { content, consent: true }));
  const [protocol] = must(await store.protocols(study.id));
  if (protocol === undefined) throw new Error('a new study has no protocol');
  const drawn = must(await drawTargets(deps, classroom.id, { id: protocol.id }, 'seed'));
  return { study, classroom: drawn, protocol };
}
