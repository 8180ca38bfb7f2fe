import { createContext, type ReactNode, useContext, useMemo } from 'react';
import type { Code } from '../../model/codeSet.ts';
import { defaultKeyMap } from '../../model/keyMap.ts';
import type { KeyMap } from '../../model/observer.ts';
import type { SessionHeader } from '../../model/session.ts';
import { useCoreServices } from '../coreServices.ts';
import { codeSigns, type SignKind } from './codeEdges.ts';

/** What stays the same through a session. */
export interface RoomFacts {
  readonly header: SessionHeader;
  readonly codes: ReadonlyMap<string, { readonly code: Code; readonly sign: SignKind }>;
  /** Several codes may be marked in one interval. */
  readonly latched: boolean;
  readonly pseudonyms: ReadonlyMap<string, string>;
  readonly keys: KeyMap;
  /** The observer chose the keys, so they are shown from the start. */
  readonly keysChosen: boolean;
  readonly lessonParts: readonly string[];
}

const FactsContext = createContext<RoomFacts | null>(null);

export function useFacts(): RoomFacts {
  const facts = useContext(FactsContext);
  if (facts === null) throw new Error('A part of the room was rendered outside a session.');
  return facts;
}

/** Reads the observer's keys and the study's lesson parts, and keeps what the header says at hand. */
export function RoomFactsFrom({
  header,
  children,
}: {
  readonly header: SessionHeader;
  readonly children: ReactNode;
}) {
  const { useStored } = useCoreServices();
  const observer = useStored((store) => store.observer(header.observer.id), [header.observer.id]);
  const study = useStored((store) => store.study(header.study), [header.study]);
  const chosen = (observer?.ok ? observer.value?.keyMap : null) ?? null;
  const lessonParts = (study?.ok ? study.value?.lessonParts : null) ?? null;
  const facts = useMemo((): RoomFacts => {
    const { schedule } = header;
    const { codes } = schedule.kind === 'laid' ? schedule.protocol.codeSet : schedule.codeSet;
    const method = schedule.kind === 'laid' ? schedule.protocol.method : schedule.method;
    const signs = codeSigns(codes);
    return {
      header,
      codes: new Map(codes.map((code) => [code.id, { code, sign: signs.get(code.id) ?? 'other' }])),
      latched: method === 'partial',
      pseudonyms: new Map(header.children.map((child) => [child.id, child.pseudonym])),
      keys: chosen ?? defaultKeyMap(),
      keysChosen: chosen?.on === true,
      lessonParts: lessonParts ?? [],
    };
  }, [header, chosen, lessonParts]);
  return <FactsContext value={facts}>{children}</FactsContext>;
}
