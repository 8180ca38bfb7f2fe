import { type MouseEvent, type SyntheticEvent, useCallback, useState } from 'react';
import { BeforeStart } from './BeforeStart.tsx';
import { BottomRow } from './BottomRow.tsx';
import { Flash } from './Flash.tsx';
import { HoldLine } from './HoldLine.tsx';
import { LessonPlan } from './LessonPlan.tsx';
import { LookAt } from './LookAt.tsx';
import { Over } from './Over.tsx';
import { useFacts } from './RoomFacts.tsx';
import { type PanelName, RoomPanel } from './RoomPanel.tsx';
import { Standstill } from './Standstill.tsx';
import { Targets } from './Targets.tsx';
import { TopRow } from './TopRow.tsx';
import { useKeyAct } from './useKeyAct.ts';
import { useKeys } from './useKeys.ts';
import { useLeaveGuard } from './useLeaveGuard.ts';
import { useRoom } from './useRoom.ts';
import './room.css';
import './targets.css';
import './bottomRow.css';

/** The recording, from the tap that begins it to the sign that all is kept. */
export function Lesson() {
  const phase = useRoom((s) => s.phase);
  const settled = useRoom((s) => s.phase === 'ready' || (s.phase === 'ended' && s.kept.kept === s.kept.of));
  const leaving = useLeaveGuard(!settled);
  if (phase === 'ready') return <BeforeStart />;
  if (phase === 'ended') return <Over />;
  return <OnTheGlass leaving={leaving} />;
}

const inPanel = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('.panel') !== null;

/** Long presses open no menus. */
const noMenu = (event: SyntheticEvent): void => event.preventDefault();

/** A tap on a button leaves the focus where it is, so that Enter and Space of a page-turner do not repeat it. */
const keepFocus = (event: MouseEvent): void => {
  if (!inPanel(event.target)) event.preventDefault();
};

function OnTheGlass({ leaving }: { readonly leaving: number }) {
  const { keys, keysChosen } = useFacts();
  const [panel, setPanel] = useState<PanelName | null>(null);
  const [keysSeen, setKeysSeen] = useState(false);
  const close = useCallback(() => setPanel(null), []);
  // After "break started" the last look stays open for its time, so its targets stay as well.
  const marking = useRoom(
    ({ phase, current }) =>
      phase === 'running' || phase === 'counting in' || (phase === 'between parts' && current !== null),
  );
  const still = useRoom(({ phase }) => phase !== 'running' && phase !== 'counting in');
  const act = useKeyAct(useCallback(() => setKeysSeen(true), []));
  useKeys(keys, panel !== null, act);
  return (
    <main
      className={`room ${marking ? '' : 'room-still'}`}
      data-keys={keysChosen || keysSeen}
      onContextMenu={noMenu}
      onMouseDown={keepFocus}
    >
      <TopRow />
      {marking && <Targets side="left" />}
      <div className="room-centre">
        {!still && <LookAt />}
        <div className="room-middle">
          {panel !== null ? (
            <RoomPanel name={panel} onPanel={setPanel} onClose={close} />
          ) : still ? (
            <Standstill />
          ) : (
            <LessonPlan />
          )}
        </div>
        <HoldLine leaving={leaving} />
      </div>
      {marking && <Targets side="right" />}
      <BottomRow onPanel={setPanel} />
      <Flash />
    </main>
  );
}
