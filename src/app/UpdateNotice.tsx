import { useState, useSyncExternalStore } from 'react';
import { useLocation } from 'wouter';
import { useCoreServices } from '../screens/coreServices.ts';
import { Button } from '../ui/Button.tsx';
import { Notice } from '../ui/Notice.tsx';
import type { Updates } from './updates.ts';
import './updateNotice.css';

/** Offers the new version between sessions; on the recording screen it keeps silent. */
export function UpdateNotice({ updates }: { readonly updates: Updates }) {
  const { words, recorder } = useCoreServices();
  const [location] = useLocation();
  const [later, setLater] = useState(false);
  const waiting = useSyncExternalStore(updates.subscribe, updates.waiting);
  const recording = useSyncExternalStore(recorder.subscribe, recorder.current) !== null;
  if (!waiting || later || recording || /^\/room\/./.test(location)) return null;
  return (
    <div className="update-notice not-in-print">
      <Notice
        kind="done"
        actions={
          <>
            <Button look="quiet" onClick={() => setLater(true)}>
              {words.common.updateLater}
            </Button>
            <Button onClick={() => updates.putIn()}>{words.common.updateNow}</Button>
          </>
        }
      >
        {words.common.updateReady}
      </Notice>
    </div>
  );
}
