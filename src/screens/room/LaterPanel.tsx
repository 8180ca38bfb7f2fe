import { type ComponentProps, type ComponentType, useEffect, useState } from 'react';
import type { RoomPanel } from './RoomPanel.tsx';

type Props = ComponentProps<typeof RoomPanel>;

let loaded: ComponentType<Props> | null = null;

/** Brings the panels; they are on the tablet, but not part of what has to be loaded before a lesson can be recorded. */
export async function loadPanels(): Promise<ComponentType<Props>> {
  loaded ??= (await import('./RoomPanel.tsx')).RoomPanel;
  return loaded;
}

/** A panel as soon as it is there. Until then nothing stands in its place: the targets around it are live. */
export function LaterPanel(props: Props) {
  const [Panel, setPanel] = useState<ComponentType<Props> | null>(() => loaded);
  useEffect(() => {
    if (Panel === null) void loadPanels().then((panel) => setPanel(() => panel));
  }, [Panel]);
  return Panel === null ? null : <Panel {...props} />;
}
