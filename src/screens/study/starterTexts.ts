import type { CodeSet } from '../../model/codeSet.ts';
import { type StarterTexts, starterCodeSets } from '../../model/starterCodeSets.ts';
import type { NewStudyTexts } from '../../tasks/index.ts';
import type { Words } from '../../words/words.ts';

function codeTexts({ starter }: Words): StarterTexts {
  return {
    onOff: starter.onOff,
    aloneOrWithOthers: starter.aloneOrWithOthers,
    onTask: {
      label: starter.onLabel,
      definition: starter.onDefinition,
      examples: starter.onExamples,
      nonExamples: starter.onNonExamples,
    },
    offTask: {
      label: starter.offLabel,
      definition: starter.offDefinition,
      examples: starter.offExamples,
      nonExamples: starter.offNonExamples,
    },
    offTaskAlone: {
      label: starter.offAloneLabel,
      definition: starter.offAloneDefinition,
      examples: starter.offAloneExamples,
      nonExamples: starter.offAloneNonExamples,
    },
    offTaskWithOthers: {
      label: starter.offOthersLabel,
      definition: starter.offOthersDefinition,
      examples: starter.offOthersExamples,
      nonExamples: starter.offOthersNonExamples,
    },
  };
}

/** What a new study starts with, in the language of the screens. */
export function newStudyTexts(words: Words): NewStudyTexts {
  const { starter } = words;
  return {
    phases: [starter.phaseBefore, starter.phaseAfter],
    conditions: [starter.conditionBreak, starter.conditionUsual],
    control: starter.conditionUsual,
    lessonParts: [starter.wholeClass, starter.group, starter.individual, starter.transition],
    codeSets: codeTexts(words),
    protocolMomentary: starter.protocolMomentary,
    protocolPartial: starter.protocolPartial,
  };
}

/** The code sets that come with the program, in the language of the screens. */
export const starterSets = (words: Words): CodeSet[] => starterCodeSets(codeTexts(words));
