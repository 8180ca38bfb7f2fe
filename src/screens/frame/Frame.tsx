import { type ReactNode, useEffect } from 'react';
import { useLocation } from 'wouter';
import { Page } from '../../ui/Page.tsx';
import { Spine } from '../../ui/Spine.tsx';
import { useWords } from '../services.ts';

/** The exercise book around every page but the recording itself: four tabs, by when they are needed. */
export function Frame({ children }: { readonly children: ReactNode }) {
  const words = useWords();
  const [location] = useLocation();
  const tabs = [
    { path: '/before', label: words.common.before },
    { path: '/room', label: words.common.room },
    { path: '/afterwards', label: words.common.afterwards },
    { path: '/study', label: words.common.study },
  ].map((tab) => ({ href: `#${tab.path}`, label: tab.label, here: location.startsWith(tab.path) }));

  // biome-ignore lint/correctness/useExhaustiveDependencies: a new address is a new page
  useEffect(() => {
    const heading = document.querySelector<HTMLElement>('main h1');
    heading?.focus({ preventScroll: true });
    window.scrollTo(0, 0);
    document.title =
      heading === null ? words.common.appName : `${heading.textContent} · ${words.common.appName}`;
  }, [location]);

  return (
    <>
      <Spine tabs={tabs} label={words.common.appName} />
      <Page>{children}</Page>
    </>
  );
}
