import type { CodeSet } from '../../../src/model/codeSet.ts';

const code = (id: string, label: string, role: 'on-task' | 'off-task') => ({
  id,
  label,
  role,
  definition: '',
  examples: '',
  nonExamples: '',
});

/** On-task, and two ways of being off it. */
export const threeCodes: CodeSet = {
  name: 'Three',
  codes: [
    code('on', 'on-task', 'on-task'),
    code('alone', 'off-task, by oneself', 'off-task'),
    code('others', 'off-task, with others', 'off-task'),
  ],
};
