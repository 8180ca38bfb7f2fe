import { createContext, use, useEffect } from 'react';

const nobody: readonly string[] = [];

/** Whom the open panel is about: the seating plan beside it shows where they sit. */
export const AboutChildren = createContext<{
  readonly children: readonly string[];
  readonly say: (children: readonly string[]) => void;
}>({ children: nobody, say: () => undefined });

/** Says whom a panel is about, for as long as it is there. */
export function useIsAbout(...children: readonly (string | null)[]): void {
  const { say } = use(AboutChildren);
  const said = children.filter((child) => child !== null).join(' ');
  useEffect(() => {
    say(said === '' ? nobody : said.split(' '));
    return () => say(nobody);
  }, [say, said]);
}
