import type { CodeSet } from './codeSet.ts';

/** What a starter set says, from the message catalogue, so that it can be read in any language. */
export interface StarterTexts {
  readonly onOff: string;
  readonly aloneOrWithOthers: string;
  readonly onTask: CodeTexts;
  readonly offTask: CodeTexts;
  readonly offTaskAlone: CodeTexts;
  readonly offTaskWithOthers: CodeTexts;
}

interface CodeTexts {
  readonly label: string;
  readonly definition: string;
  readonly examples: string;
  readonly nonExamples: string;
}

/** The two sets that come with the program; teams write their own. Ids are fixed, so that two tablets' marks meet. */
export function starterCodeSets(texts: StarterTexts): CodeSet[] {
  return [
    {
      name: texts.onOff,
      codes: [
        { id: 'on', role: 'on-task', ...texts.onTask },
        { id: 'off', role: 'off-task', ...texts.offTask },
      ],
    },
    {
      name: texts.aloneOrWithOthers,
      codes: [
        { id: 'on', role: 'on-task', ...texts.onTask },
        { id: 'off-alone', role: 'off-task', ...texts.offTaskAlone },
        { id: 'off-others', role: 'off-task', ...texts.offTaskWithOthers },
      ],
    },
  ];
}
