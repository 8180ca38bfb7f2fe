import { type MouseEvent, type SyntheticEvent, useCallback, useMemo, useRef, useState } from 'react';
import { AboutChildren } from './aboutChildren.ts';
import { BeforeStart } from './BeforeStart.tsx';
import { BottomRow } from './BottomRow.tsx';
import { Cover } from './eyesUp/Cover.tsx';
import { EyesUpGlass } from './eyesUp/EyesUpGlass.tsx';
import { Recalled } from './eyesUp/Recalled.tsx';
import { Flash } from './Flash.tsx';
import { LaterPanel } from './LaterPanel.tsx';
import { NoteDraft } from './noteDraft.ts';
import { Over } from './Over.tsx';
import { PlanGlass } from './PlanGlass.tsx';
import type { PanelName } from './panelName.ts';
import { useFacts } from './RoomFacts.tsx';
import { Standstill } from './Standstill.tsx';
import type { StartsBy } from './together/useTogether.ts';
import { useDimGlass } from './useDimGlass.ts';
import { useKeyAct } from './useKeyAct.ts';
import { useKeys } from './useKeys.ts';
import { useLeaveGuard } from './useLeaveGuard.ts';
import { useEyesUp, useManner } from './useManner.ts';
import { useRoom } from './useRoom.ts';
import './room.css';
import './targets.css';
import './bottomRow.css';
import './panelPlace.css';

/** The recording, from the tap that begins it to the sign that all is kept. */
export function Lesson() {
  const phase = useRoom((s) => s.phase);
  const settled = useRoom((s) => s.phase === 'ready' || (s.phase === 'ended' && s.kept.kept === s.kept.of));
  const leaving = useLeaveGuard(!settled);
  const [covered, setCovered] = useState(false);
  const draft = useRef('');
  const startsBy = useRef<StartsBy | null>(null);
  if (phase === 'ready') return <BeforeStart startsBy={startsBy} />;
  // What was covered stays covered, also when the session is over.
  if (phase === 'ended' && !covered) return <Over />;
  return (
    <NoteDraft value={draft}>
      <OnTheGlass leaving={leaving} covered={covered} onCover={setCovered} />
    </NoteDraft>
  );
}

const inPanel = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('.panel') !== null;

/** Long presses open no menus. */
const noMenu = (event: SyntheticEvent): void => event.preventDefault();

/** A tap on a button leaves the focus where it is, so that Enter and Space of a page-turner do not repeat it. */
const keepFocus = (event: MouseEvent): void => {
  if (!inPanel(event.target)) event.preventDefault();
};

interface GlassProps {
  readonly leaving: number;
  readonly covered: boolean;
  readonly onCover: (covered: boolean) => void;
}

function OnTheGlass({ leaving, covered, onCover }: GlassProps) {
  const { keys, keysChosen, zones } = useFacts();
  const { manner, change } = useManner();
  const dim = useDimGlass();
  const [panel, setPanel] = useState<PanelName | null>(null);
  const [keysSeen, setKeysSeen] = useState(false);
  const close = useCallback(() => setPanel(null), []);
  // After "break started" the last look stays open for its time, so its targets stay as well.
  const marking = useRoom(
    ({ phase, current }) =>
      phase === 'running' || phase === 'counting in' || (phase === 'between parts' && current !== null),
  );
  const still = useRoom(({ phase }) => phase !== 'running' && phase !== 'counting in');
  const act = useKeyAct({
    onKey: useCallback(() => setKeysSeen(true), []),
    onCover: useCallback(() => onCover(!covered), [onCover, covered]),
  });
  useKeys(keys, panel !== null && !covered, act);
  const eyesUp = useEyesUp();
  // The finger that held the cover's corner lifts over what lies there now: its click is nobody's.
  const uncovering = useRef(false);
  const strayClick = (event: MouseEvent): void => {
    if (!uncovering.current || event.detail === 0) return;
    uncovering.current = false;
    event.preventDefault();
    event.stopPropagation();
  };
  const uncover = (): void => {
    uncovering.current = true;
    onCover(false);
  };
  const [about, setAbout] = useState<readonly string[]>([]);
  const aboutNow = useMemo(() => ({ children: about, say: setAbout }), [about]);
  const open = panel === null ? null : <LaterPanel name={panel} onPanel={setPanel} onClose={close} />;
  const row = <BottomRow onPanel={setPanel} onCover={() => onCover(true)} />;
  const look = covered ? `room-covered ${dim}` : eyesUp ? `room-eyes-up ${dim}` : marking ? '' : 'room-still';
  return (
    <main
      className={`room ${look} ${open === null || covered || eyesUp ? '' : 'room-with-panel'}`}
      data-keys={keysChosen || keysSeen}
      data-hand={manner.hand}
      onContextMenu={noMenu}
      onMouseDown={keepFocus}
      onPointerDownCapture={() => {
        uncovering.current = false;
      }}
      onClickCapture={strayClick}
    >
      {covered ? (
        <Cover zones={marking ? zones : null} still={still} onUncover={uncover} />
      ) : eyesUp ? (
        <EyesUpGlass
          zones={marking ? zones : null}
          still={still}
          middle={open ?? (still ? <Standstill /> : null)}
          leaving={leaving}
          onLeave={() => change({ ...manner, layout: 'plan' })}
        />
      ) : (
        <AboutChildren value={aboutNow}>
          <PlanGlass marking={marking} still={still} panel={open} leaving={leaving} />
        </AboutChildren>
      )}
      {!covered && row}
      <Recalled />
      <Flash />
    </main>
  );
}
