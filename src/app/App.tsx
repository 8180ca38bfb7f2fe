import { useEffect } from 'react';
import { Router } from 'wouter';
import { useHashLocation } from 'wouter/use-hash-location';
import { type CoreServices, CoreServicesContext } from '../screens/coreServices.ts';
import { Routes } from '../screens/routes.tsx';
import { useSettings } from '../screens/useCurrentStudy.ts';
import type { Settings } from '../tasks/ports.ts';
import { ErrorBoundary } from './ErrorBoundary.tsx';
import { StoreNoticeLine } from './StoreNoticeLine.tsx';
import type { StoreNotices } from './storeNotices.ts';
import { UpdateNotice } from './UpdateNotice.tsx';
import type { Updates } from './updates.ts';

interface Props {
  readonly services: CoreServices;
  readonly updates: Updates;
  readonly notices: StoreNotices;
  readonly onTheme: (theme: Settings['theme']) => void;
}

/** The whole program: what screens are given, which address shows what, and what happens when one breaks. */
export function App({ services, updates, notices, onTheme }: Props) {
  return (
    <CoreServicesContext value={services}>
      <Router hook={useHashLocation}>
        <Theme onTheme={onTheme} />
        <UpdateNotice updates={updates} />
        <StoreNoticeLine notices={notices} />
        <ErrorBoundary words={services.words}>
          <Routes />
        </ErrorBoundary>
      </Router>
    </CoreServicesContext>
  );
}

function Theme({ onTheme }: Pick<Props, 'onTheme'>) {
  const theme = useSettings()?.theme;
  useEffect(() => {
    if (theme !== undefined) onTheme(theme);
  }, [theme, onTheme]);
  return null;
}
