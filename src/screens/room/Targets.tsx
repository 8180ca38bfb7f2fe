import { useMemo } from 'react';
import { codeEdges } from './codeEdges.ts';
import { Edge } from './Edge.tsx';
import { useFacts } from './RoomFacts.tsx';

/** What stands at one edge of the glass, by the session's method. */
export function Targets({ side }: { readonly side: 'left' | 'right' }) {
  const { codes, latched } = useFacts();
  const edges = useMemo(
    () =>
      codeEdges(
        [...codes.values()].map(({ code }) => code),
        latched,
      ),
    [codes, latched],
  );
  return <Edge side={side} targets={edges[side]} withChildBefore={side === 'left'} />;
}
