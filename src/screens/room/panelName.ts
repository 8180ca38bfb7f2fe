/** The panels of the room: each stands in the middle, while the targets at the edges stay live. */
export type PanelName = 'note' | 'child' | 'correct' | 'part' | 'manner' | 'end' | 'more';
