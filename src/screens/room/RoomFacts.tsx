import { createContext, type ReactNode, useContext, useMemo } from 'react';
import type { Code } from '../../model/codeSet.ts';
import { defaultKeyMap } from '../../model/keyMap.ts';
import type { KeyMap, Manner } from '../../model/observer.ts';
import type { Method } from '../../model/protocol.ts';
import type { SessionHeader } from '../../model/session.ts';
import { type Plan, planOf } from '../../recorder/grid.ts';
import { useCoreServices } from '../coreServices.ts';
import { type Unit, unitOf } from './amounts.ts';
import { codeSigns, type SignKind } from './codeEdges.ts';
import { eyesUpZones, type Zones } from './eyesUp/zones.ts';

/** What stays the same through a session. */
export interface RoomFacts {
  readonly header: SessionHeader;
  readonly method: Method;
  /** What the session consists of, in the words of the room. */
  readonly unit: Unit;
  readonly codes: ReadonlyMap<string, { readonly code: Code; readonly sign: SignKind }>;
  /** Several codes may be marked in one interval. */
  readonly latched: boolean;
  /** "None of these" is an answer. */
  readonly withNone: boolean;
  /** "Child before" has a meaning. */
  readonly withBefore: boolean;
  /** Names of the target children and of the reserves. */
  readonly pseudonyms: ReadonlyMap<string, string>;
  /** The schedule; no intervals in a session that came from a table. */
  readonly plan: Plan;
  /** How the children of a sweep follow each other; null for other rotations. */
  readonly sweep: { readonly eachMs: number } | null;
  /** The one whose looks alternate with those at peers; null for other rotations. */
  readonly target: string | null;
  /** Where the targets lie in eyes-up and under the cover; null where there are too many. */
  readonly zones: Zones | null;
  /** null where the observer has chosen nothing. */
  readonly observersManner: Manner | null;
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
  const observersManner = (observer?.ok ? observer.value?.manner : null) ?? null;
  const lessonParts = (study?.ok ? study.value?.lessonParts : null) ?? null;
  const facts = useMemo(
    (): RoomFacts => ({
      ...factsOf(header),
      observersManner,
      keys: chosen ?? defaultKeyMap(),
      keysChosen: chosen?.on === true,
      lessonParts: lessonParts ?? [],
    }),
    [header, chosen, observersManner, lessonParts],
  );
  return <FactsContext value={facts}>{children}</FactsContext>;
}

function factsOf(
  header: SessionHeader,
): Omit<RoomFacts, 'keys' | 'keysChosen' | 'observersManner' | 'lessonParts'> {
  const { schedule } = header;
  const protocol = schedule.kind === 'laid' ? schedule.protocol : null;
  const { codes } = schedule.kind === 'laid' ? schedule.protocol.codeSet : schedule.codeSet;
  const method = schedule.kind === 'laid' ? schedule.protocol.method : schedule.method;
  const signs = codeSigns(codes);
  const inTurns = method !== 'headcount' && method !== 'duration';
  const rotation = inTurns ? (protocol?.rotation ?? null) : null;
  const latched = method === 'partial' || method === 'whole';
  return {
    header,
    method,
    unit: unitOf(method),
    codes: new Map(codes.map((code) => [code.id, { code, sign: signs.get(code.id) ?? 'other' }])),
    latched,
    withNone: latched || method === 'duration',
    withBefore: inTurns,
    zones: method === 'headcount' ? null : eyesUpZones(codes, latched || method === 'duration'),
    pseudonyms: new Map(
      [...(header.reserves ?? []), ...header.children].map((child) => [child.id, child.pseudonym]),
    ),
    plan: planOf(header) ?? { intervals: [], parts: [] },
    sweep: rotation?.kind === 'sweep' ? { eachMs: rotation.eachMs } : null,
    target: rotation?.kind === 'target' ? (header.children[0]?.id ?? null) : null,
  };
}
