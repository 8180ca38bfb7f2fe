import { classWords } from './study/classWords.ts';
import { glanceWords } from './study/glanceWords.ts';
import { observerWords } from './study/observerWords.ts';
import { protocolWords } from './study/protocolWords.ts';
import { scheduleWords } from './study/scheduleWords.ts';
import { seatWords } from './study/seatWords.ts';
import { settingsWords } from './study/settingsWords.ts';

/** The study: classes, children, seats, protocols, observers, settings. */
export const study = {
  ...glanceWords,
  ...classWords,
  ...seatWords,
  ...protocolWords,
  ...scheduleWords,
  ...observerWords,
  ...settingsWords,
} as const;
