import { MorePanel } from './BottomRow.tsx';
import { ChildPanel } from './ChildPanel.tsx';
import { CorrectPanel } from './CorrectPanel.tsx';
import { MannerPanel } from './MannerPanel.tsx';
import { EndPanel, LessonPartPanel, NotePanel } from './panels.tsx';

/** The panels of the room: each stands in the middle, while the targets at the edges stay live. */
export type PanelName = 'note' | 'child' | 'correct' | 'part' | 'manner' | 'end' | 'more';

interface Props {
  readonly name: PanelName;
  readonly onPanel: (panel: PanelName) => void;
  readonly onClose: () => void;
}

/** The panel of this name. */
export function RoomPanel({ name, onPanel, onClose }: Props) {
  switch (name) {
    case 'note':
      return <NotePanel onClose={onClose} />;
    case 'child':
      return <ChildPanel onClose={onClose} />;
    case 'correct':
      return <CorrectPanel onClose={onClose} />;
    case 'part':
      return <LessonPartPanel onClose={onClose} />;
    case 'manner':
      return <MannerPanel onClose={onClose} />;
    case 'end':
      return <EndPanel onClose={onClose} />;
    case 'more':
      return <MorePanel onPanel={onPanel} onClose={onClose} />;
  }
}
