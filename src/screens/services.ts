import { createContext, useContext } from 'react';
import type { Words } from '../words/words.ts';
import type { CoreServices } from './coreServices.ts';

export type { Camera, Device, OpenOptions, Pixels, RecorderDesk } from './coreServices.ts';

/** Everything that pages are given: all words. The recording screen does without and is loaded without. */
export interface Services extends Omit<CoreServices, 'words'> {
  readonly words: Words;
}

export const ServicesContext = createContext<Services | null>(null);

/** The services of the app; a page outside it, or the recording screen, that asks for them is a bug. */
export function useServices(): Services {
  const services = useContext(ServicesContext);
  if (services === null) throw new Error('A page was rendered outside the app.');
  return services;
}

/** The words, for short. */
export function useWords(): Words {
  return useServices().words;
}
