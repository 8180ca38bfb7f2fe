/**
 * What a packed visit is likely to hold, so that it need not be said again: the names of its members as they follow one
 * another, and words that studies begin with. It belongs to the form of cards of version 1 and is never changed: with
 * another one no card of that version could be read. What is likeliest stands last (RFC 1950, section 2.2).
 */
export const cardDictionary = [
  'Whispers to a neighbour (with others).Off-task together with at least one other child or adult.',
  'Talks about something else, passes things round, laughs with a neighbour across the table.',
  'Explains the task to a partner (on-task).Off-task, and nobody else is part of it.',
  'Gazes out of the window, draws on the table, looks for something in the bag that the task does not need.',
  'off-task, by oneself","off-task, with others","Alone or with others',
  'Fidgets quietly with the eyes on the teacher; helps a neighbour with the task.',
  'Holds a pencil and gazes out of the window; talks about the weekend.',
  'At the moment of the look the child does something else than the lesson or the task asks for.',
  'At the moment of the look the child attends to the lesson or works at the task that the teacher has set.',
  'Gazes around, plays with things, walks about, talks about something else, rests the head on the table.',
  'Looks at the teacher or the board while something is explained; reads, writes or handles what the task needs; ',
  'talks with a partner about the task; fetches something that the task needs; waits with a raised hand.',
  'One after another, 10 seconds watching","partial","whole","headcount","duration","random each round","listed"',
  '"block","intervals":"one"}"sweep","eachMs":1000}"target","peerEvery":"headsUp":{"aheadMs":3000,"says":"seat"',
  '"front","left","right","start","minutes":15,"primary","second",true,{"kind":"next"}',
  'xoshiro128** from FNV-1a and splitmix32, version 1","reserves":[',
  '[1,{"children":{"~":[["id","pseudonym","stratum"],["~","~","~","~","~","~"],["Otter-01","Otter-02","Otter-03"],',
  '[null,null,null,null,null,null]]},"classroom":{"id":"~","name":"Class "},"condition":"break","draw":{"chosen":[',
  '"~1","~2","~3","~4","~5","~0"],"from":["~","~","~","~","~","~","~","~"],"method":{"generator":"',
  '","name":"stratified","version":1},"reserves":[],"seed":""},"orderSeed":"","plan":{"columns":6,"observerSide":',
  '"back","rows":5,"seats":{"~":[["child","column","id","row","table"],["~6","~7","~8","~9","~a","~b",null],',
  '[0,1,2,3,4,5,0,1,2,3,4,5,6,7],["~","~","~","~"],[0,0,0,0,0,0,1,1,1,1,1,1,2,2,2,2,2,2,3,3,3,3,3,3,4,4],',
  '[0,0,1,1,2,2,3,3,4,4,5,5,6,6,7,7,8,8,9,9,10,10,11,11,12,12,13,13,14,14,15]]}},"plannedStart":"2026-11-03T10:',
  '00:00.000+01:00","reserves":{"~":[["id","pseudonym","stratum"],["schedule":{"kind":"laid","phases":["before",',
  '"after"],"protocol":{"childrenToDraw":6,"codeSet":{"codes":{"~":[["definition","examples","id","label",',
  '"nonExamples","role"],["on","off"],["on-task","off-task"],["on-task","off-task"]]},"name":"On / off"},"cues":{',
  '"channel":"both","flash":true,"vibration":false,"volume":0.4},"graceMs":400,"id":"~","intervalMs":15000,"lookAt":',
  '"end","method":"momentary","name":"Next child, every 15 seconds","observeMs":15000,"order":"random","partLength":{',
  '"kind":"minutes","minutes":15},"kind":"rounds","rounds":10},"removed":false,"reserves":2,"revision":{"counter":0,',
  '"writer":"~"},"rotation":{"kind":"next"},"study":"~","version":1},"turns":[[0,1,2,3,4,5]]},"study":{"conditions":[',
  '"break","usual"],"id":"~","lessonParts":["whole class","group","individual","transition"],"name":"","phases":[',
  '"before","after"]},"visit":"~"}]',
].join('');
