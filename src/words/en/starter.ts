/** What a new study starts with: phases, lesson parts and two sets of codes. Teams rewrite them. */
export const starter = {
  phaseBefore: 'before',
  phaseAfter: 'after',
  conditionBreak: 'break',
  conditionUsual: 'usual',
  wholeClass: 'whole class',
  group: 'group',
  individual: 'individual',
  transition: 'transition',
  onOff: 'On / off',
  aloneOrWithOthers: 'Alone or with others',
  onLabel: 'on-task',
  onDefinition:
    'At the moment of the look the child attends to the lesson or works at the task that the teacher has set.',
  onExamples:
    'Looks at the teacher or the board while something is explained; reads, writes or handles what the task needs; talks with a partner about the task; fetches something that the task needs; waits with a raised hand.',
  onNonExamples: 'Holds a pencil and gazes out of the window; talks about the weekend.',
  offLabel: 'off-task',
  offDefinition:
    'At the moment of the look the child does something else than the lesson or the task asks for.',
  offExamples:
    'Gazes around, plays with things, walks about, talks about something else, rests the head on the table.',
  offNonExamples: 'Fidgets quietly with the eyes on the teacher; helps a neighbour with the task.',
  offAloneLabel: 'off-task, by oneself',
  offAloneDefinition: 'Off-task, and nobody else is part of it.',
  offAloneExamples:
    'Gazes out of the window, draws on the table, looks for something in the bag that the task does not need.',
  offAloneNonExamples: 'Whispers to a neighbour (with others).',
  offOthersLabel: 'off-task, with others',
  offOthersDefinition: 'Off-task together with at least one other child or adult.',
  offOthersExamples:
    'Talks about something else, passes things round, laughs with a neighbour across the table.',
  offOthersNonExamples: 'Explains the task to a partner (on-task).',
  protocolMomentary: 'Next child, every 15 seconds',
  protocolPartial: 'One after another, 10 seconds watching',
} as const;
