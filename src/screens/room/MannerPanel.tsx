import { say } from '../../words/say.ts';
import { useCoreServices } from '../coreServices.ts';
import { MannerFields } from '../manner/MannerFields.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useManner } from './useManner.ts';

/** Layout, hand and answers, changed in the room: at once, and kept for the observer. */
export function MannerPanel({ onClose }: { readonly onClose: () => void }) {
  const { words } = useCoreServices();
  const { room, common } = words;
  const { method, zones } = useFacts();
  const { manner, change, kept, seen } = useManner();
  const noEyesUp = method === 'headcount' ? room.eyesUpNotCount : zones === null ? room.eyesUpNot : null;
  return (
    <Panel
      title={room.mannerTitle}
      closeLabel={common.close}
      onClose={() => {
        seen();
        onClose();
      }}
    >
      <MannerFields manner={manner} noEyesUp={noEyesUp} onChange={change} />
      <p className="second small">{room.coverAbout({ places: zones !== null })}</p>
      <p className="second small" role="status">
        {kept !== null && (kept.ok ? room.mannerKept : say(words.problems, kept.problem))}
      </p>
    </Panel>
  );
}
