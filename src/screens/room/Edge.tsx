import { CodeSign, Ring } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import type { EdgeTarget } from './codeEdges.ts';
import { useFacts } from './RoomFacts.tsx';
import { Target } from './Target.tsx';
import { useEdgeLabel, useManner } from './useManner.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly side: 'left' | 'right';
  readonly targets: readonly EdgeTarget[];
  readonly withChildBefore?: boolean;
}

/** The targets at one edge of the glass, always in the same places. */
export function Edge({ side, targets, withChildBefore = false }: Props) {
  return (
    <section className={`edge edge-${side}`} aria-label={useEdgeLabel(side)}>
      {targets.map((target) => (
        <OneTarget key={target.kind === 'code' ? target.code.id : target.kind} target={target} />
      ))}
      {withChildBefore && <ChildBefore />}
    </section>
  );
}

interface OneProps {
  readonly target: EdgeTarget;
  /** It lies where nobody looks: how its answer is felt is said with it. */
  readonly inZone?: boolean;
}

/** One target of a session, by what it says. */
export function OneTarget({ target, inZone = false }: OneProps) {
  if (target.kind === 'code') return <CodeTarget target={target} inZone={inZone} />;
  return target.kind === 'nothing' ? <NoneOfThese inZone={inZone} /> : <CannotSee inZone={inZone} />;
}

/** How the answer to this target is felt, where it is said at all: only where nobody looks, and while touches are answered. */
function Pulse({ place, inZone }: { readonly place: number | null; readonly inZone: boolean }) {
  const { room } = useCoreWords();
  const { confirm } = useManner().manner;
  return inZone && confirm && <span className="target-hint target-pulse">{room.pulse({ place })}</span>;
}

interface CodeProps {
  readonly target: Extract<EdgeTarget, { kind: 'code' }>;
  readonly inZone: boolean;
}

function CodeTarget({ target, inZone }: CodeProps) {
  const live = useLive();
  const { room } = useCoreWords();
  const { method } = useFacts();
  const { id, label } = target.code;
  const chosen = useRoom((s) => s.current?.codes?.includes(id) ?? false);
  return (
    <Target
      className={method === 'duration' ? 'target-lasting' : ''}
      sign={<CodeSign kind={target.sign} />}
      chosen={chosen}
      action={`code:${target.position}`}
      wasFelt={(felt) => felt.code === id && !felt.outOfView}
      onTouch={(at) => live.touch(id, at)}
    >
      {label}
      {method === 'whole' && <span className="target-hint">{room.throughout}</span>}
      {method === 'duration' && chosen ? (
        <InForceFor />
      ) : (
        <Pulse place={target.position - 1} inZone={inZone} />
      )}
    </Target>
  );
}

/** How long what is in force has lasted. */
function InForceFor() {
  const { room } = useCoreWords();
  const seconds = useRoom((s) => Math.floor((s.now - (s.current?.openAt ?? s.now)) / 1000));
  return <span className="target-hint">{room.inForceFor({ ms: seconds * 1000 })}</span>;
}

function NoneOfThese({ inZone }: { readonly inZone: boolean }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { method } = useFacts();
  const chosen = useRoom((s) => s.current?.status === 'scored' && s.current.codes?.length === 0);
  return (
    <Target
      className={method === 'duration' ? 'target-quiet target-lasting' : 'target-quiet'}
      sign={<span className="target-none" />}
      chosen={chosen}
      action="nothing"
      wasFelt={(felt) => felt.code === null && !felt.outOfView}
      onTouch={(at) => live.touch(null, at)}
    >
      {method === 'whole' ? room.noneThroughout : room.noneOfThese}
      {method === 'duration' && chosen ? <InForceFor /> : <Pulse place={null} inZone={inZone} />}
    </Target>
  );
}

/** What cannot be seen is missing, and never off-task. */
export function CannotSee({ inZone = false }: { readonly inZone?: boolean }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { method } = useFacts();
  const chosen = useRoom((s) => s.current?.missing === 'out of view');
  return (
    <Target
      className={method === 'duration' ? 'target-dashed target-lasting' : 'target-dashed'}
      sign={<Ring size={34} />}
      chosen={chosen}
      action="cannot see"
      wasFelt={(felt) => felt.outOfView}
      onTouch={(at) => live.cannotSee(at)}
    >
      {room.cannotSee}
      {method === 'headcount' && <span className="target-hint">{room.noScanHint}</span>}
      {method === 'duration' && chosen ? <InForceFor /> : <Pulse place={null} inZone={inZone} />}
    </Target>
  );
}

/** Turns the next touch to the look before this one. */
function ChildBefore() {
  const live = useLive();
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const armed = useRoom((s) => s.armedBefore !== null);
  const child = useRoom((s) => (s.previous === null ? null : s.previous.child));
  const name = child === null ? undefined : pseudonyms.get(child);
  return (
    <Target
      className="target-before"
      sign={
        <svg width="34" height="34" viewBox="0 0 34 34" aria-hidden="true">
          <path className="before-arrow" d="M29 17H7M15 8L6 17L15 26" />
        </svg>
      }
      chosen={armed}
      action="child before"
      ofBefore
      onTouch={() => live.childBefore()}
    >
      {armed ? room.childBeforeArmed : room.childBefore}
      <span className="target-hint">{name}</span>
    </Target>
  );
}
