import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { Panel } from './Panel.tsx';
import type { PanelName } from './panelName.ts';
import { useFacts } from './RoomFacts.tsx';
import { Undo } from './Undo.tsx';
import { useEyesUp } from './useManner.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly onPanel: (panel: PanelName) => void;
}

interface RowProps extends Props {
  readonly onCover: () => void;
}

/** The rare things, each always in its place: undo says what it would undo; silence stands at the end. */
export function BottomRow({ onPanel, onCover }: RowProps) {
  const { room } = useCoreWords();
  return (
    <fieldset className="room-bottom">
      <legend className="visually-hidden">{room.rare}</legend>
      <div className="rare-first">
        <Undo />
        <Flag className="rare-flag-here" />
        <div className="rare-wide">
          <RareThings onPanel={onPanel} />
        </div>
        <Button className="rare rare-more" onClick={() => onPanel('more')}>
          {room.more}
        </Button>
      </div>
      <div className="rare-last">
        <Button className="rare rare-cover" onClick={onCover}>
          <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
            <path className="rare-flag" d="M3 2H17V12L11 18H3ZM11 18V12H17" />
          </svg>
          <span className="rare-word">{room.cover}</span>
        </Button>
        <Silence />
      </div>
    </fieldset>
  );
}

/** On narrow glass the rarer things wait behind one button. */
export function MorePanel({ onPanel, onClose }: Props & { readonly onClose: () => void }) {
  const { room, common } = useCoreWords();
  return (
    <Panel title={room.moreTitle} closeLabel={common.close} onClose={onClose}>
      <div className="panel-choices">
        <Flag onDone={onClose} />
        <ChildBefore onDone={onClose} />
        <RareThings onPanel={onPanel} onDone={onClose} />
      </div>
    </Panel>
  );
}

interface DoneProps {
  readonly className?: string;
  readonly onDone?: () => void;
}

function Flag({ className = '', onDone }: DoneProps) {
  const live = useLive();
  const { room } = useCoreWords();
  return (
    <Button
      className={`rare ${className}`}
      onClick={() => {
        live.flag();
        onDone?.();
      }}
    >
      <svg width="16" height="20" viewBox="0 0 16 20" aria-hidden="true">
        <path className="rare-flag" d="M2 19V2H13L10 6L13 10H2" />
      </svg>
      <span className="rare-word">{room.flag}</span>
    </Button>
  );
}

/** In eyes-up it has no place of its own on the glass. */
function ChildBefore({ onDone }: DoneProps) {
  const live = useLive();
  const { room } = useCoreWords();
  const { withBefore } = useFacts();
  const eyesUp = useEyesUp();
  if (!withBefore || !eyesUp) return null;
  return (
    <Button
      className="rare"
      onClick={() => {
        live.childBefore();
        onDone?.();
      }}
    >
      {room.childBefore}
    </Button>
  );
}

function RareThings({ onPanel, onDone }: Props & { readonly onDone?: () => void }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { lessonParts } = useFacts();
  const s = useRoom(({ phase, mayPause, lessonPart, part, state }) => ({
    running: phase === 'running',
    mayPause,
    lessonPart,
    parts: state.origins.length,
    last: state.origins.length - 1 <= part,
  }));
  const now = (act: () => void) => (): void => {
    act();
    onDone?.();
  };
  return (
    <>
      <Button className="rare" onClick={() => onPanel('child')}>
        {room.child}
      </Button>
      <Button className="rare" onClick={() => onPanel('correct')}>
        {room.correct}
      </Button>
      <AtTimes may={s.running} long label={room.interrupt} act={now(() => live.interruptClass())} />
      {s.mayPause && <AtTimes may={s.running} label={room.pause} act={now(() => live.pause())} />}
      {s.parts > 1 && (
        <AtTimes
          may={s.running && !s.last}
          long
          label={room.breakStarted}
          act={now(() => live.breakStarted())}
        />
      )}
      {lessonParts.length > 0 && (
        <Button className="rare rare-part" onClick={() => onPanel('part')}>
          <span>{s.lessonPart === null ? room.lessonPart : room.lessonPartNow({ part: s.lessonPart })}</span>
        </Button>
      )}
      <Button className="rare" onClick={() => onPanel('note')}>
        {room.note}
      </Button>
      <Button className="rare" onClick={() => onPanel('manner')}>
        {room.manner}
      </Button>
      <Button className="rare" onClick={() => onPanel('end')}>
        {room.end}
      </Button>
    </>
  );
}

interface AtTimesProps {
  /** It makes sense now. */
  readonly may: boolean;
  readonly label: string;
  /** Of two words, which take two lines where the row is short. */
  readonly long?: boolean;
  readonly act: () => void;
}

/** A deed that is not always possible: its button stays where it is, since thumbs learn places. */
function AtTimes({ may, label, long = false, act }: AtTimesProps) {
  return (
    <Button className="rare" aria-disabled={!may} onClick={may ? act : undefined}>
      <span className={long ? 'rare-two' : ''}>{label}</span>
    </Button>
  );
}

/** One touch, always in sight. */
function Silence() {
  const live = useLive();
  const { room } = useCoreWords();
  const on = useRoom((s) => s.sound.on);
  return (
    <Button className="rare rare-silence" onClick={() => live.silence(on)}>
      <svg width="22" height="20" viewBox="0 0 22 20" aria-hidden="true">
        <path className="rare-flag" d="M2 7V13H6L11 17V3L6 7Z" />
        <path
          className="rare-flag"
          d={on ? 'M15 6A6 6 0 0 1 15 14M18 3A10 10 0 0 1 18 17' : 'M15 7L20 13M20 7L15 13'}
        />
      </svg>
      <span className="rare-word">{on ? room.silence : room.soundOn}</span>
    </Button>
  );
}
