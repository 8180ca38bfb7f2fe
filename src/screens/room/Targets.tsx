import { useMemo } from 'react';
import { CountTargets } from './CountTargets.tsx';
import { codeEdges } from './codeEdges.ts';
import { Edge } from './Edge.tsx';
import { useFacts } from './RoomFacts.tsx';

/** What stands at one edge of the glass, by the session's method. */
export function Targets({ side }: { readonly side: 'left' | 'right' }) {
  const { codes, method, withNone, withBefore } = useFacts();
  const edges = useMemo(
    () =>
      codeEdges(
        [...codes.values()].map(({ code }) => code),
        withNone,
      ),
    [codes, withNone],
  );
  if (method === 'headcount') return <CountTargets side={side} />;
  return <Edge side={side} targets={edges[side]} withChildBefore={side === 'left' && withBefore} />;
}
