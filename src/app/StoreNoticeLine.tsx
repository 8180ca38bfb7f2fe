import { useSyncExternalStore } from 'react';
import { useCoreServices } from '../screens/coreServices.ts';
import { Button } from '../ui/Button.tsx';
import { Notice } from '../ui/Notice.tsx';
import type { StoreNotices } from './storeNotices.ts';
import './updateNotice.css';

/** One sentence when another window makes this one's store step aside; opening the app anew mends it. */
export function StoreNoticeLine({ notices }: { readonly notices: StoreNotices }) {
  const { words } = useCoreServices();
  const latest = useSyncExternalStore(notices.subscribe, notices.latest);
  if (latest === null) return null;
  return (
    <div className="update-notice not-in-print">
      <Notice
        kind="hold"
        actions={<Button onClick={() => window.location.reload()}>{words.common.openAnew}</Button>}
      >
        {words.common[latest]}
      </Notice>
    </div>
  );
}
