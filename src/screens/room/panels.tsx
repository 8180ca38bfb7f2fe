import { type FormEvent, use, useId, useState } from 'react';
import { Button } from '../../ui/Button.tsx';
import { Check } from '../../ui/Choice.tsx';
import { TextArea, TextField } from '../../ui/Field.tsx';
import { useCoreWords } from '../coreServices.ts';
import { aheadOf } from './amounts.ts';
import { NoteDraft } from './noteDraft.ts';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly onClose: () => void;
}

/** Words about the lesson, or about the last flag. */
export function NotePanel({ onClose }: Props) {
  const live = useLive();
  const { room } = useCoreWords();
  const form = useId();
  const flag = useRoom((s) => s.lastFlag);
  const draft = use(NoteDraft);
  const [text, setText] = useState(draft.current);
  const [aboutFlag, setAboutFlag] = useState(false);
  const leave = (): void => {
    draft.current = '';
    onClose();
  };
  const keep = (event: FormEvent): void => {
    event.preventDefault();
    if (text.trim() !== '') live.note(text.trim(), aboutFlag && flag !== null ? flag : undefined);
    leave();
  };
  return (
    <Panel
      title={room.noteTitle}
      onClose={leave}
      actions={
        <Button look="main" type="submit" form={form} disabled={text.trim() === ''}>
          {room.noteKeep}
        </Button>
      }
    >
      <form id={form} className="stack-tight" onSubmit={keep}>
        <TextArea
          label={room.noteLabel}
          rows={3}
          maxLength={2000}
          value={text}
          onChange={(event) => {
            draft.current = event.target.value;
            setText(event.target.value);
          }}
        />
        {flag !== null && <Check label={room.noteAboutFlag} checked={aboutFlag} onChange={setAboutFlag} />}
      </form>
    </Panel>
  );
}

/** Which part of the lesson it is now. */
export function LessonPartPanel({ onClose }: Props) {
  const live = useLive();
  const { room } = useCoreWords();
  const { lessonParts } = useFacts();
  const now = useRoom((s) => s.lessonPart);
  const choose = (part: string | null) => (): void => {
    if (part !== now) live.lessonPart(part);
    onClose();
  };
  return (
    <Panel title={room.partTitle} onClose={onClose}>
      <div className="panel-choices">
        {lessonParts.map((part) => (
          <Button key={part} aria-pressed={part === now} onClick={choose(part)}>
            {part}
          </Button>
        ))}
        <Button aria-pressed={now === null} onClick={choose(null)}>
          {room.partNone}
        </Button>
      </div>
    </Panel>
  );
}

/** Before session time 0 there is nothing to end, only a start to call off. */
export function EndPanel({ onClose }: Props) {
  const notBegun = useRoom((s) => s.phase === 'counting in' && s.part === 0);
  return notBegun ? <CallOff onClose={onClose} /> : <End onClose={onClose} />;
}

function CallOff({ onClose }: Props) {
  const live = useLive();
  const { room } = useCoreWords();
  const callOff = (): void => {
    live.callOff();
    onClose();
  };
  return (
    <Panel
      title={room.notBegunTitle}
      closeLabel={room.notBegunStay}
      onClose={onClose}
      actions={
        <Button look="main" onClick={callOff}>
          {room.callOff}
        </Button>
      }
    >
      <p>{room.notBegunText}</p>
    </Panel>
  );
}

/** Ending cannot be taken back, so it is asked once, with what it costs. */
function End({ onClose }: Props) {
  const live = useLive();
  const { room } = useCoreWords();
  const form = useId();
  const { plan, unit } = useFacts();
  const notMade = useRoom((s) => aheadOf(s, plan, unit));
  const [why, setWhy] = useState('');
  const end = (event: FormEvent): void => {
    event.preventDefault();
    live.end(why.trim() === '' ? undefined : why.trim());
    onClose();
  };
  return (
    <Panel
      title={room.endTitle}
      closeLabel={room.endNot}
      onClose={onClose}
      actions={
        <Button look="main" type="submit" form={form}>
          {room.endDo}
        </Button>
      }
    >
      <form id={form} className="stack-tight" onSubmit={end}>
        <p>{room.endAmount(notMade)}</p>
        <TextField
          label={room.endWords}
          maxLength={500}
          value={why}
          onChange={(event) => setWhy(event.target.value)}
        />
      </form>
    </Panel>
  );
}
