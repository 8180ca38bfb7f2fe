import { useEffect, useState } from 'react';

/**
 * Keeps the recording on the glass while `guarding`: closing the tab asks first, and the back button comes back to
 * the same page. Returns how often somebody tried to go back.
 */
export function useLeaveGuard(guarding: boolean): number {
  const [tried, setTried] = useState(0);
  useEffect(() => {
    if (!guarding) return undefined;
    const here = window.location.href;
    const ask = (event: BeforeUnloadEvent): void => event.preventDefault();
    // One more entry of the same address: going back then stays on it.
    const stay = (): void => window.history.pushState(null, '', here);
    const back = (): void => {
      stay();
      setTried((n) => n + 1);
    };
    stay();
    window.addEventListener('beforeunload', ask);
    window.addEventListener('popstate', back);
    return () => {
      window.removeEventListener('beforeunload', ask);
      window.removeEventListener('popstate', back);
    };
  }, [guarding]);
  return tried;
}
