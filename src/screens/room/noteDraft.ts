import { createContext } from 'react';

/** What is being typed as a note. It outlives the panel while the glass is covered. */
export const NoteDraft = createContext<{ current: string }>({ current: '' });
