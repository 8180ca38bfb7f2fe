import { useState } from 'react';
import { useLive, useRoom } from '../useRoom.ts';
import './recalled.css';

/** A prompt that waits for its mark was recalled: a quiet stroke along the top, once. It is felt and heard as well. */
export function Recalled() {
  const live = useLive();
  const [old] = useState(() => live.snapshot().reminded);
  const count = useRoom((s) => (s.reminded > old ? s.reminded : 0));
  return count === 0 ? null : <div key={count} className="recalled" aria-hidden="true" />;
}
