import { MorePanel } from './BottomRow.tsx';
import { ChildPanel } from './ChildPanel.tsx';
import { CorrectPanel } from './CorrectPanel.tsx';
import { MannerPanel } from './MannerPanel.tsx';
import type { PanelName } from './panelName.ts';
import { EndPanel, LessonPartPanel, NotePanel } from './panels.tsx';

export type { PanelName };

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
