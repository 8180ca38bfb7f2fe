import { useState } from 'react';
import { useLive, useRoom } from './useRoom.ts';

/** The visual cue: a calm brass frame at the edges of the glass, for 400 ms, once. */
export function Flash() {
  const live = useLive();
  const [old] = useState(() => live.snapshot().flash);
  const count = useRoom((s) => (s.flashStrongly && s.flash > old ? s.flash : 0));
  return count === 0 ? null : <div key={count} className="flash" data-flash={count} aria-hidden="true" />;
}
