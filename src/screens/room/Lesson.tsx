import { type MouseEvent, type SyntheticEvent, useCallback, useState } from 'react';
import { BeforeStart } from './BeforeStart.tsx';
import { BottomRow } from './BottomRow.tsx';
import { Cover } from './eyesUp/Cover.tsx';
import { EyesUpTop } from './eyesUp/EyesUp.tsx';
import { Recalled } from './eyesUp/Recalled.tsx';
import { ZoneTargets } from './eyesUp/ZoneTargets.tsx';
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
import { useDimGlass } from './useDimGlass.ts';
import { useKeyAct } from './useKeyAct.ts';
import { useKeys } from './useKeys.ts';
import { useLeaveGuard } from './useLeaveGuard.ts';
import { useManner } from './useManner.ts';
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
  const { keys, keysChosen, zones } = useFacts();
  const [panel, setPanel] = useState<PanelName | null>(null);
  const [keysSeen, setKeysSeen] = useState(false);
  const close = useCallback(() => setPanel(null), []);
  // After "break started" the last look stays open for its time, so its targets stay as well.
  const marking = useRoom(
    ({ phase, current }) =>
      phase === 'running' || phase === 'counting in' || (phase === 'between parts' && current !== null),
  );
  const still = useRoom(({ phase }) => phase !== 'running' && phase !== 'counting in');
  const [covered, setCovered] = useState(false);
  const { manner, change } = useManner();
  const act = useKeyAct(useCallback(() => setKeysSeen(true), []));
  const actOrCover = useCallback<typeof act>(
    (action, at) => (action === 'cover' ? setCovered((before) => !before) : act(action, at)),
    [act],
  );
  useKeys(keys, panel !== null && !covered, actOrCover);
  const glass = {
    'data-keys': keysChosen || keysSeen,
    'data-hand': manner.hand,
    onContextMenu: noMenu,
    onMouseDown: keepFocus,
  };
  const dim = useDimGlass();
  if (covered)
    return (
      <main className={`room room-covered ${dim}`} {...glass}>
        <Cover zones={marking ? zones : null} onUncover={() => setCovered(false)} />
        <Recalled />
        <Flash />
      </main>
    );
  const bottom = <BottomRow onPanel={setPanel} onCover={() => setCovered(true)} />;
  if (manner.layout === 'eyes-up' && zones !== null && !still)
    return (
      <main className={`room room-eyes-up ${dim}`} {...glass}>
        <EyesUpTop onLeave={() => change({ ...manner, layout: 'plan' })} />
        <ZoneTargets zones={zones} />
        <div className="eyes-up-over">
          {panel !== null && <RoomPanel name={panel} onPanel={setPanel} onClose={close} />}
          <HoldLine leaving={leaving} />
        </div>
        {bottom}
        <Recalled />
        <Flash />
      </main>
    );
  return (
    <main className={`room ${marking ? '' : 'room-still'}`} {...glass}>
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
      {bottom}
      <Recalled />
      <Flash />
    </main>
  );
}
