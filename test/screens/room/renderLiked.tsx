import { act } from '@testing-library/react';
import type { Manner } from '../../../src/model/observer.ts';
import type { RoomSnapshot } from '../../../src/recorder/roomSnapshot.ts';
import { loadPanels } from '../../../src/screens/room/LaterPanel.tsx';
import { Room } from '../../../src/screens/room/Room.tsx';
import { ServicesContext } from '../../../src/screens/services.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { must } from '../support/studyOf.ts';
import { FakeLive } from './fakeLive.ts';
import { deskWith } from './renderRoom.tsx';

// Panels are brought when they are asked for first; here they are there from the start.
await loadPanels();

/** The room of an observer who likes it so; `wakeUp` lets everything that waits come to its end. */
export async function renderLiked(manner: Partial<Manner>, snapshot: RoomSnapshot) {
  const live = new FakeLive(snapshot);
  const waiting = new Set<() => void>();
  const device = fakeDevice({
    wakeIn: (_, wake) => {
      waiting.add(wake);
      return () => waiting.delete(wake);
    },
  });
  const services = fakeServices({ recorder: deskWith(live), device });
  const { observer } = snapshot.state.header;
  const record = {
    ...observer,
    study: 'study-1',
    keyMap: null,
    manner: { layout: 'plan', hand: 'right', confirm: true, remind: false, ...manner },
    removed: false,
    revision: { counter: 0, writer: 'w' },
  } as const;
  must(await services.store.put({ observers: [{ record, previous: null }] }));
  const view = renderScreen(
    <ServicesContext value={null}>
      <Room session="session-1" />
    </ServicesContext>,
    services,
    '/room/session-1',
  );
  // The store answers a moment later.
  await act(async () => {
    for (let i = 0; i < 5; i += 1) await Promise.resolve();
  });
  const wakeUp = (): void =>
    act(() => {
      for (const wake of [...waiting]) {
        waiting.delete(wake);
        wake();
      }
    });
  const kept = async () => must(await services.store.observer(observer.id))?.manner;
  return { ...view, live, services, wakeUp, kept };
}
