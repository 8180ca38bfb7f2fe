import { problem } from '../../../src/kernel/result.ts';
import type { LiveSession } from '../../../src/recorder/liveSession.ts';
import type { RoomSnapshot } from '../../../src/recorder/roomSnapshot.ts';
import { loadPanels } from '../../../src/screens/room/LaterPanel.tsx';
import { Room } from '../../../src/screens/room/Room.tsx';
import { type RecorderDesk, type Services, ServicesContext } from '../../../src/screens/services.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { FakeLive } from './fakeLive.ts';

// Panels are brought when they are asked for first; here they are there from the start.
await loadPanels();

/** A desk on which one session lies. */
export function deskWith(live: LiveSession, id = 'session-1'): RecorderDesk {
  let here = true;
  const listeners = new Set<() => void>();
  return {
    current: () => (here ? live : null),
    currentId: () => (here ? id : null),
    open: async () => problem('session.running'),
    resume: async () => problem('session.notThere'),
    close: () => {
      here = false;
      for (const listener of listeners) listener();
    },
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

export function renderRoom(snapshot: RoomSnapshot, changes: Partial<Services> = {}) {
  const live = new FakeLive(snapshot);
  const recorder = deskWith(live);
  const services = fakeServices({ recorder, ...changes });
  // The recording screen has the core's words only.
  const room = (
    <ServicesContext value={null}>
      <Room session="session-1" />
    </ServicesContext>
  );
  const view = renderScreen(room, services, '/room/session-1');
  return { ...view, live, services, recorder };
}
