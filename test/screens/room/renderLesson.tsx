import { act, screen } from '@testing-library/react';
import type { SessionHeader } from '../../../src/model/session.ts';
import { loadPanels } from '../../../src/screens/room/LaterPanel.tsx';
import { Room } from '../../../src/screens/room/Room.tsx';
import { ServicesContext } from '../../../src/screens/services.ts';
import { Lesson } from '../../recorder/fakes/lesson.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { deskWith } from './renderRoom.tsx';

// Panels are brought when they are asked for first; here they are there from the start.
await loadPanels();

/** A real session on a clock that the test turns, with the room around it. */
export async function renderLesson(header: SessionHeader) {
  const lesson = await new Lesson({ header }).begin();
  const services = fakeServices({ recorder: deskWith(lesson.session) });
  const room = (
    <ServicesContext value={null}>
      <Room session="session-1" />
    </ServicesContext>
  );
  const view = renderScreen(room, services, '/room/session-1');
  return {
    ...view,
    lesson,
    /** Time goes by until this second of the session. */
    until: (seconds: number) => act(() => lesson.until(seconds * 1000)),
    /** A finger goes down on the button of this name, at this moment of the hand-driven clock. */
    touch: (name: string | RegExp) => touchAt(screen.getByRole('button', { name }), lesson.clock.page),
    heading: () => screen.getByRole('heading', { level: 1 }).textContent?.trim() ?? '',
    lead: () => view.container.querySelector('.look-lead')?.textContent ?? '',
    below: () => view.container.querySelector('.look-then')?.textContent ?? '',
  };
}

export function touchAt(element: Element, page: number): void {
  const event = new PointerEvent('pointerdown', { bubbles: true, cancelable: true, button: 0 });
  Object.defineProperty(event, 'timeStamp', { value: page });
  act(() => void element.dispatchEvent(event));
}
