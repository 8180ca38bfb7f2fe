// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { ObserversPage } from '../../../../src/screens/study/observers/ObserversPage.tsx';
import { addObserver } from '../../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

async function withQuill() {
  const services = fakeServices();
  const { study } = await studyWithClass(services);
  const observer = must(await addObserver(services.deps, study.id, 'Quill'));
  renderScreen(<ObserversPage />, services, '/study/observers');
  await screen.findByText('Quill');
  const keys = async () => must(await services.store.observer(observer.id))?.keyMap ?? null;
  return { services, study, observer, keys };
}

describe('observers', () => {
  it('are added, renamed and taken off the list, which can be undone', async () => {
    const { services, study } = await withQuill();
    const names = async () => must(await services.store.observers(study.id)).map((one) => one.name);
    await userEvent.type(screen.getByLabelText('Initials or working name'), 'Marsh');
    await userEvent.click(screen.getByRole('button', { name: 'Add this observer' }));
    await screen.findByText('Marsh');
    await userEvent.click(screen.getByRole('button', { name: 'Remove Quill' }));
    await waitFor(async () => expect(await names()).toEqual(['Marsh']));
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(async () => expect(await names()).toEqual(['Marsh', 'Quill']));
  });

  it('get another key for an action; a key that means something already is refused with what it means', async () => {
    const { keys } = await withQuill();
    await userEvent.click(screen.getByRole('button', { name: 'Keys of Quill' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Add a key for cannot see' }));
    await userEvent.keyboard('1');
    expect(await screen.findByText(/^1 already means code 1\./)).toBeTruthy();
    expect((await keys())?.keys['1'] ?? 'code:1').toBe('code:1');
    await userEvent.keyboard('z');
    await waitFor(async () => expect((await keys())?.keys.z).toBe('cannot see'));
  });

  it('can switch the keys off altogether (WCAG 2.2, 2.1.4)', async () => {
    const { keys } = await withQuill();
    await userEvent.click(screen.getByRole('button', { name: 'Keys of Quill' }));
    await userEvent.click(await screen.findByRole('checkbox', { name: /Keys work in the room/ }));
    await waitFor(async () => expect((await keys())?.on).toBe(false));
  });

  it('like the room their own way, which can be taken back; eyes-up begins with prompts recalled', async () => {
    const { services, observer } = await withQuill();
    const manner = async () => must(await services.store.observer(observer.id))?.manner;
    await userEvent.click(screen.getByRole('button', { name: 'Layout and hand of Quill' }));
    await userEvent.click(await screen.findByRole('radio', { name: /^eyes-up/ }));
    await waitFor(async () =>
      expect(await manner()).toEqual({ layout: 'eyes-up', hand: 'right', confirm: true, remind: true }),
    );
    await userEvent.click(await screen.findByRole('button', { name: 'Undo' }));
    await waitFor(async () =>
      expect(await manner()).toEqual({ layout: 'plan', hand: 'right', confirm: true, remind: false }),
    );
    await userEvent.click(screen.getByRole('radio', { name: /^left-handed/ }));
    await waitFor(async () => expect((await manner())?.hand).toBe('left'));
    await userEvent.click(screen.getByRole('checkbox', { name: /^Answer each touch/ }));
    await waitFor(async () => expect((await manner())?.confirm).toBe(false));
  });

  it('get a key for the cover like any other', async () => {
    const { keys } = await withQuill();
    await userEvent.click(screen.getByRole('button', { name: 'Keys of Quill' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Add a key for cover the glass' }));
    await userEvent.keyboard('c');
    expect(await screen.findByText(/^C already means cover the glass\./)).toBeTruthy();
    await userEvent.keyboard('x');
    await waitFor(async () => expect((await keys())?.keys.x).toBe('cover'));
  });
});
